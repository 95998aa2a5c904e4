import type { UnitQuantity } from '../units/units.js';
import type { DecimalSign } from './table.js';

/** What a column can hold. */
export const COLUMN_ROLES = [
  'TEMPERATURE',
  'PRESSURE',
  'DIFFUSIVITY',
  'TEMPERATURE_UNCERTAINTY',
  'PRESSURE_UNCERTAINTY',
  'DIFFUSIVITY_UNCERTAINTY',
  'MOLE_FRACTION',
  'REPLICATES',
  'ROW_NUMBER',
  'DATE',
  'IGNORED',
] as const;
export type ColumnRole = (typeof COLUMN_ROLES)[number];

/** How a stated uncertainty is meant. Relative or absolute is told by its unit: % and 1 are relative. */
export interface UncertaintyReading {
  /** U = k u (GUM, JCGM 100:2008, section 6.2) */
  kind: 'STANDARD' | 'EXPANDED';
  /** k of an expanded uncertainty */
  coverageFactor: number;
  /** COMMON: the same error in all points, which belongs to the series; for the diffusivity alone */
  scope: 'INDEPENDENT' | 'COMMON';
}

export const STATED_AS_STANDARD: UncertaintyReading = { kind: 'STANDARD', coverageFactor: 1, scope: 'INDEPENDENT' };

export interface ColumnMapping {
  role: ColumnRole;
  /** as a person writes it; null for what has none */
  unit: string | null;
  /** GUESSED from the size of the numbers: has to be confirmed */
  unitOrigin: 'STATED' | 'GUESSED' | 'CHOSEN';
  uncertainty: UncertaintyReading | null;
}

/** A value that holds for every row. */
export interface ConstantValue {
  value: number;
  unit: string;
}

export interface ConstantUncertainty extends ConstantValue {
  reading: UncertaintyReading;
}

/** How a table is to be understood. Rows are numbered as a spreadsheet numbers them, columns from 0. */
export interface TableMapping {
  headerRow: number | null;
  unitRow: number | null;
  columns: ColumnMapping[];
  temperature: ConstantValue | null;
  pressure: ConstantValue | null;
  diffusivityUncertainty: ConstantUncertainty | null;
  pressureOrigin: 'STATED' | 'ASSIGNED' | 'REDUCED_BY_SOURCE';
  decimal: DecimalSign;
}

/** The quantity whose units a role takes; an uncertainty may be a fraction of its quantity instead. */
export const QUANTITY_OF_ROLE: Partial<Record<ColumnRole, UnitQuantity>> = {
  TEMPERATURE: 'temperature',
  PRESSURE: 'pressure',
  DIFFUSIVITY: 'diffusivity',
  TEMPERATURE_UNCERTAINTY: 'temperature',
  PRESSURE_UNCERTAINTY: 'pressure',
  DIFFUSIVITY_UNCERTAINTY: 'diffusivity',
  MOLE_FRACTION: 'fraction',
};

export const isUncertainty = (role: ColumnRole): boolean => role.endsWith('_UNCERTAINTY');

export const NAME_OF_ROLE: Record<ColumnRole, string> = {
  TEMPERATURE: 'temperature',
  PRESSURE: 'pressure',
  DIFFUSIVITY: 'diffusivity',
  TEMPERATURE_UNCERTAINTY: 'uncertainty of the temperature',
  PRESSURE_UNCERTAINTY: 'uncertainty of the pressure',
  DIFFUSIVITY_UNCERTAINTY: 'uncertainty of the diffusivity',
  MOLE_FRACTION: 'mole fraction',
  REPLICATES: 'number of replicates',
  ROW_NUMBER: 'row number',
  DATE: 'date',
  IGNORED: 'not used',
};
