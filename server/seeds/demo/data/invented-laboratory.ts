import { standardNormals } from '../../../src/numerics/random/normals.js';
import { type DemoPoint } from './demo.types.js';

/** D of an invented nature, m²/s, at T (K) and P (Pa). */
export type DiffusivityLaw = (temperature: number, pressure: number) => number;

const STANDARD_ATMOSPHERE = 101_325;

/** D0 (T/T0)^n at one standard atmosphere, inversely as the pressure. */
export function powerLaw(D0: number, T0: number, n: number): DiffusivityLaw {
  return (temperature, pressure) => (D0 * (temperature / T0) ** n * STANDARD_ATMOSPHERE) / pressure;
}

/** How one invented laboratory measures. */
export interface LaboratoryHabits {
  readonly law: DiffusivityLaw;
  readonly seed: number;
  /** K, nominal */
  readonly temperatures: readonly number[];
  /** Pa, nominal; each temperature is measured at each pressure */
  readonly pressures: readonly number[];
  /** ln D measured − ln D true at 298.15 K, the same for all its points */
  readonly bias: number;
  /** Of the exponent of T */
  readonly biasOfExponent: number;
  /** Standard deviation of ln D from point to point */
  readonly scatter: number;
  /** What it states as u(D)/D from point to point; null where it states none */
  readonly statedUncertainty: number | null;
  /** K and Pa, standard; null where it states none */
  readonly temperatureUncertainty: number | null;
  readonly pressureUncertainty: number | null;
  /** Assigned where the source does not say; `tabulated` then holds too */
  readonly pressureOrigin?: 'ASSIGNED';
  /** T and P are those of a table or assumption, not read from instruments */
  readonly tabulated?: true;
  readonly replicates?: number;
  /** Points that went wrong: index from 0 and ln of the factor */
  readonly mishaps?: Readonly<Record<number, number>>;
}

/**
 * Points as an invented laboratory would have tabulated them: the law, its bias, its scatter, its rounding. The same
 * habits give the same points.
 */
export function measure(habits: LaboratoryHabits): DemoPoint[] {
  const normals = standardNormals(habits.seed);
  const states = habits.temperatures.flatMap((nominalT) =>
    habits.pressures.map((nominalP) => [nominalT, nominalP] as const),
  );
  return states.map(([nominalT, nominalP], index) => {
    const drift = habits.tabulated ? 0 : 1;
    const temperature = roundTo(nominalT + 0.04 * drift * normals.next(), 0.01);
    const pressure = roundTo(nominalP * (1 + 0.003 * drift * normals.next()), 5);
    const systematic = habits.bias + habits.biasOfExponent * Math.log(temperature / 298.15);
    const deviation = systematic + habits.scatter * normals.next() + (habits.mishaps?.[index] ?? 0);
    const diffusivity = significant(habits.law(temperature, pressure) * Math.exp(deviation), 4);
    const { statedUncertainty, temperatureUncertainty, pressureUncertainty } = habits;
    return {
      temperature,
      temperatureUncertainty,
      pressure,
      pressureUncertainty,
      pressureOrigin: habits.pressureOrigin ?? 'STATED',
      diffusivity,
      diffusivityUncertainty: statedUncertainty && significant(diffusivity * statedUncertainty, 2),
      replicates: habits.replicates ?? null,
    };
  });
}

/** As printed with so many significant digits. */
export function significant(value: number, digits: number): number {
  return Number(value.toPrecision(digits));
}

/** As read from a scale with such steps. */
export function roundTo(value: number, step: number): number {
  return Number((Math.round(value / step) * step).toPrecision(12));
}
