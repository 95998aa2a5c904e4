/** A column of the grid one types into. */
interface TypedColumn {
  readonly key: 'temperature' | 'pressure' | 'diffusivity' | 'uncertainty' | 'replicates';
  /** As the service reads a header. */
  readonly symbol: string;
  /** Units it may be typed in, the usual one first. */
  readonly units: readonly string[];
  /** Stays a column even while it is empty. */
  readonly required: boolean;
}

export const TYPED_COLUMNS: readonly TypedColumn[] = [
  { key: 'temperature', symbol: 'T', units: ['K', '°C', '°F'], required: true },
  { key: 'pressure', symbol: 'P', units: ['kPa', 'Pa', 'bar', 'mbar', 'atm', 'Torr'], required: true },
  { key: 'diffusivity', symbol: 'D', units: ['cm²/s', 'm²/s', 'mm²/s'], required: true },
  { key: 'uncertainty', symbol: 'u(D)', units: ['%', 'cm²/s', 'm²/s', 'mm²/s'], required: false },
  { key: 'replicates', symbol: 'N', units: [], required: false },
];

export interface TypedGrid {
  readonly units: readonly string[];
  readonly rows: readonly (readonly string[])[];
}

const FIRST_ROWS = 6;
const blankRow = (): string[] => TYPED_COLUMNS.map(() => '');
const isBlank = (row: readonly string[]): boolean => row.every((cell) => cell.trim() === '');

export const emptyGrid = (): TypedGrid => ({
  units: TYPED_COLUMNS.map(({ units }) => units[0] ?? ''),
  rows: Array.from({ length: FIRST_ROWS }, blankRow),
});

/** The grid with cells filled from a place on, growing as needed; a free row always follows the last filled one. */
export function withCells(
  grid: TypedGrid,
  row: number,
  column: number,
  cells: readonly (readonly string[])[],
): TypedGrid {
  const rows = grid.rows.map((one) => [...one]);
  cells.forEach((line, i) => {
    while (rows.length <= row + i) rows.push(blankRow());
    line.slice(0, TYPED_COLUMNS.length - column).forEach((cell, j) => {
      rows[row + i]![column + j] = cell.trim();
    });
  });
  const last = rows.at(-1);
  if (last !== undefined && !isBlank(last)) rows.push(blankRow());
  return { ...grid, rows };
}

/** Tab-separated text with a header, as the service reads it; empty while nothing is typed. Row numbers stay those of the grid. */
export function typedText({ units, rows }: TypedGrid): string {
  const filled = rows.slice(0, rows.findLastIndex((row) => !isBlank(row)) + 1);
  if (filled.length === 0) return '';
  const used = TYPED_COLUMNS.map((column, i) => column.required || filled.some((row) => (row[i] ?? '').trim() !== ''));
  const line = (cells: readonly string[]): string => cells.filter((_, i) => used[i]).join('\t');
  const header = TYPED_COLUMNS.map(({ symbol, units: known }, i) =>
    known.length === 0 ? symbol : `${symbol} / (${units[i]})`,
  );
  return [line(header), ...filled.map((row) => line(TYPED_COLUMNS.map((_, i) => row[i] ?? '')))].join('\n');
}

/** Cells of a text from a spreadsheet's clipboard. */
export const cellsOf = (text: string): string[][] =>
  text
    .replace(/\r?\n$/, '')
    .split(/\r?\n/)
    .map((line) => line.split('\t'));
