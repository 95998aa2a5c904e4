import { type FitPoint, type FitSeries } from './fit.types.js';

/**
 * The points of a fit as columns, in canonical order: points of a series by their numbers, series by their points. The
 * order given, and the keys, therefore change no bit of a result.
 */
export interface FitColumns {
  readonly count: number;
  readonly seriesCount: number;
  /** Length seriesCount + 1: series s holds the rows seriesStart[s] to seriesStart[s + 1] − 1. */
  readonly seriesStart: Int32Array;
  /** Relative standard uncertainty common to each series, 0 where none is stated */
  readonly common: Float64Array;
  /** K, Pa, m²/s, and their logarithms */
  readonly temperature: Float64Array;
  readonly pressure: Float64Array;
  readonly diffusivity: Float64Array;
  readonly lnTemperature: Float64Array;
  readonly lnPressure: Float64Array;
  readonly lnDiffusivity: Float64Array;
  /** Relative standard uncertainties; 0 where none is stated */
  readonly relativeU: { readonly diffusivity: Float64Array; temperature: Float64Array; pressure: Float64Array };
  /** Where each row, and each series, stands in the input */
  readonly pointIndex: Int32Array;
  readonly seriesIndex: Int32Array;
}

type Indexed<T> = readonly [item: T, index: number];

export function fitColumns(series: readonly FitSeries[]): FitColumns {
  const sorted = series.map((one, index) => ({ one, index, points: sortedPoints(one.points) })).sort(compareSeries);
  const rows = sorted.flatMap(({ points }) => points);
  const column = (value: (point: FitPoint) => number) => Float64Array.from(rows, ([point]) => value(point));
  const seriesStart = new Int32Array(sorted.length + 1);
  sorted.forEach(({ points }, s) => (seriesStart[s + 1] = seriesStart[s]! + points.length));
  return {
    count: rows.length,
    seriesCount: sorted.length,
    seriesStart,
    common: Float64Array.from(sorted, ({ one }) => one.commonRelativeUncertainty ?? 0),
    temperature: column((point) => point.temperature),
    pressure: column((point) => point.pressure),
    diffusivity: column((point) => point.diffusivity),
    lnTemperature: column((point) => Math.log(point.temperature)),
    lnPressure: column((point) => Math.log(point.pressure)),
    lnDiffusivity: column((point) => Math.log(point.diffusivity)),
    relativeU: {
      diffusivity: column((point) => (point.diffusivityUncertainty ?? 0) / point.diffusivity),
      temperature: column((point) => (point.temperatureUncertainty ?? 0) / point.temperature),
      pressure: column((point) => (point.pressureUncertainty ?? 0) / point.pressure),
    },
    pointIndex: Int32Array.from(rows, ([, index]) => index),
    seriesIndex: Int32Array.from(sorted, ({ index }) => index),
  };
}

/** A column mean with weights. */
export function weightedMean(values: Float64Array, weights: Float64Array): number {
  let sum = 0;
  let total = 0;
  for (let i = 0; i < values.length; i++) {
    sum += weights[i]! * values[i]!;
    total += weights[i]!;
  }
  return sum / total;
}

function sortedPoints(points: readonly FitPoint[]): Indexed<FitPoint>[] {
  return points.map((point, index): Indexed<FitPoint> => [point, index]).sort(([a], [b]) => comparePoints(a, b));
}

function comparePoints(a: FitPoint, b: FitPoint): number {
  return (
    a.temperature - b.temperature ||
    a.pressure - b.pressure ||
    a.diffusivity - b.diffusivity ||
    (a.diffusivityUncertainty ?? 0) - (b.diffusivityUncertainty ?? 0) ||
    (a.temperatureUncertainty ?? 0) - (b.temperatureUncertainty ?? 0) ||
    (a.pressureUncertainty ?? 0) - (b.pressureUncertainty ?? 0)
  );
}

interface SortableSeries {
  readonly one: FitSeries;
  readonly points: readonly Indexed<FitPoint>[];
}

function compareSeries(a: SortableSeries, b: SortableSeries): number {
  for (let i = 0; i < Math.min(a.points.length, b.points.length); i++) {
    const order = comparePoints(a.points[i]![0], b.points[i]![0]);
    if (order !== 0) return order;
  }
  return (
    a.points.length - b.points.length || (a.one.commonRelativeUncertainty ?? 0) - (b.one.commonRelativeUncertainty ?? 0)
  );
}
