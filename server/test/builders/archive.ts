import { crc32, deflateRawSync } from 'node:zlib';

export interface ArchivePart {
  name: string;
  content: string | Buffer;
  /** what the directory claims instead of the truth */
  claims?: { unpackedBytes?: number };
  /** Unix mode, for a symbolic link */
  mode?: number;
  encrypted?: boolean;
}

/** A ZIP archive (PKWARE APPNOTE 6.3.10), which may lie about what it holds. */
export function archiveOf(parts: readonly ArchivePart[]): Buffer {
  const locals: Buffer[] = [];
  const directory: Buffer[] = [];
  let offset = 0;
  for (const part of parts) {
    const content = Buffer.from(part.content);
    const packed = deflateRawSync(content);
    const name = Buffer.from(part.name);
    const fields = Buffer.alloc(26);
    fields.writeUInt16LE(20, 0);
    fields.writeUInt16LE(part.encrypted ? 1 : 0, 2);
    fields.writeUInt16LE(8, 4);
    fields.writeUInt32LE(crc32(content), 10);
    fields.writeUInt32LE(packed.length, 14);
    fields.writeUInt32LE(part.claims?.unpackedBytes ?? content.length, 18);
    fields.writeUInt16LE(name.length, 22);
    const local = Buffer.concat([Buffer.from('PK\x03\x04'), fields, name, packed]);
    const more = Buffer.alloc(14);
    more.writeUInt32LE(((part.mode ?? 0o100644) << 16) >>> 0, 6);
    more.writeUInt32LE(offset, 10);
    // Version made by: 3 in the upper byte is Unix, whose modes tell a link from a file.
    directory.push(Buffer.concat([Buffer.from('PK\x01\x02'), Buffer.from([20, 3]), fields, more, name]));
    locals.push(local);
    offset += local.length;
  }
  const listing = Buffer.concat(directory);
  const end = Buffer.alloc(18);
  end.writeUInt16LE(parts.length, 4);
  end.writeUInt16LE(parts.length, 6);
  end.writeUInt32LE(listing.length, 8);
  end.writeUInt32LE(offset, 12);
  return Buffer.concat([...locals, listing, Buffer.from('PK\x05\x06'), end]);
}

const WORKBOOK = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main';
const OFFICE = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';
const PACKAGE = 'http://schemas.openxmlformats.org/package/2006/relationships';

/** The parts of the smallest workbook that holds one sheet, by hand, so that each can be spoiled. */
export const workbookParts = (sheetXml: string): ArchivePart[] => [
  {
    name: 'xl/workbook.xml',
    content: `<workbook xmlns="${WORKBOOK}" xmlns:r="${OFFICE}"><sheets><sheet name="runs" sheetId="1" r:id="r1"/></sheets></workbook>`,
  },
  {
    name: 'xl/_rels/workbook.xml.rels',
    content: `<Relationships xmlns="${PACKAGE}"><Relationship Id="r1" Type="${OFFICE}/worksheet" Target="worksheets/sheet1.xml"/></Relationships>`,
  },
  { name: 'xl/worksheets/sheet1.xml', content: sheetXml },
];

export const sheetOf = (rows: string): string =>
  `<worksheet xmlns="${WORKBOOK}"><sheetData>${rows}</sheetData></worksheet>`;
