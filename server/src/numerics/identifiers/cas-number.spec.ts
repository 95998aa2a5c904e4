import { describe, expect, it } from '@jest/globals';
import { isCasNumber } from './cas-number.js';

describe('a CAS Registry Number', () => {
  // Water, argon, helium, carbon dioxide, ethanol, sulfur hexafluoride; from memory.
  it.each(['7732-18-5', '7440-37-1', '7440-59-7', '124-38-9', '64-17-5', '2551-62-4'])('may be %s', (text) => {
    expect(isCasNumber(text)).toBe(true);
  });

  it('has one check digit of ten', () => {
    const digits = Array.from({ length: 10 }, (_, i) => i).filter((digit) => isCasNumber(`7732-18-${digit}`));
    expect(digits).toEqual([5]);
  });

  it('is betrayed by two neighbouring digits changed over', () => {
    expect(isCasNumber('7723-18-5')).toBe(false);
  });

  it.each(['', '7732185', '7732-185', '07732-18-5', '7-18-5', ' 7732-18-5', '7732-18-5\n', '7732–18–5', '77a2-18-5'])(
    'is not written %j',
    (text) => {
      expect(isCasNumber(text)).toBe(false);
    },
  );
});
