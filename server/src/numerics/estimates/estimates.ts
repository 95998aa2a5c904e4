import { chapmanEnskog, type KineticGas } from './chapman-enskog.js';
import { combinedPotential, isInCollisionIntegralRange } from './collision-integral.js';
import { type EstimateConstants, type GasState, type PotentialConstants } from './estimate-constants.js';
import { fullerSchettlerGiddings } from './fuller-schettler-giddings.js';
import { wilkeLee } from './wilke-lee.js';

export type EstimateMethod = 'FULLER_SCHETTLER_GIDDINGS' | 'CHAPMAN_ENSKOG' | 'WILKE_LEE';

/** A diffusivity nobody measured. Shown beside measurements, never mixed into a fit. */
export interface Estimate {
  readonly method: EstimateMethod;
  readonly label: string;
  /** m²/s */
  readonly diffusivity: number;
  /** Mean of |D(estimate)/D(measured) − 1| as usually quoted for the method */
  readonly usualRelativeError: number;
  /** Of the method and of its usual error */
  readonly source: string;
}

const POLING =
  'Poling, B. E.; Prausnitz, J. M.; O’Connell, J. P. The Properties of Gases and Liquids, 5th ed., McGraw-Hill 2001, chapter 11';

interface MethodOfEstimate {
  readonly method: EstimateMethod;
  readonly label: string;
  readonly usualRelativeError: number;
  readonly source: string;
  /** m²/s; null where a constant is missing or the method does not reach the state */
  readonly diffusivity: (a: EstimateConstants, b: EstimateConstants, state: GasState) => number | null;
}

/** The usual errors are those quoted from Poling et al. from memory; each is exceeded for polar and heavy molecules. */
const METHODS: readonly MethodOfEstimate[] = [
  {
    method: 'FULLER_SCHETTLER_GIDDINGS',
    label: 'Fuller–Schettler–Giddings',
    usualRelativeError: 0.04,
    source: `Fuller, E. N.; Ensley, K.; Giddings, J. C. J. Phys. Chem. 1969, 73, 3679–3685; usual error: ${POLING}`,
    diffusivity: byFuller,
  },
  {
    method: 'CHAPMAN_ENSKOG',
    label: 'Chapman–Enskog',
    usualRelativeError: 0.08,
    source: `Bird, R. B.; Stewart, W. E.; Lightfoot, E. N. Transport Phenomena, 2nd ed., Wiley 2002, eq. 17.3-11; Neufeld, P. D.; Janzen, A. R.; Aziz, R. A. J. Chem. Phys. 1972, 57, 1100–1102; usual error: ${POLING}`,
    diffusivity: (a, b, state) => byKineticTheory(chapmanEnskog, a, b, a.lennardJones, b.lennardJones, state),
  },
  {
    method: 'WILKE_LEE',
    label: 'Wilke–Lee',
    usualRelativeError: 0.07,
    source: `Wilke, C. R.; Lee, C. Y. Ind. Eng. Chem. 1955, 47, 1253–1257; usual error: ${POLING}`,
    diffusivity: (a, b, state) => byKineticTheory(wilkeLee, a, b, a.wilkeLee, b.wilkeLee, state),
  },
];

/**
 * Estimates of the diffusivity of a pair at one state, in a fixed order.
 *
 * @returns one entry for each method whose constants both gases have and whose collision integral is known at the
 *          state; empty where there is none
 * @throws {RangeError} when temperature or pressure is not positive
 */
export function estimates(a: EstimateConstants, b: EstimateConstants, state: GasState): Estimate[] {
  if (!(state.temperature > 0 && state.pressure > 0)) {
    throw new RangeError(`temperature ${state.temperature} K and pressure ${state.pressure} Pa must be positive`);
  }
  return METHODS.flatMap(({ diffusivity: estimate, ...method }) => {
    const diffusivity = estimate(a, b, state);
    return diffusivity === null ? [] : [{ ...method, diffusivity }];
  });
}

function byFuller(a: EstimateConstants, b: EstimateConstants, state: GasState): number | null {
  if (a.diffusionVolume === null || b.diffusionVolume === null) return null;
  const first = { molarMass: a.molarMass, diffusionVolume: a.diffusionVolume };
  return fullerSchettlerGiddings(first, { molarMass: b.molarMass, diffusionVolume: b.diffusionVolume }, state);
}

function byKineticTheory(
  method: (a: KineticGas, b: KineticGas, state: GasState) => number,
  a: EstimateConstants,
  b: EstimateConstants,
  potentialOfA: PotentialConstants | null,
  potentialOfB: PotentialConstants | null,
  state: GasState,
): number | null {
  if (potentialOfA === null || potentialOfB === null) return null;
  const { depth } = combinedPotential(potentialOfA, potentialOfB);
  if (!isInCollisionIntegralRange(state.temperature / depth)) return null;
  const first = { molarMass: a.molarMass, potential: potentialOfA };
  return method(first, { molarMass: b.molarMass, potential: potentialOfB }, state);
}
