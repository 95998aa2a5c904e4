import { describe, expect, it } from '@jest/globals';
import { type EvaluableCorrelation } from '../numerics/fitting/fit.types.js';
import {
  formatNumber,
  nextNumber,
  parseNumber,
  recommendsTheSame,
  transitionProblems,
  type VersionAction,
  type VersionStatusName,
  wordProblems,
} from './version-rules.js';

const STATES: readonly VersionStatusName[] = [
  'DRAFT',
  'IN_REVIEW',
  'RETURNED',
  'APPROVED',
  'RELEASED',
  'SUPERSEDED',
  'WITHDRAWN',
];
const ALLOWED: Record<VersionAction, readonly VersionStatusName[]> = {
  change: ['DRAFT', 'RETURNED'],
  submit: ['DRAFT', 'RETURNED'],
  approve: ['IN_REVIEW'],
  return: ['IN_REVIEW', 'APPROVED'],
  release: ['APPROVED'],
  withdraw: ['RELEASED', 'SUPERSEDED'],
};
const actions = Object.keys(ALLOWED) as VersionAction[];

describe('a version', () => {
  const codes = (action: VersionAction, status: VersionStatusName, person: string, reason: string | null = 'why') =>
    transitionProblems(action, { status, preparedById: 'preparer', seriesOwnerIds: ['owner'] }, person, reason).map(
      ({ code, path }) => (path ? `${code} ${path}` : code),
    );

  it.each(actions.flatMap((action) => STATES.map((status) => [action, status] as const)))(
    'allows “%s” from %s only where the way leads there',
    (action, status) => {
      expect(codes(action, status, 'reviewer')).toEqual(ALLOWED[action].includes(status) ? [] : ['WRONG_STATE']);
    },
  );

  it('is neither reviewed nor released by whoever prepared it, who may still change and withdraw it', () => {
    expect(codes('approve', 'IN_REVIEW', 'preparer')).toEqual(['NOT_INDEPENDENT']);
    expect(codes('return', 'IN_REVIEW', 'preparer')).toEqual(['NOT_INDEPENDENT']);
    expect(codes('release', 'APPROVED', 'preparer')).toEqual(['NOT_INDEPENDENT']);
    expect(codes('change', 'DRAFT', 'preparer')).toEqual([]);
    expect(codes('withdraw', 'RELEASED', 'preparer')).toEqual([]);
  });

  it('is not reviewed by the owner of one of its series, who may release it', () => {
    expect(codes('approve', 'IN_REVIEW', 'owner')).toEqual(['NOT_INDEPENDENT']);
    expect(codes('release', 'APPROVED', 'owner')).toEqual([]);
  });

  it.each([null, '', ' '])('is neither returned nor withdrawn for the reason %j', (reason) => {
    expect(codes('return', 'IN_REVIEW', 'reviewer', reason)).toEqual(['BAD_INPUT remark']);
    expect(codes('withdraw', 'RELEASED', 'reviewer', reason)).toEqual(['BAD_INPUT reason']);
    expect(codes('approve', 'IN_REVIEW', 'reviewer', reason)).toEqual([]);
  });
});

describe('the number of a version', () => {
  it('begins at 1.0, whatever it recommends', () => {
    expect([nextNumber(null, true), nextNumber(null, false)].map(formatNumber)).toEqual(['1.0', '1.0']);
  });

  it('takes a revision for words and an edition for numbers', () => {
    expect(formatNumber(nextNumber({ edition: 2, revision: 3 }, true))).toBe('2.4');
    expect(formatNumber(nextNumber({ edition: 2, revision: 3 }, false))).toBe('3.0');
  });

  it('is read as it is written', () => {
    for (const text of ['1.0', '2.13', '10.0']) expect(formatNumber(parseNumber(text)!)).toBe(text);
    for (const text of ['', '1', '0.1', '01.0', '1.01', '1.0.0', 'v1.0', '1,0', '-1.0', '1.x']) {
      expect(parseNumber(text)).toBeNull();
    }
  });
});

describe('two correlations', () => {
  /** Invented numbers. */
  const ONE: EvaluableCorrelation = {
    form: 'POWER_LAW',
    parameters: [
      { symbol: 'D0', value: 2e-5, standardUncertainty: 1e-7, unit: 'm2/s' },
      { symbol: 'n', value: 1.75, standardUncertainty: 0.01, unit: '1' },
    ],
    covariance: [
      [1e-14, 1e-10],
      [1e-10, 1e-4],
    ],
    degreesOfFreedom: 8,
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
  };

  it('recommend the same when every number is the same', () => {
    expect(recommendsTheSame(ONE, structuredClone(ONE))).toBe(true);
  });

  it.each<[string, Partial<EvaluableCorrelation>]>([
    ['value', { parameters: [{ ...ONE.parameters[0]!, value: 2.0000001e-5 }, ONE.parameters[1]!] }],
    [
      'covariance',
      {
        covariance: [
          [1e-14, 0],
          [0, 1e-4],
        ],
      },
    ],
    ['ν', { degreesOfFreedom: null }],
    ['reference state', { referencePressure: 100_000 }],
    ['range in T', { validity: { ...ONE.validity, temperatureMaximum: 410 } }],
    ['range in P', { validity: { ...ONE.validity, pressureMinimum: 8e4 } }],
    ['scatter between series', { betweenSeries: { intercept: 1e-4, slope: 0, covariance: 0, centre: 5.7 } }],
  ])('recommend something else when the %s differs', (_, change) => {
    expect(recommendsTheSame(ONE, { ...ONE, ...change })).toBe(false);
  });
});

describe('the words of a version', () => {
  it('are a summary, and from the second version on what changed', () => {
    const paths = (summary: string, changeNote: string | null, isFirst: boolean) =>
      wordProblems({ summary, changeNote }, isFirst).map(({ path }) => path);
    expect(paths('Two laboratories.', null, true)).toEqual([]);
    expect(paths(' ', null, true)).toEqual(['summary']);
    expect(paths('', ' ', false)).toEqual(['summary', 'changeNote']);
    expect(paths('Three.', 'A third laboratory.', false)).toEqual([]);
  });
});
