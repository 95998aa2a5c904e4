import { describe, expect, it } from '@jest/globals';
import { approvalsInForce } from './review-rules.js';

const approve = (by: string) => ({ verdict: 'APPROVE' as const, by });
const giveBack = (by: string) => ({ verdict: 'RETURN' as const, by });

describe('the approvals that count', () => {
  it('are all of them where nobody returned the version', () => {
    expect(approvalsInForce([approve('a'), approve('b')])).toEqual([approve('a'), approve('b')]);
  });

  it('are those since the last return', () => {
    expect(approvalsInForce([approve('a'), giveBack('b'), approve('c')])).toEqual([approve('c')]);
  });

  it('are none right after a return', () => {
    expect(approvalsInForce([approve('a'), giveBack('a')])).toEqual([]);
  });
});
