import { type ColumnRole, isUncertainty } from './answer';

const TEMPERATURES = ['K', '°C', '°F', '°R'];
const PRESSURES = ['kPa', 'Pa', 'hPa', 'MPa', 'bar', 'mbar', 'atm', 'Torr', 'mmHg', 'psi'];
const DIFFUSIVITIES = ['cm²/s', 'm²/s', 'mm²/s', 'ft²/s', 'in²/s', 'cm²/min', 'm²/h', 'cm²/h', 'ft²/h', 'm²/d'];
const FRACTIONS = ['%', '1', '‰', 'ppm'];

const UNITS_OF: Partial<Record<ColumnRole, readonly string[]>> = {
  TEMPERATURE: TEMPERATURES,
  PRESSURE: PRESSURES,
  DIFFUSIVITY: DIFFUSIVITIES,
  TEMPERATURE_UNCERTAINTY: [...TEMPERATURES, ...FRACTIONS],
  PRESSURE_UNCERTAINTY: [...FRACTIONS, ...PRESSURES],
  DIFFUSIVITY_UNCERTAINTY: [...FRACTIONS, ...DIFFUSIVITIES],
  MOLE_FRACTION: ['1', '%', '‰', 'ppm'],
};

/** Units in which a column of a role may be; none for counts and dates. */
export const unitsOffered = (role: ColumnRole): readonly string[] => UNITS_OF[role] ?? [];

/** A column given another role: a unit that no longer fits is asked for again. */
export function inRole<
  C extends { role: ColumnRole; unit: string | null; unitOrigin: string; uncertainty: object | null },
>(column: C, role: ColumnRole) {
  const fits = column.unit !== null && unitsOffered(role).includes(column.unit);
  const reading = { kind: 'STANDARD', coverageFactor: 1, scope: 'INDEPENDENT' } as const;
  return {
    role,
    unit: fits ? column.unit : null,
    unitOrigin: 'CHOSEN' as const,
    uncertainty: isUncertainty(role) ? reading : null,
  };
}
