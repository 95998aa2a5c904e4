import { type GasState } from './estimate-constants.js';

/** One gas as Fuller's method sees it. */
export interface FullerGas {
  /** kg/mol */
  readonly molarMass: number;
  /** Σv of the set of 1969, a pure number */
  readonly diffusionVolume: number;
}

/**
 * Binary diffusivity by the method of Fuller, Schettler and Giddings with the volumes of 1969:
 *
 *     D/(cm²/s) = 0.00143 T^1.75 / {(P/bar) M_AB^(1/2) [(Σv)_A^(1/3) + (Σv)_B^(1/3)]²},  M_AB = 2/(1/M_A + 1/M_B) in g/mol
 *
 * The volumes of 1966 belong to another coefficient and must not be put in.
 *
 * @returns m²/s
 *
 * Source: E. N. Fuller, K. Ensley, J. C. Giddings, J. Phys. Chem. 73 (1969) 3679, as given by B. E. Poling,
 * J. M. Prausnitz, J. P. O'Connell, *The Properties of Gases and Liquids*, 5th ed., 2001, eq. 11-4.4.
 */
export function fullerSchettlerGiddings(a: FullerGas, b: FullerGas, { temperature, pressure }: GasState): number {
  const meanMolarMass = 2 / (1e-3 / a.molarMass + 1e-3 / b.molarMass);
  const size = Math.cbrt(a.diffusionVolume) + Math.cbrt(b.diffusionVolume);
  const squareCentimetres = (0.00143 * temperature ** 1.75) / ((pressure / 1e5) * Math.sqrt(meanMolarMass) * size ** 2);
  return squareCentimetres * 1e-4;
}
