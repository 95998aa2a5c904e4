import { EngineError } from './engine-error.js';
import { evaluateCorrelation } from './evaluate-correlation.js';
import { expressionOf } from './expression-of.js';
import { fitCorrelation } from './fit-correlation.js';
import { type FitPoint, type FitRecipe, type FitSeries, type FittedCorrelation } from './fit.types.js';
import { seriesOffset } from './series-offsets.js';

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

/** Deviations of ln D that are neither zero nor alike, for points that would otherwise be exact. */
const WIGGLE = [0.004, -0.007, 0.002, 0.006, -0.005, 0.001];

/** A series on D0 = 2e-5 m²/s, n = 1.75, `shift` away in ln D; u(D) = 1 %. */
function aSeries(temperatures: readonly number[], change: Partial<FitPoint> = {}, shift = 0): FitSeries {
  const points = temperatures.map((temperature, i) => {
    const pressure = change.pressure ?? 101325;
    const diffusivity =
      2e-5 * (temperature / 298.15) ** 1.75 * (101325 / pressure) * Math.exp(shift + WIGGLE[i % WIGGLE.length]!);
    const uncertainties = {
      diffusivityUncertainty: 0.01 * diffusivity,
      temperatureUncertainty: null,
      pressureUncertainty: null,
    };
    return { temperature, pressure, diffusivity, ...uncertainties, ...change };
  });
  return { key: `T from ${temperatures[0]}`, commonRelativeUncertainty: null, points };
}

const wide = [280, 310, 350, 400, 450, 520];

function fitted(series: readonly FitSeries[], choice: Partial<FitRecipe> = {}): FittedCorrelation {
  const outcome = fitCorrelation(series, { ...recipe, ...choice });
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  return outcome.fit;
}

function problems(
  series: readonly FitSeries[],
  choice: Partial<FitRecipe> = {},
): { code: string; path: string | null }[] {
  const outcome = fitCorrelation(series, { ...recipe, ...choice });
  if (outcome.ok) throw new Error('The fit was made');
  return outcome.problems.map(({ code, path }) => ({ code, path }));
}

const codes = (fit: FittedCorrelation) => fit.warnings.map(({ code }) => code);

describe('fitCorrelation refuses, in words,', () => {
  it('the exponent of T from one temperature', () => {
    const outcome = fitCorrelation([aSeries([300, 300, 300, 300])], recipe);

    expect(outcome).toMatchObject({ ok: false, problems: [{ code: 'NOT_DETERMINABLE' }] });
    expect(outcome.ok ? '' : outcome.problems[0]!.message).toContain('exponent n');
  });

  it('the exponent of P from one pressure', () => {
    const outcome = fitCorrelation([aSeries(wide)], { ...recipe, form: 'POWER_LAW_FREE_PRESSURE' });

    expect(outcome.ok ? '' : outcome.problems[0]!.message).toContain('exponent m');
  });

  it('the exponent of P where P rises with T along every point', () => {
    const points = wide.map(
      (temperature) => aSeries([temperature], { pressure: 1000 * temperature ** 0.8 }).points[0]!,
    );

    expect(problems([{ ...aSeries(wide), points }], { form: 'POWER_LAW_FREE_PRESSURE' })).toEqual([
      { code: 'NOT_DETERMINABLE', path: null },
    ]);
  });

  it('no more points than parameters', () => {
    expect(problems([aSeries([300, 400])])).toEqual([{ code: 'NOT_DETERMINABLE', path: null }]);
  });

  it.each(['SUTHERLAND', 'LOG_QUADRATIC', 'THREE_TERM', 'KINETIC_THEORY'] as const)(
    'the form %s, not there yet',
    (form) => {
      expect(problems([aSeries(wide)], { form })).toEqual([{ code: 'NOT_AVAILABLE', path: 'form' }]);
    },
  );

  it('a robust loss with random series effects', () => {
    expect(problems([aSeries(wide)], { loss: 'HUBER', seriesEffect: 'RANDOM_INTERCEPT' })).toEqual([
      { code: 'BAD_INPUT', path: 'loss' },
    ]);
  });

  it.each([
    ['temperature', 0],
    ['pressure', -1],
    ['diffusivity', NaN],
    ['diffusivityUncertainty', null],
    ['diffusivityUncertainty', 0],
    ['temperatureUncertainty', -1],
    ['pressureUncertainty', Infinity],
  ] as const)('a point whose %s is %d', (quantity, value) => {
    const sound = aSeries(wide);
    const points = sound.points.map((point, i) => (i === 2 ? { ...point, [quantity]: value } : point));

    expect(problems([{ ...sound, points }])).toContainEqual({
      code: 'BAD_INPUT',
      path: `series.0.points.2.${quantity}`,
    });
  });

  it('no series, and a series without points', () => {
    expect(problems([])).toContainEqual({ code: 'BAD_INPUT', path: 'series' });
    expect(problems([{ ...aSeries(wide), points: [] }])).toContainEqual({ code: 'BAD_INPUT', path: 'series.0.points' });
  });

  it.each([
    ['betweenSeriesDeviation', -0.1],
    ['referenceTemperature', 0],
    ['referencePressure', NaN],
  ] as const)('a recipe whose %s is %d', (field, value) => {
    expect(problems([aSeries(wide)], { [field]: value })).toEqual([{ code: 'BAD_INPUT', path: field }]);
  });

  it('numbers too far apart in size for a finite result', () => {
    const steep = aSeries(wide).points.map((point, i) => {
      const diffusivity = 10 ** (100 * i - 250 + (i % 2));
      return { ...point, diffusivity, diffusivityUncertainty: diffusivity / 100 };
    });

    expect(problems([{ ...aSeries(wide), points: steep }], { referenceTemperature: 1 })).toEqual([
      { code: 'NOT_DETERMINABLE', path: null },
    ]);
  });
});

describe('fitCorrelation warns of', () => {
  it('two temperatures and a narrow range', () => {
    expect(codes(fitted([aSeries([300, 300, 330, 330])]))).toEqual(
      expect.arrayContaining(['TWO_TEMPERATURES', 'NARROW_TEMPERATURE_RANGE']),
    );
  });

  it('one series, and the deviation assigned to it', () => {
    const fit = fitted([aSeries(wide)], { seriesEffect: 'RANDOM_INTERCEPT_AND_SLOPE' });

    expect(codes(fit)).toEqual(expect.arrayContaining(['ONE_SERIES', 'ASSIGNED_DEVIATION']));
    expect(fit.statistics).toMatchObject({ betweenSeriesDeviation: 0.03, betweenSeriesOrigin: 'ASSIGNED' });
  });

  it('one point on which the result rests', () => {
    const sound = aSeries([300, 301, 302, 303, 304, 600]);
    const points = sound.points.map((point, i) =>
      i === 5 ? { ...point, diffusivity: 1.1 * point.diffusivity } : point,
    );

    expect(codes(fitted([{ ...sound, points }]))).toContain('INFLUENTIAL_POINT');
  });

  it('parameters that are almost one', () => {
    expect(codes(fitted([aSeries([700, 710, 720, 730])]))).toContain('STRONG_CORRELATION');
  });

  it('pooling and of a random intercept alone, when there are several series', () => {
    const several = [aSeries(wide), aSeries(wide, {}, 0.03), aSeries(wide, {}, -0.02)];

    expect(codes(fitted(several))).toContain('POOLED');
    expect(codes(fitted(several, { seriesEffect: 'RANDOM_INTERCEPT' }))).toContain('RANDOM_INTERCEPT');
    expect(codes(fitted(several, { seriesEffect: 'RANDOM_INTERCEPT_AND_SLOPE' }))).not.toContain('ASSIGNED_DEVIATION');
  });

  it('intervals wider than they need be, when no deviation shows', () => {
    const alike = [0.3, 1, 1.7].map((shift) => aSeries(wide.map((temperature) => temperature + shift)));

    expect(codes(fitted(alike, { seriesEffect: 'RANDOM_INTERCEPT_AND_SLOPE' }))).toContain('CONSERVATIVE_INTERVALS');
  });
});

describe('a fit with an assigned deviation', () => {
  const random = { seriesEffect: 'RANDOM_INTERCEPT_AND_SLOPE' } as const;

  it('adds τ² and the common part to the variance of ln D0, and nothing to that of n', () => {
    const one = { ...aSeries(wide), commonRelativeUncertainty: 0.01 };
    const alone = fitted([aSeries(wide)], random);
    const withCommon = fitted([one], { ...random, betweenSeriesDeviation: 0.02 });
    const bare = fitted([aSeries(wide)]);
    const ofLnD0 = (fit: FittedCorrelation) => fit.covariance[0]![0]! / fit.parameters[0]!.value ** 2;

    expect(ofLnD0(alone) - ofLnD0(bare)).toBeCloseTo(0.03 ** 2, 12);
    expect(ofLnD0(withCommon) - ofLnD0(bare)).toBeCloseTo(0.02 ** 2 + 0.01 ** 2, 12);
    expect(withCommon.covariance[1]![1]).toBeCloseTo(bare.covariance[1]![1]!, 12);
  });

  it('propagates the common part into a pooled fit without letting more points average it down', () => {
    const many = { ...aSeries([...wide, ...wide, ...wide, ...wide]), commonRelativeUncertainty: 0.01 };
    const fit = fitted([many]);
    const bare = fitted([{ ...many, commonRelativeUncertainty: null }]);

    expect((fit.covariance[0]![0]! - bare.covariance[0]![0]!) / fit.parameters[0]!.value ** 2).toBeCloseTo(1e-4, 12);
  });

  it('lets three series show theirs unless one is given', () => {
    const three = [aSeries(wide), aSeries(wide, {}, 0.03), aSeries(wide, {}, -0.02)];

    expect(fitted(three, random).statistics.betweenSeriesOrigin).toBe('STATED');
    expect(fitted(three, { ...random, betweenSeriesDeviation: 0.05 }).statistics).toMatchObject({
      betweenSeriesDeviation: 0.05,
      betweenSeriesOrigin: 'ASSIGNED',
    });
  });
});

describe('a fit of exact data', () => {
  const exact = [0, 1, 2].map((s) => ({
    ...aSeries(wide),
    points: wide.map((t) => {
      const temperature = t + s;
      const diffusivity = 2e-5 * (temperature / 298.15) ** 1.75;
      return { ...aSeries([temperature]).points[0]!, diffusivity, diffusivityUncertainty: 0.01 * diffusivity };
    }),
  }));
  const choices = [
    { seriesEffect: 'POOLED' },
    { seriesEffect: 'POOLED', loss: 'HUBER' },
    { seriesEffect: 'POOLED', loss: 'BISQUARE' },
    { seriesEffect: 'RANDOM_INTERCEPT' },
    { seriesEffect: 'RANDOM_INTERCEPT_AND_SLOPE' },
  ] as const;
  const cases = choices.flatMap((choice) =>
    (['STATED', 'EFFECTIVE_VARIANCE', 'EQUAL'] as const).flatMap((weighting) =>
      (['LN_DIFFUSIVITY', 'DIFFUSIVITY'] as const).flatMap((objective) =>
        [1, 3].map((count) => ({ ...choice, weighting, objective, count })),
      ),
    ),
  );

  it.each(cases)('finds the truth: %j', ({ count, ...choice }) => {
    const [d0, n] = fitted(exact.slice(0, count), choice).parameters;

    expect(d0!.value / 2e-5).toBeCloseTo(1, 10);
    expect(n!.value).toBeCloseTo(1.75, 9);
  });
});

describe('evaluateCorrelation', () => {
  const fit = fitted([aSeries(wide)]);

  it('flags the states outside the range of T and P', () => {
    const states = evaluateCorrelation(fit, [279, 280, 520, 521, 300], [1e5, 1e5, 1e5, 1e5, 5e5], {
      coverage: 0.95,
      kind: 'MEAN',
    });

    expect(states.outside).toEqual([0, 3, 4]);
  });

  it('lets one pressure serve all temperatures', () => {
    const options = { coverage: 0.95, kind: 'MEAN' } as const;

    expect(evaluateCorrelation(fit, [300, 400], [1e5], options)).toEqual(
      evaluateCorrelation(fit, [300, 400], [1e5, 1e5], options),
    );
  });

  it('has nothing to say of a new series where no deviation is known', () => {
    const asked = () => evaluateCorrelation(fit, [300], [1e5], { coverage: 0.95, kind: 'NEW_SERIES' });

    expect(asked).toThrow(EngineError);
    expect(asked).toThrow(expect.objectContaining({ code: 'NOT_AVAILABLE' }));
  });

  it.each([
    [[300, 400], [1e5, 1e5, 1e5], 0.95],
    [[300, -1], [1e5], 0.95],
    [[300], [0], 0.95],
    [[300], [1e5], 1],
  ])('refuses temperatures %j with pressures %j at coverage %d', (temperatures, pressures, coverage) => {
    expect(() => evaluateCorrelation(fit, temperatures, pressures, { coverage, kind: 'MEAN' })).toThrow(
      expect.objectContaining({ code: 'BAD_INPUT' }),
    );
  });

  it('survives JSON', () => {
    const options = { coverage: 0.95, kind: 'MEAN' } as const;
    const stored = JSON.parse(JSON.stringify(fit)) as FittedCorrelation;

    expect(evaluateCorrelation(stored, [300], [1e5], options)).toEqual(evaluateCorrelation(fit, [300], [1e5], options));
  });

  it('gives the value that the printed expression gives', () => {
    const [, d0, t0, n, p0] = /^(\S+) \* \(T \/ (\S+)\)\^(\S+) \* \((\S+) \/ P\)$/.exec(expressionOf(fit))!.map(Number);
    const at = evaluateCorrelation(fit, [350], [9e4], { coverage: 0.95, kind: 'MEAN' });

    expect(at.diffusivities[0]! / (d0! * (350 / t0!) ** n! * (p0! / 9e4))).toBeCloseTo(1, 12);
  });
});

describe('seriesOffset', () => {
  const fit = fitted([aSeries(wide)]);

  it('is that of the fit for a series in it', () => {
    const [inFit] = fit.seriesOffsets;
    const again = seriesOffset(fit, aSeries(wide));

    expect(again.offset).toBeCloseTo(inFit!.offset, 12);
  });

  it('finds a series left out where it lies, with its common uncertainty', () => {
    const aside = { ...aSeries(wide, {}, 0.1), commonRelativeUncertainty: 0.02 };
    const { offset, standardUncertainty } = seriesOffset(fit, aside);

    expect(offset).toBeCloseTo(0.1, 10);
    expect(standardUncertainty).toBeCloseTo(Math.hypot(0.02, 0.01 / Math.sqrt(6)), 10);
  });

  it('takes the scatter of points that state no uncertainty', () => {
    const silent = aSeries(wide, { diffusivityUncertainty: null });
    const { standardUncertainty } = seriesOffset(fit, silent);

    expect(standardUncertainty).toBeGreaterThan(0.001);
    expect(standardUncertainty).toBeLessThan(0.004);
  });
});
