import { type PotentialConstants } from './estimate-constants.js';

/** Reduced temperatures for which Neufeld's equation was fitted. */
const REDUCED_TEMPERATURE_RANGE = [0.3, 100] as const;

/**
 * Reduced collision integral for diffusion Ω_D of the Lennard-Jones (12-6) potential:
 *
 *     Ω_D = A/T*^B + C exp(−D T*) + E exp(−F T*) + G exp(−H T*)
 *
 * @param reducedTemperature T* = k T/ε, 0.3 to 100
 * @throws {RangeError} outside that range
 *
 * Source: P. D. Neufeld, A. R. Janzen, R. A. Aziz, J. Chem. Phys. 57 (1972) 1100.
 */
export function collisionIntegral(reducedTemperature: number): number {
  if (!isInCollisionIntegralRange(reducedTemperature)) {
    throw new RangeError(`reduced temperature ${reducedTemperature} is not in 0.3 to 100`);
  }
  return (
    1.06036 / reducedTemperature ** 0.1561 +
    0.193 * Math.exp(-0.47635 * reducedTemperature) +
    1.03587 * Math.exp(-1.52996 * reducedTemperature) +
    1.76474 * Math.exp(-3.89411 * reducedTemperature)
  );
}

/** Whether the collision integral is known at T*. */
export function isInCollisionIntegralRange(reducedTemperature: number): boolean {
  const [low, high] = REDUCED_TEMPERATURE_RANGE;
  return reducedTemperature >= low && reducedTemperature <= high;
}

/**
 * Potential between unlike molecules: σ₁₂ the arithmetic, ε₁₂ the geometric mean.
 *
 * Source: R. B. Bird, W. E. Stewart, E. N. Lightfoot, *Transport Phenomena*, 2nd ed., 2002, §17.3.
 */
export function combinedPotential(a: PotentialConstants, b: PotentialConstants): PotentialConstants {
  return { diameter: 0.5 * (a.diameter + b.diameter), depth: Math.sqrt(a.depth * b.depth) };
}
