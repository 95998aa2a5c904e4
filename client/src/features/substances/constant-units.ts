import { type SubstanceConstantKind } from '../../gql/graphql';

/** The UCUM unit in which the service keeps each constant: one unit a kind, so that two can always be compared. */
export const CONSTANT_UNITS: Readonly<Record<SubstanceConstantKind, string>> = {
  DIFFUSION_VOLUME: '1',
  LENNARD_JONES_DIAMETER: 'nm',
  LENNARD_JONES_DEPTH: 'K',
  WILKE_LEE_DIAMETER: 'nm',
  WILKE_LEE_DEPTH: 'K',
  NORMAL_BOILING_POINT: 'K',
  LIQUID_MOLAR_VOLUME_AT_BOILING_POINT: 'cm3/mol',
  VAPOUR_PRESSURE: 'Pa',
  LIQUID_DENSITY: 'kg/m3',
  LIQUID_MOLAR_DENSITY: 'mol/m3',
  ENTHALPY_OF_VAPORISATION: 'J/mol',
  FLASH_POINT: 'K',
  LOWER_FLAMMABLE_LIMIT: '1',
  UPPER_FLAMMABLE_LIMIT: '1',
  EXPOSURE_LIMIT_TIME_WEIGHTED: '[ppm]',
  EXPOSURE_LIMIT_SHORT_TERM: '[ppm]',
};

/** Names of the kinds in a list to choose from. */
export const CONSTANT_NAMES: Readonly<Record<SubstanceConstantKind, string>> = {
  DIFFUSION_VOLUME: 'diffusion volume',
  LENNARD_JONES_DIAMETER: 'collision diameter',
  LENNARD_JONES_DEPTH: 'well depth',
  WILKE_LEE_DIAMETER: 'collision diameter of Wilke–Lee',
  WILKE_LEE_DEPTH: 'well depth of Wilke–Lee',
  NORMAL_BOILING_POINT: 'normal boiling point',
  LIQUID_MOLAR_VOLUME_AT_BOILING_POINT: 'volume at boiling point',
  VAPOUR_PRESSURE: 'vapour pressure',
  LIQUID_DENSITY: 'liquid density',
  LIQUID_MOLAR_DENSITY: 'molar density of the liquid',
  ENTHALPY_OF_VAPORISATION: 'enthalpy of vaporisation',
  FLASH_POINT: 'flash point',
  LOWER_FLAMMABLE_LIMIT: 'lower flammable limit, volume fraction in air',
  UPPER_FLAMMABLE_LIMIT: 'upper flammable limit, volume fraction in air',
  EXPOSURE_LIMIT_TIME_WEIGHTED: 'exposure limit, working day',
  EXPOSURE_LIMIT_SHORT_TERM: 'exposure limit, short term',
};

const PRINTED: Readonly<Record<string, string>> = {
  'cm3/mol': 'cm³/mol',
  'kg/m3': 'kg/m³',
  'mol/m3': 'mol/m³',
  '[ppm]': 'ppm',
  '1': '1',
};

/** A UCUM code as it is printed. */
export const printedUnit = (unit: string): string => PRINTED[unit] ?? unit;
