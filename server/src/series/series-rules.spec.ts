import { describe, expect, it } from '@jest/globals';
import { type SeriesAction, type SeriesStatusName, statusAfter, transitionProblems } from './series-rules.js';

const STATES: readonly SeriesStatusName[] = ['DRAFT', 'SUBMITTED', 'RETURNED', 'ACCEPTED', 'RETIRED'];
const ALLOWED: Record<SeriesAction, readonly SeriesStatusName[]> = {
  change: ['DRAFT', 'RETURNED'],
  submit: ['DRAFT', 'RETURNED'],
  accept: ['SUBMITTED'],
  return: ['SUBMITTED'],
  retire: ['ACCEPTED'],
};
const actions = Object.keys(ALLOWED) as SeriesAction[];
const codes = (...parameters: Parameters<typeof transitionProblems>) =>
  transitionProblems(...parameters).map(({ code, path }) => (path ? `${code} ${path}` : code));

describe('a series', () => {
  it.each(actions.flatMap((action) => STATES.map((status) => [action, status] as const)))(
    'allows “%s” from %s only where the way leads there',
    (action, status) => {
      const series = { status, submittedById: 'submitter' };
      expect(codes(action, series, 'editor', 'why')).toEqual(ALLOWED[action].includes(status) ? [] : ['WRONG_STATE']);
    },
  );

  it('leads where the trade’s words say', () => {
    expect(actions.map(statusAfter)).toEqual(['DRAFT', 'SUBMITTED', 'ACCEPTED', 'RETURNED', 'RETIRED']);
  });

  it('is not accepted by whoever submitted it, though that person may return it', () => {
    const series = { status: 'SUBMITTED', submittedById: 'editor' } as const;
    expect(codes('accept', series, 'editor')).toEqual(['NOT_INDEPENDENT']);
    expect(codes('accept', series, 'another')).toEqual([]);
    expect(codes('return', series, 'editor', 'On second thoughts.')).toEqual([]);
  });

  it.each([null, '', ' \n'])('is neither returned nor retired with the remark %j', (remark) => {
    expect(codes('return', { status: 'SUBMITTED', submittedById: null }, 'x', remark)).toEqual(['BAD_INPUT remark']);
    expect(codes('retire', { status: 'ACCEPTED', submittedById: null }, 'x', remark)).toEqual(['BAD_INPUT remark']);
  });
});
