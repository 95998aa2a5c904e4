import { describe, expect, it } from 'vitest';
import { seriesLetter } from './series-letter';

describe('the letter of a series', () => {
  it('runs from a to z, then with two letters', () => {
    expect([0, 1, 25, 26, 27, 52].map(seriesLetter)).toEqual(['a', 'b', 'z', 'aa', 'ab', 'ba']);
  });
});
