import { Field, ID, Int, ObjectType, registerEnumType } from '@nestjs/graphql';
import { Column, CreateDateColumn, Entity, PrimaryGeneratedColumn, UpdateDateColumn, VersionColumn } from 'typeorm';
import { Node } from '../common/graphql/node.js';
import { type VersionStatusName } from './version-rules.js';

export enum VersionStatus {
  DRAFT = 'DRAFT',
  IN_REVIEW = 'IN_REVIEW',
  RETURNED = 'RETURNED',
  APPROVED = 'APPROVED',
  RELEASED = 'RELEASED',
  SUPERSEDED = 'SUPERSEDED',
  WITHDRAWN = 'WITHDRAWN',
}
registerEnumType(VersionStatus, { name: 'VersionStatus' });

/** A range in P that the editor states instead of the fit's own, Pa, and why. */
export interface StatedPressureRange {
  minimum: number;
  maximum: number;
  reason: string;
}

@Entity({ name: 'data_sheet_versions' })
@ObjectType({ implements: () => [Node] })
export class DataSheetVersion implements Node {
  @PrimaryGeneratedColumn('uuid', { primaryKeyConstraintName: 'pk_data_sheet_versions' })
  @Field(() => ID)
  id: string;

  @Column('uuid', { name: 'data_sheet_id' })
  dataSheetId: string;

  @Column('int')
  edition: number;

  @Column('int')
  revision: number;

  @Column('text', { default: 'DRAFT' })
  @Field(() => VersionStatus)
  status: VersionStatusName;

  @Column('uuid', { name: 'fit_id' })
  fitId: string;

  @Column('text')
  @Field()
  summary: string;

  @Column('text', { name: 'change_note', nullable: true })
  @Field(() => String, { nullable: true, description: 'Required from the second version on.' })
  changeNote: string | null;

  /** Words of the editor by section of the sheet. */
  @Column('jsonb', { default: {} })
  remarks: Record<string, string>;

  @Column('jsonb', { nullable: true })
  validity: StatedPressureRange | null;

  @Column('uuid', { name: 'prepared_by_id' })
  preparedById: string;

  @VersionColumn({ name: 'lock_version', default: 1 })
  @Field(() => Int, { description: 'Counts changes; an update names the one it was made from.' })
  lockVersion: number;

  @Column('uuid', { name: 'superseded_by_id', nullable: true })
  supersededById: string | null;

  @Column('timestamptz', { name: 'withdrawn_at', nullable: true })
  @Field(() => Date, { nullable: true })
  withdrawnAt: Date | null;

  @Column('uuid', { name: 'withdrawn_by_id', nullable: true })
  withdrawnById: string | null;

  @Column('text', { name: 'withdrawal_reason', nullable: true })
  @Field(() => String, { nullable: true })
  withdrawalReason: string | null;

  @Column('timestamptz', { name: 'doi_registered_at', nullable: true })
  @Field(() => Date, { nullable: true, description: 'Null while the registrar has not confirmed the DOI.' })
  doiRegisteredAt: Date | null;

  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' })
  @Field()
  createdAt: Date;

  @UpdateDateColumn({ name: 'updated_at', type: 'timestamptz' })
  @Field()
  updatedAt: Date;
}

@ObjectType({ description: 'A change of state: who, when and why.' })
export class VersionEvent {
  @Field({ description: 'draft, change, submit, approve, return, release, supersede, withdraw' })
  action: string;
  @Field(() => VersionStatus, { description: 'The state it led to.' })
  status: VersionStatusName;
  @Field(() => String, { nullable: true })
  remark: string | null;
  @Field()
  at: Date;
  personId: string;
}
