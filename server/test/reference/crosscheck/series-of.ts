import { type FitSeries } from '../../../src/numerics/fitting/fit.types.js';

/** [T in K, P in Pa, D in m²/s, u(D) in m²/s or null] */
export type ReferenceRow = readonly [number, number, number, number | null];

/** A reference set's rows by series, in the form the engine takes. */
export function seriesOf(rows: Readonly<Record<string, readonly ReferenceRow[]>>): FitSeries[] {
  return Object.entries(rows).map(([key, points]) => ({
    key,
    commonRelativeUncertainty: null,
    points: points.map(([temperature, pressure, diffusivity, diffusivityUncertainty]) => ({
      temperature,
      pressure,
      diffusivity,
      diffusivityUncertainty,
      temperatureUncertainty: null,
      pressureUncertainty: null,
    })),
  }));
}
