import { describe, expect, it } from 'vitest';
import { withdrawalReason, withdrawSchema } from './withdraw-form';

describe('withdrawing', () => {
  it('tells readers what was wrong, then the words', () => {
    expect(withdrawalReason({ reason: 'series', words: ' Series c read a thermometer 4 K low.' })).toBe(
      'A series that carried weight was wrong. Series c read a thermometer 4 K low.',
    );
    expect(withdrawalReason({ reason: 'other', words: 'The lamp failed.' })).toBe('The lamp failed.');
  });

  it('needs reason, words and password', () => {
    const refused = withdrawSchema
      .safeParse({ reason: '', words: ' ', password: '' })
      .error?.issues.map(({ path }) => path[0]);
    expect(refused).toEqual(['reason', 'words', 'password']);
  });
});
