import { Field, ID, ObjectType } from '@nestjs/graphql';
import { Column, CreateDateColumn, Entity, PrimaryGeneratedColumn } from 'typeorm';
import { Node } from '../common/graphql/node.js';

@Entity({ name: 'data_sheets' })
@ObjectType({ implements: () => [Node] })
export class DataSheet implements Node {
  @PrimaryGeneratedColumn('uuid', { primaryKeyConstraintName: 'pk_data_sheets' })
  @Field(() => ID)
  id: string;

  /** Made by the database from the sheet's number. */
  @Column({ type: 'text', insert: false, update: false })
  @Field({ description: 'Short, permanent, readable: DS-0042' })
  code: string;

  @Column('uuid', { name: 'pair_id' })
  pairId: string;

  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' })
  createdAt: Date;
}
