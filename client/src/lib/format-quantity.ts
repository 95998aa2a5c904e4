const NO_BREAK_SPACE = '\u00a0';
const THIN_SPACE = '\u2009';
const MINUS = '\u2212';

/**
 * A value and its standard uncertainty, rounded together: u to two significant digits, the value to the same place
 * (GUM, JCGM 100:2008, 7.2.6).
 */
export interface RoundedQuantity {
  readonly value: string;
  readonly uncertainty: string;
  /** Places after the decimal point; negative where u is 100 or more and both are rounded to tens, hundreds, … */
  readonly places: number;
}

/** Places after the decimal point that show `uncertainty` to two significant digits; negative for tens, hundreds, … */
export function placesFor(uncertainty: number): number {
  const size = Math.abs(uncertainty);
  if (!(size > 0) || !Number.isFinite(size)) return 0;
  // Rounding may carry 0.0996 to 0.10; toExponential has rounded already.
  return 1 - Number(size.toExponential(1).split('e')[1]);
}

/** A number with `places` decimals, a true minus, and thin spaces between groups of three from four digits up. */
export function formatNumber(value: number, places: number): string {
  if (!Number.isFinite(value)) return '–';
  const step = places < 0 ? 10 ** -places : 1;
  const digits = (Math.abs(value) / step).toFixed(Math.max(0, places));
  const text = places < 0 ? String(Number(digits) * step) : digits;
  // −0.00 is 0.00: a rounded zero has no sign.
  const sign = value < 0 && Number(text) !== 0 ? MINUS : '';
  return sign + grouped(text);
}

/** The value with the fewest digits that give it back, at most `digits` significant ones; no powers of ten. */
export function formatShort(value: number, digits = 6): string {
  if (!Number.isFinite(value)) return '–';
  const [mantissa = '0', exponent = '0'] = Number(value.toPrecision(digits)).toExponential().split('e');
  const decimals = (mantissa.split('.')[1] ?? '').length;
  return formatNumber(value, Math.min(100, Math.max(0, decimals - Number(exponent))));
}

/** Sign always shown, except on what rounds to zero. */
export function formatSigned(value: number, places: number): string {
  const text = formatNumber(value, places);
  return value > 0 && Number(Math.abs(value).toFixed(places)) !== 0 ? `+${text}` : text;
}

export function roundTogether(value: number, uncertainty: number): RoundedQuantity {
  const places = placesFor(uncertainty);
  return { value: formatNumber(value, places), uncertainty: formatNumber(Math.abs(uncertainty), places), places };
}

/** `0.12455(50)`: the uncertainty in units of the last digits of the value. */
export function formatConcise(value: number, uncertainty: number): string {
  const places = placesFor(uncertainty);
  if (!(Math.abs(uncertainty) > 0)) return formatShort(value);
  const lastDigits = places < 0 ? formatNumber(uncertainty, places) : String(Math.round(uncertainty * 10 ** places));
  return `${formatNumber(value, places)}(${lastDigits})`;
}

/** A value too small or large for plain digits, as mantissa and power of ten, u in the last digits of the mantissa. */
export function conciseWithPower(value: number, uncertainty: number): { mantissa: string; exponent: number } {
  const exponent = value === 0 ? 0 : Math.floor(Math.log10(Math.abs(value)));
  if (exponent >= -3 && exponent < 6) return { mantissa: formatConcise(value, uncertainty), exponent: 0 };
  const power = 10 ** exponent;
  return { mantissa: formatConcise(value / power, uncertainty / power), exponent };
}

/** Value and unit, kept together by a no-break space. */
export const withUnit = (value: string, unit: string): string =>
  unit === '' || unit === '1' ? value : `${value}${NO_BREAK_SPACE}${unit}`;

/** From the lowest to the highest value, the unit at both ends: `283 K to 448 K`. */
export const formatRange = (low: number, high: number, unit: string, digits = 6): string =>
  `${withUnit(formatShort(low, digits), unit)} to ${withUnit(formatShort(high, digits), unit)}`;

function grouped(digits: string): string {
  const [whole = '', fraction = ''] = digits.split('.');
  const head = whole.length < 4 ? whole : whole.replace(/\B(?=(\d{3})+$)/g, THIN_SPACE);
  return fraction === '' ? head : `${head}.${fraction}`;
}

const dateFormat = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', year: 'numeric' });
const shortDateFormat = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });

/** `4 November 2026` */
export const formatDate = (iso: string): string => dateFormat.format(new Date(iso));
/** `4 Nov 2026` */
export const formatShortDate = (iso: string): string => shortDateFormat.format(new Date(iso)).replace('Sept', 'Sep');

/** `184 kB`: decimal multiples. */
export function formatBytes(bytes: number): string {
  if (bytes < 1000) return withUnit(String(bytes), 'B');
  return bytes < 1e6 ? withUnit(formatNumber(bytes / 1e3, 0), 'kB') : withUnit(formatNumber(bytes / 1e6, 1), 'MB');
}
