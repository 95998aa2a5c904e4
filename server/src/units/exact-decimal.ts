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

/** @throws {RangeError} when the denominator is not positive */
export function ratio(numerator: bigint, denominator: bigint): Ratio {
  if (denominator <= 0n) throw new RangeError('the denominator of a ratio must be positive');
  return { numerator, denominator };
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
