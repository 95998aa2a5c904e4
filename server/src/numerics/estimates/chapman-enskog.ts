import { collisionIntegral, combinedPotential } from './collision-integral.js';
import { type GasState, type PotentialConstants } from './estimate-constants.js';

/** One gas as the kinetic theory sees it. */
export interface KineticGas {
  /** kg/mol */
  readonly molarMass: number;
  readonly potential: PotentialConstants;
}

/** J/(mol K) and 1/mol, products and values of the SI of 2019 */
const MOLAR_GAS_CONSTANT = 8.314462618;
const AVOGADRO_CONSTANT = 6.02214076e23;

/**
 * Binary diffusivity by the first approximation of the Chapman–Enskog theory for an ideal gas:
 *
 *     D = (3/16) √[2 (R T)³ (1/M_A + 1/M_B)/π] / (N_A P σ_AB² Ω_D)
 *
 * with exact constants; the usual printed 0.0018583 (atm) is 0.03 %, 0.00266 (bar) 0.13 % low.
 *
 * @returns m²/s
 * @throws {RangeError} where the collision integral is not known
 *
 * Source: R. B. Bird, W. E. Stewart, E. N. Lightfoot, *Transport Phenomena*, 2nd ed., 2002, eq. 17.3-11.
 */
export function chapmanEnskog(a: KineticGas, b: KineticGas, { temperature, pressure }: GasState): number {
  const { diameter, depth } = combinedPotential(a.potential, b.potential);
  const thermal = (MOLAR_GAS_CONSTANT * temperature) ** 3;
  const speed = Math.sqrt((2 * thermal * (1 / a.molarMass + 1 / b.molarMass)) / Math.PI);
  return (0.1875 * speed) / (AVOGADRO_CONSTANT * pressure * diameter ** 2 * collisionIntegral(temperature / depth));
}
