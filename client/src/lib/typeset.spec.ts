import { expect, it } from 'vitest';
import { formulaRuns, plainText, typeset } from './typeset';

it('sets quantities italic and their labels below the line', () => {
  expect(typeset('*D*_{0} at {state}', { state: '298.15 K' })).toEqual([
    { text: 'D', style: 'QUANTITY' },
    { text: '0', style: 'SUBSCRIPT' },
    { text: ' at ', style: 'PLAIN' },
    { text: '298.15 K', style: 'PLAIN' },
  ]);
});

it('never reads what people typed as marks', () => {
  expect(typeset('{name}', { name: '*not a quantity*' })).toEqual([{ text: '*not a quantity*', style: 'PLAIN' }]);
});

it('sets the numbers of a formula below the line and can be read plainly', () => {
  const runs = formulaRuns('C2H6O');
  expect(runs.filter(({ style }) => style === 'SUBSCRIPT').map(({ text }) => text)).toEqual(['2', '6']);
  expect(plainText(runs)).toBe('C2H6O');
});
