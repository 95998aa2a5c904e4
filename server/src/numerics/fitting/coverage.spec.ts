import { standardNormals, uniforms } from '../random/normals.js';
import { evaluateCorrelation } from './evaluate-correlation.js';
import { fitCorrelation } from './fit-correlation.js';
import { type FitRecipe, type FitSeries, type SeriesEffect } from './fit.types.js';

/** The truth of every simulated data set (invented). */
const TRUTH = { d0: 2.1e-5, n: 1.78 };
const STATES = [298.15, 350, 450];

interface Laboratories {
  readonly series: number;
  /** Standard deviation between laboratories, of ln D and of n */
  readonly deviation: number;
  readonly deviationOfExponent: number;
  /** Relative standard uncertainty of a point, independent and common to its series */
  readonly u: number;
  readonly common: number;
}

const normals = standardNormals(20261201);
const uniform = uniforms(20261202);

/** Laboratories with 4 to 10 points each over ranges between 275 and 630 K. */
function simulated({ series, deviation, deviationOfExponent, u, common }: Laboratories): FitSeries[] {
  return Array.from({ length: series }, (_, key) => {
    const shift = deviation * normals.next() + common * normals.next();
    const tilt = deviationOfExponent * normals.next();
    const count = 4 + Math.floor(7 * uniform.next());
    const low = 275 + 80 * uniform.next();
    const high = low + 100 + 175 * uniform.next();
    const points = Array.from({ length: count }, (__, i) => {
      const temperature = low + ((high - low) * i) / (count - 1);
      const x = Math.log(temperature / 298.15);
      // Laboratories agree best in the middle of the range they share, about 400 K.
      const deviant = shift + tilt * Math.log(temperature / 400);
      const diffusivity = TRUTH.d0 * Math.exp(TRUTH.n * x + deviant + u * normals.next());
      return {
        temperature,
        pressure: 101325,
        diffusivity,
        diffusivityUncertainty: u * diffusivity,
        temperatureUncertainty: null,
        pressureUncertainty: null,
      };
    });
    return { key: `${key}`, commonRelativeUncertainty: common || null, points };
  });
}

/** Part of the sets whose nominal 95 % interval holds the truth: for n, and for D at each of `STATES`. */
function coverage(laboratories: Laboratories, seriesEffect: SeriesEffect, sets: number): { n: number; d: number[] } {
  const recipe: FitRecipe = {
    form: 'POWER_LAW',
    objective: 'LN_DIFFUSIVITY',
    weighting: 'STATED',
    loss: 'LEAST_SQUARES',
    seriesEffect,
    betweenSeriesDeviation: null,
    referenceTemperature: 298.15,
    referencePressure: 101325,
  };
  let ofExponent = 0;
  const ofDiffusivity = STATES.map(() => 0);
  for (let set = 0; set < sets; set++) {
    const outcome = fitCorrelation(simulated(laboratories), recipe);
    if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
    const at = evaluateCorrelation(outcome.fit, STATES, [101325], { coverage: 0.95, kind: 'MEAN' });
    const n = outcome.fit.parameters[1]!;
    if (Math.abs(n.value - TRUTH.n) <= at.coverageFactor * n.standardUncertainty!) ofExponent++;
    STATES.forEach((temperature, i) => {
      const truth = TRUTH.d0 * (temperature / 298.15) ** TRUTH.n;
      if (Math.abs(at.diffusivities[i]! - truth) <= at.expandedUncertainties[i]!) ofDiffusivity[i]!++;
    });
  }
  return { n: ofExponent / sets, d: ofDiffusivity.map((count) => count / sets) };
}

/** Sets a case; the standard error of a coverage of 95 % is then 1.5 %. */
const SETS = 200;

describe('nominal 95 % intervals over simulated laboratories (fixed seed)', () => {
  it.each([
    ['five that differ by 2.5 % in D', { series: 5, deviation: 0.025, deviationOfExponent: 0, u: 0.01, common: 0 }],
    ['five that differ in n too', { series: 5, deviation: 0.025, deviationOfExponent: 0.05, u: 0.01, common: 0 }],
    ['three that differ by 2.5 % in D', { series: 3, deviation: 0.025, deviationOfExponent: 0, u: 0.01, common: 0 }],
    ['five that do not differ', { series: 5, deviation: 0, deviationOfExponent: 0, u: 0.01, common: 0 }],
    [
      'five whose stated u is mostly common',
      { series: 5, deviation: 0.01, deviationOfExponent: 0, u: 0.003, common: 0.015 },
    ],
  ])('hold the truth for %s', (_, laboratories) => {
    const { n, d } = coverage(laboratories, 'RANDOM_INTERCEPT_AND_SLOPE', SETS);

    expect(Math.min(n, ...d)).toBeGreaterThan(0.92);
  });

  it('hold D for one laboratory with the usual assigned deviation, when laboratories differ by 2.5 %', () => {
    const { d } = coverage(
      { series: 1, deviation: 0.025, deviationOfExponent: 0, u: 0.01, common: 0.01 },
      'RANDOM_INTERCEPT_AND_SLOPE',
      SETS,
    );

    expect(Math.min(...d)).toBeGreaterThan(0.92);
  });

  it('hold the truth for pooled points only as long as laboratories do not differ', () => {
    const alike = coverage({ series: 5, deviation: 0, deviationOfExponent: 0, u: 0.01, common: 0 }, 'POOLED', SETS);
    const unlike = coverage(
      { series: 5, deviation: 0.025, deviationOfExponent: 0, u: 0.01, common: 0 },
      'POOLED',
      SETS,
    );

    expect(Math.min(alike.n, ...alike.d)).toBeGreaterThan(0.92);
    expect(Math.min(...unlike.d)).toBeLessThan(0.8);
  });
});
