import { type Loss } from './fit.types.js';

/** The consistency factor of the median absolute deviation: the upper quartile of the standard normal distribution. */
const NORMAL_QUARTILE = 0.6744897501960817;
/** ψ(t)/t and ψ′(t) of a loss. */
interface Influence {
  weight(t: number): number;
  slope(t: number): number;
}

/**
 * The constants give 95 % efficiency for normal errors: P. J. Huber, *Robust Statistics*, Wiley 1981 (1.345);
 * A. E. Beaton, J. W. Tukey, *Technometrics* 16 (1974) 147, with P. W. Holland, R. E. Welsch, *Commun. Statist.* A6
 * (1977) 813 (4.685).
 */
const HUBER: Influence = {
  weight: (t) => (Math.abs(t) <= 1.345 ? 1 : 1.345 / Math.abs(t)),
  slope: (t) => (Math.abs(t) <= 1.345 ? 1 : 0),
};
const BISQUARE: Influence = {
  weight: (t) => (Math.abs(t) < 4.685 ? (1 - (t / 4.685) ** 2) ** 2 : 0),
  slope: (t) => (Math.abs(t) < 4.685 ? (1 - (t / 4.685) ** 2) * (1 - 5 * (t / 4.685) ** 2) : 0),
};

export function influenceOf(loss: Exclude<Loss, 'LEAST_SQUARES'>): Influence {
  return loss === 'HUBER' ? HUBER : BISQUARE;
}

/**
 * Median of the absolute values over the normal quartile: the scale of residuals about zero that outliers do not move.
 *
 * @param least below which the scale does not fall, because the residuals of exact data are rounding
 */
export function medianScale(whitened: Float64Array, least: number): number {
  const sizes = whitened.map(Math.abs).sort();
  const middle = sizes.length >> 1;
  const median = sizes.length % 2 === 1 ? sizes[middle]! : (sizes[middle - 1]! + sizes[middle]!) / 2;
  return Math.max(median / NORMAL_QUARTILE, least);
}

/**
 * The factor that turns (JᵀWJ)⁻¹ into the covariance of an M-estimate:
 * κ² [Σ (ψ s)²/(N − p)]/[mean ψ′]², κ = 1 + p var(ψ′)/(N mean²). Source: Huber 1981, §7.6.
 *
 * @param whitened residuals over their standard uncertainties
 * @param scale    s
 */
export function robustFactor(
  influence: Influence,
  whitened: Float64Array,
  scale: number,
  parameterCount: number,
): number {
  const count = whitened.length;
  let squares = 0;
  let slopes = 0;
  let slopeSquares = 0;
  for (const residual of whitened) {
    const t = residual / scale;
    squares += (influence.weight(t) * residual) ** 2;
    slopes += influence.slope(t);
    slopeSquares += influence.slope(t) ** 2;
  }
  const mean = slopes / count;
  const variance = (slopeSquares - count * mean * mean) / (count - 1);
  const kappa = 1 + (parameterCount * variance) / (count * mean * mean);
  return (kappa ** 2 * (squares / (count - parameterCount))) / mean ** 2;
}
