import type { UsualUncertainty } from '../series/measurement-methods.js';
import type { Expectation } from './doubts/context.js';
import { type Issue, type IssueCode, isOpen } from './issues.js';
import type { TableMapping } from './mapping.js';
import type { RowState, UnderstoodPoint } from './points.js';
import { cellText, type DecimalSign, type Delimiter, type RawTable } from './table.js';
import type { Understood } from './understand.js';

/** So many rows and issues go into one answer, and the rows of those issues; the rest are counted. */
export const ROWS_SHOWN = 500;
export const ISSUES_SHOWN = 500;

/** A row as it was brought and as it was understood, SI; `estimate` is what the pair's estimate is there, m²/s. */
export interface ShownRow {
  number: number;
  cells: string[];
  state: RowState;
  point: Omit<UnderstoodPoint, 'row'> | null;
  estimate: number | null;
}

interface Span {
  minimum: number;
  maximum: number;
}

/** What Diffolio understood of a table. */
export interface ReadAnswer {
  source: {
    origin: RawTable['origin'];
    encoding: string | null;
    delimiter: Delimiter | null;
    decimal: DecimalSign;
    sheet: string | null;
    sheets: readonly string[];
    columnCount: number;
    /** below header and units */
    rowCount: number;
  };
  columns: { header: string; reason: string | null }[];
  mapping: TableMapping;
  rows: ShownRow[];
  issues: Issue[];
  issueCounts: Partial<Record<IssueCode, number>>;
  /** what still stands in the way of keeping the table */
  openCount: number;
  pointCount: number;
  temperature: Span | null;
  pressure: Span | null;
  commonRelativeUncertainty: number | null;
  /** what points without a stated u(D) will be given */
  assignedUncertainty: { relative: number; source: string; pointCount: number };
  estimateLabel: string | null;
  isComplete: boolean;
}

export interface ReadFacts {
  table: RawTable;
  reasons: readonly string[] | null;
  understood: Understood;
  expectation: Expectation;
  usual: UsualUncertainty;
}

export function readAnswer({ table, reasons, understood, expectation, usual }: ReadFacts): ReadAnswer {
  const { mapping, points } = understood;
  const issues = [...understood.issues].sort((x, y) => Number(isOpen(y)) - Number(isOpen(x))).slice(0, ISSUES_SHOWN);
  const header = table.rows.find(({ number }) => number === mapping.headerRow);
  return {
    source: {
      origin: table.origin,
      encoding: table.encoding,
      delimiter: table.delimiter,
      decimal: mapping.decimal,
      sheet: table.sheet,
      sheets: table.sheets,
      columnCount: table.columnCount,
      rowCount: understood.rows.length,
    },
    columns: mapping.columns.map((_, i) => ({ header: cellText(header?.cells[i]), reason: reasons?.[i] ?? null })),
    mapping,
    rows: shownRows(understood, issues, expectation),
    issues,
    issueCounts: countByCode(understood.issues),
    openCount: understood.openIssues.length,
    pointCount: points.length,
    temperature: spanOf(points.map(({ temperature }) => temperature)),
    pressure: spanOf(points.map(({ pressure }) => pressure)),
    commonRelativeUncertainty: understood.commonRelativeUncertainty,
    assignedUncertainty: {
      relative: usual.value,
      source: usual.source,
      pointCount: points.filter(({ diffusivityUncertainty }) => diffusivityUncertainty === null).length,
    },
    estimateLabel: expectation.estimateLabel,
    isComplete: understood.isComplete,
  };
}

/** The first rows, and those further down about which something is said. */
function shownRows(
  { rows, states, points, mapping }: Understood,
  issues: readonly Issue[],
  { estimate }: Expectation,
): ShownRow[] {
  const byRow = new Map(points.map(({ row, ...point }) => [row, point]));
  const asked = new Set(issues.flatMap(({ row, sameAsRow }) => [row, sameAsRow]));
  return rows.flatMap((row, i) => {
    if (i >= ROWS_SHOWN && !asked.has(row.number)) return [];
    const point = byRow.get(row.number) ?? null;
    return {
      number: row.number,
      cells: mapping.columns.map((_, column) => cellText(row.cells[column])),
      state: states[i] ?? 'OPEN',
      point,
      estimate: point && estimate ? estimate(point.temperature, point.pressure) : null,
    };
  });
}

function countByCode(issues: readonly Issue[]): Partial<Record<IssueCode, number>> {
  const counts: Partial<Record<IssueCode, number>> = {};
  for (const { code } of issues) counts[code] = (counts[code] ?? 0) + 1;
  return counts;
}

function spanOf(values: readonly number[]): Span | null {
  if (values.length === 0) return null;
  return values.reduce<Span>(
    ({ minimum, maximum }, value) => ({ minimum: Math.min(minimum, value), maximum: Math.max(maximum, value) }),
    { minimum: Infinity, maximum: -Infinity },
  );
}

/** Where an issue belongs, as the path of a problem: `rows.7.columns.2`. */
export function pathOf({ row, column }: Issue): string | null {
  const parts = [...(row === null ? [] : [`rows.${row}`]), ...(column === null ? [] : [`columns.${column}`])];
  return parts.length === 0 ? null : parts.join('.');
}
