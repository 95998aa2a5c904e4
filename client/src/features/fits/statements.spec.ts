import { describe, expect, it } from 'vitest';
import { type StatisticsNumbersFragment } from '../../gql/graphql';
import { deviationText } from './small-number';
import { asSentence, decisions, doubt } from './statements';

const statistics: StatisticsNumbersFragment = {
  pointCount: 39,
  seriesCount: 6,
  residualDegreesOfFreedom: 37,
  chiSquare: 28.5,
  reducedChiSquare: 0.77,
  chiSquareProbability: 0.85,
  residualStandardError: 0.01,
  aicc: -291.6,
  betweenSeriesDeviation: 0.0078,
  betweenSeriesOrigin: 'STATED',
  cochranQ: 16.4,
  iSquared: 0.7,
};

describe('what decides about a fit', () => {
  it('says that the points scatter as stated, and that the laboratories differ, with the figures', () => {
    const [met, differ] = decisions(statistics, []);
    expect(met).toMatchObject({ tone: 'met', reason: 'χ²/ν = 0.77, ν = 37, p = 0.85.' });
    expect(differ).toMatchObject({ tone: 'note', reason: 'Q = 16.4 for 5 degrees of freedom; τ = 0.78 % is in u.' });
  });

  it('warns of points that scatter more than stated', () => {
    const [, last] = decisions({ ...statistics, chiSquareProbability: 0.0002 }, []);
    expect(last?.tone).toBe('warning');
    expect(last?.reason).toContain('p < 0.001');
  });

  it('tells what is met first and the grave doubts last', () => {
    const doubts = [
      { code: 'ONE_SERIES', message: 'Only one series carries the fit: a bias cannot be seen' },
      { code: 'POOLED', message: 'Pooled' },
    ];
    expect(decisions({ ...statistics, cochranQ: null }, doubts).map(({ tone }) => tone)).toEqual([
      'met',
      'note',
      'warning',
    ]);
  });

  it('parts a doubt at its colon, and ends it as a sentence', () => {
    expect(doubt({ code: 'ONE_SERIES', message: 'Only one series: a bias cannot be seen' })).toEqual({
      tone: 'warning',
      verdict: 'Only one series:',
      reason: 'a bias cannot be seen.',
    });
  });

  it('names choices as the recipe does', () => {
    expect(asSentence('Choose POOLED or LEAST_SQUARES for D of CAS')).toBe('Choose pooled or squares for D of CAS.');
  });

  it('calls a deviation between series that is only left over from the arithmetic zero', () => {
    expect([1e-28, 0.31, 0.0161].map(deviationText)).toEqual(['0', '0.31', '0.016']);
  });
});
