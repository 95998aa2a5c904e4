import { describe, expect, it } from '@jest/globals';
import { type EvaluableCorrelation } from '../numerics/fitting/fit.types.js';
import { compareToStored } from './reproduction-rules.js';

/** Invented numbers. */
const correlation = (D0: number, n: number, cross = 1e-10): EvaluableCorrelation => ({
  form: 'POWER_LAW',
  parameters: [
    { symbol: 'D0', value: D0, standardUncertainty: 1e-7, unit: 'm2/s' },
    { symbol: 'n', value: n, standardUncertainty: 0.01, unit: '1' },
  ],
  covariance: [
    [1e-14, cross],
    [cross, 1e-4],
  ],
  degreesOfFreedom: null,
  referenceTemperature: 298.15,
  referencePressure: 101_325,
  validity: {
    temperatureMinimum: 280,
    temperatureMaximum: 400,
    pressureMinimum: 9e4,
    pressureMaximum: 1.1e5,
    pressureBasis: 'STATED',
  },
  betweenSeries: null,
});
const disagreeing = (recomputed: EvaluableCorrelation) =>
  compareToStored(correlation(2e-5, 1.75), recomputed)
    .filter(({ agrees }) => !agrees)
    .map(({ name }) => name);

describe('a reproduction', () => {
  it('compares each parameter and each covariance once', () => {
    const compared = compareToStored(correlation(2e-5, 1.75), correlation(2e-5, 1.75));
    expect(compared.map(({ name }) => name)).toEqual(['D0', 'n', 'cov(D0, D0)', 'cov(n, D0)', 'cov(n, n)']);
    expect(compared.every(({ agrees, stored, recomputed }) => agrees && stored === recomputed)).toBe(true);
  });

  it('agrees to 12 digits, whatever the size of the number', () => {
    expect(disagreeing(correlation(2e-5 * (1 + 1e-13), 1.75))).toEqual([]);
    expect(disagreeing(correlation(2e-5 * (1 + 1e-11), 1.75))).toEqual(['D0']);
    expect(disagreeing(correlation(2e-5, 1.75, 1.001e-10))).toEqual(['cov(n, D0)']);
  });

  it('agrees never with what is missing or no number', () => {
    expect(disagreeing({ ...correlation(2e-5, 1.75), parameters: [], covariance: [] })).toHaveLength(5);
    expect(disagreeing(correlation(Number.NaN, 1.75))).toEqual(['D0']);
  });
});
