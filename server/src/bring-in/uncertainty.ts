import { differenceToSi } from '../units/units.js';
import { uncertaintyUnit } from './check-mapping.js';
import type { Measured } from './convert.js';
import { quartiles } from './doubts/quartiles.js';
import { type Issue, refusal } from './issues.js';
import type { ColumnRole, TableMapping, UncertaintyReading } from './mapping.js';

const readingOf = (mapping: TableMapping, role: ColumnRole): UncertaintyReading | null =>
  mapping.columns.find((column) => column.role === role)?.uncertainty ?? null;

/** Whether the column of u(D) holds what is independent from point to point. */
export const columnIsIndependent = (mapping: TableMapping): boolean =>
  readingOf(mapping, 'DIFFUSIVITY_UNCERTAINTY')?.scope === 'INDEPENDENT';

/** Standard uncertainty of D, m²/s, from the one that is stated for all rows; null where none is. */
export function constantUncertainty(mapping: TableMapping, diffusivity: number): number | null {
  const stated = mapping.diffusivityUncertainty;
  const unit = stated && uncertaintyUnit(stated.unit, 'diffusivity');
  if (!stated || !unit) return null;
  const { kind, coverageFactor } = stated.reading;
  const standard = differenceToSi(stated.value, unit) / (kind === 'EXPANDED' ? coverageFactor : 1);
  return unit.quantity === 'fraction' ? standard * diffusivity : standard;
}
/** Values of a common uncertainty that differ by more are not one. */
const SAME_WITHIN = 0.01;

/** The part of u(D) common to the series, where the table or the person states one. */
export function commonPart(measured: Measured, mapping: TableMapping): { value: number | null; issues: Issue[] } {
  const constant = mapping.diffusivityUncertainty;
  if (constant?.reading.scope === 'COMMON') {
    const values = Float64Array.from(measured.diffusivity, (d) => (constantUncertainty(mapping, d) ?? Number.NaN) / d);
    return oneValue(values, null);
  }
  if (readingOf(mapping, 'DIFFUSIVITY_UNCERTAINTY')?.scope !== 'COMMON') return { value: null, issues: [] };
  const column = mapping.columns.findIndex(({ role }) => role === 'DIFFUSIVITY_UNCERTAINTY');
  const { diffusivity, diffusivityUncertainty, relative } = measured;
  return oneValue(
    diffusivityUncertainty.map((u, i) => (relative.diffusivity ? u : u / (diffusivity[i] ?? Number.NaN))),
    column,
  );
}

function oneValue(values: Float64Array, column: number | null): { value: number | null; issues: Issue[] } {
  const middle = quartiles(values)?.median ?? null;
  const differs = middle !== null && values.some((value) => Math.abs(value - middle) > SAME_WITHIN * middle);
  if (!differs) return { value: middle, issues: [] };
  const message =
    'An uncertainty common to the series is one part of D for all rows; these differ. Take it as independent from point to point, or state one percentage.';
  return { value: null, issues: [refusal('COMMON_VARIES', { row: null, column }, message)] };
}
