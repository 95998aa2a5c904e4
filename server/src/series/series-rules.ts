import { type Problem } from '../common/problem.js';

export type SeriesStatusName = 'DRAFT' | 'SUBMITTED' | 'RETURNED' | 'ACCEPTED' | 'RETIRED';
export type SeriesAction = 'change' | 'submit' | 'accept' | 'return' | 'retire';

/** From which states an action leads where. */
const TRANSITIONS: Record<SeriesAction, { from: readonly SeriesStatusName[]; to: SeriesStatusName; verb: string }> = {
  change: { from: ['DRAFT', 'RETURNED'], to: 'DRAFT', verb: 'changed' },
  submit: { from: ['DRAFT', 'RETURNED'], to: 'SUBMITTED', verb: 'submitted' },
  accept: { from: ['SUBMITTED'], to: 'ACCEPTED', verb: 'accepted' },
  return: { from: ['SUBMITTED'], to: 'RETURNED', verb: 'returned' },
  retire: { from: ['ACCEPTED'], to: 'RETIRED', verb: 'retired' },
};

export function statusAfter(action: SeriesAction): SeriesStatusName {
  return TRANSITIONS[action].to;
}

/** What stands in the way of an action on a series by this person; empty when nothing. */
export function transitionProblems(
  action: SeriesAction,
  series: { status: SeriesStatusName; submittedById: string | null },
  personId: string,
  remark: string | null = null,
): Problem[] {
  const { from, verb } = TRANSITIONS[action];
  if (!from.includes(series.status)) {
    const message = `A series that is ${series.status.toLowerCase()} cannot be ${verb}.`;
    return [{ code: 'WRONG_STATE', message, path: null }];
  }
  if (action === 'accept' && series.submittedById === personId) {
    return [{ code: 'NOT_INDEPENDENT', message: 'Whoever submitted a series does not accept it.', path: null }];
  }
  if ((action === 'return' || action === 'retire') && (remark ?? '').trim() === '') {
    return [{ code: 'BAD_INPUT', message: 'Say why, so that its owner can act on it.', path: 'remark' }];
  }
  return [];
}
