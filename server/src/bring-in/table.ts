/** A cell as it stands in the source: text, a number of a workbook, or null where there is nothing. */
export type Cell = string | number | null;

/** What is unusual about a workbook's cell. `detail`: the formula, the error code or the date as ISO 8601. */
export interface CellMark {
  column: number;
  kind: 'FORMULA' | 'DATE' | 'ERROR' | 'BOOLEAN';
  detail: string;
}

export interface TableRow {
  /** from 1, as a spreadsheet counts; empty rows count too */
  number: number;
  cells: readonly Cell[];
  marks?: readonly CellMark[];
}

export type Delimiter = ',' | ';' | '\t';
export type DecimalSign = '.' | ',';

/** A table as it was read, before anything is understood. */
export interface RawTable {
  origin: 'TEXT' | 'WORKBOOK';
  /** without the empty ones */
  rows: readonly TableRow[];
  columnCount: number;
  decimal: DecimalSign;
  /** false when nothing in the table tells a decimal sign from a sign between thousands */
  decimalCertain: boolean;
  encoding: string | null;
  delimiter: Delimiter | null;
  sheet: string | null;
  sheets: readonly string[];
}

/** Why a file or text cannot be read as a table at all. */
export type UnreadableCode =
  | 'EMPTY'
  | 'NOT_A_TABLE'
  | 'TOO_MANY_ROWS'
  | 'TOO_MANY_COLUMNS'
  | 'CELL_TOO_LONG'
  | 'QUOTE_NOT_CLOSED'
  | 'NO_SUCH_SHEET'
  | 'WORKBOOK_DAMAGED'
  | 'WORKBOOK_TOO_LARGE'
  | 'WORKBOOK_UNSAFE'
  | 'WORKBOOK_TOO_SLOW';

/** Thrown by the readers, answered as a problem: the message is meant for the person who brought the table. */
export class UnreadableTable extends Error {
  constructor(
    readonly code: UnreadableCode,
    message: string,
  ) {
    super(message);
    this.name = 'UnreadableTable';
  }
}

/** Bytes that can be read more than once; each call starts from the beginning. */
export type ByteSource = () => AsyncIterable<Uint8Array>;

export const isBlank = (cell: Cell | undefined): boolean =>
  cell === null || cell === undefined || (typeof cell === 'string' && cell.trim() === '');

export const cellText = (cell: Cell | undefined): string =>
  cell === null || cell === undefined ? '' : String(cell).trim();
