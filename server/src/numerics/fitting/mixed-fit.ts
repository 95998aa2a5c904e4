import { lnDesign } from '../correlations/design.js';
import { scaled, zeros } from '../linear-algebra/matrices.js';
import { EngineError } from './engine-error.js';
import { type Estimate } from './estimate.js';
import { lnDeviations, relativeResiduals, relativeVariances, variancesFollowFit, type FitTask } from './fit-task.js';
import { type BetweenSeries, type FitRecipe } from './fit.types.js';
import { tangentFit } from './point-fit.js';
import { fitPooled } from './pooled-fit.js';
import { betweenCovariance, likelihoodAt, type SeriesProducts } from './restricted-likelihood.js';
import { seriesProducts } from './series-products.js';
import { fitComponents, type ComponentModel, type FittedComponents } from './variance-components.js';

/** Between-series standard deviation of ln D assigned where the data cannot show one (a choice, no source). */
export const USUAL_DEVIATION = 0.03;
/** From this many series on, the between-series deviation is estimated. */
const ENOUGH_SERIES = 3;
/** Steps of ln D0 and the exponents below which rounds agree; the components are found to about as many digits. */
const SETTLED = 1e-11;
const ROUNDS = 200;
/**
 * Under equal weights the scale is free, and exact data would drive it to zero. A relative scatter below the first, or
 * below this part of the scatter of all points, is not told from none.
 */
const LEAST_SCATTER = 1e-6;
const LEAST_PART = 1e-4;

/**
 * ln D_ij = ln f + b_i + s_i (ln T_ij − centre) + e_ij with random b_i, s_i: variance components by REML, parameters
 * by generalised least squares. Objectives and variances that depend on the fit are relinearised until they settle.
 */
export function fitMixed(task: FitTask): Estimate {
  const isLinear = task.form.isLinear && task.recipe.objective === 'LN_DIFFUSIVITY' && !variancesFollowFit(task);
  let { beta } = fitPooled(task);
  for (let count = 0; count < ROUNDS; count++) {
    const round = fitTangent(task, beta);
    const step = round.fitted.at.beta.map((value) => value * round.unit);
    beta = beta.map((value, k) => value + step[k]!);
    if (isLinear || step.every((value) => Math.abs(value) <= SETTLED)) return estimateOf(task, round, beta);
  }
  throw new EngineError('NOT_DETERMINABLE', 'The series are too unlike each other for random series effects to settle');
}

/** The mixed model on the tangent at one set of parameters. Responses are measured in `unit`, ln T − centre in `spread`. */
interface TangentFit {
  readonly variances: Float64Array;
  /** Factor brought into the variances beforehand, so that the scale still to be found is of order 1 */
  readonly foreseen: number;
  readonly unit: number;
  readonly spread: number;
  readonly products: SeriesProducts[];
  readonly model: ComponentModel;
  readonly fitted: FittedComponents;
}

function fitTangent(task: FitTask, beta: Float64Array): TangentFit {
  const { recipe, data, columns } = task;
  const deviations = lnDeviations(task, beta);
  const residuals = relativeResiduals(task, deviations);
  const variances = relativeVariances(task, beta, deviations);
  const isEqual = recipe.weighting === 'EQUAL';
  const meanVariance = mean(variances);
  const reduced = mean(residuals.map((residual, i) => residual ** 2 / variances[i]!));
  const foreseen = isEqual ? Math.max(reduced, LEAST_SCATTER ** 2 / meanVariance) : 1;
  const unit = Math.sqrt(meanVariance * (isEqual ? foreseen : Math.max(1, reduced)));
  const spread = Math.sqrt(mean(data.x.map((x) => x * x)));
  const products = seriesProducts(columns, {
    design: lnDesign(task.form, beta.subarray(1), data, task.centre),
    slope: data.x.map((x) => x / spread),
    response: residuals.map((residual) => residual / unit),
    variances: variances.map((variance) => (variance * foreseen) / unit ** 2),
    common: columns.common.map((common) => common / unit),
  });
  const leastScale = isEqual ? Math.max(LEAST_PART ** 2, LEAST_SCATTER ** 2 / (meanVariance * foreseen)) : 1;
  const model = componentModel(task, unit, leastScale);
  return { variances, foreseen, unit, spread, products, model, fitted: fitComponents(products, model, true, null) };
}

function componentModel({ recipe, columns }: FitTask, unit: number, leastScale: number): ComponentModel {
  const isAssigned = columns.seriesCount < ENOUGH_SERIES || recipe.betweenSeriesDeviation !== null;
  const estimated = recipe.seriesEffect === 'RANDOM_INTERCEPT' ? 'INTERCEPT' : 'INTERCEPT_AND_SLOPE';
  return {
    leastScale,
    estimated: isAssigned ? 'NONE' : estimated,
    assigned: { intercept: (assignedDeviation(recipe) / unit) ** 2, covariance: 0, slope: 0 },
  };
}

function assignedDeviation({ betweenSeriesDeviation }: FitRecipe): number {
  return betweenSeriesDeviation ?? USUAL_DEVIATION;
}

function estimateOf(task: FitTask, round: TangentFit, beta: Float64Array): Estimate {
  const { columns, data, recipe } = task;
  const { fitted, unit, spread, variances, products } = round;
  const { at, components } = fitted;
  const isAssigned = round.model.estimated === 'NONE';
  const between: BetweenSeries = {
    intercept: components.between.intercept * unit ** 2,
    slope: components.between.slope * (unit / spread) ** 2,
    covariance: (components.between.covariance * unit ** 2) / spread,
    centre: Math.log(task.centre.temperature),
  };
  const scale = components.scale * round.foreseen;
  const unscaled = recipe.weighting === 'EQUAL' ? components : { ...components, scale: 1 };
  return {
    beta,
    covariance: scaled(at.covariance, unit ** 2),
    knownCovariance: isAssigned ? scaled(betweenCovariance(products, components, at), unit ** 2) : zeros(beta.length),
    degreesOfFreedom: isAssigned ? withinFreedom(task) : columns.seriesCount - 1,
    pointCovariance: pointCovariance(task, beta, variances),
    variances,
    scale,
    robustWeights: new Float64Array(columns.count).fill(1),
    chiSquare: likelihoodAt(products, unscaled, true).quadratic,
    marginalVariances: perPoint(task, (s, i) => {
      const x = data.x[i]!;
      const scatter = between.intercept + x * (2 * between.covariance + x * between.slope);
      return variances[i]! * scale + scatter + columns.common[s]! ** 2;
    }),
    seriesParts: perPoint(task, (s, i) => predictedDeviation(round, s, data.x[i]!)),
    betweenSeries: between,
    deviation: isAssigned
      ? { value: assignedDeviation(recipe), origin: 'ASSIGNED' }
      : { value: Math.sqrt(between.intercept), origin: 'STATED' },
    likelihood: likelihoodOf(task, round, beta),
  };
}

function pointCovariance(task: FitTask, beta: Float64Array, variances: Float64Array): number[][] {
  const weights = variances.map((variance) => 1 / variance);
  return tangentFit(task, beta, new Float64Array(variances.length), weights).unscaledCovariance;
}

/** Degrees of freedom of the scatter within the series, which is all that one or two series can show. */
function withinFreedom({ columns, form }: FitTask): number {
  return Math.max(1, columns.count - columns.seriesCount - (form.parameters.length - 1));
}

/** Best linear unbiased predictor of the deviation of series s at x. */
function predictedDeviation({ products, fitted, unit, spread }: TangentFit, s: number, x: number): number {
  const { between } = fitted.components;
  const intercept = between.intercept + products[s]!.commonVariance;
  const q0 = fitted.at.pulls[2 * s]!;
  const q1 = fitted.at.pulls[2 * s + 1]!;
  const shift = intercept * q0 + between.covariance * q1;
  const tilt = between.covariance * q0 + between.slope * q1;
  return unit * (shift + (tilt * x) / spread);
}

/** Likelihood of the objective's response at its own maximum (ML, not REML), which AICc needs. */
function likelihoodOf(task: FitTask, round: TangentFit, beta: Float64Array): Estimate['likelihood'] {
  const { variances, foreseen, products, model, fitted } = round;
  const { at } = fitComponents(products, model, false, fitted.components);
  const deviations = lnDeviations(task, beta);
  let lnUnits = 0;
  for (let i = 0; i < variances.length; i++) {
    lnUnits += Math.log(2 * Math.PI * foreseen * variances[i]!);
    if (task.recipe.objective === 'DIFFUSIVITY') lnUnits += 2 * (task.data.lnDiffusivity[i]! - deviations[i]!);
  }
  const ofVariances = { NONE: 1, INTERCEPT: 2, INTERCEPT_AND_SLOPE: 4 }[model.estimated];
  return { minusTwoLog: at.value + lnUnits, parameterCount: beta.length + ofVariances };
}

function perPoint({ columns }: FitTask, value: (series: number, row: number) => number): Float64Array {
  const result = new Float64Array(columns.count);
  for (let s = 0; s < columns.seriesCount; s++) {
    for (let i = columns.seriesStart[s]!; i < columns.seriesStart[s + 1]!; i++) result[i] = value(s, i);
  }
  return result;
}

function mean(values: Float64Array): number {
  return values.reduce((sum, value) => sum + value, 0) / values.length;
}
