import { type ColumnMapping, type ColumnRole, isUncertainty, NAME_OF_ROLE, QUANTITY_OF_ROLE } from './mapping.js';

/** A unit nobody wrote down, found from the size of the numbers. `certain`: nothing else is sensible. */
export interface UnitGuess {
  unit: string;
  certain: boolean;
  reason: string;
}

/** Upper bounds of the median for each unit: where measurements of gases usually lie (common practice, no source). */
const BY_SIZE: Partial<Record<ColumnRole, readonly (readonly [below: number, unit: string])[]>> = {
  TEMPERATURE: [
    [150, '°C'],
    [Infinity, 'K'],
  ],
  PRESSURE: [
    [9, 'atm'],
    [400, 'kPa'],
    [900, 'mmHg'],
    [1500, 'hPa'],
    [Infinity, 'Pa'],
  ],
  DIFFUSIVITY: [
    [2e-3, 'm²/s'],
    [2.5, 'cm²/s'],
    [Infinity, 'mm²/s'],
  ],
};

interface Beside {
  columns: readonly ColumnMapping[];
  medians: readonly (number | null)[];
}

/** Guesses the unit of a column from the median of its numbers and from the columns to its left. */
export function guessUnit(role: ColumnRole, median: number | null, beside: Beside): UnitGuess | null {
  if (median === null) return null;
  if (role === 'MOLE_FRACTION') {
    return median <= 1
      ? { unit: '1', certain: true, reason: 'a fraction' }
      : { unit: '%', certain: false, reason: 'taken for percent, the numbers being above 1' };
  }
  if (isUncertainty(role)) return uncertaintyUnit(role, median, beside);
  const unit = BY_SIZE[role]?.find(([below]) => median < below)?.[1];
  return unit === undefined
    ? null
    : { unit, certain: false, reason: `no unit stated; ${unit} by the size of the numbers` };
}

function uncertaintyUnit(role: ColumnRole, median: number, { columns, medians }: Beside): UnitGuess | null {
  const of = columns.findIndex(
    (column) =>
      column.role !== role && !isUncertainty(column.role) && QUANTITY_OF_ROLE[column.role] === QUANTITY_OF_ROLE[role],
  );
  const [unit, value] = [columns[of]?.unit, medians[of]];
  if (!unit || value === null || value === undefined) return null;
  const name = NAME_OF_ROLE[columns[of]?.role ?? 'IGNORED'];
  return median <= 0.2 * Math.abs(value)
    ? { unit, certain: true, reason: `no unit stated; that of the ${name}` }
    : { unit: '%', certain: false, reason: `no unit stated; too large beside the ${name} for anything but percent` };
}
