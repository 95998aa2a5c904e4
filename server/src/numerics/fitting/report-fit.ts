import { lnDesign } from '../correlations/design.js';
import { chiSquareExceedance } from '../distributions/chi-square.js';
import { leverages } from '../linear-algebra/leverage.js';
import { correlationsOf } from '../linear-algebra/matrices.js';
import { effectiveDegreesOfFreedom } from './effective-degrees-of-freedom.js';
import { type Estimate } from './estimate.js';
import { lnDeviations, relativeResiduals, type FitTask } from './fit-task.js';
import { type FitSeries, type FitStatistics, type FittedCorrelation, type FittedPoint } from './fit.types.js';
import { fitWarnings } from './fit-warnings.js';
import { reciprocals } from './point-fit.js';
import { restate } from './restate.js';
import { heterogeneity, offsetsOf, type Offsets } from './series-offsets.js';
import { validityOf } from './validity.js';

/** Turns an estimate about the centre of the data into the published result at the recipe's reference state. */
export function reportFit(task: FitTask, estimate: Estimate, series: readonly FitSeries[]): FittedCorrelation {
  const { form, recipe, columns, centre } = task;
  const reference = { temperature: recipe.referenceTemperature, pressure: recipe.referencePressure };
  const { parameters, covariance } = restate(form, estimate.beta, estimate.covariance, centre, reference);
  const deviations = lnDeviations(task, estimate.beta);
  const isEqual = recipe.weighting === 'EQUAL';
  const offsets = offsetsOf(columns, deviations, estimate.variances, {
    shapeCount: form.parameters.length - 1,
    leastScale: isEqual ? 0 : 1,
  });
  const validity = validityOf(form, columns, estimate.robustWeights);
  const statistics = statisticsOf(task, estimate, deviations, offsets);
  const correlationMatrix = correlationsOf(covariance);
  const symbols = form.parameters.map(({ symbol }) => symbol);
  return {
    form: form.name,
    parameters: form.parameters.map(({ symbol, unit }, k) => ({
      symbol,
      value: parameters[k]!,
      standardUncertainty: Math.sqrt(covariance[k]![k]!),
      unit,
    })),
    covariance,
    degreesOfFreedom: effectiveDegreesOfFreedom(form, estimate, centre, validity),
    referenceTemperature: reference.temperature,
    referencePressure: reference.pressure,
    validity,
    betweenSeries: estimate.betweenSeries,
    statistics,
    correlationMatrix,
    seriesOffsets: offsetsInOrder(task, offsets, series),
    points: pointsInOrder(task, estimate, deviations, series),
    warnings: fitWarnings({
      columns,
      recipe,
      parameterSymbols: symbols,
      correlationMatrix,
      cookDistances: cookDistances(task, estimate, deviations),
      reducedChiSquare: statistics.reducedChiSquare,
      chiSquareProbability: statistics.chiSquareProbability,
      deviation: estimate.deviation,
    }),
  };
}

function statisticsOf(task: FitTask, estimate: Estimate, deviations: Float64Array, offsets: Offsets): FitStatistics {
  const { recipe, columns } = task;
  const freedom = columns.count - estimate.beta.length;
  const isStated = recipe.weighting !== 'EQUAL';
  const spread = heterogeneity(offsets);
  return {
    pointCount: columns.count,
    seriesCount: columns.seriesCount,
    residualDegreesOfFreedom: freedom,
    chiSquare: isStated ? estimate.chiSquare : null,
    reducedChiSquare: isStated ? estimate.chiSquare / freedom : null,
    chiSquareProbability: isStated ? chiSquareExceedance(estimate.chiSquare, freedom) : null,
    residualStandardError: residualStandardError(task, estimate, deviations),
    aicc: aiccOf(estimate, columns.count),
    betweenSeriesDeviation: estimate.deviation?.value ?? null,
    betweenSeriesOrigin: estimate.deviation?.origin ?? null,
    cochranQ: spread?.cochranQ ?? null,
    iSquared: spread?.iSquared ?? null,
  };
}

/**
 * Root mean square of the residuals of the objective, per degree of freedom. For random effects it is the scatter within
 * the series: the root of the mean scaled variance.
 */
function residualStandardError({ recipe, columns }: FitTask, estimate: Estimate, deviations: Float64Array): number {
  const unit = (i: number) =>
    recipe.objective === 'DIFFUSIVITY' ? columns.diffusivity[i]! * Math.exp(-deviations[i]!) : 1;
  if (recipe.seriesEffect !== 'POOLED') {
    const total = estimate.variances.reduce((sum, variance, i) => sum + variance * unit(i) ** 2, 0);
    return Math.sqrt((estimate.scale * total) / columns.count);
  }
  const residual = (i: number) =>
    (recipe.objective === 'DIFFUSIVITY' ? Math.expm1(deviations[i]!) : deviations[i]!) * unit(i);
  const total = deviations.reduce((sum, _, i) => sum + residual(i) ** 2, 0);
  return Math.sqrt(total / (columns.count - estimate.beta.length));
}

/** Hurvich & Tsai's correction, *Biometrika* 76 (1989) 297; null without a likelihood or with too few points. */
function aiccOf({ likelihood }: Estimate, count: number): number | null {
  if (!likelihood) return null;
  const { minusTwoLog, parameterCount: k } = likelihood;
  if (count <= k + 1 || !Number.isFinite(minusTwoLog)) return null;
  return minusTwoLog + 2 * k + (2 * k * (k + 1)) / (count - k - 1);
}

/** R. D. Cook, *Technometrics* 19 (1977) 15, on what is left of the residuals when the series' own parts are taken out. */
function cookDistances(task: FitTask, estimate: Estimate, deviations: Float64Array): Float64Array {
  const { beta, scale, pointCovariance, seriesParts } = estimate;
  const residuals = relativeResiduals(task, deviations);
  const weights = reciprocals(estimate.variances, estimate.robustWeights);
  const design = lnDesign(task.form, beta.subarray(1), task.data, task.centre);
  const distances = leverages(design, weights, pointCovariance);
  for (let i = 0; i < distances.length; i++) {
    const hat = distances[i]!;
    const left = residuals[i]! - seriesParts[i]!;
    distances[i] = (left * left * weights[i]! * hat) / (scale * beta.length * (1 - hat) ** 2);
  }
  return distances;
}

function offsetsInOrder(
  { columns }: FitTask,
  offsets: Offsets,
  series: readonly FitSeries[],
): FittedCorrelation['seriesOffsets'] {
  const ordered = new Array<FittedCorrelation['seriesOffsets'][number]>(series.length);
  columns.seriesIndex.forEach((index, s) => {
    const standardUncertainty = Math.sqrt(offsets.variances[s]!);
    ordered[index] = { key: series[index]!.key, offset: offsets.means[s]!, standardUncertainty };
  });
  return ordered;
}

function pointsInOrder(
  task: FitTask,
  estimate: Estimate,
  deviations: Float64Array,
  series: readonly FitSeries[],
): FittedPoint[][] {
  const { columns, recipe } = task;
  const residuals = relativeResiduals(task, deviations);
  const ordered = series.map(({ points }) => new Array<FittedPoint>(points.length));
  columns.seriesIndex.forEach((index, s) => {
    for (let i = columns.seriesStart[s]!; i < columns.seriesStart[s + 1]!; i++) {
      const variance = estimate.variances[i]! * (recipe.weighting === 'EQUAL' ? estimate.scale : 1);
      ordered[index]![columns.pointIndex[i]!] = {
        fitted: columns.diffusivity[i]! * Math.exp(-deviations[i]!),
        lnDeviation: deviations[i]!,
        standardizedResidual: residuals[i]! / Math.sqrt(estimate.marginalVariances[i]!),
        weight: estimate.robustWeights[i]!,
        relativeUncertainty: Math.sqrt(variance),
      };
    }
  });
  return ordered;
}
