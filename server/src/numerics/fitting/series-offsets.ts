import { type FitColumns } from './fit-columns.js';
import { type EvaluableCorrelation, type FitSeries, type SeriesOffset } from './fit.types.js';
import { formOf, referenceOf } from './restate.js';

/** Mean deviations of the series in canonical order, and what the series themselves say of their uncertainty. */
export interface Offsets {
  readonly means: Float64Array;
  /** u², common part included */
  readonly variances: Float64Array;
}

/**
 * Weighted mean deviation of ln D of each series, with the scatter of the points about that mean.
 *
 * Where the points of the series scatter more than their uncertainties say, those are scaled by the square root of the
 * reduced χ² within the series; under equal weights they always are.
 *
 * @param variances      of ln D of the points, before scaling
 * @param shapeCount     fitted parameters besides D0, for the degrees of freedom within the series
 * @param leastScale     1 where uncertainties are stated, 0 under equal weights
 */
export function offsetsOf(
  columns: FitColumns,
  deviations: Float64Array,
  variances: Float64Array,
  { shapeCount, leastScale }: { shapeCount: number; leastScale: 0 | 1 },
): Offsets {
  const means = new Float64Array(columns.seriesCount);
  const precisions = new Float64Array(columns.seriesCount);
  let squares = 0;
  for (let s = 0; s < columns.seriesCount; s++) {
    for (let i = columns.seriesStart[s]!; i < columns.seriesStart[s + 1]!; i++) {
      precisions[s]! += 1 / variances[i]!;
      means[s]! += deviations[i]! / variances[i]!;
    }
    means[s]! /= precisions[s]!;
    for (let i = columns.seriesStart[s]!; i < columns.seriesStart[s + 1]!; i++) {
      squares += (deviations[i]! - means[s]!) ** 2 / variances[i]!;
    }
  }
  const freedom = columns.count - columns.seriesCount - shapeCount;
  const scale = Math.max(leastScale, freedom > 0 ? squares / freedom : 1);
  return { means, variances: precisions.map((precision, s) => scale / precision + columns.common[s]! ** 2) };
}

/** Cochran's Q of the offsets about their weighted mean, and the share of it that exceeds its expectation (I²). */
export function heterogeneity({ means, variances }: Offsets): { cochranQ: number; iSquared: number } | null {
  const freedom = means.length - 1;
  if (freedom < 1) return null;
  let precision = 0;
  let sum = 0;
  for (let s = 0; s < means.length; s++) {
    precision += 1 / variances[s]!;
    sum += means[s]! / variances[s]!;
  }
  const mean = sum / precision;
  const cochranQ = means.reduce((total, value, s) => total + (value - mean) ** 2 / variances[s]!, 0);
  // Exact data under equal weights have no variance to compare with.
  if (!Number.isFinite(cochranQ)) return null;
  return { cochranQ, iSquared: cochranQ > freedom ? (cochranQ - freedom) / cochranQ : 0 };
}

/**
 * Mean deviation of ln D of any series from a correlation: one left out of the fit, or published later.
 *
 * Points weigh by their stated relative uncertainty. If one of them states none, all weigh alike and the scatter of the
 * points stands for it. Two points or more are then needed for a statistical part; a single one has only the common part.
 *
 * @param series at least one point
 */
export function seriesOffset(correlation: EvaluableCorrelation, series: FitSeries): SeriesOffset {
  const form = formOf(correlation);
  const reference = referenceOf(correlation);
  const shape = correlation.parameters.slice(1).map(({ value }) => value);
  const lnD0 = Math.log(correlation.parameters[0]!.value);
  const deviations = series.points.map((point) => {
    const x = Math.log(point.temperature / reference.temperature);
    const p = Math.log(point.pressure / reference.pressure);
    return Math.log(point.diffusivity) - lnD0 - form.lnRatio(shape, x, p, reference);
  });
  const stated = series.points.map((point) => (point.diffusivityUncertainty ?? 0) / point.diffusivity);
  const isStated = stated.every((u) => u > 0);
  const weights = stated.map((u) => (isStated ? 1 / u ** 2 : 1));
  const precision = sum(weights);
  const offset = sum(deviations.map((deviation, i) => deviation * weights[i]!)) / precision;
  const squares = sum(deviations.map((deviation, i) => weights[i]! * (deviation - offset) ** 2));
  const observed = deviations.length > 1 ? squares / (deviations.length - 1) : 0;
  const scale = isStated ? Math.max(1, observed) : observed;
  const common = series.commonRelativeUncertainty ?? 0;
  return { key: series.key, offset, standardUncertainty: Math.sqrt(scale / precision + common ** 2) };
}

function sum(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0);
}
