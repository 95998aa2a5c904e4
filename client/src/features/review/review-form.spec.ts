import { describe, expect, it } from 'vitest';
import { conflictOfInterest, emptyReview, openQuestions, reviewInput, verdictBlock } from './review-form';

const answered = {
  ...emptyReview(['Is it right?', 'Is it safe?']),
  answers: [
    { question: 'Is it right?', answer: 'yes' as const },
    { question: 'Is it safe?', answer: 'does not apply' as const },
  ],
};

describe('a review', () => {
  it('asks for every answer before it approves, and for none to return', () => {
    const fields = { ...emptyReview(['Is it right?', 'Is it safe?']), remark: 'Section 3 is too short.' };
    expect(openQuestions(fields)).toEqual([0, 1]);
    expect(verdictBlock('APPROVE', fields)).toBe('answers');
    expect(verdictBlock('RETURN', fields)).toBeNull();
    expect(verdictBlock('APPROVE', answered)).toBeNull();
  });

  it('returns nothing without a remark', () => {
    expect(verdictBlock('RETURN', { ...answered, remark: '  ' })).toBe('remark');
  });

  it('records open questions as unanswered', () => {
    const input = reviewInput('v1', 'RETURN', { ...emptyReview(['Is it right?']), remark: ' No. ' });
    expect(input).toEqual({
      versionId: 'v1',
      verdict: 'RETURN',
      remark: 'No.',
      checklist: [{ question: 'Is it right?', answer: null }],
    });
  });

  it('is not for whoever prepared the version or owns one of its series', () => {
    const version = {
      preparedBy: { id: 'editor' },
      fit: { series: [{ title: 'Laboratory A', createdBy: { id: 'researcher' } }] },
    };
    expect(conflictOfInterest(version, 'editor')).toEqual({ kind: 'prepared' });
    expect(conflictOfInterest(version, 'researcher')).toEqual({ kind: 'owns', series: 'Laboratory A' });
    expect(conflictOfInterest(version, 'editor2')).toBeNull();
  });
});
