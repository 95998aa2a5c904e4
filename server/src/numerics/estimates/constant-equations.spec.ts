import { describe, expect, it } from '@jest/globals';
import { coversTemperature, evaluateConstant } from './constant-equations.js';
import { type ConstantEquation, equationsOf, type SubstanceConstant, valueOf } from './constant-kinds.js';

const source = 'Poling, Prausnitz, O’Connell 2001, Appendix A';
const antoineOfWater: ConstantEquation = {
  kind: 'VAPOUR_PRESSURE',
  form: 'ANTOINE',
  coefficients: { A: 10.11564, B: 1687.537, C: -42.98 },
  unit: 'Pa',
  temperatureMinimumK: 273.2,
  temperatureMaximumK: 473.2,
  source,
};
const wagnerOfWater: ConstantEquation = {
  kind: 'VAPOUR_PRESSURE',
  form: 'WAGNER',
  coefficients: {
    A: -7.76451,
    B: 1.45838,
    C: -2.7758,
    D: -1.23303,
    criticalPressure: 22122300,
    criticalTemperature: 647.35,
  },
  unit: 'Pa',
  source: 'McGarry 1983',
};
const fiveTermOfWater: ConstantEquation = {
  kind: 'VAPOUR_PRESSURE',
  form: 'FIVE_TERM',
  coefficients: { C1: 73.649, C2: -7258.2, C3: -7.3037, C4: 4.1653e-6, C5: 2 },
  unit: 'Pa',
  source: 'Perry, 8th ed., Table 2-8',
};
const densityOfWater: ConstantEquation = {
  kind: 'LIQUID_DENSITY',
  form: 'TAU_POWERS',
  coefficients: {
    A: 1094.0233,
    B: -1813.2295,
    C: 3863.9557,
    D: -2479.813,
    criticalDensity: 322,
    criticalTemperature: 647.1,
  },
  unit: 'kg/m3',
  source: 'VDI Heat Atlas, 2nd ed., D3.1',
};
const molarDensityOfEthanol: ConstantEquation = {
  kind: 'LIQUID_MOLAR_DENSITY',
  form: 'RACKETT',
  coefficients: { C1: 1628.8, C2: 0.27469, C3: 514, C4: 0.23178 },
  unit: 'mol/m3',
  source: 'Perry, 8th ed., Table 2-32',
};

describe('evaluateConstant', () => {
  // IAPWS-95 (Wagner, Pruß, J. Phys. Chem. Ref. Data 2002, 31, 387) at 298.15 K: 3.1699 kPa, 997.00 kg/m³ at saturation.
  it.each([
    ['Antoine', antoineOfWater, 0.003],
    ['Wagner', wagnerOfWater, 0.001],
    ['five-term', fiveTermOfWater, 0.0003],
  ])('gives the vapour pressure of water at 298.15 K near IAPWS-95: %s', (_name, equation, relative) => {
    expect(Math.abs(evaluateConstant(equation, 298.15) / 3169.9 - 1)).toBeLessThan(relative);
  });

  it('gives the density of liquid water at 298.15 K within 0.05 % of IAPWS-95', () => {
    expect(Math.abs(evaluateConstant(densityOfWater, 298.15) / 997.0034 - 1)).toBeLessThan(0.0005);
  });

  it('gives the density of ethanol at 293.15 K within 0.2 % of 789.3 kg/m³ (CRC Handbook, from memory)', () => {
    const density = evaluateConstant(molarDensityOfEthanol, 293.15) * 0.046069;
    expect(Math.abs(density / 789.3 - 1)).toBeLessThan(0.002);
  });

  it('refuses a temperature that is not positive, and one at or above the critical temperature', () => {
    expect(() => evaluateConstant(antoineOfWater, 0)).toThrow(RangeError);
    expect(() => evaluateConstant(wagnerOfWater, 647.35)).toThrow(/critical temperature/);
    expect(() => evaluateConstant(molarDensityOfEthanol, 600)).toThrow(/critical temperature/);
  });

  it('refuses an equation that lacks a coefficient, naming it', () => {
    expect(() => evaluateConstant({ ...antoineOfWater, coefficients: { A: 10, B: 1600 } }, 300)).toThrow(
      /coefficient C/,
    );
  });
});

describe('coversTemperature', () => {
  it('holds on the limits of the source and not beyond', () => {
    expect([273.1, 273.2, 473.2, 473.3].map((T) => coversTemperature(antoineOfWater, T))).toEqual([
      false,
      true,
      true,
      false,
    ]);
    expect(coversTemperature(fiveTermOfWater, 1000)).toBe(true);
  });
});

describe('valueOf and equationsOf', () => {
  const constants: SubstanceConstant[] = [
    { kind: 'NORMAL_BOILING_POINT', value: 373.124, unit: 'K', source },
    wagnerOfWater,
    antoineOfWater,
  ];

  it('finds a value by its kind, and nothing where there is none', () => {
    expect(valueOf(constants, 'NORMAL_BOILING_POINT')).toBe(373.124);
    expect(valueOf(constants, 'VAPOUR_PRESSURE')).toBeUndefined();
  });

  it('keeps the equations of a kind in their order, the one in use first', () => {
    expect(equationsOf(constants, 'VAPOUR_PRESSURE').map(({ form }) => form)).toEqual(['WAGNER', 'ANTOINE']);
  });
});
