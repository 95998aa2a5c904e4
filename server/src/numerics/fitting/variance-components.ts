import { minimise, type Valued } from '../least-squares/minimise.js';
import { type Symmetric2 } from '../linear-algebra/positive-definite.js';
import {
  likelihoodAt,
  type LikelihoodAt,
  type SeriesProducts,
  type VarianceComponents,
} from './restricted-likelihood.js';

/** Which components are estimated, and what the others are. */
export interface ComponentModel {
  /** φ never falls below this: 1 where uncertainties are stated */
  readonly leastScale: number;
  /** NONE: G is `assigned`; otherwise its intercept, or intercept and slope, are estimated */
  readonly estimated: 'NONE' | 'INTERCEPT' | 'INTERCEPT_AND_SLOPE';
  readonly assigned: Symmetric2;
}

export interface FittedComponents {
  readonly components: VarianceComponents;
  readonly at: LikelihoodAt;
}

/**
 * Variance components by (restricted) maximum likelihood, over the factor of G = L Lᵀ and the root of the scale's
 * excess, so that the search has no bounds: a component of zero is an ordinary stationary point.
 *
 * @param series products of responses of order 1
 * @param near   components to start from; otherwise large and small ones are tried, and the better end is taken
 */
export function fitComponents(
  series: readonly SeriesProducts[],
  model: ComponentModel,
  restricted: boolean,
  near: VarianceComponents | null,
): FittedComponents {
  const evaluate = (point: Float64Array): Valued => {
    const at = likelihoodAt(series, componentsOf(point, model), restricted);
    return { value: Number.isFinite(at.value) ? at.value : Infinity, gradient: gradientOf(point, at, model) };
  };
  const ends = startsOf(model, near).map((start) => {
    const components = componentsOf(minimise(evaluate, start), model);
    return { components, at: likelihoodAt(series, components, restricted) };
  });
  return ends.reduce((best, end) => (end.at.value < best.at.value - EQUALLY_GOOD ? end : best));
}

/** Ends whose −2 ln likelihoods differ by less are one; the first is kept, whatever rounding says. */
const EQUALLY_GOOD = 1e-9;
/** Deviations to start from, in units of the scatter of all points: wide enough apart to find a second minimum. */
const STARTS = [1, 0.1];
/** No component starts at zero exactly: the gradient there vanishes, minimum or not. */
const OFF_ZERO = 0.05;

/** The variables of the search: root of the scale's excess, then the factor of G as far as it is estimated. */
function startsOf({ leastScale, estimated }: ComponentModel, near: VarianceComponents | null): Float64Array[] {
  const size = { NONE: 1, INTERCEPT: 2, INTERCEPT_AND_SLOPE: 4 }[estimated];
  const starts = near ? [factorOf(near, leastScale)] : STARTS.map((a) => [0.3, a, 0, a]);
  return starts.map((start) => Float64Array.from(start.slice(0, size)));
}

function factorOf({ scale, between }: VarianceComponents, leastScale: number): number[] {
  const a = Math.sqrt(between.intercept) || OFF_ZERO;
  const b = between.covariance / a;
  const c = Math.sqrt(Math.max(0, between.slope - b * b));
  return [Math.sqrt(Math.max(0, scale - leastScale)), a, b, c].map((value) =>
    Math.abs(value) < OFF_ZERO ? OFF_ZERO : value,
  );
}

function componentsOf(point: Float64Array, { leastScale, estimated, assigned }: ComponentModel): VarianceComponents {
  const scale = leastScale + point[0]! ** 2;
  if (estimated === 'NONE') return { scale, between: assigned };
  const [, a, b = 0, c = 0] = point;
  return { scale, between: { intercept: a! * a!, covariance: a! * b, slope: b * b + c * c } };
}

function gradientOf(point: Float64Array, at: LikelihoodAt, { estimated }: ComponentModel): Float64Array {
  const ofScale = 2 * point[0]! * at.byScale;
  if (estimated === 'NONE') return new Float64Array([ofScale]);
  const [, a, b = 0, c = 0] = point;
  const { intercept, covariance, slope } = at.byBetween;
  const ofIntercept = 2 * a! * intercept + b * covariance;
  if (estimated === 'INTERCEPT') return new Float64Array([ofScale, ofIntercept]);
  return new Float64Array([ofScale, ofIntercept, a! * covariance + 2 * b * slope, 2 * c * slope]);
}
