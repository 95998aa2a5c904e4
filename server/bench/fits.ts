import { fitCorrelation } from '../src/numerics/fitting/fit-correlation.js';
import { type FitRecipe, type FitSeries } from '../src/numerics/fitting/fit.types.js';
import { standardNormals } from '../src/numerics/random/normals.js';
import { type BenchRow } from './bench-row.js';
import { median } from './median.js';

const ROUNDS = 9;
/** Processor time of one measurement, ms: long beside the clock's step, short beside a neighbour's burst. */
const ROUND_TIME = 60;

const recipe: FitRecipe = {
  form: 'POWER_LAW',
  objective: 'LN_DIFFUSIVITY',
  weighting: 'STATED',
  loss: 'LEAST_SQUARES',
  seriesEffect: 'POOLED',
  betweenSeriesDeviation: null,
  referenceTemperature: 298.15,
  referencePressure: 101325,
};

interface Contender {
  readonly name: string;
  readonly fit: () => void;
  readonly perSecond: number[];
}

/**
 * Complete fits of a weighted two-parameter power law per second of processor time: checks, covariance, statistics,
 * offsets, diagnostics and warnings included. Medians of rounds in which the sizes and objectives take turns.
 */
export async function benchFits(): Promise<BenchRow[]> {
  const contenders = [10, 50, 1000].flatMap((count) => contendersOf(count));
  for (const { fit } of contenders) timed(fit);
  for (let round = 0; round < ROUNDS; round++) {
    for (const contender of contenders) contender.perSecond.push(timed(contender.fit));
    // Let whatever else this process has to do happen between rounds, not within one.
    await new Promise((resolve) => setImmediate(resolve));
  }
  return contenders.map(({ name, perSecond }) => ({
    name,
    value: `${Math.round(median(perSecond)).toLocaleString('en')} fits/s`,
    gate: null,
    met: null,
  }));
}

function contendersOf(count: number): Contender[] {
  const data = [simulated(count)];
  const contender = (words: string, change: Partial<FitRecipe>): Contender => ({
    name: `Power law ${words}, weighted, N = ${count}`,
    fit: () => {
      const outcome = fitCorrelation(data, { ...recipe, ...change });
      if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
    },
    perSecond: [],
  });
  return [contender('on ln D', {}), contender('on D', { objective: 'DIFFUSIVITY' })];
}

/** Invented points with 1 % scatter about D0 = 2e-5 m²/s, n = 1.75. */
function simulated(count: number): FitSeries {
  const normals = standardNormals(count);
  const points = Array.from({ length: count }, (_, i) => {
    const temperature = 280 + (400 * i) / (count - 1);
    const diffusivity = 2e-5 * (temperature / 298.15) ** 1.75 * Math.exp(0.01 * normals.next());
    return {
      temperature,
      pressure: 101325,
      diffusivity,
      diffusivityUncertainty: 0.01 * diffusivity,
      temperatureUncertainty: null,
      pressureUncertainty: null,
    };
  });
  return { key: 'simulated', commonRelativeUncertainty: null, points };
}

/** Calls per second of processor time. */
function timed(call: () => void): number {
  const start = process.cpuUsage();
  let calls = 0;
  let milliseconds = 0;
  while (milliseconds < ROUND_TIME) {
    for (let i = 0; i < 10; i++) call();
    calls += 10;
    const { user, system } = process.cpuUsage(start);
    milliseconds = (user + system) / 1000;
  }
  return (1000 * calls) / milliseconds;
}
