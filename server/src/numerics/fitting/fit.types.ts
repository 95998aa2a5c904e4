import { type CorrelationFormName } from '../correlations/form.js';
import { type EngineProblem } from './engine-error.js';

/** One datum, SI. The uncertainties are standard and independent from point to point. */
export interface FitPoint {
  /** K */
  temperature: number;
  /** Pa */
  pressure: number;
  /** m²/s */
  diffusivity: number;
  /** m²/s; null only under equal weights */
  diffusivityUncertainty: number | null;
  /** K */
  temperatureUncertainty: number | null;
  /** Pa */
  pressureUncertainty: number | null;
}

export interface FitSeries {
  /** Names the series in the result; of no influence on the numbers */
  key: string;
  /** Relative standard uncertainty that all points share (vapour pressure, thermometer, tube, calibration) */
  commonRelativeUncertainty: number | null;
  points: readonly FitPoint[];
}

export type Objective = 'LN_DIFFUSIVITY' | 'DIFFUSIVITY';
export type Weighting = 'STATED' | 'EFFECTIVE_VARIANCE' | 'EQUAL';
export type Loss = 'LEAST_SQUARES' | 'HUBER' | 'BISQUARE';
export type SeriesEffect = 'POOLED' | 'RANDOM_INTERCEPT' | 'RANDOM_INTERCEPT_AND_SLOPE';

export interface FitRecipe {
  form: CorrelationFormName;
  objective: Objective;
  weighting: Weighting;
  loss: Loss;
  seriesEffect: SeriesEffect;
  /** Assigned between-series standard deviation of ln D; null: estimated from three series on, else `USUAL_DEVIATION` */
  betweenSeriesDeviation: number | null;
  /** T0, K */
  referenceTemperature: number;
  /** P0, Pa */
  referencePressure: number;
}

export interface FittedParameter {
  symbol: string;
  value: number;
  standardUncertainty: number | null;
  /** UCUM code */
  unit: string;
}

export interface Validity {
  /** K */
  temperatureMinimum: number;
  temperatureMaximum: number;
  /** Pa */
  pressureMinimum: number;
  pressureMaximum: number;
  /** MEASURED where the exponent of P is fitted, STATED where D ∝ 1/P is assumed */
  pressureBasis: 'MEASURED' | 'STATED';
}

/** Variances of the deviation of ln D of one laboratory: intercept + slope (ln T − centre)² + 2 covariance (ln T − centre). */
export interface BetweenSeries {
  /** τ², at the centre */
  intercept: number;
  /** τ_n², of the exponent of T */
  slope: number;
  covariance: number;
  /** ln T, T in K */
  centre: number;
}

/** What is needed to evaluate a correlation; survives JSON. */
export interface EvaluableCorrelation {
  form: CorrelationFormName;
  parameters: FittedParameter[];
  /** In the order of `parameters`, in the product of their units */
  covariance: number[][];
  /** ν of Student's t; null when the uncertainties are known and normal */
  degreesOfFreedom: number | null;
  referenceTemperature: number;
  referencePressure: number;
  validity: Validity;
  betweenSeries: BetweenSeries | null;
}

export interface FitStatistics {
  pointCount: number;
  seriesCount: number;
  /** N − p, the ν of `chiSquare` */
  residualDegreesOfFreedom: number;
  /** Of the whitened residuals of the model fitted, before any scaling; null under equal weights */
  chiSquare: number | null;
  reducedChiSquare: number | null;
  /** Probability that χ² exceeds `chiSquare` when the stated uncertainties hold */
  chiSquareProbability: number | null;
  /** Relative (objective LN_DIFFUSIVITY) or m²/s: scatter of the points, within the series for random effects */
  residualStandardError: number | null;
  /** By maximum likelihood of the objective's response; null for robust losses and where points are too few */
  aicc: number | null;
  /** τ, of ln D */
  betweenSeriesDeviation: number | null;
  /** STATED: estimated from the data as stated; ASSIGNED: given, or the usual value */
  betweenSeriesOrigin: 'STATED' | 'ASSIGNED' | null;
  /** Of the offsets of the series about their weighted mean; null for a single series */
  cochranQ: number | null;
  /** max(0, (Q − (g − 1))/Q) */
  iSquared: number | null;
}

/** Mean deviation of ln D of a series from a correlation, and the standard uncertainty the series itself gives it. */
export interface SeriesOffset {
  key: string;
  offset: number;
  standardUncertainty: number;
}

export interface FittedPoint {
  /** D of the correlation at the point, m²/s */
  fitted: number;
  /** ln D − ln fitted */
  lnDeviation: number;
  /** Residual over its standard uncertainty as the fit sees it, scale and between-series part included */
  standardizedResidual: number;
  /** Robust weight, 0 to 1; 1 for least squares */
  weight: number;
  /** √ of the variance that weighted the point, relative to D, before scaling; under equal weights the estimated one */
  relativeUncertainty: number;
}

/** A doubt that stops nothing. */
export interface FitWarning {
  code: string;
  message: string;
  path: string | null;
}

export interface FittedCorrelation extends EvaluableCorrelation {
  statistics: FitStatistics;
  correlationMatrix: number[][];
  /** In the order of the series given */
  seriesOffsets: SeriesOffset[];
  /** In the order of the series and points given */
  points: FittedPoint[][];
  warnings: FitWarning[];
}

export type FitOutcome = { ok: true; fit: FittedCorrelation } | { ok: false; problems: EngineProblem[] };
