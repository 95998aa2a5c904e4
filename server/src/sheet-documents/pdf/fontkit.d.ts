/** The part of fontkit that is used here; the package ships no types. */
declare module 'fontkit' {
  export interface FontkitFont {
    readonly unitsPerEm: number;
    layout(text: string): { readonly advanceWidth: number };
    hasGlyphForCodePoint(codePoint: number): boolean;
  }
  export function create(font: Uint8Array): FontkitFont;
}
