import fc from 'fast-check';
import { parseCellNumber, saysNothing } from './numbers.js';

describe('a number in a cell', () => {
  it.each([
    ['25.0', '.', '25.0'],
    ['25,0', ',', '25.0'],
    [' 0,1249 ', ',', '0.1249'],
    ['−1.5', '.', '-1.5'],
    ['1.2e-5', '.', '1.2e-5'],
    ['1,2E-05', ',', '1.2E-05'],
    ['1.2×10^-5', '.', '1.2e-5'],
    ['1.2 x 10−5', '.', '1.2e-5'],
    ['1.2·10^−5', '.', '1.2e-5'],
    ['101 325', '.', '101325'],
    ['101 325', '.', '101325'],
    ['101,325.5', '.', '101325.5'],
    ['1.013.250', ',', '1013250'],
    ['0,125', '.', '0.125'],
    ['0.1249', ',', '0.1249'],
    ['.5', '.', '.5'],
  ] as const)('%j with the decimal sign %s is %s', (text, decimal, number) => {
    expect(parseCellNumber(text, decimal, true)).toEqual({ text: number, alternative: null });
  });

  it('is doubtful where a sign may stand before thousands or decimals', () => {
    expect(parseCellNumber('1,013', '.', true)).toEqual({ text: '1013', alternative: '1.013' });
    expect(parseCellNumber('1,013', ',', false)).toEqual({ text: '1.013', alternative: '1013' });
    expect(parseCellNumber('1,013', ',', true)).toEqual({ text: '1.013', alternative: null });
  });

  it.each(['abc', '25 °C', '1.2.3', '1,2,3', '12a', '<0.1', '0.25(3)', 'NaN', 'Infinity', '', '1e9999', '--1'])(
    'is not %j',
    (text) => {
      expect(parseCellNumber(text, '.', true)).toBeNull();
    },
  );

  it('of a workbook is itself', () => {
    expect(parseCellNumber(0.1249, ',', true)).toEqual({ text: '0.1249', alternative: null });
  });

  it('is read back from any way a program prints it', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), fc.constantFrom('.', ','), (value, decimal) => {
        const read = parseCellNumber(String(value).replace('.', decimal), decimal, true);
        expect(Number(read?.text)).toBe(value === 0 ? Number(String(value)) : value);
      }),
    );
  });
});

describe('a cell that says there is no value', () => {
  it.each(['', ' ', '-', '–', 'n/a', 'NaN', null])('is %j', (cell) => {
    expect(saysNothing(cell)).toBe(true);
  });

  it('is not a cell with a zero', () => {
    expect(saysNothing('0')).toBe(false);
    expect(saysNothing(0)).toBe(false);
  });
});
