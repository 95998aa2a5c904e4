import { inverseGram } from '../linear-algebra/qr.js';
import { covarianceAt, linearise, polish, type Polished } from './polish.js';
import { WhitenedProblem, type LeastSquaresProblem, type LeastSquaresSolution } from './problem.js';
import { standardNormals } from '../random/normals.js';
import { ProjectedProblem } from './variable-projection.js';
import { warmStart, type WarmStartOptions } from './warm-start.js';

/** Raised when no minimum was reached from any start, or the Jacobian there does not determine every parameter. */
export class NoConvergence extends Error {}

/** A column-scaled Jacobian worse than this is looked at again from other starts before it is believed. */
const BADLY_CONDITIONED = 1e10;
/** A start is often wrong by one unit throughout; a common factor also keeps interchangeable terms in their order. */
const COMMON_FACTORS = [0.1, 10, 0.01, 100];
const RESTARTS = 24;
const SEED = 1;

/** Tried one after the other until one converges. */
const ATTEMPTS: readonly (WarmStartOptions & { readonly polishSteps: number })[] = [
  { iterations: 4, damping: 1e-2, polishSteps: 300 },
  { iterations: 0, damping: 1, polishSteps: 1000 },
  { iterations: 300, damping: 1, polishSteps: 2000 },
];

/**
 * Solves a nonlinear least-squares problem to the precision of the machine.
 *
 * Whitened and scaled, with the linear parameters projected out, a few steps of `ml-levenberg-marquardt` approach the
 * minimum; a QR polish on the analytic Jacobian finishes. Longer runs, then restarts from seeded perturbations, follow
 * only when that does not converge or ends badly conditioned. Deterministic.
 *
 * @param start of all parameters; the linear ones are of no influence
 * @throws {NoConvergence} when no start leads to a minimum
 */
export function solveLeastSquares(problem: LeastSquaresProblem, start: ArrayLike<number>): LeastSquaresSolution {
  const whitened = new WhitenedProblem(problem);
  const projected = new ProjectedProblem(whitened, problem.linear);
  const first = Float64Array.from(start);
  let best: LeastSquaresSolution | null = null;
  for (const { from, options } of attempts(projected, first)) {
    const found = attempt(projected, from, options);
    if (found && (!best || found.sumOfSquares < best.sumOfSquares)) best = found;
    if (best && best.condition < BADLY_CONDITIONED) return best;
  }
  if (!best) throw new NoConvergence('The least-squares iteration found no minimum from any start');
  return best;
}

type AttemptOptions = (typeof ATTEMPTS)[number];

function* attempts(
  projected: ProjectedProblem,
  start: Float64Array,
): Iterable<{ from: Float64Array; options: AttemptOptions }> {
  for (const options of ATTEMPTS) yield { from: start, options };
  for (const factor of COMMON_FACTORS) {
    yield {
      from: start.map((value, k) => (projected.nonlinear.includes(k) ? value * factor : value)),
      options: ATTEMPTS[0]!,
    };
  }
  const normals = standardNormals(SEED);
  for (let i = 0; i < RESTARTS; i++) {
    const from = start.slice();
    for (const k of projected.nonlinear) from[k]! *= Math.exp((1 + i / 8) * normals.next());
    yield { from, options: ATTEMPTS[0]! };
  }
}

function attempt(
  projected: ProjectedProblem,
  from: Float64Array,
  options: AttemptOptions,
): LeastSquaresSolution | null {
  const alpha = warmStart(projected, projected.pick(from), options);
  const warmed = projected.at(alpha)?.parameters ?? from;
  const polished = polish(projected.problem, warmed, options.polishSteps);
  return polished.isConverged ? describe(projected.problem, polished) : null;
}

function describe(problem: WhitenedProblem, polished: Polished): LeastSquaresSolution | null {
  const residuals = new Float64Array(problem.count);
  problem.residuals(polished.parameters, residuals);
  const at = linearise(problem, polished.parameters, residuals);
  if (!at) return null;
  return {
    parameters: polished.parameters,
    sumOfSquares: polished.sumOfSquares,
    degreesOfFreedom: problem.count - problem.parameterCount,
    unscaledCovariance: covarianceAt(at),
    relativeOffset: polished.relativeOffset,
    condition: conditionOf(inverseGram(at.factors)),
  };
}

/** |R| |R⁻¹| in the Frobenius norm, of an R whose columns have unit length: √n √tr (RᵀR)⁻¹. */
function conditionOf(inverse: readonly (readonly number[])[]): number {
  return Math.sqrt(inverse.length * inverse.reduce((trace, row, k) => trace + row[k]!, 0));
}
