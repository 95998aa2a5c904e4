import type { DecimalSign, Delimiter } from '../table.js';

export interface Dialect {
  delimiter: Delimiter;
  decimal: DecimalSign;
  decimalCertain: boolean;
}

const DELIMITERS: readonly Delimiter[] = ['\t', ';', ','];
const LINES_LOOKED_AT = 200;

/** Splits a line at the delimiter outside double quotes; quotes are dropped. Enough for looking, not for reading. */
function split(line: string, delimiter: Delimiter): string[] {
  const cells: string[] = [];
  let cell = '';
  let quoted = false;
  for (const character of line) {
    if (character === '"') quoted = !quoted;
    else if (character === delimiter && !quoted) {
      cells.push(cell);
      cell = '';
    } else cell += character;
  }
  return [...cells, cell];
}

/** Share of the lines that have as many columns as most, and that number. */
function regularity(lines: readonly string[], delimiter: Delimiter): { columns: number; share: number } {
  const counts = new Map<number, number>();
  for (const line of lines) {
    const columns = split(line, delimiter).length;
    counts.set(columns, (counts.get(columns) ?? 0) + 1);
  }
  const [columns, lineCount] = [...counts].reduce(
    (a, b) => (b[1] > a[1] || (b[1] === a[1] && b[0] > a[0]) ? b : a),
    [1, 0],
  );
  return { columns, share: lineCount / Math.max(1, lines.length) };
}

/**
 * Finds what stands between the columns and which decimal sign is used, from the beginning of a text.
 * A tab or semicolon that splits the lines evenly wins over the comma, which may then be a decimal sign.
 */
export function sniffDialect(head: string): Dialect {
  const lines = head
    .split(/\r\n|\n|\r/)
    .filter((line) => line.trim() !== '')
    .slice(0, LINES_LOOKED_AT);
  const scored = DELIMITERS.map((delimiter) => ({ delimiter, ...regularity(lines, delimiter) }));
  const even = scored.filter(({ columns, share }) => columns > 1 && share >= 0.6);
  const chosen = even[0] ?? scored.filter(({ columns }) => columns > 1).sort((a, b) => b.share - a.share)[0];
  const delimiter = chosen?.delimiter ?? ',';
  return { delimiter, ...sniffDecimal(lines.flatMap((line) => split(line, delimiter))) };
}

const WITH_COMMA = /^[+\-−]?\d*,\d+(?:e[+\-−]?\d+)?$/i;
const WITH_POINT = /^[+\-−]?\d*\.\d+(?:e[+\-−]?\d+)?$/i;
/** `1,013` and `1.013` may be a thousand and thirteen. */
const MAYBE_THOUSANDS = /^[+\-−]?[1-9]\d{0,2}[.,]\d{3}$/;

/** Finds the decimal sign from cells of text. */
export function sniffDecimal(cells: readonly string[]): Pick<Dialect, 'decimal' | 'decimalCertain'> {
  const numbers = cells.map((cell) => cell.trim());
  const commas = numbers.filter((cell) => WITH_COMMA.test(cell));
  const points = numbers.filter((cell) => WITH_POINT.test(cell));
  const sure = (found: string[]): number => found.filter((cell) => !MAYBE_THOUSANDS.test(cell)).length;
  const [sureCommas, surePoints] = [sure(commas), sure(points)];
  if (sureCommas !== surePoints) return { decimal: sureCommas > surePoints ? ',' : '.', decimalCertain: true };
  return { decimal: commas.length > points.length ? ',' : '.', decimalCertain: commas.length + points.length === 0 };
}
