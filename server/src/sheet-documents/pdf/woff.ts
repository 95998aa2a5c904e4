import { inflateSync } from 'node:zlib';

const SIGNATURE = 0x774f4646;
const HEADER_BYTES = { woff: 44, sfnt: 12 } as const;
const ENTRY_BYTES = { woff: 20, sfnt: 16 } as const;
const padded = (length: number): number => (length + 3) & ~3;

interface Table {
  readonly tag: number;
  readonly checksum: number;
  readonly data: Buffer;
}

/**
 * The font inside a WOFF file (W3C WOFF 1.0, sections 3 to 5), unpacked once by the zlib of the platform. The renderer would unpack its
 * tables in JavaScript, and again for each document.
 *
 * @throws {RangeError} when the bytes are no WOFF 1.0
 */
export function unpackWoff(woff: Buffer): Buffer {
  if (woff.length < HEADER_BYTES.woff || woff.readUInt32BE(0) !== SIGNATURE)
    throw new RangeError('not a WOFF 1.0 font');
  const flavour = woff.readUInt32BE(4);
  const count = woff.readUInt16BE(12);
  const tables = Array.from({ length: count }, (_, i) => readTable(woff, HEADER_BYTES.woff + i * ENTRY_BYTES.woff));
  return writeSfnt(flavour, tables);
}

function readTable(woff: Buffer, entry: number): Table {
  const offset = woff.readUInt32BE(entry + 4);
  const packedLength = woff.readUInt32BE(entry + 8);
  const length = woff.readUInt32BE(entry + 12);
  const packed = woff.subarray(offset, offset + packedLength);
  return {
    tag: woff.readUInt32BE(entry),
    checksum: woff.readUInt32BE(entry + 16),
    data: packedLength < length ? inflateSync(packed) : packed,
  };
}

/** Header, table directory, tables on four-byte boundaries (OpenType 1.9, "Organization of an OpenType font"). */
function writeSfnt(flavour: number, tables: readonly Table[]): Buffer {
  const first = HEADER_BYTES.sfnt + tables.length * ENTRY_BYTES.sfnt;
  const sfnt = Buffer.alloc(tables.reduce((end, { data }) => end + padded(data.length), first));
  const power = Math.floor(Math.log2(tables.length));
  sfnt.writeUInt32BE(flavour, 0);
  sfnt.writeUInt16BE(tables.length, 4);
  sfnt.writeUInt16BE(16 * 2 ** power, 6);
  sfnt.writeUInt16BE(power, 8);
  sfnt.writeUInt16BE(16 * (tables.length - 2 ** power), 10);
  let offset = first;
  tables.forEach(({ tag, checksum, data }, i) => {
    const entry = HEADER_BYTES.sfnt + i * ENTRY_BYTES.sfnt;
    [tag, checksum, offset, data.length].forEach((value, field) => sfnt.writeUInt32BE(value, entry + 4 * field));
    data.copy(sfnt, offset);
    offset += padded(data.length);
  });
  return sfnt;
}
