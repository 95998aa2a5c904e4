import { parseUnit, type Unit, type UnitQuantity } from '../units/units.js';
import { readHeader, type HeaderReading } from './headers.js';
import {
  type ColumnMapping,
  type ColumnRole,
  isUncertainty,
  NAME_OF_ROLE,
  QUANTITY_OF_ROLE,
  STATED_AS_STANDARD,
  type TableMapping,
} from './mapping.js';
import { parseCellNumber } from './numbers.js';
import { cellText, isBlank, type RawTable, type TableRow } from './table.js';
import { guessUnit } from './unit-guesses.js';

/** A mapping found in a table, and for each column why. */
export interface Recognised {
  mapping: TableMapping;
  reasons: string[];
}

/** Titles and remarks may stand above a table; data begin within so many rows. */
const ROWS_BEFORE_DATA = 40;
const ROWS_LOOKED_AT = 500;

/** Finds header, units and the meaning of each column. */
export function recognise(table: RawTable): Recognised {
  const layout = findLayout(table);
  const data = dataRows(table, layout).slice(0, ROWS_LOOKED_AT);
  const medians = Array.from({ length: table.columnCount }, (_, column) => medianOf(table, data, column));
  const headers = namedColumns(table, layout);
  const roles = layout.headerRow === null ? rolesByPlace(medians) : headers.map(({ role }) => role);
  const columns: ColumnMapping[] = [];
  const reasons: string[] = [];
  roles.forEach((role, column) => {
    const header = headers[column] ?? NOTHING_SAID;
    const unitRowUnit = unitIn(table, layout.unitRow, column);
    const found = understandColumn({
      role,
      header,
      unitRowUnit,
      column,
      columns,
      medians,
      guessedRole: layout.headerRow === null,
    });
    columns.push(found.mapping);
    reasons.push(found.reason);
  });
  return {
    mapping: {
      ...layout,
      columns,
      temperature: null,
      pressure: null,
      diffusivityUncertainty: null,
      pressureOrigin: 'STATED',
      decimal: table.decimal,
    },
    reasons,
  };
}

interface Layout {
  headerRow: number | null;
  unitRow: number | null;
}

/** The rows that hold data under a layout: what stands below header and units. */
export function dataRows(table: RawTable, layout: Layout): readonly TableRow[] {
  const above = Math.max(layout.headerRow ?? 0, layout.unitRow ?? 0);
  const first = table.rows.findIndex(({ number }) => number > above);
  return first < 0 ? [] : table.rows.slice(first);
}

function findLayout(table: RawTable): Layout {
  const isData = (row: TableRow): boolean => {
    const filled = row.cells.filter((cell) => !isBlank(cell));
    const numbers = filled.filter((cell) => parseCellNumber(cell, table.decimal, true) !== null);
    return numbers.length > 0 && numbers.length >= filled.length / 2;
  };
  const first = table.rows.slice(0, ROWS_BEFORE_DATA).findIndex(isData);
  const above = table.rows[first - 1];
  if (first < 0) return { headerRow: table.rows[0]?.number ?? null, unitRow: null };
  if (above === undefined) return { headerRow: null, unitRow: null };
  const header = table.rows[first - 2];
  const filled = above.cells.filter((cell) => !isBlank(cell));
  const units = filled.filter((cell) => bracketed(cellText(cell)) !== null);
  return header !== undefined && units.length > filled.length / 2
    ? { headerRow: header.number, unitRow: above.number }
    : { headerRow: above.number, unitRow: null };
}

const bracketed = (text: string): Unit | null => parseUnit(text.replace(/^[[(](.*)[\])]$/, '$1'));

const NOTHING_SAID: HeaderReading = { role: null, unit: null, unknownUnit: null, uncertainty: null };

function namedColumns(table: RawTable, { headerRow }: Layout): HeaderReading[] {
  const cells = headerRow === null ? [] : (rowOf(table, headerRow)?.cells ?? []);
  const headers: HeaderReading[] = [];
  for (let column = 0; column < table.columnCount; column++) {
    const header = readHeader(cellText(cells[column]), headers[column - 1]?.role ?? null);
    const role = header.role ?? roleByUnit(header.unit);
    const taken = role !== null && role !== 'IGNORED' && headers.some((other) => other.role === role);
    headers.push({ ...header, role: taken ? null : role });
  }
  return headers;
}

const ROLE_OF_UNIT: Partial<Record<UnitQuantity, ColumnRole>> = {
  temperature: 'TEMPERATURE',
  pressure: 'PRESSURE',
  diffusivity: 'DIFFUSIVITY',
};

const roleByUnit = (unit: Unit | null): ColumnRole | null =>
  unit === null ? null : (ROLE_OF_UNIT[unit.quantity] ?? null);

/** Without a header the first columns of numbers are taken in the usual order; it has to be confirmed. */
function rolesByPlace(medians: readonly (number | null)[]): (ColumnRole | null)[] {
  const numeric = medians.filter((median) => median !== null).length;
  const order: ColumnRole[] =
    numeric < 3
      ? ['TEMPERATURE', 'DIFFUSIVITY']
      : ['TEMPERATURE', 'PRESSURE', 'DIFFUSIVITY', 'DIFFUSIVITY_UNCERTAINTY'];
  return medians.map((median) => (median === null ? null : (order.shift() ?? null)));
}

const rowOf = (table: RawTable, number: number | null): TableRow | undefined =>
  table.rows.find((row) => row.number === number);

const unitIn = (table: RawTable, unitRow: number | null, column: number): Unit | null =>
  unitRow === null ? null : bracketed(cellText(rowOf(table, unitRow)?.cells[column]));

function medianOf(table: RawTable, rows: readonly TableRow[], column: number): number | null {
  const numbers = rows
    .map((row) => parseCellNumber(row.cells[column] ?? null, table.decimal, true))
    .filter((number) => number !== null)
    .map(({ text }) => Number(text))
    .sort((a, b) => a - b);
  return numbers[Math.floor(numbers.length / 2)] ?? null;
}

interface ColumnFacts {
  role: ColumnRole | null;
  header: HeaderReading;
  unitRowUnit: Unit | null;
  column: number;
  /** columns to the left, understood */
  columns: readonly ColumnMapping[];
  medians: readonly (number | null)[];
  guessedRole: boolean;
}

function understandColumn(facts: ColumnFacts): { mapping: ColumnMapping; reason: string } {
  const { role, header, unitRowUnit, guessedRole } = facts;
  if (role === null) {
    return {
      mapping: { role: 'IGNORED', unit: null, unitOrigin: 'STATED', uncertainty: null },
      reason: 'names no quantity',
    };
  }
  const uncertainty = isUncertainty(role) ? (header.uncertainty ?? STATED_AS_STANDARD) : null;
  const named = guessedRole
    ? `taken for the ${NAME_OF_ROLE[role]} by its place`
    : `the header names the ${NAME_OF_ROLE[role]}`;
  if (QUANTITY_OF_ROLE[role] === undefined) {
    return { mapping: { role, unit: null, unitOrigin: 'STATED', uncertainty }, reason: named };
  }
  const stated = header.unit ?? unitRowUnit;
  if (stated !== null) {
    const where = header.unit === null ? 'the row of units' : 'the header';
    return {
      mapping: { role, unit: stated.symbol, unitOrigin: guessedRole ? 'GUESSED' : 'STATED', uncertainty },
      reason: `${named}; unit from ${where}`,
    };
  }
  if (header.unknownUnit !== null) {
    return {
      mapping: { role, unit: header.unknownUnit, unitOrigin: 'STATED', uncertainty },
      reason: `${named}; its unit is not known`,
    };
  }
  const guess = guessUnit(role, facts.medians[facts.column] ?? null, facts);
  return {
    mapping: {
      role,
      unit: guess?.unit ?? null,
      unitOrigin: guess?.certain && !guessedRole ? 'STATED' : 'GUESSED',
      uncertainty,
    },
    reason: guess === null ? `${named}; no unit found` : `${named}; ${guess.reason}`,
  };
}
