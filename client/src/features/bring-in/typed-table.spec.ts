import { describe, expect, it } from 'vitest';
import { cellsOf, emptyGrid, typedText, withCells } from './typed-table';

describe('the grid one types into', () => {
  it('is no table while nothing is typed', () => {
    expect(typedText(emptyGrid())).toBe('');
  });

  it('writes a header with units and only the columns that are used', () => {
    const grid = withCells(emptyGrid(), 0, 0, [['298.15', '101.3', '0.1249']]);
    expect(typedText(grid)).toBe('T / (K)\tP / (kPa)\tD / (cm²/s)\n298.15\t101.3\t0.1249');
  });

  it('keeps an empty row between filled ones, so that row numbers stay', () => {
    const grid = withCells(withCells(emptyGrid(), 0, 0, [['1']]), 2, 0, [['3']]);
    expect(typedText(grid).split('\n')).toHaveLength(4);
  });

  it('grows under pasted cells and leaves a free row after them', () => {
    const pasted = cellsOf(Array.from({ length: 20 }, (_, i) => `${290 + i}\t101,3\t0,12`).join('\r\n') + '\r\n');
    const { rows } = withCells(emptyGrid(), 0, 0, pasted);
    expect(rows).toHaveLength(21);
    expect(rows[19]).toEqual(['309', '101,3', '0,12', '', '']);
  });

  it('drops pasted cells beyond its last column', () => {
    const { rows } = withCells(emptyGrid(), 0, 3, [['1', '2', '3', '4']]);
    expect(rows[0]).toEqual(['', '', '', '1', '2']);
  });
});
