import { type BetweenSeries } from './fit.types.js';

/** What a fit found, about the centre of the data; `beta` is ln D0 at the centre, then the shape. */
export interface Estimate {
  readonly beta: Float64Array;
  /** Covariance of beta, all parts together */
  readonly covariance: number[][];
  /** The part of it that comes from assigned or stated common deviations, taken as known */
  readonly knownCovariance: number[][];
  /** Degrees of freedom of the other part */
  readonly degreesOfFreedom: number;
  /** (XᵀWX)⁻¹ of the points alone: W their robust weights over their variances, neither scaled nor with series parts */
  readonly pointCovariance: number[][];
  /** Variances of the points' relative residuals, before the scale */
  readonly variances: Float64Array;
  /** The common factor on these variances */
  readonly scale: number;
  /** Robust weights, 0 to 1 */
  readonly robustWeights: Float64Array;
  /** Of the whitened residuals, before the scale */
  readonly chiSquare: number;
  /** Marginal variances of the points: scaled, between-series part included */
  readonly marginalVariances: Float64Array;
  /** Mean residuals that belong to the series rather than to the points; one per row */
  readonly seriesParts: Float64Array;
  readonly betweenSeries: BetweenSeries | null;
  /** τ, and whether it was estimated from the data (STATED) or taken as known (ASSIGNED); null when there is neither */
  readonly deviation: { readonly value: number; readonly origin: 'STATED' | 'ASSIGNED' } | null;
  /** −2 ln likelihood at its maximum and the parameters it counts; null where there is no likelihood */
  readonly likelihood: { readonly minusTwoLog: number; readonly parameterCount: number } | null;
}
