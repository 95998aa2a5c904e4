import { powerLawFreePressureSet } from '../../../test/reference/crosscheck/power-law-free-pressure.js';
import { powerLawHuber } from '../../../test/reference/crosscheck/power-law-huber.js';
import { powerLawRandomIntercept } from '../../../test/reference/crosscheck/power-law-random-intercept.js';
import { powerLawWeighted } from '../../../test/reference/crosscheck/power-law-weighted.js';
import { seriesOf } from '../../../test/reference/crosscheck/series-of.js';
import { agreeingDigits } from '../../../test/reference/strd/strd-problem.js';
import { evaluateCorrelation } from './evaluate-correlation.js';
import { fitCorrelation } from './fit-correlation.js';
import { type FitRecipe, type FitSeries, type FittedCorrelation } from './fit.types.js';

/** Sources: each fixture names the programs its figures were confirmed with. */
const DIGITS = 8;

const onDiffusivity: FitRecipe = {
  form: 'POWER_LAW',
  objective: 'DIFFUSIVITY',
  weighting: 'STATED',
  loss: 'LEAST_SQUARES',
  seriesEffect: 'POOLED',
  betweenSeriesDeviation: null,
  referenceTemperature: 298.15,
  referencePressure: 101325,
};

function fitted(series: FitSeries[], recipe: FitRecipe): FittedCorrelation {
  const outcome = fitCorrelation(series, recipe);
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  return outcome.fit;
}

function expectDigits(actual: readonly number[], reference: readonly number[]): void {
  expect(actual).toHaveLength(reference.length);
  actual.forEach((value, i) => expect(agreeingDigits(value, reference[i]!)).toBeGreaterThan(DIGITS));
}

const values = (fit: FittedCorrelation) => fit.parameters.map(({ value }) => value);

describe.each([
  ['the weighted power law', powerLawWeighted, 'POWER_LAW'],
  ['the power law with a fitted exponent of pressure', powerLawFreePressureSet, 'POWER_LAW_FREE_PRESSURE'],
] as const)('fitCorrelation on D against R and SciPy: %s', (_, reference, form) => {
  const fit = fitted(seriesOf(reference.series), { ...onDiffusivity, form });

  it('gives parameters and covariance to 8 digits', () => {
    expectDigits(values(fit), Object.values(reference.parameters));
    expectDigits(fit.covariance.flat(), reference.covariance.flat());
  });

  it('gives χ² and AICc to 8 digits', () => {
    expectDigits([fit.statistics.chiSquare!, fit.statistics.aicc!], [reference.chiSquare, reference.aicc]);
  });

  it('gives D, u and the limits of the 95 % interval to 8 digits', () => {
    expectPredictions(fit, reference.predictions);
  });
});

describe('fitCorrelation under Huber’s loss against R and SciPy', () => {
  const fit = fitted(seriesOf(powerLawHuber.series), { ...onDiffusivity, loss: 'HUBER' });

  it('gives parameters and covariance to 8 digits', () => {
    expectDigits(values(fit), Object.values(powerLawHuber.parameters));
    expectDigits(fit.covariance.flat(), powerLawHuber.covariance.flat());
  });

  it('gives the robust weights to 8 digits', () => {
    expectDigits(
      fit.points[0]!.map(({ weight }) => weight),
      powerLawHuber.weights,
    );
  });

  it('gives D, u and the limits of the 95 % interval to 8 digits', () => {
    expectPredictions(fit, powerLawHuber.predictions);
  });

  it('claims no likelihood', () => {
    expect(fit.statistics.aicc).toBeNull();
  });
});

describe('fitCorrelation with a random intercept against nlme (REML)', () => {
  const reference = powerLawRandomIntercept;
  const fit = fitted(seriesOf(reference.series), {
    ...onDiffusivity,
    objective: 'LN_DIFFUSIVITY',
    weighting: 'EQUAL',
    seriesEffect: 'RANDOM_INTERCEPT',
  });

  it('gives parameters and their covariance to 8 digits', () => {
    const d0 = Math.exp(reference.lnD0);
    const [[ofIntercept, mixed], [, ofExponent]] = reference.covariance;
    expectDigits(values(fit), [d0, reference.n]);
    expectDigits(fit.covariance.flat(), [d0 ** 2 * ofIntercept, d0 * mixed, d0 * mixed, ofExponent]);
  });

  it('gives the deviations within and between series, and AICc by maximum likelihood, to 8 digits', () => {
    const { residualStandardError, betweenSeriesDeviation, aicc } = fit.statistics;
    expectDigits(
      [residualStandardError!, betweenSeriesDeviation!, aicc!],
      [reference.withinSeriesDeviation, reference.betweenSeriesDeviation, reference.aicc],
    );
  });

  it('gives u and the intervals, for the mean and for a new laboratory, with t of series − 1', () => {
    for (const [temperature, d, uOfLn, low, high, newLow, newHigh] of reference.predictions) {
      const mean = evaluateCorrelation(fit, [temperature], [101325], { coverage: 0.95, kind: 'MEAN' });
      const single = evaluateCorrelation(fit, [temperature], [101325], { coverage: 0.95, kind: 'NEW_SERIES' });
      // The reference states intervals of ln D; half their ratio in logarithms is U/D.
      expectDigits(
        [mean.diffusivities[0]!, mean.standardUncertainties[0]! / d, mean.expandedUncertainties[0]! / d],
        [d, uOfLn, Math.log(high / low) / 2],
      );
      expectDigits([single.expandedUncertainties[0]! / d], [Math.log(newHigh / newLow) / 2]);
    }
  });
});

type Prediction = readonly [temperature: number, d: number, u: number, low: number, high: number];

function expectPredictions(fit: FittedCorrelation, predictions: readonly Prediction[]): void {
  for (const [temperature, d, u, low, high] of predictions) {
    const at = evaluateCorrelation(fit, [temperature], [101325], { coverage: 0.95, kind: 'MEAN' });
    const [value, expanded] = [at.diffusivities[0]!, at.expandedUncertainties[0]!];
    expectDigits([value, at.standardUncertainties[0]!, value - expanded, value + expanded], [d, u, low, high]);
  }
}
