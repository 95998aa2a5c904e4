import { fromSi, unitOf } from '../units/units.js';

const NO_BREAK_SPACE = '\u00a0';
const THIN_SPACE = '\u2009';
const MINUS = '\u2212';

/** Units of the printed sheet, whatever units its reader prefers on the page. */
export const PRINTED_UNITS = {
  temperature: unitOf('K'),
  celsius: unitOf('°C'),
  pressure: unitOf('kPa'),
  diffusivity: unitOf('cm²/s'),
} as const;
export type PrintedQuantity = keyof typeof PRINTED_UNITS;

/** An SI value in the unit of the printed sheet. */
export const inPrintedUnit = (quantity: PrintedQuantity, value: number): number =>
  fromSi(value, PRINTED_UNITS[quantity]);

/** Decimal places that show `uncertainty` to two significant digits (GUM, JCGM 100:2008, 7.2.6); 0 where both stand before the point. */
export function placesFor(uncertainty: number): number {
  const size = Math.abs(uncertainty);
  if (!(size > 0) || !Number.isFinite(size)) return 0;
  // toExponential rounds first, so that 0.0996 counts as 0.10.
  const exponent = Number(size.toExponential(1).split('e')[1]);
  return Math.min(100, Math.max(0, 1 - exponent));
}

/** A number with `places` decimals, a true minus, and thin spaces between groups of three from four digits up. */
export function formatNumber(value: number, places: number): string {
  const digits = Math.abs(value).toFixed(places);
  // A rounded zero has no sign.
  const sign = value < 0 && Number(digits) !== 0 ? MINUS : '';
  const [whole = '', fraction] = digits.split('.');
  const grouped = whole.length < 4 ? whole : whole.replace(/\B(?=(\d{3})+$)/g, THIN_SPACE);
  return sign + (fraction === undefined ? grouped : `${grouped}.${fraction}`);
}

/** The fewest digits that give the value back, at most `digits` significant ones. */
export function formatShort(value: number, digits = 6): string {
  const [mantissa = '0', exponent = '0'] = Number(value.toPrecision(digits)).toExponential().split('e');
  const decimals = mantissa.split('.')[1]?.length ?? 0;
  return formatNumber(value, Math.min(100, Math.max(0, decimals - Number(exponent))));
}

/** With so many significant digits, zeros at the end included. */
export function formatSignificant(value: number, digits: number): string {
  const exponent = Number(value.toExponential(digits - 1).split('e')[1]);
  return formatNumber(value, Math.min(100, Math.max(0, digits - 1 - exponent)));
}

/** The sign always shown, except on what rounds to zero. */
export function formatSigned(value: number, places: number): string {
  const text = formatNumber(value, places);
  return value > 0 && Number(value.toFixed(places)) !== 0 ? `+${text}` : text;
}

/** An uncertainty alone: two significant digits. */
export const formatUncertainty = (uncertainty: number): string => formatNumber(uncertainty, placesFor(uncertainty));

/** `0.12455(50)`: the value, and its standard uncertainty in units of the last digits (GUM 7.2.2). */
export function formatConcise(value: number, uncertainty: number): string {
  if (!(uncertainty > 0)) return formatShort(value);
  const places = placesFor(uncertainty);
  return `${formatNumber(value, places)}(${Math.round(uncertainty * 10 ** places)})`;
}

/** A value with its unit, kept on one line; a pure number alone. */
export const withUnit = (value: string, unit: string): string =>
  unit === '' || unit === '1' ? value : `${value}${NO_BREAK_SPACE}${unit}`;

/** An SI value in the unit of the printed sheet, with the unit. */
export const formatQuantity = (quantity: PrintedQuantity, value: number): string =>
  withUnit(formatShort(inPrintedUnit(quantity, value), 8), PRINTED_UNITS[quantity].symbol);

/** `283.15 K to 448.15 K` */
export const formatExtent = (quantity: PrintedQuantity, minimum: number, maximum: number): string =>
  `${formatQuantity(quantity, minimum)} to ${formatQuantity(quantity, maximum)}`;

const MONTHS = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
] as const;

/** `4 November 2026`, the day in UTC */
export function formatDate(iso: string): string {
  const date = new Date(iso);
  return `${date.getUTCDate()} ${MONTHS[date.getUTCMonth()] ?? ''} ${date.getUTCFullYear()}`;
}
