import { Font } from '@react-pdf/renderer';
import { create, type FontkitFont } from 'fontkit';
import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { unpackWoff } from './woff.js';

const require = createRequire(import.meta.url);

interface Cut {
  readonly file: string;
  readonly fontWeight: number;
  readonly fontStyle: 'normal' | 'italic';
}

const SLANTS = ['normal', 'italic'] as const;
const cuts = (fontPackage: string, subset: string, weights: readonly number[]): Cut[] =>
  weights.flatMap((fontWeight) =>
    SLANTS.map((fontStyle) => ({
      file: `@fontsource/${fontPackage}/files/${fontPackage}-${subset}-${fontWeight}-${fontStyle}.woff`,
      fontWeight,
      fontStyle,
    })),
  );
const MATH_FILE = '@fontsource/noto-sans-math/files/noto-sans-math-latin-400-normal.woff';

/** The family of every text, and of the charts. */
export const WORK_SANS = 'Work Sans';

/** Work Sans, then what it lacks: letters of central Europe, Greek, Cyrillic, and the signs of mathematics. */
const FAMILIES: ReadonlyMap<string, readonly Cut[]> = new Map([
  [WORK_SANS, cuts('work-sans', 'latin', [300, 400, 600])],
  ['Work Sans Extended', cuts('work-sans', 'latin-ext', [400, 600])],
  ['Noto Sans Greek', cuts('noto-sans', 'greek', [400, 600])],
  ['Noto Sans Cyrillic', cuts('noto-sans', 'cyrillic', [400, 600])],
  ['Noto Sans Math', SLANTS.map((fontStyle): Cut => ({ file: MATH_FILE, fontWeight: 400, fontStyle }))],
]);

/** In the order in which glyphs are looked for */
export const PRINT_FAMILIES: readonly string[] = [...FAMILIES.keys()];

const unpacked = new Map<string, Buffer>();

function dataOf(file: string): Buffer {
  const data = unpacked.get(file) ?? unpackWoff(readFileSync(require.resolve(file)));
  unpacked.set(file, data);
  return data;
}

/** The upright cut of a family, for measuring and for asking which glyphs it has. */
export function openFont(family: string, weight: 400 | 600 = 400): FontkitFont {
  const cut = FAMILIES.get(family)?.find(
    ({ fontWeight, fontStyle }) => fontWeight === weight && fontStyle === 'normal',
  );
  if (cut === undefined) throw new RangeError(`no upright cut ${weight} of ${family}`);
  return create(dataOf(cut.file));
}

const registered = new Set<string>();

/** Makes families known to the renderer, each once. */
export function registerFonts(families: readonly string[]): void {
  // A hyphen inside a formula, a DOI or a name would be read as part of it.
  Font.registerHyphenationCallback((word) => [word]);
  for (const family of families) {
    if (registered.has(family)) continue;
    registered.add(family);
    const fonts = (FAMILIES.get(family) ?? []).map(({ file, fontWeight, fontStyle }) => ({
      src: `data:font/ttf;base64,${dataOf(file).toString('base64')}`,
      fontWeight,
      fontStyle,
    }));
    Font.register({ family, fonts });
  }
}
