import { Field, ID, Int, ObjectType } from '@nestjs/graphql';
import { Column, CreateDateColumn, Entity, PrimaryGeneratedColumn } from 'typeorm';
import { Node } from '../common/graphql/node.js';
import { type FitRecipe, type FittedCorrelation } from '../numerics/fitting/fit.types.js';

/** A point that carried no weight, and why. */
export interface ExcludedPointRecord {
  seriesId: string;
  index: number;
  reason: string;
}

/** A series of the pair that carried no weight, and why. */
export interface LeftOutSeriesRecord {
  seriesId: string;
  reason: string;
}

/** One computation of a correlation from a chosen set of points: kept once, never changed. */
@Entity({ name: 'fits' })
@ObjectType({ implements: () => [Node] })
export class Fit implements Node {
  @PrimaryGeneratedColumn('uuid', { primaryKeyConstraintName: 'pk_fits' })
  @Field(() => ID)
  id: string;

  @Column('uuid', { name: 'pair_id' })
  pairId: string;

  @Column('int')
  @Field(() => Int, { description: 'Consecutive within the pair, from 1.' })
  number: number;

  @Column('jsonb')
  recipe: FitRecipe;

  @Column('jsonb', { name: 'excluded_points' })
  excluded: ExcludedPointRecord[];

  @Column('jsonb', { name: 'left_out_series' })
  leftOut: LeftOutSeriesRecord[];

  /** With the offsets keyed by series id. */
  @Column('jsonb')
  result: FittedCorrelation;

  @Column('text', { name: 'engine_version' })
  @Field()
  engineVersion: string;

  @Column('uuid', { name: 'created_by_id' })
  createdById: string;

  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' })
  @Field()
  createdAt: Date;
}
