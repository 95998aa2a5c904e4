/**
 * A number as people type it: decimal point or comma, true minus, thin or no-break spaces between groups of digits.
 *
 * @returns null where the text is no number
 */
export function parseNumber(text: string): number | null {
  const plain = text
    .trim()
    .replace(/[\s\u00a0\u2009\u202f]/g, '')
    .replace('\u2212', '-')
    .replace(',', '.');
  if (!/^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(plain)) return null;
  const value = Number(plain);
  return Number.isFinite(value) ? value : null;
}
