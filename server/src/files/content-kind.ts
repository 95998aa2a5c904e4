import { TextDecoder } from 'node:util';

/** What a file holds, judged by its first bytes and never by its name. */
export type ContentKind = 'EMPTY' | 'TEXT' | 'WORKBOOK' | 'OTHER';

/** So many bytes from the start of a file decide its kind. */
export const CONTENT_HEAD_BYTES = 4096;

const ZIP_LOCAL_HEADER = [0x50, 0x4b, 0x03, 0x04];

const startsWith = (bytes: Uint8Array, prefix: readonly number[]): boolean =>
  prefix.every((byte, index) => bytes[index] === byte);

/** Control characters that no table of text holds: all but tab, line ends and form feeds. */
export const CONTROL = /(?![\t-\r\u007f-\u009f])\p{Cc}/u;

const isForeign = (byte: number): boolean => byte < 32 && CONTROL.test(String.fromCharCode(byte));

/**
 * The kind of content by its first {@link CONTENT_HEAD_BYTES} bytes. A ZIP archive counts as a workbook here; whether it
 * is one is found out by reading it under limits.
 */
export function contentKind(head: Uint8Array): ContentKind {
  if (head.length === 0) return 'EMPTY';
  if (startsWith(head, ZIP_LOCAL_HEADER)) return 'WORKBOOK';
  return looksLikeText(head) ? 'TEXT' : 'OTHER';
}

function looksLikeText(head: Uint8Array): boolean {
  if (startsWith(head, [0x25, 0x50, 0x44, 0x46])) return false; // a PDF begins with readable text
  const utf16 = utf16Mark(head) ?? utf16WithoutMark(head);
  return utf16 === null ? !head.some(isForeign) : !CONTROL.test(new TextDecoder(utf16).decode(head));
}

const utf16Mark = (head: Uint8Array): 'utf-16le' | 'utf-16be' | null =>
  startsWith(head, [0xff, 0xfe]) ? 'utf-16le' : startsWith(head, [0xfe, 0xff]) ? 'utf-16be' : null;

/**
 * Finds UTF-16 that has no byte order mark: nearly every other byte is zero where the text is mostly Latin.
 *
 * @returns the encoding, or null when the zeros do not look like it
 */
export function utf16WithoutMark(head: Uint8Array): 'utf-16le' | 'utf-16be' | null {
  let even = 0;
  let odd = 0;
  for (let i = 0; i < head.length; i++) {
    if (head[i] === 0 && i % 2 === 0) even++;
    else if (head[i] === 0) odd++;
  }
  const half = head.length / 2;
  if (odd > 0.7 * half && even < 0.05 * half) return 'utf-16le';
  if (even > 0.7 * half && odd < 0.05 * half) return 'utf-16be';
  return null;
}
