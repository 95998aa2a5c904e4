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

interface PlacedSeries {
  readonly common: number;
  readonly index: number;
  readonly points: readonly FitPoint[];
  /** Index in the input of each of the points */
  readonly places: readonly number[];
}

export function fitColumns(series: readonly FitSeries[]): FitColumns {
  const sorted = series.map(placed).sort(compareSeries);
  const count = series.reduce((sum, { points }) => sum + points.length, 0);
  // One block of memory for all columns: allocating it costs more than filling it.
  const block = new Float64Array(9 * count);
  let used = 0;
  const column = () => block.subarray(used, (used += count));
  const columns = {
    count,
    seriesCount: series.length,
    seriesStart: new Int32Array(series.length + 1),
    common: Float64Array.from(sorted, ({ common }) => common),
    temperature: column(),
    pressure: column(),
    diffusivity: column(),
    lnTemperature: column(),
    lnPressure: column(),
    lnDiffusivity: column(),
    relativeU: { diffusivity: column(), temperature: column(), pressure: column() },
    pointIndex: new Int32Array(count),
    seriesIndex: Int32Array.from(sorted, ({ index }) => index),
  };
  let row = 0;
  sorted.forEach(({ points, places }, s) => {
    for (let i = 0; i < points.length; i++) {
      fillRow(columns, row, points[i]!);
      columns.pointIndex[row] = places[i]!;
      row++;
    }
    columns.seriesStart[s + 1] = row;
  });
  return columns;
}

function fillRow(columns: FitColumns, row: number, point: FitPoint): void {
  const { temperature, pressure, diffusivity } = point;
  columns.temperature[row] = temperature;
  columns.pressure[row] = pressure;
  columns.diffusivity[row] = diffusivity;
  columns.lnTemperature[row] = Math.log(temperature);
  columns.lnPressure[row] = Math.log(pressure);
  columns.lnDiffusivity[row] = Math.log(diffusivity);
  columns.relativeU.diffusivity[row] = (point.diffusivityUncertainty ?? 0) / diffusivity;
  columns.relativeU.temperature[row] = (point.temperatureUncertainty ?? 0) / temperature;
  columns.relativeU.pressure[row] = (point.pressureUncertainty ?? 0) / pressure;
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

function placed({ points, commonRelativeUncertainty }: FitSeries, index: number): PlacedSeries {
  const places = points.map((_, i) => i).sort((a, b) => comparePoints(points[a]!, points[b]!));
  return { common: commonRelativeUncertainty ?? 0, index, points: places.map((i) => points[i]!), places };
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

function compareSeries(a: PlacedSeries, b: PlacedSeries): number {
  for (let i = 0; i < Math.min(a.points.length, b.points.length); i++) {
    const order = comparePoints(a.points[i]!, b.points[i]!);
    if (order !== 0) return order;
  }
  return a.points.length - b.points.length || a.common - b.common;
}
