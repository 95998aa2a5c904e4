import { plus, propagated, scaled, zeros } from '../linear-algebra/matrices.js';
import { lnDesign } from '../correlations/design.js';
import { EngineError } from './engine-error.js';
import { type Estimate } from './estimate.js';
import { lnDeviations, relativeResiduals, relativeVariances, variancesFollowFit, type FitTask } from './fit-task.js';
import { type BetweenSeries, type Loss } from './fit.types.js';
import { fitPoints, reciprocals, tangentFit, type PointFit } from './point-fit.js';
import { influenceOf, medianScale, robustFactor } from './robust.js';

/** Steps between rounds of weights, in units of 1 (ln D0 and exponents are of that order), below which they agree. */
const SETTLED = 1e-12;
const ROUNDS = 300;
/** Residuals of exact data are rounding; a relative scatter below this is not told from none. */
const LEAST_SCATTER = 1e-9;

/** Where the rounds of weights have settled. */
interface Settled {
  readonly beta: Float64Array;
  readonly variances: Float64Array;
  readonly robustWeights: Float64Array;
  readonly unscaledCovariance: number[][];
}

/** All points alike, whatever series they come from. */
export function fitPooled(task: FitTask): Estimate {
  const settled = settle(task);
  const { beta, variances, robustWeights } = settled;
  const deviations = lnDeviations(task, beta);
  const whitened = whitenedBy(variances, relativeResiduals(task, deviations));
  const chiSquare = sumOfSquares(whitened);
  const degreesOfFreedom = whitened.length - beta.length;
  const scale = scaleOf(task, whitened, chiSquare / degreesOfFreedom, settled);
  const given = task.recipe.betweenSeriesDeviation;
  const knownCovariance = commonCovariance(task, settled);
  return {
    beta,
    covariance: plus(scaled(unscaledCovariance(task, settled), scale), knownCovariance),
    knownCovariance,
    degreesOfFreedom,
    pointCovariance: settled.unscaledCovariance,
    variances,
    scale,
    robustWeights,
    chiSquare,
    marginalVariances: multiplied(variances, scale),
    seriesParts: new Float64Array(whitened.length),
    betweenSeries: assignedScatter(task),
    deviation: given === null ? null : { value: given, origin: 'ASSIGNED' },
    likelihood: task.recipe.loss === 'LEAST_SQUARES' ? likelihoodOf(task, variances, chiSquare, deviations) : null,
  };
}

/** What the scale multiplies: for robust losses the information of all points, outliers included (Huber 1981, §7.6). */
function unscaledCovariance(task: FitTask, { beta, variances, unscaledCovariance: weighted }: Settled): number[][] {
  if (task.recipe.loss === 'LEAST_SQUARES') return weighted;
  const right = new Float64Array(variances.length);
  return tangentFit(task, beta, right, reciprocals(variances, ones(variances.length))).unscaledCovariance;
}

/** A given deviation does not weight pooled points; it only says what a new laboratory may find. */
function assignedScatter({ recipe, centre }: FitTask): BetweenSeries | null {
  const deviation = recipe.betweenSeriesDeviation;
  return deviation === null
    ? null
    : { intercept: deviation ** 2, slope: 0, covariance: 0, centre: Math.log(centre.temperature) };
}

/** Iterates the weights that depend on the fit: effective variances, robust weights. */
function settle(task: FitTask): Settled {
  const { loss } = task.recipe;
  const leastSquares = settleUnder(task, 'LEAST_SQUARES', null);
  if (loss === 'LEAST_SQUARES') return leastSquares;
  const huber = settleUnder(task, 'HUBER', leastSquares.beta);
  // The bisquare has more than one solution; the one near Huber's is meant (Huber 1981, §7.8).
  return loss === 'HUBER' ? huber : settleUnder(task, 'BISQUARE', huber.beta);
}

function settleUnder(task: FitTask, loss: Loss, near: Float64Array | null): Settled {
  const alike = ones(task.columns.count);
  let fit: PointFit | { readonly beta: Float64Array } = near
    ? { beta: near }
    : fitPoints(task, initialVariances(task), alike, null);
  for (let round = 0; round < ROUNDS; round++) {
    const { beta } = fit;
    const deviations = lnDeviations(task, beta);
    const variances = relativeVariances(task, beta, deviations);
    if (loss === 'LEAST_SQUARES' && 'unscaledCovariance' in fit && !variancesFollowFit(task)) {
      return { ...fit, variances, robustWeights: alike };
    }
    const robustWeights =
      loss === 'LEAST_SQUARES' ? alike : robustWeightsOf(loss, relativeResiduals(task, deviations), variances);
    const next = fitPoints(task, variances, robustWeights, beta);
    const step = beta.reduce((longest, value, k) => Math.max(longest, Math.abs(next.beta[k]! - value)), 0);
    if (step <= SETTLED) return { ...next, variances, robustWeights };
    fit = next;
  }
  throw new EngineError(
    'NOT_DETERMINABLE',
    'The weights do not settle: the points allow more than one reading under this loss',
  );
}

/** Variances before anything is fitted: exponents of the form's start, fitted values equal to measured ones. */
function initialVariances(task: FitTask): Float64Array {
  const beta = new Float64Array(task.form.parameters.length);
  if (variancesFollowFit(task)) beta.set(task.form.start(task.data, task.centre), 1);
  return relativeVariances(task, beta, new Float64Array(task.columns.count));
}

function robustWeightsOf(
  loss: Exclude<Loss, 'LEAST_SQUARES'>,
  residuals: Float64Array,
  variances: Float64Array,
): Float64Array {
  const whitened = whitenedBy(variances, residuals);
  const scale = medianScale(whitened, leastScale(variances));
  const influence = influenceOf(loss);
  return whitened.map((residual) => influence.weight(residual / scale));
}

/** The common factor on the variances: always the observed one under equal weights, never below 1 where u is stated. */
function scaleOf(
  { recipe }: FitTask,
  whitened: Float64Array,
  reducedChiSquare: number,
  { beta, variances }: Settled,
): number {
  const observed =
    recipe.loss === 'LEAST_SQUARES'
      ? reducedChiSquare
      : robustFactor(influenceOf(recipe.loss), whitened, medianScale(whitened, leastScale(variances)), beta.length);
  return Math.max(recipe.weighting === 'EQUAL' ? leastScale(variances) ** 2 : 1, observed);
}

/** `LEAST_SCATTER` in units of the points' standard uncertainties. */
function leastScale(variances: Float64Array): number {
  return LEAST_SCATTER / Math.sqrt(variances[0]!);
}

/**
 * What the uncertainty common to each series does to the parameters.
 *
 * Pooled points are weighted by their independent part alone, as if the common part were not there; it is then
 * propagated through that estimator (GUM 5.2), so that more points of a series do not average it down. It is not scaled
 * by χ²: residuals say nothing about it.
 */
function commonCovariance(task: FitTask, settled: Settled): number[][] {
  const { columns, form, data, centre } = task;
  const { beta, variances, robustWeights, unscaledCovariance: weighted } = settled;
  const size = beta.length;
  if (!columns.common.some((u) => u > 0)) return zeros(size);
  const weights = reciprocals(variances, robustWeights);
  const design = lnDesign(form, beta.subarray(1), data, centre);
  let middle = zeros(size);
  for (let s = 0; s < columns.seriesCount; s++) {
    const pull = Array.from({ length: size }, (_, k) => {
      let sum = 0;
      for (let i = columns.seriesStart[s]!; i < columns.seriesStart[s + 1]!; i++)
        sum += weights[i]! * design[k * columns.count + i]!;
      return sum * columns.common[s]!;
    });
    middle = plus(
      middle,
      pull.map((a) => pull.map((b) => a * b)),
    );
  }
  return propagated(weighted, middle);
}

/** Gaussian likelihood of the objective's response with the common scale at its maximum; the scale is counted. */
function likelihoodOf(
  task: FitTask,
  variances: Float64Array,
  chiSquare: number,
  deviations: Float64Array,
): Estimate['likelihood'] {
  const count = variances.length;
  let lnVariances = 0;
  for (let i = 0; i < count; i++) {
    const lnUnit = task.recipe.objective === 'LN_DIFFUSIVITY' ? 0 : task.data.lnDiffusivity[i]! - deviations[i]!;
    lnVariances += Math.log(variances[i]!) + 2 * lnUnit;
  }
  const minusTwoLog = count * (Math.log((2 * Math.PI * chiSquare) / count) + 1) + lnVariances;
  return { minusTwoLog, parameterCount: task.form.parameters.length + 1 };
}

function ones(count: number): Float64Array {
  return new Float64Array(count).fill(1);
}

function whitenedBy(variances: Float64Array, residuals: Float64Array): Float64Array {
  const whitened = new Float64Array(residuals.length);
  for (let i = 0; i < whitened.length; i++) whitened[i] = residuals[i]! / Math.sqrt(variances[i]!);
  return whitened;
}

function multiplied(values: Float64Array, factor: number): Float64Array {
  const result = values.slice();
  for (let i = 0; i < result.length; i++) result[i]! *= factor;
  return result;
}

function sumOfSquares(values: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < values.length; i++) sum += values[i]! * values[i]!;
  return sum;
}
