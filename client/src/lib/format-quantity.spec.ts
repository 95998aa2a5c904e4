import { describe, expect, it } from 'vitest';
import {
  conciseWithPower,
  formatBytes,
  formatConcise,
  formatNumber,
  formatRange,
  formatShort,
  formatSigned,
  placesFor,
  roundTogether,
} from './format-quantity';

describe('a value and its standard uncertainty', () => {
  // GUM, JCGM 100:2008, 7.2.2: the concise notation m_S = 100,021 47(35) g.
  it('is printed in the concise form of the GUM', () => {
    expect(formatConcise(100.02147, 0.00035)).toBe('100.02147(35)');
  });

  // The Diffolio design's own example.
  it.each([
    [0.124546, 0.000504, '0.12455(50)'],
    [0.2505, 0.0031, '0.2505(31)'],
    [1.7875, 0.0268, '1.788(27)'],
    [-0.5, 0.04, '−0.500(40)'],
  ])('rounds u to two significant digits and the value to the same place: %d, %d', (value, u, printed) => {
    expect(formatConcise(value, u)).toBe(printed);
  });

  it('carries a rounding of u over a power of ten', () => {
    expect(placesFor(0.0996)).toBe(2);
    expect(roundTogether(1.23456, 0.0996)).toEqual({ value: '1.23', uncertainty: '0.10', places: 2 });
  });

  it('rounds to tens where two digits of u lie before the point', () => {
    expect(formatConcise(12_345, 678)).toBe('12\u2009350(680)');
  });

  it('prints a value whose u is zero to the digits that give it back', () => {
    expect(formatConcise(298.15, 0)).toBe('298.15');
  });

  it('takes a power of ten out of what plain digits would hide', () => {
    expect(conciseWithPower(1.24546e-5, 5.04e-8)).toEqual({ mantissa: '1.2455(50)', exponent: -5 });
    expect(conciseWithPower(0.124546, 5.04e-4)).toEqual({ mantissa: '0.12455(50)', exponent: 0 });
  });
});

describe('a number', () => {
  it('has a true minus and thin spaces between groups of three from four digits up', () => {
    expect(formatNumber(-1234567.891, 2)).toBe('−1\u2009234\u2009567.89');
    expect(formatNumber(999, 0)).toBe('999');
    expect(formatNumber(1000, 0)).toBe('1\u2009000');
  });

  it('loses its sign when it rounds to zero', () => {
    expect(formatNumber(-0.001, 2)).toBe('0.00');
    expect(formatSigned(0.04, 1)).toBe('0.0');
    expect(formatSigned(0.06, 1)).toBe('+0.1');
    expect(formatSigned(-0.06, 1)).toBe('−0.1');
  });

  it('is shown by a dash when there is none', () => {
    expect(formatNumber(Number.NaN, 2)).toBe('–');
    expect(formatShort(Number.POSITIVE_INFINITY)).toBe('–');
  });

  it('is shortened without powers of ten', () => {
    expect(formatShort(101.325)).toBe('101.325');
    expect(formatShort(0.000012)).toBe('0.000012');
    expect(formatShort(1 / 3)).toBe('0.333333');
  });
});

it('keeps the unit at both ends of a range, on one line with its number', () => {
  expect(formatRange(283.15, 448.15, 'K')).toBe('283.15\u00a0K to 448.15\u00a0K');
});

it('counts bytes in decimal multiples', () => {
  expect([999, 184_000, 2_500_000].map(formatBytes)).toEqual(['999\u00a0B', '184\u00a0kB', '2.5\u00a0MB']);
});
