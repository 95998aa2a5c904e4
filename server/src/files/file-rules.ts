import { contentKind, CONTENT_HEAD_BYTES } from './content-kind.js';

/** What a person may bring in within a day; enough for a campaign of measurements, too little to fill a disk. */
export const DAILY_QUOTA = { files: 100, bytes: 500 * 1024 * 1024 };

export const MEDIA_TYPE_OF_WORKBOOK = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';

/** Every workbook names this part, in plain letters, in the directory of its archive. */
const WORKBOOK_PART = 'xl/workbook.xml';

/**
 * The media type of a file that is taken, judged by its bytes and never by its name; null for what is not taken.
 * Pasted tables, CSV and other delimited text count as text.
 */
export function mediaTypeOf(bytes: Buffer): string | null {
  switch (contentKind(bytes.subarray(0, CONTENT_HEAD_BYTES))) {
    case 'TEXT':
      return 'text/plain';
    case 'WORKBOOK':
      return bytes.includes(WORKBOOK_PART) ? MEDIA_TYPE_OF_WORKBOOK : null;
    case 'EMPTY':
    case 'OTHER':
      return null;
  }
}

const LONGEST_NAME = 200;

/** A name fit for display and for a header: no path, no control or direction characters, of bounded length. */
export function displayName(name: string): string {
  const base = name.split(/[\\/]/).at(-1) ?? '';
  const clean = base.replace(/[\p{Cc}\p{Cf}\p{Zl}\p{Zp}\p{Cs}]/gu, '').trim();
  return clean.slice(0, LONGEST_NAME).replace(/^\.+$/, '') || 'unnamed';
}

/** The header of a download (RFC 6266): an ASCII name, and the whole one as RFC 8187 encodes it. */
export function attachment(name: string): string {
  const ascii = name.replace(/[^\x20-\x7e]|["\\%]/g, '_');
  const encoded = encodeURIComponent(name).replace(/['()*]/g, (c) => `%${c.charCodeAt(0).toString(16).toUpperCase()}`);
  return `attachment; filename="${ascii}"; filename*=UTF-8''${encoded}`;
}
