import italic from '@fontsource-variable/work-sans/files/work-sans-latin-wght-italic.woff2?url';
import upright from '@fontsource-variable/work-sans/files/work-sans-latin-wght-normal.woff2?url';
import symbolsItalic from '../fonts/symbols-italic.woff2?url';
import symbols from '../fonts/symbols-normal.woff2?url';
import { chartSvg, type Size } from './chart';
import { figureLayout } from './layout';
import { printedLook } from './look';
import { figureOption } from './option';
import { type FigureSpec } from './spec';

/** Width of a saved figure, CSS px: that of the widest column. */
const SAVED_WIDTH = 896;
const PIXELS_PER_CSS_PX = 2;

const FACES = [
  ['Work Sans Variable', 'normal', upright],
  ['Work Sans Variable', 'italic', italic],
  ['Diffolio Symbols', 'normal', symbols],
  ['Diffolio Symbols', 'italic', symbolsItalic],
] as const;

/** A figure as it is saved: day colours on white, its typeface inside the file. */
export async function pictureSvg(spec: FigureSpec): Promise<{ svg: string; size: Size }> {
  const { width, height } = figureLayout(spec, SAVED_WIDTH);
  const size = { width, height };
  const drawn = chartSvg({ ...figureOption(spec, SAVED_WIDTH, printedLook), backgroundColor: printedLook.paper }, size);
  const faces = await Promise.all(
    FACES.map(async ([family, style, url]) => fontFace(family, style, await dataUri(url))),
  );
  return { svg: drawn.replace(/(<svg[^>]*>)/, (tag) => `${tag}<style>${faces.join('')}</style>`), size };
}

export async function picturePng(spec: FigureSpec): Promise<Blob> {
  const { svg, size } = await pictureSvg(spec);
  const url = URL.createObjectURL(new Blob([svg], { type: 'image/svg+xml' }));
  try {
    const image = new Image();
    image.src = url;
    await image.decode();
    const canvas = new OffscreenCanvas(size.width * PIXELS_PER_CSS_PX, size.height * PIXELS_PER_CSS_PX);
    canvas.getContext('2d')?.drawImage(image, 0, 0, canvas.width, canvas.height);
    return await canvas.convertToBlob({ type: 'image/png' });
  } finally {
    URL.revokeObjectURL(url);
  }
}

const fontFace = (family: string, style: string, source: string) =>
  `@font-face{font-family:"${family}";font-style:${style};font-weight:100 900;src:url(${source}) format("woff2")}`;

async function dataUri(url: string): Promise<string> {
  const bytes = new Uint8Array(await (await fetch(url)).arrayBuffer());
  const text = Array.from(bytes, (byte) => String.fromCharCode(byte)).join('');
  return `data:font/woff2;base64,${btoa(text)}`;
}
