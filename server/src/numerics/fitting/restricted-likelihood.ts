import { propagated } from '../linear-algebra/matrices.js';
import { inverseAndLogDeterminant, type Symmetric2 } from '../linear-algebra/positive-definite.js';

/**
 * What one series contributes to the likelihood: weighted cross products of its design X (N×p), its random-effects
 * design Z = [1, z] and its response y, with W = diag(1/v). The cost of an evaluation does not depend on N.
 */
export interface SeriesProducts {
  /** p×p, row after row */
  readonly xx: Float64Array;
  /** p×2, row after row */
  readonly xz: Float64Array;
  readonly zz: Symmetric2;
  readonly xy: Float64Array;
  readonly zy: readonly [number, number];
  readonly yy: number;
  readonly count: number;
  /** Known variance of the intercept of this series (its common uncertainty squared) */
  readonly commonVariance: number;
}

/** Variances: `scale` φ of the points' v, and the between-series matrix G = [[intercept, covariance], [·, slope]]. */
export interface VarianceComponents {
  readonly scale: number;
  readonly between: Symmetric2;
}

export interface LikelihoodAt {
  /** −2 ln likelihood up to a constant that the components do not change */
  readonly value: number;
  /** Its derivative by the scale */
  readonly byScale: number;
  /** By intercept, covariance (which stands twice in G) and slope */
  readonly byBetween: Symmetric2;
  /** Generalised least squares: solution and (XᵀV⁻¹X)⁻¹ */
  readonly beta: Float64Array;
  readonly covariance: number[][];
  /** (y − Xβ)ᵀ V⁻¹ (y − Xβ) */
  readonly quadratic: number;
  /** F = XᵀV⁻¹Z of each series, p×2 row after row */
  readonly designPulls: Float64Array;
  /** Zᵀ V⁻¹ (y − Xβ) of each series, two by two; times G it is the best linear unbiased predictor of its deviation */
  readonly pulls: Float64Array;
}

/**
 * −2 ln likelihood of y = Xβ + Zb + e, V_i = φ D_i + Z_i (G + diag(c_i², 0)) Z_iᵀ, with its gradient.
 *
 * Source: D. A. Harville, *J. Am. Stat. Assoc.* 72 (1977) 320, equations 3.3 and 4.1; V is inverted by Woodbury's
 * identity in the form ZᵀV⁻¹Z = (φI + AG)⁻¹A, A = ZᵀWZ, which holds for a singular G and loses no digits.
 *
 * @param restricted REML; otherwise maximum likelihood
 */
export function likelihoodAt(
  series: readonly SeriesProducts[],
  { scale, between }: VarianceComponents,
  restricted: boolean,
): LikelihoodAt {
  const size = series[0]!.xy.length;
  const sums = new WhitenedSums(series.length, size);
  for (let s = 0; s < series.length; s++) sums.add(s, series[s]!, scale, between);

  const { inverse: covariance, lnDeterminant } = inverseAndLogDeterminant(sums.information);
  const beta = new Float64Array(size);
  let quadratic = sums.yvy;
  for (let k = 0; k < size; k++) {
    for (let l = 0; l < size; l++) beta[k]! += covariance[k]![l]! * sums.right[l]!;
  }
  for (let k = 0; k < size; k++) quadratic -= beta[k]! * sums.right[k]!;

  const byBetween = { intercept: 0, covariance: 0, slope: 0 };
  // tr(P V) = N − p and yᵀP y = quadratic hold for the whole of V; what G has of them is taken off for φ.
  let ofScale = -quadratic - (restricted ? size : 0);
  const pulls = sums.responsePulls;
  for (let s = 0; s < series.length; s++) {
    const { count, commonVariance } = series[s]!;
    for (let k = 0; k < size; k++) {
      pulls[2 * s]! -= beta[k]! * sums.designPulls[2 * (s * size + k)]!;
      pulls[2 * s + 1]! -= beta[k]! * sums.designPulls[2 * (s * size + k) + 1]!;
    }
    const q0 = pulls[2 * s]!;
    const q1 = pulls[2 * s + 1]!;
    // ZᵀPZ less the squares of ZᵀPy, element by element.
    let intercept = sums.zvz[3 * s]! - q0 * q0;
    let mixed = sums.zvz[3 * s + 1]! - q0 * q1;
    let slope = sums.zvz[3 * s + 2]! - q1 * q1;
    for (let k = 0; restricted && k < size; k++) {
      for (let l = 0; l < size; l++) {
        const at = 2 * s * size;
        const c = covariance[k]![l]!;
        intercept -= sums.designPulls[at + 2 * k]! * c * sums.designPulls[at + 2 * l]!;
        mixed -= sums.designPulls[at + 2 * k]! * c * sums.designPulls[at + 2 * l + 1]!;
        slope -= sums.designPulls[at + 2 * k + 1]! * c * sums.designPulls[at + 2 * l + 1]!;
      }
    }
    byBetween.intercept += intercept;
    byBetween.covariance += 2 * mixed;
    byBetween.slope += slope;
    const g = between;
    ofScale += count - (g.intercept + commonVariance) * intercept - 2 * g.covariance * mixed - g.slope * slope;
  }
  return {
    value: sums.lnDeterminant + (restricted ? lnDeterminant : 0) + quadratic,
    byScale: ofScale / scale,
    byBetween,
    beta,
    covariance,
    quadratic,
    designPulls: sums.designPulls,
    pulls,
  };
}

/** The part of the covariance of β that comes from the series' deviations: C (Σ F_i G_i F_iᵀ) C. */
export function betweenCovariance(
  series: readonly SeriesProducts[],
  { between }: VarianceComponents,
  { covariance, designPulls }: LikelihoodAt,
): number[][] {
  const size = covariance.length;
  const middle = Array.from({ length: size }, () => new Array<number>(size).fill(0));
  series.forEach(({ commonVariance }, s) => {
    const pull = (k: number) => [designPulls[2 * (s * size + k)]!, designPulls[2 * (s * size + k) + 1]!] as const;
    for (let i = 0; i < size; i++) {
      for (let j = 0; j < size; j++) {
        middle[i]![j]! += form(pull(i), { ...between, intercept: between.intercept + commonVariance }, pull(j));
      }
    }
  });
  return propagated(covariance, middle);
}

function form(left: readonly [number, number], g: Symmetric2, right: readonly [number, number]): number {
  return (
    left[0] * (g.intercept * right[0] + g.covariance * right[1]) +
    left[1] * (g.covariance * right[0] + g.slope * right[1])
  );
}

/** The cross products of all series with V⁻¹ in the place of W: summed for β, kept apart for the series' deviations. */
class WhitenedSums {
  readonly information: number[][];
  readonly right: Float64Array;
  yvy = 0;
  lnDeterminant = 0;
  /** ZᵀV⁻¹Z, three by three: intercept, covariance, slope */
  readonly zvz: Float64Array;
  /** XᵀV⁻¹Z, p×2 row after row */
  readonly designPulls: Float64Array;
  /** ZᵀV⁻¹y, two by two */
  readonly responsePulls: Float64Array;

  constructor(
    seriesCount: number,
    private readonly size: number,
  ) {
    this.information = Array.from({ length: size }, () => new Array<number>(size).fill(0));
    this.right = new Float64Array(size);
    this.zvz = new Float64Array(3 * seriesCount);
    this.designPulls = new Float64Array(2 * size * seriesCount);
    this.responsePulls = new Float64Array(2 * seriesCount);
  }

  add(s: number, one: SeriesProducts, scale: number, between: Symmetric2): void {
    const { size, designPulls, responsePulls, zvz } = this;
    const { xx, xz, zz: a, xy, zy } = one;
    const g00 = between.intercept + one.commonVariance;
    const { covariance: g01, slope: g11 } = between;
    // B = φI + A G, not symmetric; its inverse is applied to what Zᵀ has made of Z, X and y.
    const b00 = scale + a.intercept * g00 + a.covariance * g01;
    const b01 = a.intercept * g01 + a.covariance * g11;
    const b10 = a.covariance * g00 + a.slope * g01;
    const b11 = scale + a.covariance * g01 + a.slope * g11;
    const determinant = b00 * b11 - b01 * b10;
    zvz[3 * s] = (b11 * a.intercept - b01 * a.covariance) / determinant;
    zvz[3 * s + 1] = (b11 * a.covariance - b01 * a.slope) / determinant;
    zvz[3 * s + 2] = (b00 * a.slope - b10 * a.covariance) / determinant;
    const y0 = (b11 * zy[0] - b01 * zy[1]) / determinant;
    const y1 = (b00 * zy[1] - b10 * zy[0]) / determinant;
    responsePulls[2 * s] = y0;
    responsePulls[2 * s + 1] = y1;
    const at = 2 * s * size;
    for (let k = 0; k < size; k++) {
      designPulls[at + 2 * k] = (b11 * xz[2 * k]! - b01 * xz[2 * k + 1]!) / determinant;
      designPulls[at + 2 * k + 1] = (b00 * xz[2 * k + 1]! - b10 * xz[2 * k]!) / determinant;
    }
    // V⁻¹ = (W − W Z G (ZᵀV⁻¹))/φ applied to what stands on the right.
    for (let k = 0; k < size; k++) {
      const h0 = g00 * xz[2 * k]! + g01 * xz[2 * k + 1]!;
      const h1 = g01 * xz[2 * k]! + g11 * xz[2 * k + 1]!;
      this.right[k]! += (xy[k]! - h0 * y0 - h1 * y1) / scale;
      for (let l = 0; l <= k; l++) {
        const lessened = xx[k * size + l]! - h0 * designPulls[at + 2 * l]! - h1 * designPulls[at + 2 * l + 1]!;
        this.information[k]![l]! += lessened / scale;
      }
    }
    this.yvy += (one.yy - form(zy, { intercept: g00, covariance: g01, slope: g11 }, [y0, y1])) / scale;
    this.lnDeterminant += (one.count - 2) * Math.log(scale) + Math.log(determinant);
  }
}
