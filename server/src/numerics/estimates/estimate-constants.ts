import { type SubstanceConstant, valueOf } from './constant-kinds.js';

/** Parameters of the Lennard-Jones (12-6) potential, or of a method's stand-in for them. */
export interface PotentialConstants {
  /** σ, m */
  readonly diameter: number;
  /** ε/k, K */
  readonly depth: number;
}

/** What the estimates know of one gas; a method whose constants are missing is left out. */
export interface EstimateConstants {
  /** kg/mol */
  readonly molarMass: number;
  /** Σv of the set of 1969, a pure number */
  readonly diffusionVolume: number | null;
  readonly lennardJones: PotentialConstants | null;
  readonly wilkeLee: PotentialConstants | null;
}

/** State at which a diffusivity is wanted. */
export interface GasState {
  /** K */
  readonly temperature: number;
  /** Pa */
  readonly pressure: number;
}

const NANOMETRE = 1e-9;
const CUBIC_CENTIMETRE = 1e-6;

/**
 * What the estimates need, read from a substance's constants.
 *
 * Wilke–Lee takes σ = 1.18 V_b^(1/3) (Å, cm³/mol) and ε/k = 1.15 T_b for both gases, unless the constants give its σ
 * and ε/k outright, as they do for air. Source: Poling, Prausnitz, O'Connell, *The Properties of Gases and Liquids*,
 * 5th ed., 2001, chapter 11.
 *
 * @param molarMass kg/mol
 */
export function estimateConstants(molarMass: number, constants: readonly SubstanceConstant[]): EstimateConstants {
  const value = valueOf.bind(null, constants);
  const lengthOf = (nanometres: number | undefined) => nanometres && nanometres * NANOMETRE;
  return {
    molarMass,
    diffusionVolume: value('DIFFUSION_VOLUME') ?? null,
    lennardJones: potential(lengthOf(value('LENNARD_JONES_DIAMETER')), value('LENNARD_JONES_DEPTH')),
    wilkeLee:
      potential(lengthOf(value('WILKE_LEE_DIAMETER')), value('WILKE_LEE_DEPTH')) ??
      wilkeLeePotential(value('LIQUID_MOLAR_VOLUME_AT_BOILING_POINT'), value('NORMAL_BOILING_POINT')),
  };
}

function potential(diameter: number | undefined, depth: number | undefined): PotentialConstants | null {
  return diameter === undefined || depth === undefined ? null : { diameter, depth };
}

/** σ/Å = 1.18 (V_b/(cm³/mol))^(1/3) is σ/m = 1.18 × 10⁻⁸ (V_b/(m³/mol))^(1/3). */
function wilkeLeePotential(molarVolumeCm3?: number, boilingPoint?: number): PotentialConstants | null {
  if (molarVolumeCm3 === undefined || boilingPoint === undefined) return null;
  return { diameter: 1.18e-8 * Math.cbrt(molarVolumeCm3 * CUBIC_CENTIMETRE), depth: 1.15 * boilingPoint };
}
