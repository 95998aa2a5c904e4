import { describe, expect, it } from 'vitest';
import { type EditedVersionFragment } from '../../gql/graphql';
import { draftInput, editSchema, versionFields, wasReleased, wordsSchema } from './version-words';

const validity = { pressureMinimum: 100_600, pressureMaximum: 102_000, pressureBasis: 'STATED' };

const version = (more: object = {}) =>
  ({
    id: 'v1',
    lockVersion: 4,
    summary: 'Six series of four methods.',
    changeNote: null,
    remarks: [{ section: 'correlation', text: 'One term suffices.' }],
    content: { remarks: [{ section: 'correlation', text: 'One term suffices.' }] },
    correlation: { validity },
    fit: { correlation: { validity } },
    ...more,
  }) as unknown as EditedVersionFragment;

const stated = version({
  content: { remarks: [{ section: 'correlation', text: 'One term suffices. The gas stays dilute.' }] },
  correlation: { validity: { ...validity, pressureMinimum: 1000, pressureMaximum: 400_000 } },
});

describe('the words of a version', () => {
  it('keep the fit’s own range in P until another is stated', () => {
    const fields = versionFields(version());
    expect(fields.range.states).toBe(false);
    expect(draftInput(version(), fields)).toEqual({
      versionId: 'v1',
      lockVersion: 4,
      summary: 'Six series of four methods.',
      changeNote: null,
      remarks: [{ section: 'correlation', text: 'One term suffices.' }],
      pressureRange: null,
    });
  });

  it('part the reason for a stated range from the words of the section', () => {
    const fields = versionFields(stated);
    expect(fields.range).toEqual({ states: true, minimum: '1', maximum: '400', reason: 'The gas stays dilute.' });
    expect(fields.remarks.correlation).toBe('One term suffices.');
    expect(draftInput(stated, fields).pressureRange).toEqual({
      minimum: 1000,
      maximum: 400_000,
      reason: 'The gas stays dilute.',
    });
  });

  it('refuse a range that ends before it begins, and one without a reason', () => {
    const fields = versionFields(stated);
    const refused = (range: Partial<typeof fields.range>) =>
      editSchema(true)
        .safeParse({ ...fields, range: { ...fields.range, ...range } })
        .error?.issues.map(({ path }) => path.join('.'));
    expect(refused({})).toBeUndefined();
    expect(refused({ minimum: '500' })).toEqual(['range.maximum']);
    expect(refused({ maximum: 'much', reason: ' ' })).toEqual(['range.maximum', 'range.reason']);
    expect(refused({ states: false, reason: '' })).toBeUndefined();
  });

  it('say what changed from the second version on', () => {
    expect(
      wasReleased([
        { number: '1.1', status: 'DRAFT' },
        { number: '1.0', status: 'WITHDRAWN' },
      ]),
    ).toBe('1.0');
    expect(wasReleased([{ number: '1.0', status: 'IN_REVIEW' }])).toBeNull();
    expect(wordsSchema(true).safeParse({ summary: 'Six series.', changeNote: '' }).success).toBe(true);
    expect(wordsSchema(false).safeParse({ summary: 'Six series.', changeNote: ' ' }).success).toBe(false);
  });
});
