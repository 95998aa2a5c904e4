/** One gas of a bath, and how fast the trace diffuses in it alone. */
export interface BathGas {
  /** Of the bath without the trace */
  readonly moleFraction: number;
  /** Of the trace in this gas at the state of the bath, m²/s */
  readonly diffusivity: number;
  /** Standard, of the diffusivity */
  readonly relativeUncertainty: number;
}

/** Fractions printed to four places may miss one by this much. */
const FRACTION_TOLERANCE = 5e-4;

/**
 * Diffusivity of a trace in a bath of several gases by Blanc's law, 1/D = Σ x_j/D_j, the sum over the bath alone.
 *
 * @returns D in m²/s and its relative standard uncertainty, the D_j taken as independent and x_j as exact
 * @throws {RangeError} when a fraction or diffusivity is not positive, or the fractions do not sum to one
 *
 * Source: A. Blanc, J. Phys. (Paris) 7 (1908) 825; the uncertainty by JCGM 100:2008, 5.1.2.
 */
export function blanc(bath: readonly BathGas[]): { diffusivity: number; relativeUncertainty: number } {
  if (!bath.every((gas) => gas.moleFraction > 0 && gas.diffusivity > 0)) {
    throw new RangeError('mole fractions and diffusivities of a bath must be positive');
  }
  const total = bath.reduce((sum, gas) => sum + gas.moleFraction, 0);
  if (!(Math.abs(total - 1) <= FRACTION_TOLERANCE)) throw new RangeError(`mole fractions sum to ${total}, not to one`);

  const resistances = bath.map((gas) => gas.moleFraction / (total * gas.diffusivity));
  const diffusivity = 1 / resistances.reduce((sum, resistance) => sum + resistance, 0);
  const parts = bath.map((gas, index) => diffusivity * (resistances[index] ?? 0) * gas.relativeUncertainty);
  return { diffusivity, relativeUncertainty: Math.hypot(...parts) };
}
