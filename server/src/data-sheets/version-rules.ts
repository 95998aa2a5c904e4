import { type Problem } from '../common/problem.js';
import { type EvaluableCorrelation } from '../numerics/fitting/fit.types.js';

export type VersionStatusName =
  'DRAFT' | 'IN_REVIEW' | 'RETURNED' | 'APPROVED' | 'RELEASED' | 'SUPERSEDED' | 'WITHDRAWN';
export type VersionAction = 'change' | 'submit' | 'approve' | 'return' | 'release' | 'withdraw';

export interface VersionNumber {
  edition: number;
  revision: number;
}

/** From which states an action leads where. Superseding happens to a version; nobody does it to one. */
const TRANSITIONS: Record<VersionAction, { from: readonly VersionStatusName[]; to: VersionStatusName; verb: string }> =
  {
    change: { from: ['DRAFT', 'RETURNED'], to: 'DRAFT', verb: 'changed' },
    submit: { from: ['DRAFT', 'RETURNED'], to: 'IN_REVIEW', verb: 'submitted for review' },
    approve: { from: ['IN_REVIEW'], to: 'APPROVED', verb: 'approved' },
    return: { from: ['IN_REVIEW', 'APPROVED'], to: 'RETURNED', verb: 'returned' },
    release: { from: ['APPROVED'], to: 'RELEASED', verb: 'released' },
    withdraw: { from: ['RELEASED', 'SUPERSEDED'], to: 'WITHDRAWN', verb: 'withdrawn' },
  };

export const STATES_OF_RELEASED: readonly VersionStatusName[] = ['RELEASED', 'SUPERSEDED', 'WITHDRAWN'];

export function isReleased(status: VersionStatusName): boolean {
  return STATES_OF_RELEASED.includes(status);
}

export function statusAfter(action: VersionAction): VersionStatusName {
  return TRANSITIONS[action].to;
}

const words = (status: VersionStatusName) => status.toLowerCase().replace('_', ' ');

/** What of a version and of the person decides about an action. */
export interface VersionCase {
  status: VersionStatusName;
  preparedById: string;
  /** People who brought in or submitted one of the series of its fit */
  seriesOwnerIds: readonly string[];
}

/** What stands in the way of an action on a version by this person; empty when nothing. */
export function transitionProblems(
  action: VersionAction,
  version: VersionCase,
  personId: string,
  reason: string | null = null,
): Problem[] {
  const { from, verb } = TRANSITIONS[action];
  if (!from.includes(version.status)) {
    return [
      { code: 'WRONG_STATE', message: `A version that is ${words(version.status)} cannot be ${verb}.`, path: null },
    ];
  }
  const conflict = conflictOfInterest(action, version, personId);
  if (conflict) return [{ code: 'NOT_INDEPENDENT', message: conflict, path: null }];
  if ((action === 'return' || action === 'withdraw') && (reason ?? '').trim() === '') {
    const path = action === 'return' ? 'remark' : 'reason';
    return [{ code: 'BAD_INPUT', message: 'Say why; readers and editors depend on it.', path }];
  }
  return [];
}

/** Nobody approves or releases alone what they prepared alone. */
function conflictOfInterest(action: VersionAction, version: VersionCase, personId: string): string | null {
  const isReview = action === 'approve' || action === 'return';
  if ((isReview || action === 'release') && version.preparedById === personId) {
    return `Whoever prepared a version does not ${isReview ? 'review' : 'release'} it.`;
  }
  if (isReview && version.seriesOwnerIds.includes(personId)) {
    return 'Whoever owns one of the series of a version does not review it.';
  }
  return null;
}

/** Do two correlations recommend the same values, uncertainties and range? */
export function recommendsTheSame(a: EvaluableCorrelation, b: EvaluableCorrelation): boolean {
  const essence = (c: EvaluableCorrelation) =>
    JSON.stringify([
      c.form,
      c.parameters,
      c.covariance,
      c.degreesOfFreedom,
      c.referenceTemperature,
      c.referencePressure,
      c.betweenSeries,
      c.validity.temperatureMinimum,
      c.validity.temperatureMaximum,
      c.validity.pressureMinimum,
      c.validity.pressureMaximum,
    ]);
  return essence(a) === essence(b);
}

/**
 * The number that follows: a new edition when a recommended value, its uncertainty or its range changes, a new revision
 * when only words or metadata do.
 *
 * @param last the newest version ever released, null before the first
 */
export function nextNumber(last: VersionNumber | null, isSameRecommendation: boolean): VersionNumber {
  if (!last) return { edition: 1, revision: 0 };
  return isSameRecommendation
    ? { edition: last.edition, revision: last.revision + 1 }
    : { edition: last.edition + 1, revision: 0 };
}

export function formatNumber({ edition, revision }: VersionNumber): string {
  return `${edition}.${revision}`;
}

export function parseNumber(text: string): VersionNumber | null {
  const match = /^([1-9]\d{0,5})\.(0|[1-9]\d{0,5})$/.exec(text.trim());
  return match ? { edition: Number(match[1]), revision: Number(match[2]) } : null;
}

/** Sections of a sheet that may carry words of the editor. */
export const SECTIONS = [
  'correlation',
  'figures',
  'recommended',
  'series',
  'estimates',
  'uncertainty',
  'cautions',
  'citation',
  'versions',
] as const;

export interface VersionWords {
  summary: string;
  changeNote: string | null;
}

/** What must be mended in the words of a version; empty when nothing. */
export function wordProblems(words: VersionWords, isFirst: boolean): Problem[] {
  const problems: Problem[] = [];
  if (words.summary.trim() === '')
    problems.push({ code: 'BAD_INPUT', message: 'A version has a summary.', path: 'summary' });
  if (!isFirst && (words.changeNote ?? '').trim() === '') {
    const message = 'From the second version on, say what changed.';
    problems.push({ code: 'BAD_INPUT', message, path: 'changeNote' });
  }
  return problems;
}
