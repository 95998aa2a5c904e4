import { Field, Float, ID, Int, ObjectType } from '@nestjs/graphql';
import { Problem, Warning } from '../common/problem.js';
import { SeriesPoint, UncertaintyOrigin } from '../series/series.entity.js';
import { Correlation } from './correlation.types.js';
import { Fit } from './fit.entity.js';

@ObjectType()
export class FitStatistics {
  @Field(() => Int)
  pointCount: number;
  @Field(() => Int)
  seriesCount: number;
  @Field(() => Int)
  residualDegreesOfFreedom: number;
  @Field(() => Float, { nullable: true, description: 'Null where no uncertainties were stated.' })
  chiSquare: number | null;
  @Field(() => Float, { nullable: true })
  reducedChiSquare: number | null;
  @Field(() => Float, {
    nullable: true,
    description: 'Probability that χ² exceeds `chiSquare` when the stated uncertainties hold.',
  })
  chiSquareProbability: number | null;
  @Field(() => Float, { nullable: true, description: 'Relative (objective LN_DIFFUSIVITY) or m²/s' })
  residualStandardError: number | null;
  @Field(() => Float, { nullable: true, description: 'Null for robust losses and where points ≤ parameters + 2.' })
  aicc: number | null;
  @Field(() => Float, {
    nullable: true,
    description: 'Between-series standard deviation of ln D, estimated or assigned; null when there is neither.',
  })
  betweenSeriesDeviation: number | null;
  @Field(() => UncertaintyOrigin, { nullable: true })
  betweenSeriesOrigin: UncertaintyOrigin | `${UncertaintyOrigin}` | null;
  @Field(() => Float, { nullable: true, description: "Cochran's Q of the series' offsets; null for a single series." })
  cochranQ: number | null;
  @Field(() => Float, {
    nullable: true,
    description: 'I²: share of the scatter of the offsets that is between series, 0 to 1.',
  })
  iSquared: number | null;
}

@ObjectType()
export class SeriesOffset {
  @Field(() => Float, { description: 'Mean deviation of ln D from the correlation, and its standard uncertainty' })
  offset: number;
  @Field(() => Float)
  standardUncertainty: number;
  /** Resolved to `series`. */
  key: string;
}

@ObjectType()
export class ExcludedPoint {
  @Field()
  reason: string;
  @Field(() => SeriesPoint)
  point: SeriesPoint;
  /** Resolved to `series`. */
  seriesId: string;
}

@ObjectType({ description: 'A series of the pair that carried no weight.' })
export class LeftOutSeries {
  @Field()
  reason: string;
  /** Resolved to `series`. */
  seriesId: string;
}

@ObjectType({ description: 'How the points of one series lie to the correlation; columns in the order of its points.' })
export class SeriesAnalysis {
  @Field(() => ID)
  seriesId: string;
  @Field({ description: 'False for a series left out.' })
  carriesWeight: boolean;
  @Field(() => Float, { description: 'Mean deviation of ln D from the correlation.' })
  offset: number;
  @Field(() => Float)
  offsetStandardUncertainty: number;
  @Field(() => Float64Array, { description: 'm²/s, the correlation at each point' })
  fitted: Float64Array;
  @Field(() => Float64Array, { description: 'ln D − ln of the correlation' })
  lnDeviations: Float64Array;
  @Field(() => Float64Array, { description: 'Residual over its standard uncertainty' })
  standardizedResiduals: Float64Array;
  @Field(() => Float64Array, { description: '0 for a point left out; else the robust weight, 1 for least squares' })
  weights: Float64Array;
}

@ObjectType({ description: 'All that the workspace shows of a fit, kept or not.' })
export class FitAnalysis {
  @Field(() => Correlation)
  correlation: Correlation;
  @Field(() => FitStatistics)
  statistics: FitStatistics;
  @Field(() => [[Float]], { description: 'Correlation coefficients of the parameters.' })
  correlationMatrix: number[][];
  @Field(() => Float, { nullable: true, description: 'τ_n: between-series standard deviation of the exponent of T.' })
  betweenSeriesSlopeDeviation: number | null;
  @Field(() => [SeriesAnalysis], { description: 'Series used, then those left out.' })
  series: SeriesAnalysis[];
  @Field(() => [Warning])
  warnings: Warning[];
}

@ObjectType()
export class FitPayload {
  @Field(() => Fit, { nullable: true })
  fit: Fit | null;
  @Field(() => [Problem])
  problems: Problem[];
}

@ObjectType()
export class FitPreviewPayload {
  @Field(() => FitAnalysis, { nullable: true })
  analysis: FitAnalysis | null;
  @Field(() => [Problem])
  problems: Problem[];
}

@ObjectType({ description: 'An estimate of kinetic theory or an empirical method along a column of states.' })
export class PairEstimate {
  @Field()
  method: string;
  @Field()
  label: string;
  @Field(() => Float64Array, { description: 'm²/s' })
  diffusivities: Float64Array;
  @Field(() => Float, { description: 'Mean error as usually quoted for the method.' })
  usualRelativeError: number;
  @Field()
  source: string;
}
