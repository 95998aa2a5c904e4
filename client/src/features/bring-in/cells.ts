import { formatNumber, formatShort, placesFor } from '../../lib/format-quantity';
import { differenceFromSi, fromSi, type Quantity, type ReaderUnits, unitLabel } from '../../lib/units';
import { mostPlaces } from '../../ui/numbers/aligned';
import { type ColumnRole, type UnderstoodPoint } from './answer';

const VALUE_DIGITS = 6;
const ESTIMATE_DIGITS = 4;

/** How the values of a column are shown. */
interface Shown {
  readonly value: (point: UnderstoodPoint, units: ReaderUnits) => number | null;
  readonly unit: (units: ReaderUnits) => string;
  /** Uncertainties have two significant digits each; values share their decimals. */
  readonly isUncertainty: boolean;
}

const value = (quantity: Quantity): Shown => ({
  value: (point, units) => fromSi(quantity, point[quantity], units[quantity]),
  unit: (units) => unitLabel(quantity, units[quantity]),
  isUncertainty: false,
});

const uncertainty = (quantity: Quantity): Shown => ({
  value: (point, units) => {
    const u = point[`${quantity}Uncertainty`];
    return u === null ? null : differenceFromSi(quantity, u, units[quantity]);
  },
  unit: (units) => unitLabel(quantity, units[quantity]),
  isUncertainty: true,
});

const plain = (key: 'moleFraction' | 'replicates'): Shown => ({
  value: (point) => point[key],
  unit: () => '',
  isUncertainty: false,
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

/** The most decimals that a column's values have. */
export function placesIn(shown: Shown, points: readonly UnderstoodPoint[], units: ReaderUnits): number {
  const texts = points.flatMap((point) => {
    const one = shown.value(point, units);
    return one === null
      ? []
      : [shown.isUncertainty ? formatNumber(one, placesFor(one)) : formatShort(one, VALUE_DIGITS)];
  });
  return mostPlaces(texts);
}

/** A value of a column in the style of that column; empty where there is none. */
export function cellText(shown: Shown, point: UnderstoodPoint, units: ReaderUnits, places: number): string {
  const one = shown.value(point, units);
  if (one === null) return '';
  return formatNumber(one, shown.isUncertainty ? placesFor(one) : places);
}

export const estimateText = (estimate: number, units: ReaderUnits): string =>
  formatShort(fromSi('diffusivity', estimate, units.diffusivity), ESTIMATE_DIGITS);

/** 100 (D/D(estimate) − 1) */
export const percentAgainst = (point: UnderstoodPoint, estimate: number): number =>
  100 * (point.diffusivity / estimate - 1);
