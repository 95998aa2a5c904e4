import { inflateSync } from 'node:zlib';

/** What a test asks of a PDF. */
export interface ReadPdf {
  readonly pageCount: number;
  /** Text in the order it was drawn, the lines of a text block joined by spaces */
  readonly text: string;
  readonly fonts: readonly { readonly name: string; readonly isEmbedded: boolean }[];
  readonly imageCount: number;
  /** The document's information dictionary and the language of its catalogue */
  readonly information: ReadonlyMap<string, string>;
}

/**
 * Reads a PDF of the kind the server writes (ISO 32000-1, 7.3 and 9.10): classic objects, streams plain or deflated, text in composite
 * fonts with a ToUnicode map.
 */
export function readPdf(bytes: Buffer): ReadPdf {
  const objects = objectsOf(bytes);
  const bodies = [...objects.values()];
  const pages = bodies.filter(({ head }) => /\/Type \/Page\b(?!s)/.test(head));
  const fonts = new Map(
    [...objects].filter(([, { head }]) => /\/Type \/Font\b(?!D)/.test(head) && head.includes('/BaseFont')),
  );
  const topFonts = [...fonts.values()].filter(({ head }) => !/\/Subtype \/CIDFont/.test(head));
  return {
    pageCount: pages.length,
    text: pages.map(({ head }) => textOf(head, objects)).join('\n'),
    fonts: topFonts.map(({ head }) => ({
      name: /\/BaseFont \/([^\s/>]+)/.exec(head)?.[1] ?? '',
      isEmbedded: isEmbedded(head, objects),
    })),
    imageCount: bodies.filter(({ head }) => /\/Subtype \/Image/.test(head)).length,
    information: informationOf(bytes, objects),
  };
}

interface PdfObject {
  /** Dictionary, as text */
  readonly head: string;
  readonly stream: Buffer | null;
}

function objectsOf(bytes: Buffer): Map<number, PdfObject> {
  const source = bytes.toString('latin1');
  const objects = new Map<number, PdfObject>();
  for (const match of source.matchAll(/(?:^|\n)(\d+) 0 obj\r?\n/g)) {
    const start = match.index + match[0].length;
    const streamAt = /\bstream\r?\n|\bendobj/g;
    streamAt.lastIndex = start;
    const found = streamAt.exec(source);
    if (found === null) continue;
    const head = source.slice(start, found.index);
    objects.set(Number(match[1]), {
      head,
      stream: found[0].startsWith('stream') ? streamOf(bytes, head, streamAt.lastIndex) : null,
    });
  }
  return objects;
}

function streamOf(bytes: Buffer, head: string, start: number): Buffer {
  const raw = bytes.subarray(start, start + Number(/\/Length (\d+)/.exec(head)?.[1] ?? 0));
  return head.includes('/FlateDecode') ? inflateSync(raw) : raw;
}

const referenced = (head: string, name: string, objects: Map<number, PdfObject>): PdfObject | undefined => {
  const found = new RegExp(`/${name} \\[?(\\d+) 0 R`).exec(head);
  return found === null ? undefined : objects.get(Number(found[1]));
};

function isEmbedded(head: string, objects: Map<number, PdfObject>): boolean {
  const descendant = referenced(head, 'DescendantFonts', objects);
  const descriptor = referenced(descendant?.head ?? head, 'FontDescriptor', objects);
  return descriptor !== undefined && /\/FontFile[23]? \d+ 0 R/.test(descriptor.head);
}

function textOf(page: string, objects: Map<number, PdfObject>): string {
  const resources = referenced(page, 'Resources', objects)?.head ?? page;
  const fontsAt = /\/Font <<([\s\S]*?)>>/.exec(resources)?.[1] ?? '';
  const maps = new Map(
    [...fontsAt.matchAll(/\/(\w+) (\d+) 0 R/g)].map(([, name = '', id]) => {
      const font = objects.get(Number(id))?.head ?? '';
      return [name, glyphTexts(referenced(font, 'ToUnicode', objects)?.stream?.toString('latin1') ?? '')];
    }),
  );
  const drawing = referenced(page, 'Contents', objects)?.stream?.toString('latin1') ?? '';
  let current = new Map<number, string>();
  let text = '';
  for (const [operator, font, glyphs] of drawing.matchAll(/\/(\w+) [\d.]+ Tf|\[([^\]]*)\] TJ|\bET\b/g)) {
    if (font !== undefined) current = maps.get(font) ?? new Map();
    else if (operator === 'ET') text += '\n';
    else for (const code of codesIn(glyphs ?? '')) text += current.get(code) ?? '\ufffd';
  }
  return text;
}

const codesIn = (glyphs: string): number[] =>
  [...glyphs.matchAll(/<([\da-f]+)>/gi)].flatMap(([, hex = '']) =>
    (hex.match(/.{4}/g) ?? []).map((code) => Number.parseInt(code, 16)),
  );

const fromHex = (hex: string): string =>
  String.fromCharCode(...(hex.match(/.{4}/g) ?? []).map((unit) => Number.parseInt(unit, 16)));

/** Text of each glyph code, from the ranges of a ToUnicode map. */
function glyphTexts(map: string): Map<number, string> {
  const texts = new Map<number, string>();
  for (const [, block = ''] of map.matchAll(/beginbfrange([\s\S]*?)endbfrange/g)) {
    for (const [, from = '', list, first = ''] of block.matchAll(
      /<([\da-f]+)>\s*<[\da-f]+>\s*(?:\[([^\]]*)\]|<([\da-f]+)>)/gi,
    )) {
      const start = Number.parseInt(from, 16);
      const entries = list === undefined ? [first] : [...list.matchAll(/<([\da-f ]*)>/gi)].map(([, hex = '']) => hex);
      entries.forEach((hex, i) => texts.set(start + i, fromHex(hex.replaceAll(' ', ''))));
    }
  }
  return texts;
}

function informationOf(bytes: Buffer, objects: Map<number, PdfObject>): Map<string, string> {
  const source = bytes.toString('latin1');
  const information = referenced(source.slice(source.lastIndexOf('trailer')), 'Info', objects)?.head ?? '';
  const catalogue = referenced(source.slice(source.lastIndexOf('trailer')), 'Root', objects)?.head ?? '';
  return new Map(
    [...information.matchAll(/\/(\w+) (\d+) 0 R/g), ...catalogue.matchAll(/\/(Lang) (\d+) 0 R/g)]
      .map(([, name = '', id]): [string, string] => [name, literal(objects.get(Number(id))?.head ?? '')])
      .concat(
        [...catalogue.matchAll(/\/(Lang) (\([^)]*\))/g)].map(([, name = '', text = '']) => [name, literal(text)]),
      ),
  );
}

/** A literal string (7.3.4.2), UTF-16 where it begins with a byte-order mark. */
function literal(source: string): string {
  const inside = /^\s*\(([\s\S]*)\)\s*$/.exec(source)?.[1] ?? '';
  const bytes = Buffer.from(
    inside.replace(/\\([nrtbf()\\])/g, (_, letter: string) => ESCAPES[letter] ?? letter),
    'latin1',
  );
  return bytes[0] === 0xfe && bytes[1] === 0xff
    ? Buffer.from(bytes.subarray(2)).swap16().toString('utf16le')
    : bytes.toString('latin1');
}
const ESCAPES: Readonly<Record<string, string>> = { n: '\n', r: '\r', t: '\t', b: '\b', f: '\f' };
