import { fromSi, toSi, type Quantity, type ReaderUnits } from '../../lib/units';

const STEPS = [1, 2, 2.5, 5, 10];

/** Round values between `min` and `max`, at most `most` of them, at one step of 1, 2, 2.5 or 5 times a power of ten. */
export function roundTicks(min: number, max: number, most: number): number[] {
  if (!(max > min) || most < 1) return [];
  const rough = (max - min) / most;
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = (STEPS.find((candidate) => candidate * power >= rough * (1 - 1e-9)) ?? 10) * power;
  const first = Math.ceil(min / step - 1e-9);
  const count = Math.floor(max / step + 1e-9) - first + 1;
  return Array.from({ length: Math.max(0, count) }, (_, i) => Number(((first + i) * step).toPrecision(12)));
}

const DECADE = [1, 1.2, 1.5, 2, 2.5, 3, 4, 5, 6, 8];
const COARSER = [DECADE, [1, 1.5, 2, 3, 5, 7], [1, 2, 5], [1]];

/** Round values for a logarithmic axis: preferred numbers of each decade, as many as `most` allows. */
export function logTicks(min: number, max: number, most: number): number[] {
  if (!(min > 0) || !(max > min)) return [];
  const decades = Array.from(
    { length: Math.floor(Math.log10(max)) - Math.floor(Math.log10(min)) + 1 },
    (_, i) => Math.floor(Math.log10(min)) + i,
  );
  const all = COARSER.map((digits) =>
    decades
      .flatMap((decade) => digits.map((digit) => Number((digit * 10 ** decade).toPrecision(12))))
      .filter((tick) => tick >= min && tick <= max),
  );
  const fitting = all.find((ticks) => ticks.length <= most) ?? all.at(-1) ?? [];
  return fitting.length >= 2 ? fitting : roundTicks(min, max, most).filter((tick) => tick > 0);
}

/** Ticks that are round in the reader's unit, in SI. */
export function readerTicks<Q extends Quantity>(
  quantity: Q,
  range: { readonly min: number; readonly max: number; readonly logarithmic?: boolean },
  unit: ReaderUnits[Q],
  most: number,
): number[] {
  const min = fromSi(quantity, range.min, unit);
  const max = fromSi(quantity, range.max, unit);
  // A temperature axis spans less than a decade: even steps read better there.
  const ticks = range.logarithmic && quantity !== 'temperature' ? logTicks(min, max, most) : roundTicks(min, max, most);
  return ticks.map((tick) => toSi(quantity, tick, unit));
}
