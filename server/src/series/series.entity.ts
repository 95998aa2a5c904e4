import { Field, Float, ID, Int, ObjectType, registerEnumType } from '@nestjs/graphql';
import { Column, CreateDateColumn, Entity, PrimaryGeneratedColumn, VersionColumn } from 'typeorm';
import { Node } from '../common/graphql/node.js';
import { Warning } from '../common/problem.js';
import { type SeriesStatusName } from './series-rules.js';

export enum SeriesStatus {
  DRAFT = 'DRAFT',
  SUBMITTED = 'SUBMITTED',
  RETURNED = 'RETURNED',
  ACCEPTED = 'ACCEPTED',
  RETIRED = 'RETIRED',
}
registerEnumType(SeriesStatus, { name: 'SeriesStatus' });

export enum DataOrigin {
  TABLE = 'TABLE',
  GRAPH = 'GRAPH',
  SMOOTHED = 'SMOOTHED',
  EQUATION = 'EQUATION',
  TUBE_RUN = 'TUBE_RUN',
}
registerEnumType(DataOrigin, { name: 'DataOrigin' });

export enum PressureOrigin {
  STATED = 'STATED',
  ASSIGNED = 'ASSIGNED',
  REDUCED_BY_SOURCE = 'REDUCED_BY_SOURCE',
}
registerEnumType(PressureOrigin, { name: 'PressureOrigin' });

export enum UncertaintyOrigin {
  STATED = 'STATED',
  ASSIGNED = 'ASSIGNED',
}
registerEnumType(UncertaintyOrigin, { name: 'UncertaintyOrigin' });

@Entity({ name: 'series' })
@ObjectType({ implements: () => [Node] })
export class Series implements Node {
  @PrimaryGeneratedColumn('uuid', { primaryKeyConstraintName: 'pk_series' })
  @Field(() => ID)
  id: string;

  @Column('uuid', { name: 'pair_id' })
  pairId: string;

  @Column('text')
  @Field()
  title: string;

  @Column('text')
  @Field()
  source: string;

  @Column('text')
  @Field()
  method: string;

  @Column('text', { nullable: true })
  @Field(() => String, { nullable: true })
  apparatus: string | null;

  @Column('text', { name: 'data_origin', default: 'TABLE' })
  @Field(() => DataOrigin)
  dataOrigin: DataOrigin;

  @Column('text', { default: 'DRAFT' })
  @Field(() => SeriesStatus)
  status: SeriesStatusName;

  @Column('double precision', { name: 'common_relative_uncertainty', nullable: true })
  @Field(() => Float, {
    nullable: true,
    description:
      'Relative standard uncertainty common to all points of the series (vapour pressure, thermometer, tube, calibration).',
  })
  commonRelativeUncertainty: number | null;

  @Column('uuid', { name: 'same_data_as_id', nullable: true })
  sameDataAsId: string | null;

  @Column('uuid', { name: 'file_id', nullable: true })
  fileId: string | null;

  @Column('jsonb', { default: [] })
  @Field(() => [Warning])
  warnings: Warning[];

  @Column('uuid', { name: 'created_by_id' })
  createdById: string;

  @Column('uuid', { name: 'submitted_by_id', nullable: true })
  submittedById: string | null;

  @VersionColumn({ name: 'lock_version', default: 1 })
  @Field(() => Int, { description: 'Counts changes; an update names the one it was made from.' })
  lockVersion: number;

  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' })
  @Field()
  createdAt: Date;
}

@ObjectType()
export class SeriesPoint {
  @Field(() => ID)
  id: string;
  @Field(() => Float, { description: 'K' })
  temperature: number;
  @Field(() => Float, { description: 'Pa' })
  pressure: number;
  @Field(() => PressureOrigin)
  pressureOrigin: PressureOrigin;
  @Field(() => Float, { description: 'm²/s' })
  diffusivity: number;
  @Field(() => Float, {
    nullable: true,
    description: 'm²/s, standard uncertainty independent from point to point',
  })
  diffusivityUncertainty: number | null;
  @Field(() => UncertaintyOrigin, { nullable: true })
  uncertaintyOrigin: UncertaintyOrigin | null;
  @Field(() => Float, { nullable: true, description: 'K, standard uncertainty' })
  temperatureUncertainty: number | null;
  @Field(() => Float, { nullable: true, description: 'Pa, standard uncertainty' })
  pressureUncertainty: number | null;
  @Field(() => Float, { nullable: true, description: 'of the first substance as displayed' })
  moleFraction: number | null;
  @Field(() => Int, { nullable: true })
  replicates: number | null;
}

@ObjectType({ description: 'A change of state: who, when and why.' })
export class SeriesEvent {
  @Field({ description: 'create, change, submit, accept, return, retire' })
  action: string;
  @Field(() => SeriesStatus, { description: 'The state it led to.' })
  status: SeriesStatusName;
  @Field(() => String, { nullable: true })
  remark: string | null;
  @Field()
  at: Date;
  personId: string;
}
