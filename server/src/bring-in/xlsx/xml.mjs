// @ts-check
import { SaxesParser } from 'saxes';
import { damaged, Refused } from './archive.mjs';

/**
 * @typedef {object} XmlHandlers
 * @property {(name: string, attributes: Record<string, string>) => void} [open]
 * @property {(text: string) => void} [text]
 * @property {(name: string) => void} [close]
 */

/**
 * Reads XML as a stream; names come without their prefix. A document type declaration is refused, so that no entity but
 * the five of XML exists.
 *
 * @param {AsyncIterable<string>} pieces
 * @param {XmlHandlers} handlers
 * @param {() => Promise<void>} [afterEach] waited for after each piece, so that a slow reader slows the reading
 */
export async function readXml(pieces, handlers, afterEach = async () => {}) {
  const parser = new SaxesParser({ xmlns: false, position: false });
  /** @type {Error | null} */
  let failure = null;
  parser.on('doctype', () => {
    failure ??= new Refused('WORKBOOK_UNSAFE', 'The workbook holds a document type declaration; it is not read.');
  });
  parser.on('error', () => {
    failure ??= damaged();
  });
  parser.on('opentag', (tag) =>
    handlers.open?.(local(tag.name), /** @type {Record<string, string>} */ (tag.attributes)),
  );
  parser.on('text', (text) => handlers.text?.(text));
  parser.on('cdata', (text) => handlers.text?.(text));
  parser.on('closetag', (tag) => handlers.close?.(local(tag.name)));
  for await (const piece of pieces) {
    parser.write(piece);
    if (failure) throw failure;
    await afterEach();
  }
  parser.close();
  if (failure) throw failure;
  await afterEach();
}

/** @param {string} name */
const local = (name) => name.slice(name.indexOf(':') + 1);
