import { remembered, useRemembered } from './remembered';

/** A unit the reader may choose: value in SI = (value + offset) × factor. Factors are exact by definition. */
interface Unit {
  readonly label: string;
  readonly factor: number;
  readonly offset: number;
}

const scale = (label: string, factor: number, offset = 0): Unit => ({ label, factor, offset });

/**
 * Exact definitions: kelvin, degree Celsius, pascal, bar, square metre per second from the SI Brochure, 9th ed. (BIPM
 * 2019); degree Fahrenheit, standard atmosphere and torr (1/760 atm) from NIST SP 811 (2008), appendix B.
 */
export const temperatureUnits = {
  K: scale('K', 1),
  degC: scale('°C', 1, 273.15),
  degF: scale('°F', 5 / 9, 459.67),
} as const;

export const pressureUnits = {
  kPa: scale('kPa', 1e3),
  Pa: scale('Pa', 1),
  bar: scale('bar', 1e5),
  atm: scale('atm', 101_325),
  Torr: scale('Torr', 101_325 / 760),
} as const;

export const diffusivityUnits = {
  cm2_s: scale('cm²/s', 1e-4),
  m2_s: scale('m²/s', 1),
  mm2_s: scale('mm²/s', 1e-6),
} as const;

export type TemperatureUnit = keyof typeof temperatureUnits;
export type PressureUnit = keyof typeof pressureUnits;
export type DiffusivityUnit = keyof typeof diffusivityUnits;

export interface ReaderUnits {
  readonly temperature: TemperatureUnit;
  readonly pressure: PressureUnit;
  readonly diffusivity: DiffusivityUnit;
}

const tables = { temperature: temperatureUnits, pressure: pressureUnits, diffusivity: diffusivityUnits } as const;
export type Quantity = keyof typeof tables;

export const defaultUnits: ReaderUnits = { temperature: 'K', pressure: 'kPa', diffusivity: 'cm2_s' };

const unitOf = <Q extends Quantity>(quantity: Q, unit: ReaderUnits[Q]): Unit =>
  (tables[quantity] as Record<ReaderUnits[Q], Unit>)[unit];

/** The unit as printed: `cm²/s`. */
export const unitLabel = <Q extends Quantity>(quantity: Q, unit: ReaderUnits[Q]): string =>
  unitOf(quantity, unit).label;

/** A value in SI, in the unit asked for. */
export function fromSi<Q extends Quantity>(quantity: Q, value: number, unit: ReaderUnits[Q]): number {
  const { factor, offset } = unitOf(quantity, unit);
  return trimmed(value / factor - offset);
}

/** A value in the unit given, in SI. */
export function toSi<Q extends Quantity>(quantity: Q, value: number, unit: ReaderUnits[Q]): number {
  const { factor, offset } = unitOf(quantity, unit);
  return trimmed((value + offset) * factor);
}

/** A difference or an uncertainty in SI, in the unit asked for: no offset. */
export const differenceFromSi = <Q extends Quantity>(quantity: Q, value: number, unit: ReaderUnits[Q]): number =>
  trimmed(value / unitOf(quantity, unit).factor);

/** Drops the last binary digit or two, so that 25 °C is 298.15 K and not 298.15000000000003 K. */
const trimmed = (value: number): number => Number(value.toPrecision(14));

const isUnit = (table: object, unit: unknown): boolean => typeof unit === 'string' && Object.hasOwn(table, unit);

function readUnits(stored: unknown): ReaderUnits | undefined {
  if (typeof stored !== 'object' || stored === null) return undefined;
  const units = stored as ReaderUnits;
  const known = (Object.keys(tables) as Quantity[]).every((quantity) => isUnit(tables[quantity], units[quantity]));
  return known ? units : undefined;
}

/** The reader's units, remembered in this browser. */
export const readerUnits = remembered<ReaderUnits>('diffolio.units', () => defaultUnits, readUnits);

export const useReaderUnits = (): ReaderUnits => useRemembered(readerUnits);
