import { describe, expect, it } from '@jest/globals';
import { estimateConstants } from '../../src/numerics/estimates/estimate-constants.js';
import { type EstimateMethod, estimates } from '../../src/numerics/estimates/estimates.js';
import { starterLibrary } from './library.js';

const library = starterLibrary();

/** Measured D at 1 atm: Fuller, Schettler, Giddings, Ind. Eng. Chem. 58 (1966) No. 5, 18, Table III; T in K, D in cm²/s. */
const MEASURED = [
  ['hydrogen', 'nitrogen', 294.0, 0.763],
  ['hydrogen', 'carbon dioxide', 298.0, 0.646],
  ['hydrogen', 'methane', 298.0, 0.726],
  ['hydrogen', 'benzene', 311.3, 0.4036],
  ['helium', 'nitrogen', 298.0, 0.688],
  ['helium', 'carbon dioxide', 298.2, 0.612],
  ['nitrogen', 'carbon dioxide', 298.0, 0.165],
  ['nitrogen', 'ethylene', 298.0, 0.163],
  ['nitrogen', 'hexane', 288.6, 0.0757],
  ['argon', 'carbon dioxide', 276.2, 0.1326],
  ['air', 'water', 298.2, 0.26],
  ['air', 'ethanol', 298.2, 0.135],
] as const;

function deviations(method: EstimateMethod): number[] {
  return MEASURED.flatMap(([first, second, temperature, squareCentimetres]) => {
    const found = estimates(constantsOf(first), constantsOf(second), { temperature, pressure: 101_325 });
    const estimate = found.find((candidate) => candidate.method === method);
    return estimate ? [Math.abs((estimate.diffusivity * 1e4) / squareCentimetres - 1)] : [];
  });
}

function constantsOf(name: string) {
  const substance = library.find((candidate) => candidate.name === name);
  if (!substance) throw new Error(`the library lacks ${name}`);
  return estimateConstants(substance.molarMassKgPerMol, substance.constants);
}

const mean = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0) / values.length;

describe('estimates from the constants of the library', () => {
  it('miss twelve measured diffusivities by about the usual error of each method', () => {
    const fuller = deviations('FULLER_SCHETTLER_GIDDINGS');
    const kinetic = deviations('CHAPMAN_ENSKOG');
    expect([fuller.length, kinetic.length]).toEqual([12, 12]);
    expect(mean(fuller)).toBeLessThan(0.045);
    expect(Math.max(...fuller)).toBeLessThan(0.1);
    expect(mean(kinetic)).toBeLessThan(0.08);
    // The worst of kinetic theory is water, whose dipole the Lennard-Jones potential does not know.
    expect(Math.max(...kinetic)).toBeLessThan(0.19);
  });

  it('reach Wilke–Lee for pairs whose gases both have V_b and T_b', () => {
    const wilkeLee = deviations('WILKE_LEE');
    expect(wilkeLee.length).toBeGreaterThanOrEqual(8);
    expect(mean(wilkeLee)).toBeLessThan(0.1);
  });
});
