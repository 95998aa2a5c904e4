import {
  applyQTransposed,
  columnNorms,
  factorise,
  inverseGram,
  solveUpper,
  type QrFactors,
} from '../linear-algebra/qr.js';
import { type WhitenedProblem } from './problem.js';

/**
 * Householder-QR Levenberg–Marquardt with step rejection, then plain Gauss–Newton steps judged by their length.
 *
 * Tests on the sum of squares stall near the square root of the machine precision, because close to the minimum the
 * sum no longer moves; the length of the Gauss–Newton step still does, down to the precision itself. Methods:
 * J. J. Moré, *Lecture Notes in Mathematics* 630 (1978) 105; convergence: D. M. Bates, D. G. Watts, *Technometrics* 23
 * (1981) 179.
 */
export interface Polished {
  readonly parameters: Float64Array;
  readonly sumOfSquares: number;
  readonly relativeOffset: number;
  /** Length of the last Gauss–Newton step relative to the parameters */
  readonly stepLength: number;
  readonly isConverged: boolean;
}

const CONVERGED_OFFSET = 1e-10;
/** A relative step this short moves no digit that is asked for; it decides where the residuals are rounding noise. */
const CONVERGED_STEP = 1e-11;
/** So is a step that moves the model by this part of the response; it decides for parameters that are zero. */
const CONVERGED_MOVE = 1e-14;
const SMALL_OFFSET = 1e-3;
const STEPS_WITHOUT_GAIN = 2;
/** Steps this short, relative to the parameters, are rounding. */
const ROUNDING = 4 * Number.EPSILON;

/** One linearisation: the Gauss–Newton step, and what tells how far the point is from the minimum. */
interface Linearisation {
  readonly factors: QrFactors;
  readonly norms: Float64Array;
  /** Qᵀ r */
  readonly rotated: Float64Array;
  readonly relativeOffset: number;
}

/** Linearises at `parameters`, whose residuals are given; null where the Jacobian is not finite or has a zero column. */
export function linearise(
  problem: WhitenedProblem,
  parameters: Float64Array,
  residuals: Float64Array,
): Linearisation | null {
  const { count, parameterCount } = problem;
  const jacobian = new Float64Array(count * parameterCount);
  problem.jacobian(parameters, jacobian);
  const norms = columnNorms(jacobian, count, parameterCount);
  if (!norms.every((norm) => norm > 0 && Number.isFinite(norm))) return null;
  for (let k = 0; k < parameterCount; k++) {
    for (let i = k * count; i < (k + 1) * count; i++) jacobian[i]! /= norms[k]!;
  }
  const factors = factorise(jacobian, count, parameterCount);
  const rotated = residuals.slice();
  applyQTransposed(factors, rotated);
  return { factors, norms, rotated, relativeOffset: relativeOffset(rotated, parameterCount) };
}

/** Bates & Watts: length of the residuals' part in the tangent plane over that across it, each per degree of freedom. */
function relativeOffset(rotated: Float64Array, parameterCount: number): number {
  let tangential = 0;
  let normal = 0;
  for (let i = 0; i < rotated.length; i++) {
    if (i < parameterCount) tangential += rotated[i]! ** 2;
    else normal += rotated[i]! ** 2;
  }
  if (tangential === 0) return 0;
  return Math.sqrt(tangential / parameterCount / (normal / Math.max(1, rotated.length - parameterCount)));
}

/** (JᵀJ)⁻¹ at the linearisation, in the units of the parameters. */
export function covarianceAt({ factors, norms }: Linearisation): number[][] {
  return inverseGram(factors).map((row, i) => row.map((value, j) => value / (norms[i]! * norms[j]!)));
}

export function polish(problem: WhitenedProblem, start: Float64Array, maximumSteps: number): Polished {
  const descended = descend(problem, start, maximumSteps);
  return gaussNewton(problem, descended);
}

/** Levenberg–Marquardt until the relative offset is small or nothing improves any more. */
function descend(problem: WhitenedProblem, start: Float64Array, maximumSteps: number): Float64Array {
  let parameters = start;
  const residuals = new Float64Array(problem.count);
  let sum = problem.residuals(parameters, residuals);
  let damping = 1e-3;
  let growth = 2;
  let at = linearise(problem, parameters, residuals);
  for (let step = 0; step < maximumSteps && at && at.relativeOffset > SMALL_OFFSET && damping < 1e16; step++) {
    const trial = parameters.slice();
    const move = dampedStep(at, damping);
    for (let k = 0; k < trial.length; k++) trial[k]! += move[k]! / at.norms[k]!;
    const trialResiduals = new Float64Array(problem.count);
    const trialSum = problem.residuals(trial, trialResiduals);
    const gain = (sum - trialSum) / predictedGain(at, move, damping);
    const next = trialSum < sum ? linearise(problem, trial, trialResiduals) : null;
    if (next) {
      parameters = trial;
      sum = trialSum;
      at = next;
      // H. B. Nielsen, *Damping parameter in Marquardt's method*, IMM-REP-1999-05, DTU 1999.
      damping *= Math.max(1 / 3, 1 - (2 * gain - 1) ** 3);
      growth = 2;
    } else {
      damping *= growth;
      growth *= 2;
    }
  }
  return parameters;
}

/** The minimiser of |r − J s|² + damping |s|² in scaled parameters, from R and Qᵀr alone. */
function dampedStep({ factors, rotated }: Linearisation, damping: number): Float64Array {
  const { columns, rows, vectors, diagonal } = factors;
  const augmented = new Float64Array(2 * columns * columns);
  for (let k = 0; k < columns; k++) {
    for (let i = 0; i < k; i++) augmented[k * 2 * columns + i] = vectors[k * rows + i]!;
    augmented[k * 2 * columns + k] = diagonal[k]!;
    augmented[k * 2 * columns + columns + k] = Math.sqrt(damping);
  }
  const right = new Float64Array(2 * columns);
  right.set(rotated.subarray(0, columns));
  const small = factorise(augmented, 2 * columns, columns);
  applyQTransposed(small, right);
  return solveUpper(small, right);
}

/** |r|² − |r − J s|² of the linear model, which for a damped step is |J s|² + 2 damping |s|². */
function predictedGain({ factors }: Linearisation, step: Float64Array, damping: number): number {
  const { columns, rows, vectors, diagonal } = factors;
  let gain = 0;
  for (let i = 0; i < columns; i++) {
    let moved = diagonal[i]! * step[i]!;
    for (let k = i + 1; k < columns; k++) moved += vectors[k * rows + i]! * step[k]!;
    gain += moved * moved + 2 * damping * step[i]! ** 2;
  }
  return gain;
}

/** Full Gauss–Newton steps while they get shorter; returns the point whose next step is the shortest. */
function gaussNewton(problem: WhitenedProblem, start: Float64Array): Polished {
  const residuals = new Float64Array(problem.count);
  let parameters = start;
  let best: Polished | null = null;
  for (let sinceBest = 0; sinceBest < STEPS_WITHOUT_GAIN; sinceBest++) {
    const sumOfSquares = problem.residuals(parameters, residuals);
    const at = Number.isFinite(sumOfSquares) ? linearise(problem, parameters, residuals) : null;
    if (!at) break;
    const step = solveUpper(at.factors, at.rotated);
    const next = parameters.map((value, k) => value + step[k]! / at.norms[k]!);
    const stepLength = relativeLength(step, at.norms, parameters);
    const isConverged =
      at.relativeOffset < CONVERGED_OFFSET ||
      stepLength < CONVERGED_STEP ||
      step.every((value) => Math.abs(value) <= CONVERGED_MOVE * problem.norm);
    if (!best || stepLength < best.stepLength) {
      best = { parameters, sumOfSquares, relativeOffset: at.relativeOffset, stepLength, isConverged };
      sinceBest = -1;
    }
    if (stepLength <= ROUNDING) break;
    parameters = next;
  }
  return (
    best ?? {
      parameters: start,
      sumOfSquares: Infinity,
      relativeOffset: Infinity,
      stepLength: Infinity,
      isConverged: false,
    }
  );
}

/** Largest step of a parameter relative to the parameter. */
function relativeLength(step: Float64Array, norms: Float64Array, parameters: Float64Array): number {
  let longest = 0;
  for (let k = 0; k < step.length; k++) {
    const relative = Math.abs(step[k]! / norms[k]!) / Math.max(Math.abs(parameters[k]!), Number.MIN_VALUE);
    if (!(relative <= longest)) longest = relative;
  }
  return longest;
}
