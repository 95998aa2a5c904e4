import { lnDesign } from '../correlations/design.js';
import { fitLinear, type LinearFit } from '../least-squares/linear-fit.js';
import { type LeastSquaresProblem } from '../least-squares/problem.js';
import { solveLeastSquares } from '../least-squares/solve.js';
import { EngineError } from './engine-error.js';
import { lnDeviations, type FitTask } from './fit-task.js';

/** Parameters and what the points alone say of them. */
export interface PointFit {
  /** ln D0 at the centre, then the shape */
  readonly beta: Float64Array;
  /** (XᵀWX)⁻¹ of beta, W = weights/variances */
  readonly unscaledCovariance: number[][];
}

/**
 * The parameters that least squares with given weights gives, all points alike.
 *
 * On ln D a linear form takes one QR factorisation; everything else goes through the general solver.
 *
 * @param variances of the relative residuals at `near`, length N
 * @param weights   factors on the reciprocal variances, 0 to 1
 * @param near      where to start, null for the form's own start and residuals of zero
 */
export function fitPoints(
  task: FitTask,
  variances: Float64Array,
  weights: Float64Array,
  near: Float64Array | null,
): PointFit {
  return task.recipe.objective === 'LN_DIFFUSIVITY' && task.form.isLinear
    ? fitLogarithms(task, variances, weights)
    : fitDirectly(task, variances, weights, near);
}

function fitLogarithms(task: FitTask, variances: Float64Array, weights: Float64Array): PointFit {
  const origin = new Float64Array(task.form.parameters.length);
  const { solution, unscaledCovariance } = tangentFit(
    task,
    origin,
    lnDeviations(task, origin),
    reciprocals(variances, weights),
  );
  return { beta: solution, unscaledCovariance };
}

function fitDirectly(
  task: FitTask,
  variances: Float64Array,
  weights: Float64Array,
  near: Float64Array | null,
): PointFit {
  const deviations = near ? lnDeviations(task, near) : new Float64Array(task.columns.count);
  const start = near ?? new Float64Array([0, ...task.form.start(task.data, task.centre)]);
  const sigma = variances.map((variance, i) => Math.sqrt(variance / weights[i]!) * fittedValue(task, deviations, i));
  const solution = solveLeastSquares(directProblem(task, sigma), [Math.exp(start[0]!), ...start.subarray(1)]);
  const beta = solution.parameters;
  const d0 = beta[0]!;
  beta[0] = Math.log(d0);
  const unscaledCovariance = solution.unscaledCovariance.map((row, i) =>
    row.map((value, j) => value / (i === 0 ? d0 : 1) / (j === 0 ? d0 : 1)),
  );
  return { beta, unscaledCovariance };
}

/** weights/variances */
export function reciprocals(variances: Float64Array, weights: Float64Array): Float64Array {
  const result = new Float64Array(variances.length);
  for (let i = 0; i < result.length; i++) result[i] = weights[i]! / variances[i]!;
  return result;
}

/**
 * Weighted linear least squares of `right` on the tangent ∂ ln f/∂(ln D0, shape) at `beta`.
 *
 * @throws {EngineError} NOT_DETERMINABLE when the points cannot tell the parameters apart
 */
export function tangentFit(task: FitTask, beta: Float64Array, right: Float64Array, weights: Float64Array): LinearFit {
  const fit = fitLinear(lnDesign(task.form, beta.subarray(1), task.data, task.centre), right, weights);
  if (!('undeterminable' in fit)) return fit;
  const { symbol } = task.form.parameters[fit.undeterminable]!;
  const message = `${symbol} cannot be determined: over these points its effect cannot be told from that of the parameters before it`;
  throw new EngineError('NOT_DETERMINABLE', message);
}

function fittedValue({ columns }: FitTask, deviations: Float64Array, i: number): number {
  return columns.diffusivity[i]! * Math.exp(-deviations[i]!);
}

/** Least squares on D itself: D0 is the linear parameter, the shape is not. */
function directProblem({ form, data, centre, columns }: FitTask, sigma: Float64Array): LeastSquaresProblem {
  const rows = columns.count;
  const gradient = new Float64Array(form.parameters.length - 1);
  return {
    observed: columns.diffusivity,
    deviations: sigma,
    parameterCount: form.parameters.length,
    linear: [0],
    model: (parameters, into) => {
      const shape = parameters.subarray(1);
      for (let i = 0; i < rows; i++) {
        into[i] = parameters[0]! * Math.exp(form.lnRatio(shape, data.x[i]!, data.p[i]!, centre));
      }
    },
    jacobian: (parameters, into) => {
      const shape = parameters.subarray(1);
      for (let i = 0; i < rows; i++) {
        const ratio = Math.exp(form.lnRatio(shape, data.x[i]!, data.p[i]!, centre));
        form.lnRatioGradient(shape, data.x[i]!, data.p[i]!, centre, gradient);
        into[i] = ratio;
        for (let k = 0; k < gradient.length; k++) into[(k + 1) * rows + i] = parameters[0]! * ratio * gradient[k]!;
      }
    },
  };
}
