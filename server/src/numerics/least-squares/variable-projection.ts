import {
  applyQ,
  applyQTransposed,
  columnNorms,
  dependentColumn,
  factorise,
  solveUpper,
  type QrFactors,
} from '../linear-algebra/qr.js';
import { type WhitenedProblem } from './problem.js';

/** The best the linear parameters can do for given nonlinear ones. */
export interface Projection {
  /** All parameters, the linear ones at their optimum */
  readonly parameters: Float64Array;
  /** observed − model, whitened */
  readonly residuals: Float64Array;
  readonly sumOfSquares: number;
  /** Kaufman's Jacobian of the projected model by the nonlinear parameters, column-major */
  readonly jacobian: Float64Array;
}

const DEPENDENT = 1e-13;

/**
 * Variable projection: the parameters the model is linear in are eliminated exactly, so that an iteration sees only
 * the others. G. H. Golub, V. Pereyra, *SIAM J. Numer. Anal.* 10 (1973) 413; the simplified Jacobian: L. Kaufman,
 * *BIT* 15 (1975) 49.
 */
export class ProjectedProblem {
  readonly nonlinear: readonly number[];

  constructor(
    readonly problem: WhitenedProblem,
    private readonly linear: readonly number[],
  ) {
    const all = Array.from({ length: problem.parameterCount }, (_, k) => k);
    this.nonlinear = all.filter((k) => !linear.includes(k));
  }

  /** The nonlinear parameters of a full vector. */
  pick(parameters: Float64Array): number[] {
    return this.nonlinear.map((k) => parameters[k]!);
  }

  /** Null where model or Jacobian are not finite, or the linear parameters cannot be told apart. */
  at(alpha: ArrayLike<number>): Projection | null {
    const { problem, linear, nonlinear } = this;
    const rows = problem.count;
    const parameters = new Float64Array(problem.parameterCount);
    nonlinear.forEach((k, i) => (parameters[k] = alpha[i]!));
    const jacobian = new Float64Array(rows * problem.parameterCount);
    const residuals = new Float64Array(rows);
    const factors = linear.length > 0 ? this.solveLinear(parameters, jacobian, residuals) : undefined;
    if (factors === null) return null;

    const sumOfSquares = problem.residuals(parameters, residuals);
    problem.jacobian(parameters, jacobian);
    if (!Number.isFinite(sumOfSquares) || !jacobian.every(Number.isFinite)) return null;
    const columns = nonlinear.map((k) => jacobian.slice(k * rows, (k + 1) * rows));
    if (factors) columns.forEach((column) => projectAway(factors, column));
    const projected = new Float64Array(rows * nonlinear.length);
    columns.forEach((column, k) => projected.set(column, k * rows));
    return { parameters, residuals, sumOfSquares, jacobian: projected };
  }

  /** Puts the optimal linear parameters into `parameters`; the other two arguments are room to work in. */
  private solveLinear(parameters: Float64Array, jacobian: Float64Array, residuals: Float64Array): QrFactors | null {
    const { problem, linear } = this;
    const rows = problem.count;
    const sum = problem.residuals(parameters, residuals);
    problem.jacobian(parameters, jacobian);
    const basis = new Float64Array(rows * linear.length);
    linear.forEach((k, i) => basis.set(jacobian.subarray(k * rows, (k + 1) * rows), i * rows));
    if (!Number.isFinite(sum) || !basis.every(Number.isFinite)) return null;
    const norms = columnNorms(basis, rows, linear.length);
    const factors = factorise(basis, rows, linear.length);
    if (dependentColumn(factors, norms, DEPENDENT) >= 0) return null;
    applyQTransposed(factors, residuals);
    solveUpper(factors, residuals).forEach((value, i) => (parameters[linear[i]!] = value));
    return factors;
  }
}

/** Replaces a column by its part across the space of the factorised columns. */
function projectAway(factors: QrFactors, column: Float64Array): void {
  applyQTransposed(factors, column);
  column.fill(0, 0, factors.columns);
  applyQ(factors, column);
}
