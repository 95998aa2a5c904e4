import type { Cell, DecimalSign } from './table.js';

/**
 * A number read from a cell as exact decimal text with a point.
 * `alternative` is the other reading, where a sign may stand before the decimals or between the thousands.
 */
export interface CellNumber {
  text: string;
  alternative: string | null;
}

const PLAIN = /^[+-]?(?:\d+(?:\.\d*)?|\.\d+)(?:e[+-]?\d{1,3})?$/i;
/** `1.2×10^-5`, `1.2*10-5` */
const TIMES_TEN = /^(.*?)[×x*·]10\^?([+-]?\d{1,3})$/i;
/** digits in threes, as ISO 80000-1 groups them with a space */
const SPACED = /^([+-]?\d{1,3})((?: \d{3})+)(?=$|[.,])/;

/** What nearly every cell of a long table looks like. */
const WITHOUT_DOUBT = { '.': /^-?\d{1,15}(?:\.\d{1,15})?$/, ',': /^-?\d{1,15}(?:,\d{1,15})?$/ };

/**
 * Reads a number the way it is written in tables: decimal point or comma, minus sign or hyphen, powers of ten as `e-5` or
 * `×10^-5`, thousands set off by spaces or by the sign that is not the decimal one.
 *
 * @returns null when it is no number
 */
export function parseCellNumber(cell: Cell, decimal: DecimalSign, decimalCertain: boolean): CellNumber | null {
  if (typeof cell === 'number') return Number.isFinite(cell) ? { text: String(cell), alternative: null } : null;
  if (cell === null) return null;
  if (decimalCertain && WITHOUT_DOUBT[decimal].test(cell)) return { text: cell.replace(',', '.'), alternative: null };
  const text = cell
    .replace(/[\u00a0\u2009\u202f]/g, ' ')
    .trim()
    .replace(/[−–]/g, '-')
    .replace(SPACED, (whole) => whole.replaceAll(' ', ''))
    .replace(/ ?([×x*·]) ?10/i, '$110')
    .replace(TIMES_TEN, '$1e$2');
  const other = decimal === '.' ? ',' : '.';
  if (text.includes(decimal) && text.indexOf(decimal) !== text.lastIndexOf(decimal))
    return grouped(text, decimal, other);
  return text.includes(other) ? grouped(text, other, decimal) : single(text, decimal, decimalCertain);
}

/** At most one sign, the decimal one. */
function single(text: string, decimal: DecimalSign, certain: boolean): CellNumber | null {
  const plain = text.replace(decimal, '.');
  if (!PLAIN.test(plain)) return null;
  const maybeThousands = !certain && /^[+-]?[1-9]\d{0,2}[.,]\d{3}$/.test(text);
  return { text: plain, alternative: maybeThousands ? text.replace(decimal, '') : null };
}

/** `thousands` stands between groups of three digits; when it stands there once and alone it may be a decimal sign. */
function grouped(text: string, thousands: DecimalSign, decimal: DecimalSign): CellNumber | null {
  const [t, d] = [`\\${thousands}`, `\\${decimal}`];
  const whole = new RegExp(`^[+-]?\\d{1,3}(?:${t}\\d{3})+(?:${d}\\d+)?$`);
  if (whole.test(text)) {
    const alone = text.split(thousands).length === 2 && !text.includes(decimal);
    // `0,125` beside decimal points is no group of thousands.
    if (alone && /^[+-]?0/.test(text)) return { text: text.replace(thousands, '.'), alternative: null };
    const joined = text.replaceAll(thousands, '').replace(decimal, '.');
    return { text: joined, alternative: alone ? text.replace(thousands, '.') : null };
  }
  const once = text.replace(thousands, '.');
  return text.split(thousands).length === 2 && PLAIN.test(once) ? { text: once, alternative: null } : null;
}

const NOTHING = new Set(['', '-', '–', '—', 'n/a', 'na', 'n.a.', 'nan', 'none', '...', '…']);

/** Whether a cell says that there is no value. */
export const saysNothing = (cell: Cell | undefined): boolean =>
  cell === null ||
  cell === undefined ||
  (typeof cell === 'string' && !/^\d/.test(cell) && NOTHING.has(cell.trim().toLowerCase()));
