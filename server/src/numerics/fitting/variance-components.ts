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

/** Starts of the intercept and slope deviations, in units of the scatter of all points; the best end is taken. */
const STARTS: readonly (readonly [number, number])[] = [
  [1, 1],
  [1, 0.1],
  [0.1, 1],
  [0.1, 0.1],
];

/**
 * Variance components by (restricted) maximum likelihood, over the factor of G = L Lᵀ and the root of the scale's
 * excess, so that the search has no bounds: a component of zero is an ordinary stationary point.
 *
 * @param series products of responses of order 1
 */
export function fitComponents(
  series: readonly SeriesProducts[],
  model: ComponentModel,
  restricted: boolean,
): FittedComponents {
  const evaluate = (point: Float64Array): Valued => {
    const at = likelihoodAt(series, componentsOf(point, model), restricted);
    return { value: Number.isFinite(at.value) ? at.value : Infinity, gradient: gradientOf(point, at, model) };
  };
  let best: FittedComponents | null = null;
  for (const start of startsOf(model)) {
    const components = componentsOf(minimise(evaluate, start), model);
    const at = likelihoodAt(series, components, restricted);
    if (!best || at.value < best.at.value - 1e-9) best = { components, at };
  }
  return best!;
}

/** The variables of the search: root of the scale's excess, then the factor of G as far as it is estimated. */
function startsOf({ leastScale, estimated }: ComponentModel): Float64Array[] {
  const scale = Math.max(0.3, 1 - leastScale);
  if (estimated === 'NONE') return [new Float64Array([scale])];
  if (estimated === 'INTERCEPT') return [1, 0.1].map((a) => new Float64Array([scale, a]));
  return STARTS.map(([a, c]) => new Float64Array([scale, a, 0, c]));
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
