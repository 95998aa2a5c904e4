import { plainText, typeset, typesetFormula } from './typeset.js';

describe('typeset', () => {
  it('sets quantities, subscripts and superscripts apart from the words', () => {
    expect(typeset('At *T*_{0} in cm^{2}/s')).toEqual([
      { text: 'At ', style: 'PLAIN' },
      { text: 'T', style: 'QUANTITY' },
      { text: '0', style: 'SUBSCRIPT' },
      { text: ' in cm', style: 'PLAIN' },
      { text: '2', style: 'SUPERSCRIPT' },
      { text: '/s', style: 'PLAIN' },
    ]);
  });

  it('leaves marks in the words of people as they are', () => {
    expect(typeset('by {who}', { who: 'A*B* {x} _{1}' })).toEqual([{ text: 'by A*B* {x} _{1}', style: 'PLAIN' }]);
  });

  it('takes runs as a value', () => {
    expect(plainText(typeset('{a} and *b*', { a: [{ text: 'x', style: 'QUANTITY' }] }))).toBe('x and b');
  });

  it('refuses a sentence with a value missing', () => {
    expect(() => typeset('{pressure}')).toThrow(RangeError);
  });

  it('sets the digits of a formula below the line', () => {
    expect(typesetFormula('C2H6O').map((run) => `${run.style[1]}${run.text}`)).toEqual(['LC', 'U2', 'LH', 'U6', 'LO']);
  });
});
