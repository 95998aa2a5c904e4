import { expect, it } from 'vitest';
import { searchWords } from './search-words';

it('takes a pair and a state apart', () => {
  expect(searchWords('water + air at 320 K and 90 kPa')).toEqual({
    words: 'water air',
    temperature: 320,
    pressure: 90_000,
  });
  expect(searchWords('ethanol at 25 °C and 1 atm')).toEqual({
    words: 'ethanol',
    temperature: 298.15,
    pressure: 101_325,
  });
});

it('leaves names alone that hold “at”', () => {
  expect(searchWords('carbon tetrachloride')).toEqual({
    words: 'carbon tetrachloride',
    temperature: null,
    pressure: null,
  });
  expect(searchWords('gas at work')).toEqual({ words: 'gas at work', temperature: null, pressure: null });
});
