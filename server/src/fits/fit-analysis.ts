import { evaluateCorrelation } from '../numerics/fitting/evaluate-correlation.js';
import { type FittedCorrelation } from '../numerics/fitting/fit.types.js';
import { seriesOffset } from '../numerics/fitting/series-offsets.js';
import { type Series, type SeriesPoint } from '../series/series.entity.js';
import { toCorrelation } from './correlation-evaluation.js';
import { skippedIn, toFitSeries } from './fit-choice.js';
import { type ExcludedPointRecord } from './fit.entity.js';
import { type FitAnalysis, type SeriesAnalysis } from './fit.types.js';

/** Coverage plays no part in what is read here. */
const ANY_COVERAGE = 0.95;

/** Everything a picture of the fit shows, for series used and series left out alike. */
export function analyse(
  result: FittedCorrelation,
  used: readonly Series[],
  leftOut: readonly Series[],
  excluded: readonly ExcludedPointRecord[],
  points: ReadonlyMap<string, readonly SeriesPoint[]>,
): FitAnalysis {
  const { statistics, correlationMatrix, warnings, betweenSeries } = result;
  return {
    correlation: toCorrelation(result),
    statistics,
    correlationMatrix,
    betweenSeriesSlopeDeviation: betweenSeries && betweenSeries.slope > 0 ? Math.sqrt(betweenSeries.slope) : null,
    warnings,
    series: [
      ...used.map((series) =>
        analyseSeries(result, series, points.get(series.id) ?? [], skippedIn(excluded, series.id), true),
      ),
      ...leftOut.map((series) => analyseSeries(result, series, points.get(series.id) ?? [], new Set(), false)),
    ],
  };
}

function analyseSeries(
  result: FittedCorrelation,
  series: Series,
  points: readonly SeriesPoint[],
  skipped: ReadonlySet<number>,
  carriesWeight: boolean,
): SeriesAnalysis {
  const state = evaluateCorrelation(
    result,
    points.map((point) => point.temperature),
    points.map((point) => point.pressure),
    { coverage: ANY_COVERAGE, kind: 'MEAN' },
  );
  const lnDeviations = Float64Array.from(points, (point, i) => Math.log(point.diffusivity / state.diffusivities[i]!));
  const position = result.seriesOffsets.findIndex((offset) => offset.key === series.id);
  const fittedPoints = carriesWeight ? (result.points[position] ?? []) : [];
  const standardizedResiduals = new Float64Array(points.length);
  const weights = new Float64Array(points.length);
  let next = 0;
  points.forEach((point, i) => {
    const fitted = carriesWeight && !skipped.has(i) ? fittedPoints[next++] : undefined;
    weights[i] = fitted?.weight ?? 0;
    // A point that took no part is judged by its own u and the correlation's.
    const own = (point.diffusivityUncertainty ?? 0) / point.diffusivity;
    const apart = Math.hypot(own, state.standardUncertainties[i]! / state.diffusivities[i]!);
    standardizedResiduals[i] = fitted?.standardizedResidual ?? lnDeviations[i]! / apart;
  });
  const offset =
    carriesWeight && result.seriesOffsets[position]
      ? result.seriesOffsets[position]
      : seriesOffset(result, toFitSeries(series, points, new Set()));
  return {
    seriesId: series.id,
    carriesWeight,
    offset: offset.offset,
    offsetStandardUncertainty: offset.standardUncertainty,
    fitted: state.diffusivities,
    lnDeviations,
    standardizedResiduals,
    weights,
  };
}
