import { describe, expect, it } from 'vitest';
import { parseReason, reasonText } from './reasons';

describe('the reason for leaving something out', () => {
  it('is kept as its code and its words', () => {
    expect(reasonText('apparatus', ' tubes 12 mm deep ')).toBe('apparatus: tubes 12 mm deep');
  });

  it('comes apart again, colons in its words included', () => {
    const text = reasonText('conditions', 'pressure not stated: cannot be reduced');
    expect(parseReason(text)).toEqual({ code: 'conditions', words: 'pressure not stated: cannot be reduced' });
  });

  it('is read whatever the case of its code', () => {
    expect(parseReason('Apparatus: end effect')).toEqual({ code: 'apparatus', words: 'end effect' });
  });

  it('without a code of the list is words alone', () => {
    expect(parseReason('not chosen for this fit')).toEqual({ code: null, words: 'not chosen for this fit' });
    expect(parseReason('weather: bad')).toEqual({ code: null, words: 'weather: bad' });
  });
});
