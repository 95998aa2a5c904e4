import { describe, expect, it } from '@jest/globals';
import { type SubstanceConstant } from './constant-kinds.js';
import { estimateConstants } from './estimate-constants.js';
import { estimates } from './estimates.js';

const source = 'Poling, Prausnitz, O’Connell 2001';
const ofEthanol: SubstanceConstant[] = [
  { kind: 'DIFFUSION_VOLUME', value: 51.77, unit: '1', source },
  { kind: 'LENNARD_JONES_DIAMETER', value: 0.453, unit: 'nm', source },
  { kind: 'LENNARD_JONES_DEPTH', value: 362.6, unit: 'K', source },
  { kind: 'NORMAL_BOILING_POINT', value: 351.44, unit: 'K', source },
  { kind: 'LIQUID_MOLAR_VOLUME_AT_BOILING_POINT', value: 59.2, unit: 'cm3/mol', source },
];
const ofNitrogen: SubstanceConstant[] = [
  { kind: 'DIFFUSION_VOLUME', value: 18.5, unit: '1', source },
  { kind: 'LENNARD_JONES_DIAMETER', value: 0.3798, unit: 'nm', source },
  { kind: 'LENNARD_JONES_DEPTH', value: 71.4, unit: 'K', source },
  { kind: 'NORMAL_BOILING_POINT', value: 77.36, unit: 'K', source },
  { kind: 'LIQUID_MOLAR_VOLUME_AT_BOILING_POINT', value: 31.2, unit: 'cm3/mol', source },
];
const ethanol = estimateConstants(0.046069, ofEthanol);
const nitrogen = estimateConstants(0.028014, ofNitrogen);
const room = { temperature: 298.15, pressure: 101_325 };

describe('estimateConstants', () => {
  it('turns nanometres into metres and takes σ and ε/k of Wilke–Lee from V_b and T_b', () => {
    expect(ethanol.lennardJones?.diameter).toBeCloseTo(4.53e-10, 20);
    expect(ethanol.wilkeLee?.diameter).toBeCloseTo(1.18e-10 * Math.cbrt(59.2), 20);
    expect(ethanol.wilkeLee?.depth).toBeCloseTo(1.15 * 351.44, 10);
  });

  it('prefers σ and ε/k of Wilke–Lee where they are given outright, as for air', () => {
    const air = estimateConstants(0.0289655, [
      { kind: 'LIQUID_MOLAR_VOLUME_AT_BOILING_POINT', value: 29.9, unit: 'cm3/mol', source },
      { kind: 'WILKE_LEE_DIAMETER', value: 0.362, unit: 'nm', source },
      { kind: 'WILKE_LEE_DEPTH', value: 97, unit: 'K', source },
    ]);
    expect(air.wilkeLee?.diameter).toBeCloseTo(3.62e-10, 20);
    expect(air.wilkeLee?.depth).toBe(97);
    expect(air.lennardJones).toBeNull();
    expect(air.diffusionVolume).toBeNull();
  });

  it('knows nothing of a method of which half the constants are missing', () => {
    const half = estimateConstants(0.1, [{ kind: 'LENNARD_JONES_DEPTH', value: 300, unit: 'K', source }]);
    expect(half.lennardJones).toBeNull();
  });
});

describe('estimates', () => {
  it('gives each method once, with its usual error and its source', () => {
    const found = estimates(ethanol, nitrogen, room);
    expect(found.map(({ method }) => method)).toEqual(['FULLER_SCHETTLER_GIDDINGS', 'CHAPMAN_ENSKOG', 'WILKE_LEE']);
    expect(found.every(({ usualRelativeError, source: cited }) => usualRelativeError > 0 && cited.length > 20)).toBe(
      true,
    );
  });

  it('surrounds the diffusivity of ethanol in air, 0.132 cm²/s at 298 K, by no more than 12 %', () => {
    // Nitrogen stands for air here. 0.132: Welty, Wicks, Wilson 1984, as in Benítez, Table A.1.
    const off = estimates(ethanol, nitrogen, room).map(({ diffusivity }) => Math.abs(diffusivity / 1.32e-5 - 1));
    expect(Math.max(...off)).toBeLessThan(0.12);
  });

  it('leaves out a method whose constants are missing for one gas', () => {
    const bare = { ...nitrogen, lennardJones: null };
    expect(estimates(ethanol, bare, room).map(({ method }) => method)).toEqual([
      'FULLER_SCHETTLER_GIDDINGS',
      'WILKE_LEE',
    ]);
    expect(estimates(ethanol, { ...bare, wilkeLee: null, diffusionVolume: null }, room)).toEqual([]);
  });

  it('leaves out kinetic theory where its collision integral is not known', () => {
    const helium = estimateConstants(0.0040026, [
      { kind: 'LENNARD_JONES_DIAMETER', value: 0.2551, unit: 'nm', source },
      { kind: 'LENNARD_JONES_DEPTH', value: 10.22, unit: 'K', source },
    ]);
    expect(estimates(helium, helium, { temperature: 1000, pressure: 1e5 })).toHaveLength(1);
    expect(estimates(helium, helium, { temperature: 1100, pressure: 1e5 })).toEqual([]);
  });

  it('refuses a state that is not positive', () => {
    expect(() => estimates(ethanol, nitrogen, { temperature: 0, pressure: 1e5 })).toThrow(RangeError);
    expect(() => estimates(ethanol, nitrogen, { temperature: 300, pressure: -1 })).toThrow(RangeError);
  });
});
