import { type KineticGas } from './chapman-enskog.js';
import { collisionIntegral, combinedPotential } from './collision-integral.js';
import { type GasState } from './estimate-constants.js';

/**
 * Binary diffusivity by the method of Wilke and Lee:
 *
 *     D/(cm²/s) = (3.03 − 0.98/M_AB^(1/2)) 10⁻³ T^(3/2) / ((P/bar) M_AB^(1/2) (σ_AB/Å)² Ω_D)
 *
 * M_AB = 2/(1/M_A + 1/M_B) in g/mol. The potentials are the method's own, not those of kinetic theory (see
 * `estimateConstants`).
 *
 * @returns m²/s
 * @throws {RangeError} where the collision integral is not known
 *
 * Source: C. R. Wilke, C. Y. Lee, Ind. Eng. Chem. 47 (1955) 1253, as given by B. E. Poling, J. M. Prausnitz,
 * J. P. O'Connell, *The Properties of Gases and Liquids*, 5th ed., 2001, eq. 11-4.1.
 */
export function wilkeLee(a: KineticGas, b: KineticGas, { temperature, pressure }: GasState): number {
  const { diameter, depth } = combinedPotential(a.potential, b.potential);
  const rootMolarMass = Math.sqrt(2 / (1e-3 / a.molarMass + 1e-3 / b.molarMass));
  const angstroms = diameter * 1e10;
  const numerator = (3.03 - 0.98 / rootMolarMass) * 1e-3 * temperature ** 1.5;
  const denominator = (pressure / 1e5) * rootMolarMass * angstroms ** 2 * collisionIntegral(temperature / depth);
  return (numerator / denominator) * 1e-4;
}
