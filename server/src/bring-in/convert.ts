import { differenceToSi, toSi, type Unit, unitOf } from '../units/units.js';
import { columnUnit } from './check-mapping.js';
import { doubt, type Issue, type RefusalCode, refusal } from './issues.js';
import {
  type ColumnMapping,
  type ColumnRole,
  type ConstantValue,
  isUncertainty,
  NAME_OF_ROLE,
  type TableMapping,
} from './mapping.js';
import { parseCellNumber, saysNothing } from './numbers.js';
import { type Cell, cellText, type DecimalSign, type TableRow } from './table.js';

/**
 * The rows of a table as columns in SI; NaN where there is no value. Uncertainties are standard ones, already divided by
 * their coverage factor, and relative where `relative` says so.
 */
export interface Measured {
  /** row numbers */
  rows: Int32Array;
  temperature: Float64Array;
  pressure: Float64Array;
  diffusivity: Float64Array;
  temperatureUncertainty: Float64Array;
  pressureUncertainty: Float64Array;
  diffusivityUncertainty: Float64Array;
  moleFraction: Float64Array;
  replicates: Float64Array;
  relative: { temperature: boolean; pressure: boolean; diffusivity: boolean };
}

export type MeasuredColumn = Exclude<keyof Measured, 'rows' | 'relative'>;

/** Where the values of a column go. */
export const COLUMN_OF_ROLE: Partial<Record<ColumnRole, MeasuredColumn>> = {
  TEMPERATURE: 'temperature',
  PRESSURE: 'pressure',
  DIFFUSIVITY: 'diffusivity',
  TEMPERATURE_UNCERTAINTY: 'temperatureUncertainty',
  PRESSURE_UNCERTAINTY: 'pressureUncertainty',
  DIFFUSIVITY_UNCERTAINTY: 'diffusivityUncertainty',
  MOLE_FRACTION: 'moleFraction',
  REPLICATES: 'replicates',
};

const IS_REQUIRED = new Set<ColumnRole>(['TEMPERATURE', 'PRESSURE', 'DIFFUSIVITY']);

/** The largest number the database keeps in its column. */
const MOST_REPLICATES = 2_147_483_647;

const columnOf = (length: number): Float64Array => new Float64Array(length).fill(Number.NaN);

/** Converts the data rows under a mapping that has been checked. Each cell that cannot be taken as it stands is an issue. */
export function convert(
  rows: readonly TableRow[],
  mapping: TableMapping,
  decimalCertain: boolean,
): { measured: Measured; issues: Issue[] } {
  const measured: Measured = {
    rows: Int32Array.from(rows, ({ number }) => number),
    temperature: columnOf(rows.length),
    pressure: columnOf(rows.length),
    diffusivity: columnOf(rows.length),
    temperatureUncertainty: columnOf(rows.length),
    pressureUncertainty: columnOf(rows.length),
    diffusivityUncertainty: columnOf(rows.length),
    moleFraction: columnOf(rows.length),
    replicates: columnOf(rows.length),
    relative: { temperature: false, pressure: false, diffusivity: false },
  };
  const issues: Issue[] = [];
  mapping.columns.forEach((column, index) => {
    const into = COLUMN_OF_ROLE[column.role];
    if (into === undefined) return;
    const reader = new CellReader(column, index, mapping.decimal, decimalCertain, issues);
    rows.forEach((row, i) => {
      measured[into][i] = reader.read(row);
    });
    markRelative(measured, column);
  });
  fillConstant(measured.temperature, mapping.temperature);
  fillConstant(measured.pressure, mapping.pressure);
  return { measured, issues };
}

/** One value for all rows, which a column of its own overrides. */
function fillConstant(column: Float64Array, constant: ConstantValue | null): void {
  if (constant !== null && column.every(Number.isNaN)) column.fill(toSi(constant.value, unitOf(constant.unit)));
}

function markRelative({ relative }: Measured, column: ColumnMapping): void {
  if (columnUnit(column)?.quantity !== 'fraction') return;
  if (column.role === 'TEMPERATURE_UNCERTAINTY') relative.temperature = true;
  if (column.role === 'PRESSURE_UNCERTAINTY') relative.pressure = true;
  if (column.role === 'DIFFUSIVITY_UNCERTAINTY') relative.diffusivity = true;
}

class CellReader {
  private readonly unit: Unit | null;
  private readonly name: string;

  constructor(
    private readonly mapping: ColumnMapping,
    private readonly column: number,
    private readonly decimal: DecimalSign,
    private readonly decimalCertain: boolean,
    private readonly issues: Issue[],
  ) {
    this.unit = columnUnit(mapping);
    this.name = NAME_OF_ROLE[mapping.role];
  }

  /** The value in SI, or NaN with an issue where there should be one. */
  read(row: TableRow): number {
    const at = { row: row.number, column: this.column };
    const cell = row.cells[this.column] ?? null;
    const marked = this.readMarks(row, at);
    if (marked !== null) return marked;
    if (saysNothing(cell)) {
      if (IS_REQUIRED.has(this.mapping.role))
        this.issues.push(refusal('MISSING_VALUE', at, `Row ${row.number} has no ${this.name}.`));
      return Number.NaN;
    }
    return this.readNumber(cell, at);
  }

  /** What a workbook says about the cell; null when it is to be read like any other. */
  private readMarks(row: TableRow, at: { row: number; column: number }): number | null {
    const marks = row.marks?.filter(({ column }) => column === this.column);
    if (marks === undefined || marks.length === 0) return null;
    const shown = cellText(row.cells[this.column]);
    for (const { kind, detail } of marks) {
      if (kind === 'ERROR')
        return this.refuse('CELL_ERROR', at, `The cell shows an error, ${detail}, instead of the ${this.name}.`);
      if (kind === 'DATE')
        return this.refuse(
          'DATE_IN_NUMBER',
          at,
          `The cell holds the date ${shown}, not the ${this.name}. Spreadsheets turn numbers such as 1.5 into dates.`,
        );
      if (kind === 'BOOLEAN') return this.refuse('TEXT_IN_NUMBER', at, `“${shown}” is not a number.`);
    }
    const formula = marks.find(({ kind }) => kind === 'FORMULA');
    if (formula === undefined) return null;
    if (shown === '') {
      return this.refuse(
        'FORMULA_WITHOUT_RESULT',
        at,
        `The cell holds the formula =${formula.detail} and no result. Save the workbook once with its results, or type the number.`,
      );
    }
    this.issues.push(
      doubt(
        'FORMULA',
        at,
        `The cell holds a formula, =${formula.detail}. Formulas are not computed here; the result kept in the workbook is ${shown}.`,
        {
          choices: [{ id: 'KEEP', label: `take the result, ${shown}` }],
          suggested: 'KEEP',
        },
      ),
    );
    return null;
  }

  private readNumber(cell: Cell, at: { row: number; column: number }): number {
    const number = parseCellNumber(cell, this.decimal, this.decimalCertain);
    if (number === null) return this.refuse('TEXT_IN_NUMBER', at, `“${cellText(cell)}” is not a number.`);
    const value = this.inSi(number.text);
    const fault = this.faultOf(value, cellText(cell));
    if (fault !== null) return this.refuse(fault.code, at, fault.message);
    if (number.alternative !== null) this.askAboutThousands(number.text, number.alternative, at);
    return value;
  }

  private inSi(text: string): number {
    const { role, uncertainty } = this.mapping;
    if (this.unit === null) return Number(text);
    if (!isUncertainty(role)) return toSi(text, this.unit);
    const stated = differenceToSi(text, this.unit);
    return uncertainty?.kind === 'EXPANDED' ? stated / uncertainty.coverageFactor : stated;
  }

  private faultOf(value: number, shown: string): { code: RefusalCode; message: string } | null {
    const { role, unit } = this.mapping;
    if (role === 'MOLE_FRACTION') {
      if (value >= 0 && value <= 1) return null;
      return { code: 'OUT_OF_BOUNDS', message: `A mole fraction lies between 0 and 1; ${shown} in ${unit} does not.` };
    }
    if (role === 'REPLICATES') {
      if (Number.isInteger(value) && value >= 1 && value <= MOST_REPLICATES) return null;
      return { code: 'OUT_OF_BOUNDS', message: `A number of replicates is a whole number from 1; ${shown} is not.` };
    }
    if (value > 0 && Number.isFinite(value)) return null;
    const message = isUncertainty(role)
      ? `An uncertainty is above zero; ${shown} is not. Leave the cell empty where none is known.`
      : `The ${this.name} must be above ${role === 'TEMPERATURE' ? 'absolute zero' : 'zero'}; ${shown} ${unit} is not.`;
    return { code: 'NOT_POSITIVE', message };
  }

  private askAboutThousands(taken: string, alternative: string, at: { row: number; column: number }): void {
    const other = this.inSi(alternative);
    if (this.faultOf(other, alternative) !== null) return;
    const message = `The sign in this number may stand before decimals or between thousands: ${taken} or ${alternative}?`;
    this.issues.push(
      doubt('DECIMAL_OR_THOUSANDS', at, message, {
        choices: [
          { id: 'KEEP', label: `it is ${taken}` },
          { id: 'READ_AS', label: `it is ${alternative}` },
        ],
        readAs: { value: other },
      }),
    );
  }

  private refuse(code: RefusalCode, at: { row: number; column: number }, message: string): number {
    this.issues.push(refusal(code, at, message));
    return Number.NaN;
  }
}
