import { z } from 'zod';
import { type SeriesDetailFragment, type SeriesPointInput, type UpdateSeriesInput } from '../../gql/graphql';
import { formatShort } from '../../lib/format-quantity';
import { parseNumber } from '../../lib/parse-number';
import { differenceFromSi, fromSi, type Quantity, type ReaderUnits, toSi } from '../../lib/units';
import { seriesStrings } from '../../strings/series';

const words = seriesStrings.edit;

export const dataOrigins = ['TABLE', 'GRAPH', 'SMOOTHED', 'EQUATION', 'TUBE_RUN'] as const;

const needed = z.string().trim().min(1, words.needed);
const isPositive = (text: string) => (parseNumber(text) ?? 0) > 0;
const positive = z.string().refine(isPositive, words.badNumber);

/** What is typed for one point, in the reader's units. `id` names the stored point it began as. */
const pointSchema = z.object({
  id: z.string().nullable(),
  temperature: z.string(),
  pressure: positive,
  diffusivity: positive,
  uncertainty: z.string().refine((text) => text.trim() === '' || isPositive(text), words.badUncertainty),
});
export type PointFields = z.infer<typeof pointSchema>;

/** The form of a series; temperatures are above absolute zero in whatever unit they are typed. */
export const seriesFormSchema = (units: ReaderUnits) =>
  z.object({
    title: needed,
    source: needed,
    method: needed,
    apparatus: z.string(),
    dataOrigin: z.enum(dataOrigins),
    common: z.string().refine((text) => text.trim() === '' || isPercent(text), words.badPercent),
    points: z
      .array(
        pointSchema.refine(({ temperature }) => isTemperature(temperature, units), {
          path: ['temperature'],
          error: words.badNumber,
        }),
      )
      .min(1, words.atLeastOne),
  });
export type SeriesFields = z.infer<ReturnType<typeof seriesFormSchema>>;

function isPercent(text: string): boolean {
  const value = parseNumber(text);
  return value !== null && value >= 0 && value < 100;
}

function isTemperature(text: string, units: ReaderUnits): boolean {
  const value = parseNumber(text);
  return value !== null && toSi('temperature', value, units.temperature) > 0;
}

const plain = (value: number): string => formatShort(value, 8).replaceAll('\u2009', '').replace('\u2212', '-');

type Point = SeriesDetailFragment['points'][number];

/** A stored point as it stands in the form. An assigned u(D) is left empty: it is assigned anew. */
function pointFields(point: Point, units: ReaderUnits): PointFields {
  const shown = <Q extends Quantity>(quantity: Q, value: number) => plain(fromSi(quantity, value, units[quantity]));
  const u = point.uncertaintyOrigin === 'STATED' ? point.diffusivityUncertainty : null;
  return {
    id: point.id,
    temperature: shown('temperature', point.temperature),
    pressure: shown('pressure', point.pressure),
    diffusivity: shown('diffusivity', point.diffusivity),
    uncertainty: u == null ? '' : plain(differenceFromSi('diffusivity', u, units.diffusivity)),
  };
}

export const emptyPoint: PointFields = { id: null, temperature: '', pressure: '', diffusivity: '', uncertainty: '' };

export const seriesFields = (series: SeriesDetailFragment, units: ReaderUnits): SeriesFields => ({
  title: series.title,
  source: series.source,
  method: series.method,
  apparatus: series.apparatus ?? '',
  dataOrigin: series.dataOrigin,
  common: series.commonRelativeUncertainty == null ? '' : plain(100 * series.commonRelativeUncertainty),
  points: series.points.map((point) => pointFields(point, units)),
});

/**
 * The change as the service takes it, SI. A number that was not touched keeps its stored value to the last digit, whatever
 * unit it was shown in; without a change of any point no points are sent.
 */
export function updateInput(series: SeriesDetailFragment, fields: SeriesFields, units: ReaderUnits): UpdateSeriesInput {
  const before = seriesFields(series, units).points;
  const untouched = JSON.stringify(before) === JSON.stringify(fields.points);
  const common = parseNumber(fields.common);
  return {
    id: series.id,
    lockVersion: series.lockVersion,
    title: fields.title,
    source: fields.source,
    method: fields.method,
    apparatus: fields.apparatus.trim() || null,
    dataOrigin: fields.dataOrigin,
    commonRelativeUncertainty: common === null ? null : common / 100,
    sameDataAsId: series.sameDataAs?.id ?? null,
    points: untouched ? null : fields.points.map((point) => pointInput(point, series, units)),
  };
}

function pointInput(fields: PointFields, series: SeriesDetailFragment, units: ReaderUnits): SeriesPointInput {
  const stored = series.points.find(({ id }) => id === fields.id);
  const shown = stored && pointFields(stored, units);
  const value = (name: 'temperature' | 'pressure' | 'diffusivity'): number =>
    stored && shown?.[name] === fields[name] ? stored[name] : toSi(name, parseNumber(fields[name]) ?? NaN, units[name]);
  return {
    temperature: value('temperature'),
    pressure: value('pressure'),
    pressureOrigin: stored?.pressureOrigin ?? 'STATED',
    diffusivity: value('diffusivity'),
    diffusivityUncertainty: uncertaintyInput(fields, stored, shown, units),
    temperatureUncertainty: stored?.temperatureUncertainty ?? null,
    pressureUncertainty: stored?.pressureUncertainty ?? null,
    moleFraction: stored?.moleFraction ?? null,
    replicates: stored?.replicates ?? null,
  };
}

function uncertaintyInput(
  fields: PointFields,
  stored: Point | undefined,
  shown: PointFields | undefined,
  units: ReaderUnits,
): number | null {
  const typed = parseNumber(fields.uncertainty);
  if (typed === null) return null;
  if (stored && shown?.uncertainty === fields.uncertainty) return stored.diffusivityUncertainty ?? null;
  return toSi('diffusivity', typed, units.diffusivity);
}
