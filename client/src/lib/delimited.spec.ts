import { expect, it } from 'vitest';
import { toCsv, toTabs } from './delimited';

// RFC 4180, section 2: CRLF between records; fields with commas, quotes or line breaks in quotes, quotes doubled.
it('writes CSV as RFC 4180 has it', () => {
  expect(
    toCsv({
      head: ['T / K', 'source'],
      rows: [
        [298.15, 'Laboratory "A", 2014'],
        [null, 'plain'],
      ],
    }),
  ).toBe('T / K,source\r\n298.15,"Laboratory ""A"", 2014"\r\n,plain\r\n');
});

it('defuses a text that a spreadsheet would run', () => {
  expect(toCsv({ head: ['x'], rows: [['=1+1'], ['-0.5'], ['@a']] })).toBe("x\r\n'=1+1\r\n-0.5\r\n'@a\r\n");
});

it('separates cells by tabs for the clipboard', () => {
  expect(toTabs({ head: ['a', 'b'], rows: [[1, 'two\tthree']] })).toBe('a\tb\n1\ttwo three');
});
