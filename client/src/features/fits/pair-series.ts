import { type AnalysisNumbersFragment, type FitSeriesFragment } from '../../gql/graphql';
import { seriesLetter } from '../../lib/series-letter';
import { type Choice } from './choice';

type SeriesAnalysis = AnalysisNumbersFragment['series'][number];

/** One point as the workspace shows it. SI. */
export interface PairPoint {
  readonly id: string;
  /** From 1, in the order of the series. */
  readonly number: number;
  readonly temperature: number;
  readonly pressure: number;
  readonly diffusivity: number;
  readonly uncertainty: number;
  /** D P/P0 */
  readonly reduced: number;
  /** u(D)/D */
  readonly relativeUncertainty: number;
  /** D/D(fit) − 1; null without a fit. */
  readonly deviation: number | null;
  /** In u; null without a fit, and for a series that is not accepted. */
  readonly residual: number | null;
  /** Of a robust fit; 1 otherwise. */
  readonly weight: number;
  readonly open: boolean;
}

/** One series as the workspace shows it: its letter and mark are those of its place in the pair. */
export interface PairSeries {
  readonly id: string;
  readonly letter: string;
  readonly mark: number;
  readonly title: string;
  readonly status: FitSeriesFragment['status'];
  readonly method: string;
  readonly submittedBy: { readonly id: string; readonly name: string } | null;
  /** Why it carries no weight; null when it does, or is not accepted. */
  readonly reason: string | null;
  readonly carriesWeight: boolean;
  /** Root mean square of u(D)/D. */
  readonly usualUncertainty: number;
  readonly uncertaintyAssigned: boolean;
  readonly offset: { readonly value: number; readonly uncertainty: number } | null;
  readonly temperatureMinimum: number;
  readonly temperatureMaximum: number;
  readonly points: readonly PairPoint[];
}

/** The fitted D at P0 along the temperature axis. */
export interface FittedCurve {
  readonly temperatures: readonly number[];
  readonly diffusivities: readonly number[];
}

interface Sources {
  readonly series: readonly FitSeriesFragment[];
  readonly choice: Pick<Choice, 'seriesOut' | 'pointsOut'>;
  /** Pa */
  readonly referencePressure: number;
  readonly analysis: Pick<AnalysisNumbersFragment, 'series'> | null;
  readonly curve: FittedCurve | null;
  /** Of a kept fit: the series it knew, whatever has become of them since. */
  readonly only?: ReadonlySet<string>;
}

const SHOWN = ['ACCEPTED', 'SUBMITTED'];

/** The series of a pair that are accepted or wait for it, with what the choice and the fit say of them. */
export function pairSeries(sources: Sources): PairSeries[] {
  const { only } = sources;
  const isShown = ({ id, status }: FitSeriesFragment) => (only ? only.has(id) : SHOWN.includes(status));
  return sources.series.flatMap((series) => (isShown(series) ? [oneSeries(series, sources)] : []));
}

function oneSeries(series: FitSeriesFragment, sources: Sources): PairSeries {
  const { choice, analysis } = sources;
  const isAccepted = series.status === 'ACCEPTED' || sources.only !== undefined;
  const found = isAccepted ? analysis?.series.find(({ seriesId }) => seriesId === series.id) : undefined;
  const reason = isAccepted ? (choice.seriesOut[series.id] ?? null) : null;
  const carriesWeight = isAccepted && reason === null;
  const temperatures = series.points.map(({ temperature }) => temperature);
  const points = series.points.map((_, i) => onePoint(series, i, found, carriesWeight, sources));
  return {
    id: series.id,
    letter: seriesLetter(series.ordinal),
    mark: series.ordinal,
    title: series.title,
    status: series.status,
    method: series.method,
    submittedBy: series.submittedBy ?? null,
    reason,
    carriesWeight,
    usualUncertainty: rootMeanSquare(points.map(({ relativeUncertainty }) => relativeUncertainty)),
    uncertaintyAssigned: series.points.some(({ uncertaintyOrigin }) => uncertaintyOrigin === 'ASSIGNED'),
    offset: found ? { value: found.offset, uncertainty: found.offsetStandardUncertainty } : null,
    temperatureMinimum: Math.min(...temperatures),
    temperatureMaximum: Math.max(...temperatures),
    points,
  };
}

function onePoint(
  series: FitSeriesFragment,
  index: number,
  found: SeriesAnalysis | undefined,
  carriesWeight: boolean,
  { choice, referencePressure, curve }: Sources,
): PairPoint {
  const { id, temperature, pressure, diffusivity, diffusivityUncertainty } = series.points[index]!;
  const reduced = (diffusivity * pressure) / referencePressure;
  const uncertainty = diffusivityUncertainty ?? 0;
  const lnDeviation = found?.lnDeviations[index] ?? lnDeviationFrom(curve, temperature, reduced);
  return {
    id,
    number: index + 1,
    temperature,
    pressure,
    diffusivity,
    uncertainty,
    reduced,
    relativeUncertainty: uncertainty / diffusivity,
    deviation: lnDeviation === null ? null : Math.expm1(lnDeviation),
    residual: found?.standardizedResiduals[index] ?? null,
    weight: found?.weights[index] ?? 1,
    open: !carriesWeight || choice.pointsOut[id] !== undefined,
  };
}

/** How far a point that the fit does not know lies from its curve: straight between two temperatures in ln D, ln T. */
export function lnDeviationFrom(curve: FittedCurve | null, temperature: number, reduced: number): number | null {
  if (curve === null) return null;
  const next = curve.temperatures.findIndex((T) => T >= temperature);
  const [T0, T1] = [curve.temperatures[next - 1], curve.temperatures[next]];
  const [D0, D1] = [curve.diffusivities[next - 1], curve.diffusivities[next]];
  if (T0 === undefined || T1 === undefined || D0 === undefined || D1 === undefined) return null;
  const share = Math.log(temperature / T0) / Math.log(T1 / T0);
  return Math.log(reduced) - Math.log(D0) - share * Math.log(D1 / D0);
}

const rootMeanSquare = (values: readonly number[]): number =>
  Math.sqrt(values.reduce((sum, value) => sum + value * value, 0) / Math.max(1, values.length));
