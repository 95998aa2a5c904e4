import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { create } from 'fontkit';
import { unpackWoff } from './woff.js';

const woff = readFileSync(
  createRequire(import.meta.url).resolve('@fontsource/work-sans/files/work-sans-latin-400-normal.woff'),
);

describe('the font inside a WOFF file', () => {
  const font = unpackWoff(woff);

  it('has the same glyphs and widths as in the file', () => {
    const widthIn = (bytes: Buffer) => create(bytes).layout('0.12455(50) cm²/s').advanceWidth;
    expect(widthIn(font)).toBe(widthIn(woff));
    expect(create(font).unitsPerEm).toBe(create(woff).unitsPerEm);
  });

  // OpenType 1.9, "Table Directory": the sum of a table's 32-bit words is its checksum; `head` is summed with its adjustment left out.
  it('keeps the checksum of each table', () => {
    const count = font.readUInt16BE(4);
    for (let i = 0; i < count; i += 1) {
      const entry = 12 + 16 * i;
      if (font.toString('latin1', entry, entry + 4) === 'head') continue;
      const [offset, length] = [font.readUInt32BE(entry + 8), font.readUInt32BE(entry + 12)];
      let sum = 0;
      for (let at = offset; at < offset + length; at += 4) sum = (sum + font.readUInt32BE(at)) >>> 0;
      expect(sum).toBe(font.readUInt32BE(entry + 4));
      expect(offset % 4).toBe(0);
    }
    expect(count).toBeGreaterThan(8);
  });

  it('is not taken from bytes that are no WOFF', () => {
    expect(() => unpackWoff(Buffer.from('not a font'))).toThrow(RangeError);
    expect(() => unpackWoff(font)).toThrow('not a WOFF');
  });
});
