import { plus, propagated, scaled, zeros } from '../linear-algebra/matrices.js';
import { lnDesign } from '../correlations/design.js';
import { EngineError } from './engine-error.js';
import { type Estimate } from './estimate.js';
import { lnDeviations, relativeResiduals, relativeVariances, variancesFollowFit, type FitTask } from './fit-task.js';
import { type BetweenSeries, type Loss } from './fit.types.js';
import { fitPoints, tangentFit } from './point-fit.js';
import { influenceOf, medianScale, robustFactor } from './robust.js';

/** Steps between rounds of weights, in units of 1 (ln D0 and exponents are of that order), below which they agree. */
const SETTLED = 1e-13;
const ROUNDS = 1000;

/** Where the rounds of weights have settled. */
interface Settled {
  readonly beta: Float64Array;
  readonly variances: Float64Array;
  readonly robustWeights: Float64Array;
}

/** All points alike, whatever series they come from. */
export function fitPooled(task: FitTask): Estimate {
  const { beta, variances, robustWeights } = settle(task);
  const residuals = relativeResiduals(task, lnDeviations(task, beta));
  const whitened = residuals.map((residual, i) => residual / Math.sqrt(variances[i]!));
  const chiSquare = sumOfSquares(whitened);
  const degreesOfFreedom = residuals.length - beta.length;
  const scale = scaleOf(task, whitened, chiSquare / degreesOfFreedom, beta.length);

  const { unscaledCovariance } = tangentFit(
    task,
    beta,
    residuals,
    variances.map((variance) => 1 / variance),
  );
  const given = task.recipe.betweenSeriesDeviation;
  const knownCovariance = commonCovariance(task, beta, variances, robustWeights);
  return {
    beta,
    covariance: plus(scaled(unscaledCovariance, scale), knownCovariance),
    knownCovariance,
    degreesOfFreedom,
    variances,
    scale,
    robustWeights,
    chiSquare,
    marginalVariances: variances.map((variance) => variance * scale),
    seriesParts: new Float64Array(residuals.length),
    betweenSeries: assignedScatter(task),
    deviation: given === null ? null : { value: given, origin: 'ASSIGNED' },
    likelihood: task.recipe.loss === 'LEAST_SQUARES' ? likelihoodOf(task, variances, chiSquare, beta) : null,
  };
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
  const ones = new Float64Array(task.columns.count).fill(1);
  let beta = near ?? fitPoints(task, initialVariances(task), ones, null);
  for (let round = 0; round < ROUNDS; round++) {
    const deviations = lnDeviations(task, beta);
    const variances = relativeVariances(task, beta, deviations);
    const robustWeights =
      loss === 'LEAST_SQUARES' ? ones : robustWeightsOf(loss, relativeResiduals(task, deviations), variances);
    if (loss === 'LEAST_SQUARES' && !variancesFollowFit(task)) return { beta, variances, robustWeights };
    const next = fitPoints(task, variances, robustWeights, beta);
    const step = beta.reduce((longest, value, k) => Math.max(longest, Math.abs(next[k]! - value)), 0);
    beta = next;
    if (step <= SETTLED) return { beta, variances, robustWeights };
  }
  throw new EngineError(
    'NOT_DETERMINABLE',
    'The weights do not settle: the points allow more than one reading under this loss',
  );
}

/** Variances before anything is fitted: exponents of the form's start, fitted values equal to measured ones. */
function initialVariances(task: FitTask): Float64Array {
  const shape = task.form.start(task.data, task.centre);
  return relativeVariances(task, new Float64Array([0, ...shape]), new Float64Array(task.columns.count));
}

function robustWeightsOf(
  loss: Exclude<Loss, 'LEAST_SQUARES'>,
  residuals: Float64Array,
  variances: Float64Array,
): Float64Array {
  const whitened = residuals.map((residual, i) => residual / Math.sqrt(variances[i]!));
  const scale = medianScale(whitened);
  const influence = influenceOf(loss);
  return whitened.map((residual) => influence.weight(residual / scale));
}

/** The common factor on the variances: always the observed one under equal weights, never below 1 where u is stated. */
function scaleOf(
  { recipe }: FitTask,
  whitened: Float64Array,
  reducedChiSquare: number,
  parameterCount: number,
): number {
  const observed =
    recipe.loss === 'LEAST_SQUARES'
      ? reducedChiSquare
      : robustFactor(influenceOf(recipe.loss), whitened, medianScale(whitened), parameterCount);
  return recipe.weighting === 'EQUAL' ? observed : Math.max(1, observed);
}

/**
 * What the uncertainty common to each series does to the parameters.
 *
 * Pooled points are weighted by their independent part alone, as if the common part were not there; it is then
 * propagated through that estimator (GUM 5.2), so that more points of a series do not average it down. It is not scaled
 * by χ²: residuals say nothing about it.
 */
function commonCovariance(
  task: FitTask,
  beta: Float64Array,
  variances: Float64Array,
  robustWeights: Float64Array,
): number[][] {
  const { columns, form, data, centre } = task;
  const size = beta.length;
  if (!columns.common.some((u) => u > 0)) return zeros(size);
  const weights = variances.map((variance, i) => robustWeights[i]! / variance);
  const { unscaledCovariance } = tangentFit(task, beta, new Float64Array(columns.count), weights);
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
  return propagated(unscaledCovariance, middle);
}

/** Gaussian likelihood of the objective's response with the common scale at its maximum; the scale is counted. */
function likelihoodOf(
  task: FitTask,
  variances: Float64Array,
  chiSquare: number,
  beta: Float64Array,
): Estimate['likelihood'] {
  const count = variances.length;
  let lnVariances = 0;
  const deviations = lnDeviations(task, beta);
  for (let i = 0; i < count; i++) {
    const lnUnit = task.recipe.objective === 'LN_DIFFUSIVITY' ? 0 : task.data.lnDiffusivity[i]! - deviations[i]!;
    lnVariances += Math.log(variances[i]!) + 2 * lnUnit;
  }
  const minusTwoLog = count * (Math.log((2 * Math.PI * chiSquare) / count) + 1) + lnVariances;
  return { minusTwoLog, parameterCount: beta.length + 1 };
}

function sumOfSquares(values: Float64Array): number {
  return values.reduce((sum, value) => sum + value * value, 0);
}
