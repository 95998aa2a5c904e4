import { type FontkitFont } from 'fontkit';
import { PRINT_FAMILIES, WORK_SANS, openFont } from './print-fonts.js';

/** Stands for a character that no font of the document has. */
const NO_GLYPH = '\u25a1';
const NO_GLYPH_FAMILY = 'Noto Sans Math';

const fonts = new Map<string, FontkitFont>();
const familyByCharacter = new Map<string, string | null>();

/** The first family with a glyph; a font is opened only when those before it do not suffice. */
function familyOf(character: string): string | null {
  const known = familyByCharacter.get(character);
  if (known !== undefined) return known;
  const found = PRINT_FAMILIES.find((family) => {
    const font = fonts.get(family) ?? openFont(family);
    fonts.set(family, font);
    return font.hasGlyphForCodePoint(character.codePointAt(0) ?? 0);
  });
  familyByCharacter.set(character, found ?? null);
  return found ?? null;
}

/** A value with its texts ready to be set, and the families that takes, Work Sans first. */
export interface Printable<T> {
  readonly value: T;
  readonly families: string[];
}

/**
 * Prepares every text in a value of plain data: line ends become spaces, and a character without a glyph a hollow square, which would
 * else be printed as some other character.
 */
export function printable<T>(value: T): Printable<T> {
  const used = new Set([WORK_SANS]);
  const setText = (text: string): string => {
    let printed = '';
    for (const character of text.replace(/\s*[\r\n]+\s*/g, ' ')) {
      const family = familyOf(character);
      used.add(family ?? NO_GLYPH_FAMILY);
      printed += family === null ? NO_GLYPH : character;
    }
    return printed;
  };
  const prepared = mapTexts(value, setText) as T;
  return { value: prepared, families: PRINT_FAMILIES.filter((family) => used.has(family)) };
}

function mapTexts(value: unknown, change: (text: string) => string): unknown {
  if (typeof value === 'string') return change(value);
  if (Array.isArray(value)) return value.map((entry: unknown) => mapTexts(entry, change));
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value).map(([name, member]: [string, unknown]) => [name, mapTexts(member, change)]),
  );
}
