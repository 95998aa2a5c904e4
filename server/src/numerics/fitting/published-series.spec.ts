import { marreroMason, marreroMasonLimit, marreroMasonRows } from '../../../test/reference/marrero-mason.js';
import { fullerCompilation, type PublishedSeries } from '../../../test/reference/published-series.js';
import { evaluateCorrelation } from './evaluate-correlation.js';
import { fitCorrelation } from './fit-correlation.js';
import { type FitRecipe, type FittedCorrelation } from './fit.types.js';

/** Sources of both sides: the fixtures. The compilation states no uncertainty of its points, so they weigh alike. */
const recipe: FitRecipe = {
  form: 'POWER_LAW',
  objective: 'LN_DIFFUSIVITY',
  weighting: 'EQUAL',
  loss: 'LEAST_SQUARES',
  seriesEffect: 'RANDOM_INTERCEPT_AND_SLOPE',
  betweenSeriesDeviation: null,
  referenceTemperature: 298.15,
  referencePressure: 101325,
};

function fitted({ pair, points }: PublishedSeries, seriesEffect: FitRecipe['seriesEffect']): FittedCorrelation {
  const rows = points.map(([temperature, diffusivity]) => ({
    temperature,
    pressure: 101325,
    diffusivity,
    diffusivityUncertainty: null,
    temperatureUncertainty: null,
    pressureUncertainty: null,
  }));
  const outcome = fitCorrelation([{ key: pair, commonRelativeUncertainty: null, points: rows }], {
    ...recipe,
    seriesEffect,
  });
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  return outcome.fit;
}

/** Largest difference from Marrero and Mason over the common range, in percent and over the combined uncertainties. */
function disagreement(
  series: PublishedSeries,
  seriesEffect: FitRecipe['seriesEffect'],
): { percent: number; ratio: number } {
  const fit = fitted(series, seriesEffect);
  const row = marreroMasonRows.find(({ pair }) => pair === series.pair)!;
  const low = Math.max(row.range[0], fit.validity.temperatureMinimum);
  const high = Math.min(row.range[1], fit.validity.temperatureMaximum);
  const states = Array.from({ length: 41 }, (_, i) => low * (high / low) ** (i / 40)).map((temperature) => {
    const at = evaluateCorrelation(fit, [temperature], [101325], { coverage: 0.95, kind: 'MEAN' });
    const difference = Math.log(at.diffusivities[0]! / marreroMason(row, temperature));
    const limit = marreroMasonLimit(row, temperature) ?? 0;
    const combined = Math.hypot(at.expandedUncertainties[0]! / at.diffusivities[0]!, limit);
    return { percent: 100 * difference, ratio: Math.abs(difference) / combined };
  });
  return states.reduce((worst, state) => (state.ratio > worst.ratio ? state : worst));
}

const withLimit = fullerCompilation.filter((series) => limited(series.pair));

function limited(pair: string): boolean {
  return marreroMasonRows.some((row) => row.pair === pair && row.group !== null);
}

describe('the Marrero–Mason fixture', () => {
  it.each([
    ['hydrogen–nitrogen', 300, 7.8423e-5],
    ['argon–xenon', 300, 1.144e-5],
    ['nitrogen–carbon dioxide', 300, 1.6709e-5],
  ])('gives D of %s at %d K as worked out from the printed constants', (pair, temperature, diffusivity) => {
    const row = marreroMasonRows.find((one) => one.pair === pair)!;

    expect(marreroMason(row, temperature) / diffusivity).toBeCloseTo(1, 4);
  });

  it('reads the limits of group I as printed at 300 K and between', () => {
    const row = marreroMasonRows.find(({ group }) => group === 'I')!;

    expect(marreroMasonLimit(row, 300)).toBeCloseTo(0.01, 12);
    expect(marreroMasonLimit(row, Math.sqrt(300 * 500))).toBeCloseTo(0.015, 12);
  });
});

describe('published temperature series against the Marrero–Mason correlation of the pair', () => {
  it('covers ten pairs with a limit of uncertainty', () => {
    expect(withLimit).toHaveLength(10);
  });

  it.each(withLimit)('agrees for $pair within the two uncertainties combined at 95 %', (series) => {
    expect(disagreement(series, 'RANDOM_INTERCEPT_AND_SLOPE').ratio).toBeLessThan(1);
  });

  it('disagrees for five pairs when the scatter of the points alone stands for the uncertainty (POOLED)', () => {
    const beyond = withLimit
      .map((series) => ({ pair: series.pair, ...disagreement(series, 'POOLED') }))
      .filter(({ ratio }) => ratio > 1)
      .map(({ pair, percent, ratio }) => `${pair}: ${percent.toFixed(1)} %, ${ratio.toFixed(2)} times the combined U`);

    expect(beyond).toEqual([
      'hydrogen–nitrogen: 4.4 %, 1.56 times the combined U',
      'helium–oxygen: -3.5 %, 1.16 times the combined U',
      'helium–carbon dioxide: -3.6 %, 1.02 times the combined U',
      'neon–argon: -3.5 %, 1.10 times the combined U',
      'argon–xenon: 2.6 %, 1.58 times the combined U',
    ]);
  });

  it('differs for the pairs with water, whose limit Marrero and Mason state in a table not at hand, by these sizes', () => {
    const sizes = fullerCompilation
      .filter(({ pair }) => !limited(pair))
      .map((series) => `${series.pair}: ${disagreement(series, 'RANDOM_INTERCEPT_AND_SLOPE').percent.toFixed(1)} %`);

    expect(sizes).toEqual(['nitrogen–water: -4.2 %', 'carbon dioxide–water: 8.1 %', 'air–water: -3.4 %']);
  });
});
