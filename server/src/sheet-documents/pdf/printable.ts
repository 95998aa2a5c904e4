import { openSync, type FontkitFont } from 'fontkit';
import { upright } from './print-fonts.js';

/** Stands for a character that no font of the document has. */
const NO_GLYPH = '\u25a1';

const fonts: FontkitFont[] = [];
const known = new Map<string, boolean>();

/** Whether any font has a glyph; a font is opened only when those before it do not suffice. */
function hasGlyph(character: string): boolean {
  const codePoint = character.codePointAt(0) ?? 0;
  const files = upright();
  for (const [i, file] of files.entries()) {
    const font = fonts[i] ?? openSync(file);
    fonts[i] = font;
    if (font.hasGlyphForCodePoint(codePoint)) return true;
  }
  return false;
}

function printableText(text: string): string {
  let printed = '';
  for (const character of text.replace(/\s*[\r\n]+\s*/g, ' ')) {
    const isKnown = known.get(character) ?? hasGlyph(character);
    known.set(character, isKnown);
    printed += isKnown ? character : NO_GLYPH;
  }
  return printed;
}

/**
 * The same value with each text in it ready to be set: line ends become spaces, and a character without a glyph a hollow square,
 * which would else be printed as some other character.
 */
export function printable<T>(value: T): T;
export function printable(value: unknown): unknown {
  if (typeof value === 'string') return printableText(value);
  if (Array.isArray(value)) return value.map((entry: unknown) => printable(entry));
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value).map(([name, member]: [string, unknown]) => [name, printable(member)]),
  );
}
