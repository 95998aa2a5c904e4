import { formatShort } from '../../lib/format-quantity';
import { parseNumber } from '../../lib/parse-number';
import { fromSi, toSi, type ReaderUnits } from '../../lib/units';

type Typed = 'temperature' | 'pressure';

/** What stands in a field of the evaluator: as typed, in which unit, and in SI; null while it is no possible value. */
export interface Entry<Q extends Typed> {
  readonly text: string;
  readonly unit: ReaderUnits[Q];
  /** K or Pa */
  readonly si: number | null;
}

/** What a person typed, taken in the unit beside it. Temperatures and pressures are above zero. */
export function typedEntry<Q extends Typed>(quantity: Q, text: string, unit: ReaderUnits[Q]): Entry<Q> {
  const value = parseNumber(text);
  const si = value === null ? null : toSi(quantity, value, unit);
  return { text, unit, si: si !== null && si > 0 ? si : null };
}

/** A value in SI, as it stands in a field of that unit. */
export const entryOf = <Q extends Typed>(quantity: Q, si: number, unit: ReaderUnits[Q]): Entry<Q> => ({
  text: formatShort(fromSi(quantity, si, unit), 7)
    .replaceAll('\u2009', '')
    .replace('\u2212', '-'),
  unit,
  si,
});

/** The entry in another unit: what was typed stays as typed as long as its unit does. */
export function inUnit<Q extends Typed>(quantity: Q, entry: Entry<Q>, unit: ReaderUnits[Q]): Entry<Q> {
  if (entry.unit === unit) return entry;
  return entry.si === null ? typedEntry(quantity, entry.text, unit) : entryOf(quantity, entry.si, unit);
}
