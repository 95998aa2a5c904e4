import { expect, it } from 'vitest';
import { parseNumber } from './parse-number';

it.each([
  ['313.15', 313.15],
  ['313,15', 313.15],
  [' 1\u2009013,25 ', 1013.25],
  ['\u22125', -5],
  ['1e-5', 1e-5],
  ['.5', 0.5],
])('reads %j as the number it is', (text, value) => {
  expect(parseNumber(text)).toBe(value);
});

it.each(['', '  ', 'abc', '1.2.3', '12 K', '--5', 'Infinity', '0x10'])('takes %j for no number', (text) => {
  expect(parseNumber(text)).toBeNull();
});
