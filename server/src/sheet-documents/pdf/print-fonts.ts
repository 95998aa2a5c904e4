import { Font } from '@react-pdf/renderer';
import { createRequire } from 'node:module';

const require = createRequire(import.meta.url);
const fileOf = (fontPackage: string, name: string): string =>
  require.resolve(`@fontsource/${fontPackage}/files/${name}.woff`);

const WEIGHTS = [300, 400, 500, 600] as const;
const SLANTS = ['normal', 'italic'] as const;
const cuts = (fontPackage: string, subset: string, weights: readonly number[] = WEIGHTS) =>
  weights.flatMap((fontWeight) =>
    SLANTS.map((fontStyle) => ({
      src: fileOf(fontPackage, `${fontPackage}-${subset}-${fontWeight}-${fontStyle}`),
      fontWeight,
      fontStyle,
    })),
  );
const mathFile = fileOf('noto-sans-math', 'noto-sans-math-latin-400-normal');

const WORK_SANS = 'Work Sans';

/**
 * Work Sans, then what it lacks: letters of central Europe, Greek, Cyrillic, and the signs of mathematics. A character that none of
 * them has would be printed as another one.
 */
const FAMILIES: Readonly<
  Record<string, readonly { src: string; fontWeight?: number; fontStyle?: 'normal' | 'italic' }[]>
> = {
  [WORK_SANS]: cuts('work-sans', 'latin'),
  'Work Sans Extended': cuts('work-sans', 'latin-ext', [400, 600]),
  'Noto Sans Greek': cuts('noto-sans', 'greek', [400, 600]),
  'Noto Sans Cyrillic': cuts('noto-sans', 'cyrillic', [400, 600]),
  'Noto Sans Math': SLANTS.map((fontStyle) => ({ src: mathFile, fontStyle })),
};

/** For every text of the document, in the order in which glyphs are looked for. */
export const PRINT_FAMILIES: string[] = Object.keys(FAMILIES);

/** Work Sans alone, for measuring text. */
export const workSansFile = (fontWeight: 400 | 600): string =>
  fileOf('work-sans', `work-sans-latin-${fontWeight}-normal`);

/** The upright, regular cut of each family, in the order in which glyphs are looked for. */
export const upright = (): string[] =>
  Object.values(FAMILIES).flatMap((fonts) => {
    const cut = fonts.find(({ fontWeight = 400, fontStyle }) => fontWeight === 400 && fontStyle === 'normal');
    return cut === undefined ? [] : [cut.src];
  });

/** Makes the fonts known to the renderer; every time the same, so it may be repeated. */
export function registerPrintFonts(): void {
  for (const [family, fonts] of Object.entries(FAMILIES)) Font.register({ family, fonts: [...fonts] });
  // A hyphen inside a formula, a DOI or a name would be read as part of it.
  Font.registerHyphenationCallback((word) => [word]);
}
