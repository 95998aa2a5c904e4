import { expect, it } from 'vitest';
import { entryOf, inUnit, typedEntry } from './evaluator-entry';

it('keeps what was typed as long as its unit stays', () => {
  const entry = typedEntry('pressure', '1,0', 'bar');
  expect(entry).toEqual({ text: '1,0', unit: 'bar', si: 100_000 });
  expect(inUnit('pressure', entry, 'bar').text).toBe('1,0');
});

it('turns a value, not its digits, into the new unit', () => {
  expect(inUnit('temperature', entryOf('temperature', 298.15, 'K'), 'degC').text).toBe('25');
  expect(inUnit('pressure', typedEntry('pressure', '760', 'Torr'), 'atm').text).toBe('1');
});

it('takes nothing at or below absolute zero, and no pressure of zero', () => {
  expect(typedEntry('temperature', '-273.15', 'degC').si).toBeNull();
  expect(typedEntry('pressure', '0', 'kPa').si).toBeNull();
  expect(typedEntry('temperature', 'warm', 'K').si).toBeNull();
});
