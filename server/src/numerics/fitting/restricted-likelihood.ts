import { propagated } from '../linear-algebra/matrices.js';
import { fromSymmetric, inverseAndLogDeterminant, type Symmetric2 } from '../linear-algebra/positive-definite.js';

/**
 * What one series contributes to the likelihood: weighted cross products of its design X (N×p), its random-effects
 * design Z = [1, z] and its response y, with W = diag(1/v). The cost of an evaluation does not depend on N.
 */
export interface SeriesProducts {
  readonly xx: number[][];
  /** p×2 */
  readonly xz: number[][];
  readonly zz: Symmetric2;
  readonly xy: number[];
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
  /** By scale */
  readonly byScale: number;
  /** By intercept, covariance (counted twice in G) and slope */
  readonly byBetween: Symmetric2;
  /** Generalised least squares: solution and (XᵀV⁻¹X)⁻¹ */
  readonly beta: number[];
  readonly covariance: number[][];
  /** (y − Xβ)ᵀ V⁻¹ (y − Xβ) */
  readonly quadratic: number;
  /** Covariance of beta that comes from the between-series part alone */
  readonly betweenCovariance: number[][];
  /** Zᵀ V⁻¹ (y − Xβ) of each series; G times it is the best linear unbiased predictor of the series' deviation */
  readonly pulls: (readonly [number, number])[];
}

/**
 * −2 ln likelihood of y = Xβ + Zb + e, V_i = φ D_i + Z_i (G + diag(c_i², 0)) Z_iᵀ, with its gradient.
 *
 * Source: D. A. Harville, *J. Am. Stat. Assoc.* 72 (1977) 320, equations 3.3 and 4.1; V is inverted by Woodbury's
 * identity in the form (ZᵀV⁻¹Z) = (φI + AG)⁻¹A, A = ZᵀWZ, which holds for a singular G and loses no digits.
 *
 * @param restricted REML; otherwise maximum likelihood
 */
export function likelihoodAt(
  series: readonly SeriesProducts[],
  { scale, between }: VarianceComponents,
  restricted: boolean,
): LikelihoodAt {
  const parts = series.map((one) => seriesAt(one, scale, between));
  const size = series[0]!.xy.length;
  const information = sumMatrices(
    parts.map(({ xvx }) => xvx),
    size,
  );
  const right = Array.from({ length: size }, (_, k) => sum(parts.map(({ xvy }) => xvy[k]!)));
  const { inverse: covariance, lnDeterminant } = inverseAndLogDeterminant(information);
  const beta = covariance.map((row) => sum(row.map((value, k) => value * right[k]!)));
  const quadratic = sum(parts.map(({ yvy }) => yvy)) - sum(beta.map((value, k) => value * right[k]!));

  const gradient = { intercept: 0, covariance: 0, slope: 0 };
  let traceBetween = 0;
  let quadraticBetween = 0;
  const betweenCovariance = Array.from({ length: size }, () => new Array<number>(size).fill(0));
  const pulls = parts.map((part) => {
    const q0 = part.zvy[0] - sum(beta.map((value, k) => value * part.xvz[k]![0]));
    const q1 = part.zvy[1] - sum(beta.map((value, k) => value * part.xvz[k]![1]));
    // ZᵀPZ of the series: ZᵀV⁻¹Z less what the estimation of β takes from it.
    const taken = restricted ? sandwiched(part.xvz, covariance) : ZERO;
    const pzz = fromSymmetric((key) => part.zvz[key] - taken[key]);
    const g = part.between;
    gradient.intercept += pzz.intercept - q0 * q0;
    gradient.covariance += 2 * (pzz.covariance - q0 * q1);
    gradient.slope += pzz.slope - q1 * q1;
    traceBetween += g.intercept * pzz.intercept + 2 * g.covariance * pzz.covariance + g.slope * pzz.slope;
    quadraticBetween += g.intercept * q0 * q0 + 2 * g.covariance * q0 * q1 + g.slope * q1 * q1;
    addBetween(betweenCovariance, part.xvz, g);
    return [q0, q1] as const;
  });

  const freedom = sum(series.map(({ count }) => count)) - (restricted ? size : 0);
  return {
    value: sum(parts.map(({ lnDeterminant: ln }) => ln)) + (restricted ? lnDeterminant : 0) + quadratic,
    byScale: (freedom - traceBetween - (quadratic - quadraticBetween)) / scale,
    byBetween: gradient,
    beta,
    covariance,
    quadratic,
    betweenCovariance: propagated(covariance, betweenCovariance),
    pulls,
  };
}

const ZERO: Symmetric2 = { intercept: 0, covariance: 0, slope: 0 };

/** The products of one series with V⁻¹ in the place of W. */
function seriesAt(one: SeriesProducts, scale: number, between: Symmetric2) {
  const { xx, xz, zz: a, xy, zy, yy, count, commonVariance } = one;
  const g = { ...between, intercept: between.intercept + commonVariance };
  // B = φI + A G, not symmetric.
  const b00 = scale + a.intercept * g.intercept + a.covariance * g.covariance;
  const b01 = a.intercept * g.covariance + a.covariance * g.slope;
  const b10 = a.covariance * g.intercept + a.slope * g.covariance;
  const b11 = scale + a.covariance * g.covariance + a.slope * g.slope;
  const determinant = b00 * b11 - b01 * b10;
  const solve = (u: number, v: number) =>
    [(b11 * u - b01 * v) / determinant, (b00 * v - b10 * u) / determinant] as const;
  const [t00] = solve(a.intercept, a.covariance);
  const [t01, t11] = solve(a.covariance, a.slope);
  const zvy = solve(zy[0], zy[1]);
  const xvz = xz.map((row) => solve(row[0]!, row[1]!));
  // V⁻¹ = (W − W Z G (Zᵀ V⁻¹))/φ applied to what is on the right.
  const lessen = (left: readonly number[], right: readonly [number, number]) =>
    left[0]! * (g.intercept * right[0] + g.covariance * right[1]) +
    left[1]! * (g.covariance * right[0] + g.slope * right[1]);
  return {
    between: g,
    zvz: { intercept: t00, covariance: t01, slope: t11 },
    zvy,
    xvz,
    xvx: xx.map((row, i) => row.map((value, j) => (value - lessen(xz[i]!, xvz[j]!)) / scale)),
    xvy: xy.map((value, i) => (value - lessen(xz[i]!, zvy)) / scale),
    yvy: (yy - lessen(zy, zvy)) / scale,
    lnDeterminant: (count - 2) * Math.log(scale) + Math.log(determinant),
  };
}

/** Fᵀ C F for F = XᵀV⁻¹Z of a series. */
function sandwiched(f: readonly (readonly [number, number])[], covariance: readonly (readonly number[])[]): Symmetric2 {
  const result = { intercept: 0, covariance: 0, slope: 0 };
  for (let i = 0; i < f.length; i++) {
    for (let j = 0; j < f.length; j++) {
      const c = covariance[i]![j]!;
      result.intercept += f[i]![0] * c * f[j]![0];
      result.covariance += f[i]![0] * c * f[j]![1];
      result.slope += f[i]![1] * c * f[j]![1];
    }
  }
  return result;
}

/** Adds F G Fᵀ. */
function addBetween(target: number[][], f: readonly (readonly [number, number])[], g: Symmetric2): void {
  for (let i = 0; i < f.length; i++) {
    for (let j = 0; j < f.length; j++) {
      const [a, b] = f[i]!;
      const [c, d] = f[j]!;
      target[i]![j]! += a * (g.intercept * c + g.covariance * d) + b * (g.covariance * c + g.slope * d);
    }
  }
}

function sumMatrices(matrices: readonly number[][][], size: number): number[][] {
  return Array.from({ length: size }, (_, i) =>
    Array.from({ length: size }, (__, j) => sum(matrices.map((matrix) => matrix[i]![j]!))),
  );
}

function sum(values: readonly number[]): number {
  let total = 0;
  for (const value of values) total += value;
  return total;
}
