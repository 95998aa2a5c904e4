import type { EvaluableCorrelation } from '../numerics/fitting/fit.types.js';
import type { SheetExcludedPoint, SheetSeries } from './sheet-content.types.js';
import type { SeriesFacts } from './sheet-facts.js';
import { recommendedAt } from './correlation-values.js';
import { sheetStrings } from './sheet-strings.js';

/** The letter of a series: a to z, then aa, ab, … */
export function seriesKey(ordinal: number): string {
  const letter = String.fromCharCode(97 + (ordinal % 26));
  return ordinal < 26 ? letter : seriesKey(Math.floor(ordinal / 26) - 1) + letter;
}

/** A series as a row of the sheet's table. */
export function sheetSeries(series: SeriesFacts): SheetSeries {
  const { points } = series;
  const relative = points.diffusivityUncertainties.flatMap((u, i) => {
    const D = points.diffusivities[i];
    return u === null || D === undefined ? [] : [u / D];
  });
  return {
    key: seriesKey(series.ordinal),
    mark: series.ordinal,
    title: series.title,
    source: series.source,
    method: series.method,
    apparatus: series.apparatus,
    origin: sheetStrings.origins[series.dataOrigin],
    pointCount: points.temperatures.length,
    weightedPointCount: series.leftOutBecause === null ? points.temperatures.length - series.excluded.length : 0,
    ...extentOf(series),
    relativeUncertainty: relative.length === 0 ? null : rootMeanSquare(relative),
    uncertaintyAssigned: points.uncertaintyOrigins.includes('ASSIGNED'),
    commonRelativeUncertainty: series.commonRelativeUncertainty,
    offset: series.offset?.value ?? null,
    offsetStandardUncertainty: series.offset?.standardUncertainty ?? null,
    reason: series.leftOutBecause,
  };
}

const rootMeanSquare = (values: readonly number[]): number =>
  Math.sqrt(values.reduce((sum, value) => sum + value ** 2, 0) / values.length);

function extentOf({
  points,
}: SeriesFacts): Pick<
  SheetSeries,
  'temperatureMinimum' | 'temperatureMaximum' | 'pressureMinimum' | 'pressureMaximum'
> {
  const [temperatureMinimum, temperatureMaximum] = extremes(points.temperatures);
  const [pressureMinimum, pressureMaximum] = extremes(points.pressures);
  return { temperatureMinimum, temperatureMaximum, pressureMinimum, pressureMaximum };
}

/** Smallest and largest of a column. */
export const extremes = (values: readonly number[]): [number, number] => [
  values.reduce((a, b) => Math.min(a, b), Number.POSITIVE_INFINITY),
  values.reduce((a, b) => Math.max(a, b), Number.NEGATIVE_INFINITY),
];

/** Single points left out of series that were used. */
export function excludedPoints(
  correlation: EvaluableCorrelation,
  series: readonly SeriesFacts[],
): SheetExcludedPoint[] {
  return series
    .filter((one) => one.leftOutBecause === null)
    .flatMap((one) =>
      one.excluded.map(({ index, reason }) => {
        const temperature = one.points.temperatures[index] ?? Number.NaN;
        const pressure = one.points.pressures[index] ?? Number.NaN;
        const diffusivity = one.points.diffusivities[index] ?? Number.NaN;
        const [fitted = Number.NaN] = recommendedAt(correlation, [temperature], [pressure]).diffusivities;
        const deviation = 100 * (diffusivity / fitted - 1);
        return { seriesKey: seriesKey(one.ordinal), temperature, pressure, diffusivity, deviation, reason };
      }),
    );
}

/** Temperatures of the points that carried weight, by method of measurement. */
export function weightedTemperaturesByMethod(series: readonly SeriesFacts[]): Map<string, number[]> {
  const byMethod = new Map<string, number[]>();
  for (const one of series) {
    if (one.leftOutBecause !== null) continue;
    const excluded = new Set(one.excluded.map(({ index }) => index));
    const temperatures = one.points.temperatures.filter((_, i) => !excluded.has(i));
    byMethod.set(one.method, [...(byMethod.get(one.method) ?? []), ...temperatures]);
  }
  return byMethod;
}
