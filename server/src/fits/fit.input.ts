import { Field, Float, ID, InputType, registerEnumType } from '@nestjs/graphql';
import { CorrelationForm } from './correlation.types.js';

export enum Objective {
  LN_DIFFUSIVITY = 'LN_DIFFUSIVITY',
  DIFFUSIVITY = 'DIFFUSIVITY',
}
registerEnumType(Objective, { name: 'Objective' });

export enum Weighting {
  STATED = 'STATED',
  EFFECTIVE_VARIANCE = 'EFFECTIVE_VARIANCE',
  EQUAL = 'EQUAL',
}
registerEnumType(Weighting, {
  name: 'Weighting',
  valuesMap: { STATED: { description: 'u(D) alone' }, EFFECTIVE_VARIANCE: { description: 'u(D), u(T) and u(P)' } },
});

export enum Loss {
  LEAST_SQUARES = 'LEAST_SQUARES',
  HUBER = 'HUBER',
  BISQUARE = 'BISQUARE',
}
registerEnumType(Loss, { name: 'Loss' });

export enum SeriesEffect {
  POOLED = 'POOLED',
  RANDOM_INTERCEPT = 'RANDOM_INTERCEPT',
  RANDOM_INTERCEPT_AND_SLOPE = 'RANDOM_INTERCEPT_AND_SLOPE',
}
registerEnumType(SeriesEffect, { name: 'SeriesEffect' });

@InputType()
export class ExcludedPointInput {
  @Field(() => ID)
  pointId: string;
  @Field()
  reason: string;
}

@InputType({ description: 'Why an accepted series of the pair carries no weight.' })
export class LeftOutSeriesInput {
  @Field(() => ID)
  seriesId: string;
  @Field()
  reason: string;
}

@InputType()
export class FitCorrelationInput {
  @Field(() => ID)
  pairId: string;
  @Field(() => CorrelationForm)
  form: CorrelationForm;
  @Field(() => [ID], {
    nullable: true,
    description: 'Accepted series to use; all accepted series of the pair when absent.',
  })
  seriesIds?: string[] | null;
  @Field(() => [ExcludedPointInput], { nullable: true })
  excludedPoints?: ExcludedPointInput[] | null;
  @Field(() => [LeftOutSeriesInput], { nullable: true, description: 'Reasons for accepted series that are not used.' })
  leftOutSeries?: LeftOutSeriesInput[] | null;
  @Field(() => Objective, { nullable: true, defaultValue: Objective.LN_DIFFUSIVITY })
  objective?: Objective | null;
  @Field(() => Weighting, { nullable: true, defaultValue: Weighting.EFFECTIVE_VARIANCE })
  weighting?: Weighting | null;
  @Field(() => Loss, { nullable: true, defaultValue: Loss.LEAST_SQUARES })
  loss?: Loss | null;
  @Field(() => SeriesEffect, { nullable: true, defaultValue: SeriesEffect.RANDOM_INTERCEPT_AND_SLOPE })
  seriesEffect?: SeriesEffect | null;
  @Field(() => Float, {
    nullable: true,
    description:
      "Assigned between-series deviation of ln D; with one or two series the group's own value, else 0.03, is assigned when absent, and a warning says so.",
  })
  betweenSeriesDeviation?: number | null;
  @Field(() => Float, { nullable: true, defaultValue: 298.15, description: 'K' })
  referenceTemperature?: number | null;
  @Field(() => Float, { nullable: true, defaultValue: 101325, description: 'Pa' })
  referencePressure?: number | null;
}
