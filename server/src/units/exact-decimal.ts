/** A rational number kept exactly: numerator / denominator, the denominator positive. */
export interface Ratio {
  readonly numerator: bigint;
  readonly denominator: bigint;
}

const DECIMAL = /^([+-]?)(\d*)(?:\.(\d*))?(?:[eE]([+-]?\d+))?$/;

/** The largest decimal exponent read; beyond it a double is 0 or infinite anyway. */
const MAX_EXPONENT = 400;

/** More digits than decide the rounding of a quotient to a double, with a digit that says whether more follow. */
const QUOTIENT_DIGITS = 40;

/**
 * Reads a decimal text such as `101.325`, `-1.2e-5` or `.5` without rounding.
 *
 * @returns the number, or null when the text is not a decimal number
 */
export function exactDecimal(text: string): Ratio | null {
  const match = DECIMAL.exec(text);
  if (!match) return null;
  const [, sign, whole = '', fraction = '', exponentText = '0'] = match;
  if (whole === '' && fraction === '') return null;
  const exponent = Number(exponentText);
  if (Math.abs(exponent) > MAX_EXPONENT) return null;
  const digits = BigInt(`${whole}${fraction}`) * (sign === '-' ? -1n : 1n);
  const shift = exponent - fraction.length;
  return shift >= 0
    ? { numerator: digits * 10n ** BigInt(shift), denominator: 1n }
    : ratio(digits, 10n ** BigInt(-shift));
}

/** In lowest terms. @throws {RangeError} when the denominator is not positive */
export function ratio(numerator: bigint, denominator: bigint): Ratio {
  if (denominator <= 0n) throw new RangeError('the denominator of a ratio must be positive');
  const divisor = greatestCommonDivisor(numerator < 0n ? -numerator : numerator, denominator);
  return { numerator: numerator / divisor, denominator: denominator / divisor };
}

function greatestCommonDivisor(a: bigint, b: bigint): bigint {
  let [larger, smaller] = [a, b];
  while (smaller !== 0n) [larger, smaller] = [smaller, larger % smaller];
  return larger === 0n ? 1n : larger;
}

/** A ratio from two decimal texts, both exact: `ratioOf('101325', '760')`. */
export function ratioOf(numerator: string, denominator = '1'): Ratio {
  const over = exactDecimal(numerator);
  const under = exactDecimal(denominator);
  if (!over || !under) throw new RangeError(`${numerator} / ${denominator} is not a ratio of decimal numbers`);
  return divide(over, under);
}

export const add = (a: Ratio, b: Ratio): Ratio =>
  ratio(a.numerator * b.denominator + b.numerator * a.denominator, a.denominator * b.denominator);

export const subtract = (a: Ratio, b: Ratio): Ratio => add(a, { ...b, numerator: -b.numerator });

export const multiply = (a: Ratio, b: Ratio): Ratio => ratio(a.numerator * b.numerator, a.denominator * b.denominator);

/** @throws {RangeError} when `b` is not positive; conversion factors are */
export const divide = (a: Ratio, b: Ratio): Ratio => ratio(a.numerator * b.denominator, a.denominator * b.numerator);

/** The double nearest to the ratio. */
export function toNumber({ numerator, denominator }: Ratio): number {
  const negative = numerator < 0n;
  const size = negative ? -numerator : numerator;
  // Enough digits of the quotient, then a 1 where anything was left over: the decimal text rounds as the ratio does.
  const lead = Math.max(0, QUOTIENT_DIGITS + denominator.toString().length - size.toString().length);
  const scaled = size * 10n ** BigInt(lead);
  const quotient = scaled / denominator;
  const sticky = scaled % denominator === 0n ? '0' : '1';
  return Number(`${negative ? '-' : ''}${quotient}${sticky}e${-lead - 1}`);
}

/** A linear map y = (x + offset) · factor in whole numbers small enough for a double to hold each exactly. */
interface SmallMap {
  offsetOver: number;
  offsetUnder: number;
  factorOver: number;
  factorUnder: number;
}

/**
 * The map (x + offset) · factor on decimal texts, its results the doubles nearest to the exact ones.
 *
 * Where numerator and denominator of a result fit into a double each, one division rounds correctly (IEEE 754), which is
 * some ten times faster than whole numbers of any length; tables hold a hundred thousand rows.
 */
export function linearMap(offset: Ratio, factor: Ratio): (decimal: string) => number | null {
  const small: SmallMap = {
    offsetOver: Number(offset.numerator),
    offsetUnder: Number(offset.denominator),
    factorOver: Number(factor.numerator),
    factorUnder: Number(factor.denominator),
  };
  const isSmall = Object.values(small).every(Number.isSafeInteger);
  return (decimal) => {
    const quick = isSmall ? mapSmall(decimal, small) : null;
    if (quick !== null) return quick;
    const exact = exactDecimal(decimal);
    return exact === null ? null : toNumber(multiply(add(exact, offset), factor));
  };
}

const SHORT_DECIMAL = /^(-?)(\d{0,12})(?:\.(\d{0,12}))?$/;
const POWERS_OF_TEN = Array.from({ length: 13 }, (_, power) => 10 ** power);

function mapSmall(decimal: string, { offsetOver, offsetUnder, factorOver, factorUnder }: SmallMap): number | null {
  const match = SHORT_DECIMAL.exec(decimal);
  if (!match) return null;
  const [, sign, whole = '', fraction = ''] = match;
  const digits = whole + fraction;
  const scale = POWERS_OF_TEN[fraction.length];
  if (digits.length === 0 || digits.length > 15 || scale === undefined) return null;
  const unscaled = (sign === '-' ? -1 : 1) * Number(digits) * offsetUnder;
  const over = (unscaled + offsetOver * scale) * factorOver;
  const under = scale * offsetUnder * factorUnder;
  // A product or sum that is a safe integer was made from exact parts: doubles never come back below the limit.
  const isExact = [unscaled, offsetOver * scale, over, under].every(Number.isSafeInteger);
  return isExact ? over / under : null;
}
