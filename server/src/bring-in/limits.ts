/** What one table may hold. */
export const MAX_DATA_ROWS = 100_000;
/** Title lines, header and units may stand above the data. */
export const MAX_ROWS = MAX_DATA_ROWS + 50;
export const MAX_COLUMNS = 60;
export const MAX_CELL_CHARACTERS = 1_000;
export const MAX_FILE_BYTES = 20 * 1024 * 1024;

export interface WorkbookLimits {
  entries: number;
  unpackedBytes: number;
  /** unpacked : packed, for what unpacks to more than `ratioFromBytes` */
  ratio: number;
  ratioFromBytes: number;
  rows: number;
  columns: number;
  cellCharacters: number;
}

/** What a workbook may unpack to, and what reading one may cost. */
export const WORKBOOK_LIMITS: Readonly<WorkbookLimits> = {
  entries: 50,
  unpackedBytes: 200 * 1024 * 1024,
  ratio: 100,
  ratioFromBytes: 1024 * 1024,
  rows: MAX_ROWS,
  columns: MAX_COLUMNS,
  cellCharacters: MAX_CELL_CHARACTERS,
};
export const WORKBOOK_HEAP_MIB = 256;
export const WORKBOOK_WALL_MS = 30_000;
