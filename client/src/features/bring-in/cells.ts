import { formatShort } from '../../lib/format-quantity';
import { differenceFromSi, fromSi, type ReaderUnits, unitLabel } from '../../lib/units';
import { type ColumnRole, type UnderstoodPoint } from './answer';

const VALUE_DIGITS = 6;
const UNCERTAINTY_DIGITS = 2;
const ESTIMATE_DIGITS = 4;

interface Shown {
  readonly text: (point: UnderstoodPoint, units: ReaderUnits) => string | null;
  readonly unit: (units: ReaderUnits) => string;
}

const value = (quantity: 'temperature' | 'pressure' | 'diffusivity'): Shown => ({
  text: (point, units) => formatShort(fromSi(quantity, point[quantity], units[quantity]), VALUE_DIGITS),
  unit: (units) => unitLabel(quantity, units[quantity]),
});

const uncertainty = (quantity: 'temperature' | 'pressure' | 'diffusivity'): Shown => ({
  text: (point, units) => {
    const u = point[`${quantity}Uncertainty`];
    return u === null ? null : formatShort(differenceFromSi(quantity, u, units[quantity]), UNCERTAINTY_DIGITS);
  },
  unit: (units) => unitLabel(quantity, units[quantity]),
});

const plain = (key: 'moleFraction' | 'replicates'): Shown => ({
  text: (point) => (point[key] === null ? null : formatShort(point[key], VALUE_DIGITS)),
  unit: () => '',
});

/** How a column is understood, in the reader's units; a role that is not understood has no entry. */
export const SHOWN: Partial<Record<ColumnRole, Shown>> = {
  TEMPERATURE: value('temperature'),
  PRESSURE: value('pressure'),
  DIFFUSIVITY: value('diffusivity'),
  TEMPERATURE_UNCERTAINTY: uncertainty('temperature'),
  PRESSURE_UNCERTAINTY: uncertainty('pressure'),
  DIFFUSIVITY_UNCERTAINTY: uncertainty('diffusivity'),
  MOLE_FRACTION: plain('moleFraction'),
  REPLICATES: plain('replicates'),
};

export const estimateText = (estimate: number, units: ReaderUnits): string =>
  formatShort(fromSi('diffusivity', estimate, units.diffusivity), ESTIMATE_DIGITS);

/** 100 (D/D(estimate) − 1) */
export const percentAgainst = (point: UnderstoodPoint, estimate: number): number =>
  100 * (point.diffusivity / estimate - 1);
