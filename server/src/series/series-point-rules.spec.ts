import { describe, expect, it } from '@jest/globals';
import { type IncomingPoint, pointProblems, pointWarnings } from './series-point-rules.js';

const POINT: IncomingPoint = { temperature: 300, pressure: 101_325, diffusivity: 2e-5, diffusivityUncertainty: 4e-7 };
const points = (...changes: Partial<IncomingPoint>[]) => changes.map((change) => ({ ...POINT, ...change }));
const problems = (...changes: Partial<IncomingPoint>[]) =>
  pointProblems(points(...changes)).map(({ code, path }) => `${code} ${path}`);
const warnings = (...changes: Partial<IncomingPoint>[]) =>
  pointWarnings(points(...changes)).map(({ code, path }) => `${code} ${path}`);

describe('the points of a series', () => {
  it('are sound where nothing is amiss, uncertainties stated or not', () => {
    expect(problems({}, { diffusivityUncertainty: null, moleFraction: 0, replicates: 1 }, { moleFraction: 1 })).toEqual(
      [],
    );
    expect(warnings({}, { temperature: 350, diffusivity: 2.6e-5 })).toEqual([]);
  });

  it('are at least one', () => {
    expect(pointProblems([])).toMatchObject([{ code: 'BAD_INPUT', path: 'points' }]);
  });

  it.each(['temperature', 'pressure', 'diffusivity'] as const)('have a finite %s above zero', (field) => {
    for (const value of [0, -1, Number.NaN, Infinity]) {
      expect(problems({}, { [field]: value })).toEqual([`BAD_INPUT points.1.${field}`]);
    }
  });

  it.each(['diffusivityUncertainty', 'temperatureUncertainty', 'pressureUncertainty'] as const)(
    'have a %s above zero or none',
    (field) => {
      for (const value of [0, -1, Number.NaN, Infinity]) {
        expect(problems({ [field]: value })).toEqual([`BAD_INPUT points.0.${field}`]);
      }
      expect(problems({ [field]: null })).toEqual([]);
    },
  );

  it.each([
    [{ moleFraction: -0.1 }, 'points.0.moleFraction'],
    [{ moleFraction: 1.1 }, 'points.0.moleFraction'],
    [{ replicates: 0 }, 'points.0.replicates'],
  ])('have no %j', (change, path) => {
    expect(problems(change)).toEqual([`BAD_INPUT ${path}`]);
  });

  it('show every fault at once', () => {
    expect(problems({ temperature: 0, pressure: 0 }, { moleFraction: 2 })).toHaveLength(3);
  });
});

describe('doubts about points', () => {
  it('tell a repeated row, not a replicate', () => {
    expect(warnings({}, { diffusivity: 2.01e-5 }, {})).toEqual(['DUPLICATE_POINT points.2']);
  });

  it.each([
    ['cm²/s read as m²/s', 0.2],
    ['a slip of four powers of ten', 2e-9],
  ])('tell %s', (_, diffusivity) => {
    expect(warnings({ diffusivity, diffusivityUncertainty: null })).toEqual([
      'UNLIKELY_DIFFUSIVITY points.0.diffusivity',
    ]);
  });

  it('judge D at one atmosphere, so that a low pressure raises none', () => {
    expect(warnings({ pressure: 100, diffusivity: 2e-2, diffusivityUncertainty: 4e-4 })).toEqual([]);
  });

  it('tell a temperature that looks like °C', () => {
    expect(warnings({ temperature: 25 })).toEqual(['UNLIKELY_TEMPERATURE points.0.temperature']);
  });

  it('tell an uncertainty of more than half of D', () => {
    expect(warnings({ diffusivityUncertainty: 1.1e-5 })).toEqual(['LARGE_UNCERTAINTY points.0.diffusivityUncertainty']);
  });

  it('tell D·P that falls while T rises, in whatever order the rows stand', () => {
    const falling = [{ temperature: 400, diffusivity: 1.9e-5 }, { temperature: 300 }];
    expect(warnings(...falling)).toEqual(['FALLING_WITH_TEMPERATURE points.0.diffusivity']);
    expect(warnings({ temperature: 300 }, { temperature: 303, diffusivity: 1.99e-5 })).toEqual([]);
  });
});
