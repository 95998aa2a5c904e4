import type { Measured } from '../convert.js';
import type { ColumnRole, TableMapping } from '../mapping.js';
import { cellText, type TableRow } from '../table.js';

/** A table while it is judged: what was read, and the likeliest reading of each cell that is doubtful. */
export class Judged {
  readonly temperature: Float64Array;
  readonly pressure: Float64Array;
  readonly diffusivity: Float64Array;
  /** rows in which a cell is probably not what it says and has a likelier reading */
  readonly reread: Uint8Array;
  /** rows whose D stands out and has no other reading */
  readonly far: Uint8Array;
  /** indices of the rows in which T, P and D were read */
  readonly complete: readonly number[];

  constructor(
    readonly rows: readonly TableRow[],
    readonly mapping: TableMapping,
    readonly measured: Measured,
  ) {
    this.temperature = measured.temperature.slice();
    this.pressure = measured.pressure.slice();
    this.diffusivity = measured.diffusivity.slice();
    this.reread = new Uint8Array(rows.length);
    this.far = new Uint8Array(rows.length);
    this.complete = this.findComplete();
  }

  /** Positive values stay positive, however they are read. */
  private findComplete(): number[] {
    return [...this.rows.keys()].filter(
      (i) => this.temperatureAt(i) > 0 && this.pressureAt(i) > 0 && this.diffusivityAt(i) > 0,
    );
  }

  temperatureAt(i: number): number {
    return this.temperature[i] ?? Number.NaN;
  }

  pressureAt(i: number): number {
    return this.pressure[i] ?? Number.NaN;
  }

  diffusivityAt(i: number): number {
    return this.diffusivity[i] ?? Number.NaN;
  }

  columnOf(role: ColumnRole): number {
    return this.mapping.columns.findIndex((column) => column.role === role);
  }

  /** Where a message about a cell belongs. */
  place(i: number, column: number): { row: number; column: number } {
    return { row: this.rows[i]?.number ?? 0, column };
  }

  /** The cell as it was brought. */
  shown(i: number, column: number): string {
    return cellText(this.rows[i]?.cells[column]);
  }

  /** u(D)/D as stated, else `usual`. */
  relativeUncertaintyAt(i: number, usual: number): number {
    const stated = this.measured.diffusivityUncertainty[i] ?? Number.NaN;
    if (!(stated > 0)) return usual;
    return this.measured.relative.diffusivity ? stated : stated / this.diffusivityAt(i);
  }
}

/** Four significant digits, as a person would type them. */
export const short = (value: number): string => String(Number(value.toPrecision(4)));
