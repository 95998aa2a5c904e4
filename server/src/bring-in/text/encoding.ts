import { TextDecoder } from 'node:util';
import { CONTENT_HEAD_BYTES, contentKind, CONTROL, utf16WithoutMark } from '../../files/content-kind.js';
import { type ByteSource, UnreadableTable } from '../table.js';

/** Latin-1 is read as its superset Windows-1252, as the WHATWG Encoding Standard does. */
export type Encoding = 'utf-8' | 'utf-16le' | 'utf-16be' | 'windows-1252';

const BINARY = 'This is not a table of text: it holds binary data, whatever its name says.';

/**
 * Finds the encoding of a text by reading it once: byte order mark, the zeros of UTF-16, valid UTF-8, else Windows-1252.
 *
 * @throws {UnreadableTable} EMPTY or NOT_A_TABLE
 */
export async function detectEncoding(source: ByteSource): Promise<Encoding> {
  const utf8 = new TextDecoder('utf-8', { fatal: true });
  const head: Uint8Array[] = [];
  let headBytes = 0;
  let validUtf8 = true;
  for await (const chunk of source()) {
    if (headBytes < CONTENT_HEAD_BYTES) {
      head.push(chunk.subarray(0, CONTENT_HEAD_BYTES - headBytes));
      headBytes += Math.min(chunk.length, CONTENT_HEAD_BYTES - headBytes);
    }
    validUtf8 &&= decodes(utf8, chunk);
  }
  validUtf8 &&= decodes(utf8, null);
  return encodingOf(Buffer.concat(head), validUtf8);
}

function encodingOf(head: Uint8Array, validUtf8: boolean): Encoding {
  const kind = contentKind(head);
  if (kind === 'EMPTY') throw new UnreadableTable('EMPTY', 'There is nothing in it: no byte, no row.');
  if (kind !== 'TEXT') throw new UnreadableTable('NOT_A_TABLE', BINARY);
  if (head[0] === 0xff && head[1] === 0xfe) return 'utf-16le';
  if (head[0] === 0xfe && head[1] === 0xff) return 'utf-16be';
  return utf16WithoutMark(head) ?? (validUtf8 ? 'utf-8' : 'windows-1252');
}

function decodes(decoder: TextDecoder, chunk: Uint8Array | null): boolean {
  try {
    if (chunk === null) decoder.decode();
    else decoder.decode(chunk, { stream: true });
    return true;
  } catch {
    return false;
  }
}

/** Decodes piece by piece; a byte order mark is dropped. @throws {UnreadableTable} when binary data turns up further on */
export async function* decoded(source: ByteSource, encoding: Encoding): AsyncGenerator<string> {
  const decoder = new TextDecoder(encoding);
  for await (const chunk of source()) {
    const text = decoder.decode(chunk, { stream: true });
    if (CONTROL.test(text)) throw new UnreadableTable('NOT_A_TABLE', BINARY);
    if (text !== '') yield text;
  }
  const rest = decoder.decode();
  if (rest !== '') yield rest;
}
