import fc from 'fast-check';
import { evaluateCorrelation } from './evaluate-correlation.js';
import { fitCorrelation } from './fit-correlation.js';
import { type FitPoint, type FitRecipe, type FitSeries, type FittedCorrelation } from './fit.types.js';
import { restateCorrelation } from './restate.js';

const pooled: FitRecipe = {
  form: 'POWER_LAW',
  objective: 'LN_DIFFUSIVITY',
  weighting: 'EFFECTIVE_VARIANCE',
  loss: 'LEAST_SQUARES',
  seriesEffect: 'POOLED',
  betweenSeriesDeviation: null,
  referenceTemperature: 298.15,
  referencePressure: 101325,
};
const mixed: FitRecipe = { ...pooled, seriesEffect: 'RANDOM_INTERCEPT_AND_SLOPE' };
const onDiffusivity: FitRecipe = { ...pooled, objective: 'DIFFUSIVITY', weighting: 'STATED' };
const recipe = fc.constantFrom(pooled, mixed, onDiffusivity, { ...pooled, weighting: 'EQUAL', loss: 'HUBER' } as const);

/** Three to five series of a pair near D0 = 2e-5 m²/s and n = 1.75, each with a deviation of its own. */
const series: fc.Arbitrary<FitSeries[]> = fc.array(aSeries(), { minLength: 3, maxLength: 5 });

function aSeries(): fc.Arbitrary<FitSeries> {
  const point = fc.record({
    temperature: fc.double({ min: 260, max: 700, noNaN: true }),
    pressure: fc.double({ min: 2e4, max: 2e5, noNaN: true }),
    deviation: fc.double({ min: -0.03, max: 0.03, noNaN: true }),
    u: fc.double({ min: 0.005, max: 0.03, noNaN: true }),
  });
  return fc
    .record({
      key: fc.uuid(),
      shift: fc.double({ min: -0.04, max: 0.04, noNaN: true }),
      common: fc.option(fc.double({ min: 0.001, max: 0.02, noNaN: true })),
      points: fc.array(point, { minLength: 4, maxLength: 7 }),
    })
    .map(({ key, shift, common, points }) => ({
      key,
      commonRelativeUncertainty: common,
      points: points.map(({ temperature, pressure, deviation, u }) => {
        const diffusivity = 2e-5 * (temperature / 298.15) ** 1.75 * (101325 / pressure) * Math.exp(shift + deviation);
        return {
          temperature,
          pressure,
          diffusivity,
          diffusivityUncertainty: u * diffusivity,
          temperatureUncertainty: 0.1,
          pressureUncertainty: 50,
        };
      }),
    }));
}

function fitted(data: readonly FitSeries[], choice: FitRecipe): FittedCorrelation {
  const outcome = fitCorrelation(data, choice);
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  return outcome.fit;
}

const numbersOf = (fit: FittedCorrelation) => ({
  parameters: fit.parameters,
  covariance: fit.covariance,
  statistics: fit.statistics,
  betweenSeries: fit.betweenSeries,
});

function mapPoints(data: readonly FitSeries[], change: (point: FitPoint) => FitPoint): FitSeries[] {
  return data.map((one) => ({ ...one, points: one.points.map(change) }));
}

function expectClose(actual: readonly number[], expected: readonly number[], digits: number): void {
  actual.forEach((value, i) => expect(Math.abs(value / expected[i]! - 1)).toBeLessThan(10 ** -digits));
}

const runs = { numRuns: 40, seed: 20261201 };

describe('fitCorrelation on any series', () => {
  it('changes no bit when points and series are put in another order under other keys', () => {
    fc.assert(
      fc.property(series, recipe, fc.infiniteStream(fc.nat()), (data, choice, numbers) => {
        const shuffled = shuffle(data, numbers).map((one, i) => ({
          ...one,
          key: `renamed ${i}`,
          points: shuffle(one.points, numbers),
        }));

        expect(numbersOf(fitted(shuffled, choice))).toEqual(numbersOf(fitted(data, choice)));
      }),
      runs,
    );
  });

  it('scales D0 and its uncertainty by the factor D is scaled by, and leaves n alone', () => {
    fc.assert(
      fc.property(series, recipe, fc.double({ min: 1e-3, max: 1e3, noNaN: true }), (data, choice, factor) => {
        const scaled = mapPoints(data, (point) => ({
          ...point,
          diffusivity: point.diffusivity * factor,
          diffusivityUncertainty: point.diffusivityUncertainty! * factor,
        }));
        const [d0, n] = fitted(data, choice).parameters;
        const [scaledD0, scaledN] = fitted(scaled, choice).parameters;

        expectClose(
          [scaledD0!.value, scaledD0!.standardUncertainty!],
          [factor * d0!.value, factor * d0!.standardUncertainty!],
          7,
        );
        expectClose([scaledN!.value, scaledN!.standardUncertainty!], [n!.value, n!.standardUncertainty!], 7);
      }),
      runs,
    );
  });

  it('scales D0 by the factor P is scaled by', () => {
    fc.assert(
      fc.property(series, recipe, fc.double({ min: 0.1, max: 10, noNaN: true }), (data, choice, factor) => {
        const scaled = mapPoints(data, (point) => ({
          ...point,
          pressure: point.pressure * factor,
          pressureUncertainty: point.pressureUncertainty! * factor,
        }));
        const [d0] = fitted(data, choice).parameters;
        const [scaledD0] = fitted(scaled, choice).parameters;

        expectClose(
          [scaledD0!.value, scaledD0!.standardUncertainty!],
          [factor * d0!.value, factor * d0!.standardUncertainty!],
          7,
        );
      }),
      runs,
    );
  });

  it('is the identity when restated to another reference state and back', () => {
    const state = fc.record({
      temperature: fc.double({ min: 200, max: 1000, noNaN: true }),
      pressure: fc.double({ min: 1e4, max: 1e6, noNaN: true }),
    });
    fc.assert(
      fc.property(series, recipe, state, (data, choice, elsewhere) => {
        const fit = fitted(data, choice);
        const back = restateCorrelation(restateCorrelation(fit, elsewhere), { temperature: 298.15, pressure: 101325 });

        expectClose(
          back.parameters.map(({ value }) => value),
          fit.parameters.map(({ value }) => value),
          12,
        );
        // n keeps its variance; the variance of D0 loses to cancellation what the far state's correlation takes.
        expectClose(diagonal(back.covariance), diagonal(fit.covariance), 10);
      }),
      runs,
    );
  });

  it('gives the same values and uncertainties from every reference state', () => {
    fc.assert(
      fc.property(series, recipe, fc.double({ min: 200, max: 1000, noNaN: true }), (data, choice, temperature) => {
        const here = fitted(data, choice);
        const there = fitted(data, { ...choice, referenceTemperature: temperature });
        const states = [[300, 450, 600], [101325]] as const;
        const options = { coverage: 0.95, kind: 'MEAN' } as const;
        const [a, b] = [here, there].map((fit) => evaluateCorrelation(fit, ...states, options));

        expectClose([...b!.diffusivities], [...a!.diffusivities], 11);
        expectClose([...b!.expandedUncertainties], [...a!.expandedUncertainties], 8);
      }),
      runs,
    );
  });

  it('changes nothing when every series is given twice with doubled variances (pooled, stated, unscaled)', () => {
    fc.assert(
      fc.property(series, (data) => {
        // Uncertainties generous enough that χ² does not scale the covariance.
        const once = data.map((one) => ({
          ...one,
          commonRelativeUncertainty: null,
          points: one.points.map((point) => ({ ...point, diffusivityUncertainty: 0.2 * point.diffusivity })),
        }));
        const half = mapPoints(once, (point) => ({
          ...point,
          diffusivityUncertainty: point.diffusivityUncertainty! * Math.SQRT2,
        }));
        const choice: FitRecipe = { ...pooled, weighting: 'STATED' };
        const [single, twice] = [fitted(once, choice), fitted([...half, ...half], choice)];

        expectClose(
          twice.parameters.map(({ value }) => value),
          single.parameters.map(({ value }) => value),
          12,
        );
        expectClose(twice.covariance.flat(), single.covariance.flat(), 10);
      }),
      runs,
    );
  });
});

function shuffle<T>(items: readonly T[], numbers: Iterator<number>): T[] {
  return items
    .map((item) => ({ item, rank: numbers.next().value as number }))
    .sort((a, b) => a.rank - b.rank)
    .map(({ item }) => item);
}

function diagonal(matrix: readonly (readonly number[])[]): number[] {
  return matrix.map((row, i) => row[i]!);
}
