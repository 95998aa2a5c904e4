import { checkMapping } from './check-mapping.js';
import { COLUMN_OF_ROLE, convert, type Measured } from './convert.js';
import { cellUnitDoubts } from './doubts/cell-units.js';
import { columnUnitDoubts } from './doubts/column-units.js';
import type { Expectation } from './doubts/context.js';
import { diffusivitySizeDoubts } from './doubts/diffusivity-size.js';
import { duplicateDoubts } from './doubts/duplicates.js';
import { fallingDoubts } from './doubts/falling.js';
import { Judged } from './doubts/judged.js';
import { decide, type Decisions, type Issue, isOpen, refusal } from './issues.js';
import type { TableMapping } from './mapping.js';
import { pointsOf, type RowState, type UnderstoodPoint } from './points.js';
import { dataRows } from './recognise.js';
import type { RawTable, TableRow } from './table.js';
import { commonPart } from './uncertainty.js';

/** What was understood of a table under a mapping and the decisions taken. */
export interface Understood {
  /** the mapping, with the units that were decided */
  mapping: TableMapping;
  rows: readonly TableRow[];
  states: RowState[];
  /** one for each row whose state is KEPT or OPEN and whose T, P and D could be read */
  points: UnderstoodPoint[];
  issues: Issue[];
  /** relative standard uncertainty common to all points, when the table states one */
  commonRelativeUncertainty: number | null;
  pressureOrigin: TableMapping['pressureOrigin'];
  /** what still has to be mended or decided, rows that are left out apart */
  openIssues: Issue[];
  isComplete: boolean;
}

/** Applies a mapping to a table: points in SI, and at each cell that cannot be taken as it stands what to do about it. */
export function understand(
  table: RawTable,
  given: TableMapping,
  decisions: Decisions,
  expectation: Expectation,
): Understood {
  const rows = dataRows(table, given);
  const faults = checkMapping(given);
  if (rows.length === 0)
    faults.push(refusal('NO_ROWS', { row: null, column: null }, 'There is a header and no data below it.'));
  if (faults.some(({ severity }) => severity === 'REFUSAL'))
    return notUnderstood(rows, given, decide(faults, decisions));

  const first = judge(rows, given, table, expectation);
  const columnIssues = decide([...faults, ...first.columnDoubts], decisions);
  const mapping = withDecidedUnits(given, columnIssues);
  const { measured, issues } = mapping === given ? first : judge(rows, mapping, table, expectation);
  const common = commonPart(measured, mapping);
  return conclude(rows, mapping, measured, {
    issues: [...columnIssues, ...common.issues, ...decide(issues, decisions)],
    common: common.value,
  });
}

interface Judgement {
  measured: Measured;
  /** about whole columns */
  columnDoubts: Issue[];
  /** about rows and cells, in the order of the rows */
  issues: Issue[];
}

function judge(rows: readonly TableRow[], mapping: TableMapping, table: RawTable, expectation: Expectation): Judgement {
  const { measured, issues } = convert(rows, mapping, table.decimalCertain);
  const judged = new Judged(rows, mapping, measured);
  const cells = cellUnitDoubts(judged);
  const columnDoubts = columnUnitDoubts(judged, expectation);
  const sizes = columnDoubts.length > 0 ? [] : diffusivitySizeDoubts(judged, expectation);
  const falling = fallingDoubts(judged, expectation);
  const all = [...issues, ...cells, ...sizes, ...falling, ...duplicateDoubts(judged)];
  all.sort((a, b) => (a.row ?? 0) - (b.row ?? 0) || (a.column ?? -1) - (b.column ?? -1));
  return { measured, columnDoubts, issues: oncePerCell(all) };
}

/** One thing at a time: of several doubts about one cell the first is asked, the others may vanish with it. */
function oncePerCell(issues: readonly Issue[]): Issue[] {
  const seen = new Set<string>();
  return issues.filter(({ severity, row, column }) => {
    if (severity === 'REFUSAL' || column === null) return true;
    const cell = `${row}:${column}`;
    if (seen.has(cell)) return false;
    seen.add(cell);
    return true;
  });
}

function withDecidedUnits(mapping: TableMapping, issues: readonly Issue[]): TableMapping {
  const units = new Map<number, string>();
  for (const { column, decided, readAs } of issues) {
    if (column !== null && decided === 'READ_AS' && readAs && 'unit' in readAs) units.set(column, readAs.unit);
  }
  if (units.size === 0) return mapping;
  const columns = mapping.columns.map((column, i) => ({ ...column, unit: units.get(i) ?? column.unit }));
  return { ...mapping, columns };
}

interface Findings {
  issues: Issue[];
  common: number | null;
}

function conclude(rows: readonly TableRow[], mapping: TableMapping, measured: Measured, found: Findings): Understood {
  const states = statesOf(rows, found.issues);
  const points = pointsOf(mapping, withReadings(mapping, measured, found.issues), states);
  const leftOut = new Set(rows.filter((_, i) => states[i] === 'LEFT_OUT').map(({ number }) => number));
  if (!states.includes('KEPT') && !states.includes('OPEN')) {
    found.issues.push(refusal('NO_ROWS', { row: null, column: null }, 'Every row is left out; nothing would be kept.'));
  }
  const openIssues = found.issues.filter((one) => isOpen(one) && !isInLeftOutRow(one, leftOut));
  return {
    mapping,
    rows,
    states,
    points,
    issues: found.issues,
    commonRelativeUncertainty: found.common,
    pressureOrigin: mapping.pressureOrigin,
    openIssues,
    isComplete: openIssues.length === 0,
  };
}

function notUnderstood(rows: readonly TableRow[], mapping: TableMapping, issues: Issue[]): Understood {
  return {
    mapping,
    rows,
    states: rows.map(() => 'OPEN'),
    points: [],
    issues,
    commonRelativeUncertainty: null,
    pressureOrigin: mapping.pressureOrigin,
    openIssues: issues.filter(isOpen),
    isComplete: false,
  };
}

function statesOf(rows: readonly TableRow[], issues: readonly Issue[]): RowState[] {
  const leftOut = new Set<number>();
  const open = new Set<number>();
  for (const one of issues) {
    if (one.row === null) continue;
    if (one.decided === 'LEAVE_OUT') leftOut.add(one.row);
    else if (isOpen(one)) open.add(one.row);
  }
  return rows.map(({ number }) => (leftOut.has(number) ? 'LEFT_OUT' : open.has(number) ? 'OPEN' : 'KEPT'));
}

/** Other things need no answer in a row that is left out. */
function isInLeftOutRow(one: Issue, leftOut: ReadonlySet<number>): boolean {
  return one.row !== null && leftOut.has(one.row);
}

/** The columns with the decided readings in place of what the cells say. */
function withReadings(mapping: TableMapping, measured: Measured, issues: readonly Issue[]): Measured {
  const decided = issues.filter(({ decided: choice, readAs }) => choice === 'READ_AS' && readAs && 'value' in readAs);
  if (decided.length === 0) return measured;
  const index = new Map([...measured.rows].map((row, i) => [row, i]));
  const changed = structuredClone(measured);
  for (const { row, column, readAs } of decided) {
    const role = mapping.columns[column ?? -1]?.role;
    const into = role === undefined ? undefined : COLUMN_OF_ROLE[role];
    const i = index.get(row ?? -1);
    if (into !== undefined && i !== undefined && readAs && 'value' in readAs) changed[into][i] = readAs.value;
  }
  return changed;
}
