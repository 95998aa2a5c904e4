import { divide, exactDecimal, linearMap, multiply, ratioOf, subtract, toNumber, type Ratio } from './exact-decimal.js';
import { UNITS, type Unit, type UnitQuantity } from './unit-table.js';

export type { Unit, UnitQuantity } from './unit-table.js';

const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** One spelling for what people type differently: superscripts, signs of multiplication, `**`, degree signs, spaces. */
function plain(text: string): string {
  return text
    .trim()
    .replace(/[⁰¹²³⁴⁵⁶⁷⁸⁹]/g, (digit) => String(SUPERSCRIPTS.indexOf(digit)))
    .replace(/[⁻−–]/g, '-')
    .replace(/[º°˚]/g, 'deg ')
    .replace(/℃/g, 'deg C')
    .replace(/℉/g, 'deg F')
    .replace(/\*\*|\^/g, '')
    .replace(/[·⋅∙×*]/g, ' ')
    .replace(/[{}]/g, '')
    .replace(/\bsq(?:uare)?\.? ?(\p{L}+)/giu, '$12')
    .replace(/\s+per\s+/gi, '/')
    .replace(/\s*\/\s*/g, '/')
    .replace(/\s+/g, ' ')
    .trim();
}

/** `cm2 s-1` and `cm2.s-1` become `cm2/s`; the rest stays. */
const withQuotient = (text: string): string => text.replace(/[ .]?(\p{L}+)\(?-1\)?$/u, '/$1').replace(/ \//g, '/');

const squeeze = (text: string): string => withQuotient(text).replace(/[ .]/g, '');

const EXACT = new Map<string, Unit>();
const ANY_CASE = new Map<string, Unit>();
for (const unit of UNITS) {
  for (const name of [unit.symbol, ...(unit.ucum === null ? [] : [unit.ucum]), ...unit.aliases]) {
    const key = squeeze(plain(name));
    if (!EXACT.has(key)) EXACT.set(key, unit);
    if (!ANY_CASE.has(key.toLowerCase())) ANY_CASE.set(key.toLowerCase(), unit);
  }
}
// mPa is a millipascal, a thousand millionth of what reading it without regard to case would make of it.
const CASE_MATTERS = new Set(['mPa']);

function named(text: string): Unit | null {
  const key = squeeze(text);
  if (key === '' || CASE_MATTERS.has(key)) return null;
  return EXACT.get(key) ?? ANY_CASE.get(key.toLowerCase()) ?? null;
}

const POWER_OF_TEN = /^(?:x ?)?(?:(\d+(?:\.\d+)?)[eE]([+-]?\d+)|10\(?([+-]\d+|\d)\)?) ?(?=\D)/;

/**
 * Reads a unit as people write it: `cm2/s`, `cm^2 s-1`, `degC`, `mm Hg`, `10^-5 m²/s`.
 *
 * @param quantity when given, only a unit of this quantity is found
 * @returns null when the text names no unit of the table
 */
export function parseUnit(text: string, quantity?: UnitQuantity): Unit | null {
  const spelled = plain(text);
  const found = named(spelled) ?? scaled(spelled);
  return found !== null && (quantity === undefined || found.quantity === quantity) ? found : null;
}

/** A unit with a power of ten before it, as tables print it (quantity calculus, SI Brochure section 5.4.1). */
function scaled(text: string): Unit | null {
  const match = POWER_OF_TEN.exec(text);
  if (!match) return null;
  const unit = named(text.slice(match[0].length));
  if (unit === null || unit.offset.numerator !== 0n) return null;
  const scale = match[1] === undefined ? `1e${match[3]}` : `${match[1]}e${match[2]}`;
  const power = exactDecimal(scale);
  if (power === null || power.numerator <= 0n) return null;
  return { ...unit, symbol: `${scale} ${unit.symbol}`, ucum: null, factor: multiply(unit.factor, power) };
}

/** The unit of a symbol that is known to be in the table. @throws {RangeError} when it is not */
export function unitOf(symbol: string): Unit {
  const unit = parseUnit(symbol);
  if (unit === null) throw new RangeError(`${symbol} is not a unit of the table`);
  return unit;
}

export const unitsOf = (quantity: UnitQuantity): readonly Unit[] => UNITS.filter((unit) => unit.quantity === quantity);

/** A number as a person would write it is taken as exactly that decimal number. */
function exact(value: number | string): Ratio {
  const read = exactDecimal(String(value));
  if (read === null) throw new RangeError(`${value} is not a finite decimal number`);
  return read;
}

const ZERO = ratioOf('0');

interface Conversions {
  value: (decimal: string) => number | null;
  difference: (decimal: string) => number | null;
}
const CONVERSIONS = new WeakMap<Unit, Conversions>();

function conversionsOf(unit: Unit): Conversions {
  const known = CONVERSIONS.get(unit);
  if (known) return known;
  const made = { value: linearMap(unit.offset, unit.factor), difference: linearMap(ZERO, unit.factor) };
  CONVERSIONS.set(unit, made);
  return made;
}

function converted(value: number | string, convert: (decimal: string) => number | null): number {
  const result = convert(String(value));
  if (result === null) throw new RangeError(`${value} is not a finite decimal number`);
  return result;
}

/**
 * Converts a value to SI: the double nearest to the exact result, so 25 °C is 298.15 K to the last bit.
 *
 * @param value a finite number or its decimal text (point as decimal sign)
 * @throws {RangeError} when the value is not a finite decimal number
 */
export const toSi = (value: number | string, unit: Unit): number => converted(value, conversionsOf(unit).value);

/** Converts a difference, such as an uncertainty, to SI: the zero of the scale does not matter. */
export const differenceToSi = (value: number | string, unit: Unit): number =>
  converted(value, conversionsOf(unit).difference);

/** Converts from SI; the double nearest to the exact result. */
export const fromSi = (value: number, unit: Unit): number =>
  toNumber(subtract(divide(exact(value), unit.factor), unit.offset));

/** Converts a difference from SI. */
export const differenceFromSi = (value: number, unit: Unit): number => toNumber(divide(exact(value), unit.factor));

/** How many of `other` one of `unit` is, offsets apart: cm²/s to m²/s is 1e-4. */
export const factorBetween = (unit: Unit, other: Unit): number => toNumber(divide(unit.factor, other.factor));
