import { Field, ID, ObjectType, registerEnumType } from '@nestjs/graphql';
import { Column, CreateDateColumn, Entity, PrimaryGeneratedColumn } from 'typeorm';
import { Node } from '../common/graphql/node.js';
import { ROLES, type RoleName } from '../common/viewer.js';

export const Role = Object.fromEntries(ROLES.map((role) => [role, role])) as { [R in RoleName]: R };
registerEnumType(Role, { name: 'Role' });

/** Somebody who can sign in. Only the name, ORCID and roles leave the server. */
@Entity({ name: 'people' })
@ObjectType({ implements: () => [Node] })
export class Person implements Node {
  @PrimaryGeneratedColumn('uuid', { primaryKeyConstraintName: 'pk_people' })
  @Field(() => ID)
  id: string;

  /** In lower case. */
  @Column('text')
  email: string;

  @Column('text')
  @Field()
  name: string;

  @Column('text', { nullable: true })
  @Field(() => String, { nullable: true })
  orcid: string | null;

  @Column('text', { array: true })
  @Field(() => [Role])
  roles: RoleName[];

  /** PHC string of argon2id; null until an invitation is accepted. */
  @Column('text', { name: 'password_hash', nullable: true, select: false })
  passwordHash: string | null;

  @Column('timestamptz', { name: 'disabled_at', nullable: true })
  disabledAt: Date | null;

  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' })
  createdAt: Date;
}
