import { Field, ID, ObjectType } from '@nestjs/graphql';
import { Column, CreateDateColumn, Entity, PrimaryGeneratedColumn } from 'typeorm';
import { Node } from '../common/graphql/node.js';

@Entity({ name: 'gas_pairs' })
@ObjectType({ implements: () => [Node] })
export class GasPair implements Node {
  @PrimaryGeneratedColumn('uuid', { primaryKeyConstraintName: 'pk_gas_pairs' })
  @Field(() => ID)
  id: string;

  @Column('uuid', { name: 'first_id' })
  firstId: string;

  @Column('uuid', { name: 'second_id' })
  secondId: string;

  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' })
  createdAt: Date;
}
