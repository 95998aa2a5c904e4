import { EigenvalueDecomposition, Matrix } from 'ml-matrix';

/** A smooth function of a few variables: its value and gradient at a point. */
export interface Valued {
  readonly value: number;
  readonly gradient: Float64Array;
}

const STEPS = 200;
const DIFFERENCE = 1e-5;
/** Below this step, values no longer tell better from worse; the gradient still does. */
const FINE = 1e-6;
const SETTLED = 1e-14;

/**
 * Newton's method for a few variables of order 1, with the Hessian by differences of the analytic gradient, its
 * eigenvalues made positive, and halving of steps that do not descend. Converges to the precision of the gradient.
 *
 * @returns the point reached; a stationary one unless the function has none
 */
export function minimise(evaluate: (point: Float64Array) => Valued, start: Float64Array): Float64Array {
  let point = start;
  let here = evaluate(point);
  let shortest = Infinity;
  for (let step = 0; step < STEPS; step++) {
    const move = newtonStep(evaluate, point, here.gradient);
    const length = move.reduce((longest, value) => Math.max(longest, Math.abs(value)), 0);
    if (length < FINE && length >= shortest / 2) return point;
    if (length < FINE) shortest = length;
    const next = length < FINE ? moved(point, move, 1) : descended(evaluate, point, here.value, move);
    if (!next) return point;
    point = next;
    here = evaluate(point);
    if (length < SETTLED) return point;
  }
  return point;
}

function newtonStep(
  evaluate: (point: Float64Array) => Valued,
  point: Float64Array,
  gradient: Float64Array,
): Float64Array {
  const size = point.length;
  const hessian = new Matrix(size, size);
  for (let k = 0; k < size; k++) {
    const width = DIFFERENCE * Math.max(1, Math.abs(point[k]!));
    const beside = evaluate(shifted(point, k, width)).gradient;
    for (let i = 0; i < size; i++) hessian.set(i, k, (beside[i]! - gradient[i]!) / width);
  }
  if (!hessian.to1DArray().every(Number.isFinite)) return downhill(gradient);
  const { realEigenvalues, eigenvectorMatrix } = new EigenvalueDecomposition(
    hessian.add(hessian.transpose()).mul(0.5),
    {
      assumeSymmetric: true,
    },
  );
  const floor = 1e-8 * realEigenvalues.reduce((largest, value) => Math.max(largest, Math.abs(value)), Number.MIN_VALUE);
  const step = new Float64Array(size);
  realEigenvalues.forEach((eigenvalue, e) => {
    let along = 0;
    for (let i = 0; i < size; i++) along += eigenvectorMatrix.get(i, e) * gradient[i]!;
    // A flat direction is left alone: stepping along it would only follow the rounding of the gradient.
    const curvature = Math.abs(eigenvalue);
    if (curvature <= floor) return;
    for (let i = 0; i < size; i++) step[i]! -= (along / curvature) * eigenvectorMatrix.get(i, e);
  });
  const longest = step.reduce((length, value) => Math.max(length, Math.abs(value)), 0);
  return longest > 2 ? step.map((value) => (2 * value) / longest) : step;
}

/** A short step down the gradient, for a point at the edge of where the function is defined; none where it is not. */
function downhill(gradient: Float64Array): Float64Array {
  const steepest = gradient.reduce((largest, value) => Math.max(largest, Math.abs(value)), 0);
  return gradient.map((value) => (steepest > 0 && steepest < Infinity ? (-0.1 * value) / steepest : 0));
}

function descended(
  evaluate: (point: Float64Array) => Valued,
  point: Float64Array,
  value: number,
  move: Float64Array,
): Float64Array | null {
  for (let part = 1; part > 1e-10; part /= 2) {
    const next = moved(point, move, part);
    if (evaluate(next).value < value) return next;
  }
  return null;
}

function moved(point: Float64Array, move: Float64Array, part: number): Float64Array {
  return point.map((value, k) => value + part * move[k]!);
}

function shifted(point: Float64Array, k: number, by: number): Float64Array {
  const result = point.slice();
  result[k]! += by;
  return result;
}
