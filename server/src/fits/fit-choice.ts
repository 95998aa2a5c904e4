import { problem, type Problem } from '../common/problem.js';
import { type FitRecipe, type FitSeries } from '../numerics/fitting/fit.types.js';
import { type Series, type SeriesPoint } from '../series/series.entity.js';
import { parsePointId } from '../series/series-points.store.js';
import { type ExcludedPointRecord, type LeftOutSeriesRecord } from './fit.entity.js';
import { Loss, Objective, SeriesEffect, Weighting, type FitCorrelationInput } from './fit.input.js';

const STANDARD_TEMPERATURE_K = 298.15;
const STANDARD_PRESSURE_PA = 101_325;

/** What is fitted: the accepted series of a pair that carry weight, without the points left out. */
export interface FitChoice {
  used: Series[];
  leftOut: LeftOutSeriesRecord[];
  excluded: ExcludedPointRecord[];
}

export function recipeOf(input: FitCorrelationInput): FitRecipe {
  return {
    form: input.form,
    objective: input.objective ?? Objective.LN_DIFFUSIVITY,
    weighting: input.weighting ?? Weighting.EFFECTIVE_VARIANCE,
    loss: input.loss ?? Loss.LEAST_SQUARES,
    seriesEffect: input.seriesEffect ?? SeriesEffect.RANDOM_INTERCEPT_AND_SLOPE,
    betweenSeriesDeviation: input.betweenSeriesDeviation ?? null,
    referenceTemperature: input.referenceTemperature ?? STANDARD_TEMPERATURE_K,
    referencePressure: input.referencePressure ?? STANDARD_PRESSURE_PA,
  };
}

/** The series whose data this one holds: followed from repeat to repeat to the first; itself where it repeats none. */
function originOf(series: Series, all: readonly Series[]): Series {
  const repeated = all.find((other) => other.id === series.sameDataAsId);
  return repeated ? originOf(repeated, all) : series;
}

/** All accepted series, of those with the same data only one: the origin, or the first that came where it is not accepted. */
function withoutRepeats(accepted: readonly Series[], all: readonly Series[]): Series[] {
  const chosen = new Map<Series, Series>();
  for (const series of accepted) {
    const origin = originOf(series, all);
    if (series === origin || !chosen.has(origin)) chosen.set(origin, series);
  }
  const carrying = new Set(chosen.values());
  return accepted.filter((series) => carrying.has(series));
}

function repeatProblems(used: readonly Series[], all: readonly Series[]): Problem[] {
  const first = new Map<Series, Series>();
  return used.flatMap((series) => {
    const origin = originOf(series, all);
    const other = first.get(origin);
    if (!other) {
      first.set(origin, series);
      return [];
    }
    return [
      problem(
        'BAD_INPUT',
        `“${series.title}” holds the same data as “${other.title}”; only one of them carries weight.`,
        'seriesIds',
      ),
    ];
  });
}

function chosenSeries(input: FitCorrelationInput, all: readonly Series[]): { used: Series[]; problems: Problem[] } {
  const accepted = all.filter((series) => series.status === 'ACCEPTED');
  if (!input.seriesIds) {
    const used = withoutRepeats(accepted, all);
    return used.length > 0
      ? { used, problems: [] }
      : { used, problems: [problem('BAD_INPUT', 'This pair has no accepted series yet.', 'seriesIds')] };
  }
  const problems: Problem[] = [];
  const used = new Set<Series>();
  input.seriesIds.forEach((id, i) => {
    const series = all.find((candidate) => candidate.id === id);
    if (!series) problems.push(problem('BAD_INPUT', 'This series is not one of the pair.', `seriesIds.${i}`));
    else if (series.status !== 'ACCEPTED') {
      problems.push(
        problem('WRONG_STATE', `“${series.title}” is not accepted; only accepted series are fitted.`, `seriesIds.${i}`),
      );
    } else used.add(series);
  });
  if (input.seriesIds.length === 0) problems.push(problem('BAD_INPUT', 'Choose at least one series.', 'seriesIds'));
  return { used: [...used], problems: [...problems, ...repeatProblems([...used], all)] };
}

function excludedPoints(
  input: FitCorrelationInput,
  used: readonly Series[],
  points: ReadonlyMap<string, readonly SeriesPoint[]>,
): { excluded: ExcludedPointRecord[]; problems: Problem[] } {
  const problems: Problem[] = [];
  const excluded: ExcludedPointRecord[] = [];
  (input.excludedPoints ?? []).forEach(({ pointId, reason }, i) => {
    const place = parsePointId(pointId);
    const isThere =
      place && used.some((series) => series.id === place.seriesId) && points.get(place.seriesId)?.[place.index];
    if (!place || !isThere)
      problems.push(problem('BAD_INPUT', 'This point is not in a series of the fit.', `excludedPoints.${i}.pointId`));
    else if (reason.trim() === '')
      problems.push(problem('BAD_INPUT', 'Say why the point is left out.', `excludedPoints.${i}.reason`));
    else if (!excluded.some((other) => other.seriesId === place.seriesId && other.index === place.index)) {
      excluded.push({ ...place, reason: reason.trim() });
    }
  });
  return { excluded, problems };
}

function leftOutSeries(
  input: FitCorrelationInput,
  all: readonly Series[],
  used: readonly Series[],
): LeftOutSeriesRecord[] {
  const reasons = new Map((input.leftOutSeries ?? []).map(({ seriesId, reason }) => [seriesId, reason.trim()]));
  return all
    .filter((series) => series.status === 'ACCEPTED' && !used.includes(series))
    .map((series) => {
      const repeats = used.find((other) => originOf(other, all) === originOf(series, all));
      const unsaid = repeats ? `duplicate: repeats the data of ${repeats.title}` : 'not chosen for this fit';
      return { seriesId: series.id, reason: reasons.get(series.id) || unsaid };
    });
}

/** What `input` chooses among all series of the pair, or what must be mended. */
export function chooseForFit(
  input: FitCorrelationInput,
  all: readonly Series[],
  points: ReadonlyMap<string, readonly SeriesPoint[]>,
): { choice: FitChoice; problems: Problem[] } {
  const { used, problems } = chosenSeries(input, all);
  const exclusion = excludedPoints(input, used, points);
  const choice = { used, excluded: exclusion.excluded, leftOut: leftOutSeries(input, all, used) };
  return { choice, problems: [...problems, ...exclusion.problems] };
}

/** The engine's form of a series, without the points at `skipped`. */
export function toFitSeries(series: Series, points: readonly SeriesPoint[], skipped: ReadonlySet<number>): FitSeries {
  return {
    key: series.id,
    commonRelativeUncertainty: series.commonRelativeUncertainty,
    points: points.filter((_, index) => !skipped.has(index)),
  };
}

export function skippedIn(excluded: readonly ExcludedPointRecord[], seriesId: string): Set<number> {
  return new Set(excluded.filter((point) => point.seriesId === seriesId).map((point) => point.index));
}
