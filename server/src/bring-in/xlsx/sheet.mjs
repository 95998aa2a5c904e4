// @ts-check
import { Refused } from './archive.mjs';
import { readXml } from './xml.mjs';

/**
 * @typedef {import('../table.js').Cell} Cell
 * @typedef {import('../table.js').CellMark} CellMark
 * @typedef {import('../table.js').TableRow} TableRow
 * @typedef {{ rows: number, columns: number, cellCharacters: number }} SheetLimits
 * @typedef {{ column: number, type: string, format: number, formula: string | null, value: string | null }} RawCell
 */

const MS_PER_DAY = 86_400_000;

/**
 * Reads a sheet's rows as a stream, empty ones left out.
 *
 * @param {import('./archive.mjs').Archive} archive
 * @param {string} path
 * @param {import('./workbook.mjs').Workbook} workbook
 * @param {SheetLimits} limits
 * @param {(rows: TableRow[]) => Promise<unknown>} deliver
 */
export async function readSheet(archive, path, workbook, limits, deliver) {
  /** @type {TableRow[]} */
  let ready = [];
  let count = 0;
  let number = 0;
  let lastColumn = -1;
  /** @type {Cell[]} */
  let cells = [];
  /** @type {CellMark[]} */
  let marks = [];
  /** @type {RawCell | null} */
  let cell = null;
  /** @type {'formula' | 'value' | null} */
  let collects = null;

  const handlers = {
    /** @param {string} name @param {Record<string, string>} attributes */
    open(name, attributes) {
      if (name === 'row') {
        number = attributes.r === undefined ? number + 1 : Number(attributes.r);
        lastColumn = -1;
        cells = [];
        marks = [];
      } else if (name === 'c') {
        // A cell may leave its address out: it then follows the one before.
        const column = attributes.r === undefined ? lastColumn + 1 : columnOf(attributes.r);
        lastColumn = column;
        cell = { column, type: attributes.t ?? 'n', format: Number(attributes.s ?? 0), formula: null, value: null };
      } else if (cell) {
        if (name === 'f') {
          cell.formula = '';
          collects = 'formula';
        } else if (name === 'v' || name === 't') {
          cell.value ??= '';
          collects = 'value';
        }
      }
    },
    /** @param {string} text */
    text(text) {
      if (!cell || collects === null) return;
      cell[collects] += text;
      if ((cell[collects]?.length ?? 0) > limits.cellCharacters) throw tooLong(number, limits);
    },
    /** @param {string} name */
    close(name) {
      if (name === 'f' || name === 'v' || name === 't') collects = null;
      else if (name === 'c' && cell) {
        place(cell, cells, marks, workbook, { number, limits });
        cell = null;
      } else if (name === 'row' && cells.some((value) => value !== null && value !== undefined && value !== '')) {
        if (++count > limits.rows) throw new Refused('TOO_MANY_ROWS', 'The sheet has more rows than a table may have.');
        ready.push(marks.length > 0 ? { number, cells: [...cells], marks } : { number, cells: [...cells] });
      }
    },
  };
  await readXml(archive.text(path), handlers, async () => {
    if (ready.length === 0) return;
    await deliver(ready);
    ready = [];
  });
}

/**
 * @param {RawCell} cell
 * @param {Cell[]} cells
 * @param {CellMark[]} marks
 * @param {import('./workbook.mjs').Workbook} workbook
 * @param {{ number: number, limits: SheetLimits }} where
 */
function place(cell, cells, marks, workbook, { number, limits }) {
  if (cell.value === null && cell.formula === null) return;
  if (!(cell.column >= 0 && cell.column < limits.columns)) {
    throw new Refused('TOO_MANY_COLUMNS', `Row ${number} has more than ${limits.columns} columns.`);
  }
  while (cells.length < cell.column) cells.push(null);
  const { value, mark } = valueOf(cell, workbook);
  if (typeof value === 'string' && value.length > limits.cellCharacters) throw tooLong(number, limits);
  cells[cell.column] = value;
  if (mark) marks.push({ column: cell.column, ...mark });
  if (cell.formula !== null) marks.push({ column: cell.column, kind: 'FORMULA', detail: cell.formula });
}

/**
 * @param {RawCell} cell
 * @param {import('./workbook.mjs').Workbook} workbook
 * @returns {{ value: Cell, mark?: Omit<CellMark, 'column'> }}
 */
function valueOf({ type, format, value }, { isDate, from1904, shared }) {
  if (value === null) return { value: null };
  switch (type) {
    case 's':
      return { value: shared[Number(value)] ?? '' };
    case 'str':
    case 'inlineStr':
      return { value };
    case 'e':
      return { value, mark: { kind: 'ERROR', detail: value } };
    case 'b':
      return { value: value === '1' ? 'TRUE' : 'FALSE', mark: { kind: 'BOOLEAN', detail: value } };
    case 'd':
      return { value, mark: { kind: 'DATE', detail: value } };
    default: {
      const number = Number(value);
      if (value.trim() === '' || !Number.isFinite(number)) return { value };
      if (!isDate[format]) return { value: number };
      const date = isoDate(number, from1904);
      return date === null ? { value: number } : { value: date, mark: { kind: 'DATE', detail: date } };
    }
  }
}

/**
 * Days since 1899-12-30 (which makes up for the 29 February 1900 that the format counts), or since 1904-01-01.
 *
 * @param {number} days
 * @param {boolean} from1904
 */
function isoDate(days, from1904) {
  const date = new Date(Date.UTC(from1904 ? 1904 : 1899, from1904 ? 0 : 11, from1904 ? 1 : 30) + days * MS_PER_DAY);
  if (Number.isNaN(date.getTime())) return null;
  const text = date.toISOString();
  return text.endsWith('T00:00:00.000Z') ? text.slice(0, 10) : text;
}

/** @param {string} address such as `AB12` */
function columnOf(address) {
  let column = 0;
  for (const letter of address.match(/^[A-Z]{1,3}/)?.[0] ?? '') column = 26 * column + letter.charCodeAt(0) - 64;
  return column - 1;
}

/** @param {number} row @param {SheetLimits} limits */
const tooLong = (row, limits) =>
  new Refused('CELL_TOO_LONG', `A cell of row ${row} has more than ${limits.cellCharacters} characters.`);
