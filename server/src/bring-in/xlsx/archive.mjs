// @ts-check
import yauzl from 'yauzl';

/**
 * A workbook that is refused. `code` is one of the codes of an unreadable table.
 */
export class Refused extends Error {
  /**
   * @param {'NOT_A_TABLE' | 'WORKBOOK_DAMAGED' | 'WORKBOOK_TOO_LARGE' | 'WORKBOOK_UNSAFE' | 'TOO_MANY_ROWS' | 'TOO_MANY_COLUMNS' | 'CELL_TOO_LONG' | 'NO_SUCH_SHEET' | 'EMPTY'} code
   * @param {string} message
   */
  constructor(code, message) {
    super(message);
    this.code = code;
  }
}

/**
 * @typedef {object} ArchiveLimits
 * @property {number} entries
 * @property {number} unpackedBytes
 * @property {number} ratio
 * @property {number} ratioFromBytes
 */

const SYMBOLIC_LINK = 0o120000;
const FILE_TYPE = 0o170000;
const TOO_LARGE = 'The workbook unpacks to far more than a table of measurements holds; it is not read.';

/**
 * The parts of a workbook. What the directory at the end of the archive claims is checked before anything is unpacked, and
 * the same limit is held against the bytes that really come out. Parts are found through that directory alone.
 */
export class Archive {
  #zip;
  #limits;
  /** @type {Map<string, import('yauzl').Entry>} */
  #entries;
  #inflated = 0;

  /**
   * @param {import('yauzl').ZipFile} zip
   * @param {Map<string, import('yauzl').Entry>} entries
   * @param {ArchiveLimits} limits
   */
  constructor(zip, entries, limits) {
    this.#zip = zip;
    this.#entries = entries;
    this.#limits = limits;
  }

  /**
   * @param {Buffer} bytes
   * @param {ArchiveLimits} limits
   * @returns {Promise<Archive>}
   */
  static async open(bytes, limits) {
    const zip = await openZip(bytes);
    if (zip.entryCount > limits.entries) {
      throw new Refused(
        'WORKBOOK_TOO_LARGE',
        `The workbook has ${zip.entryCount} parts; ${limits.entries} are allowed.`,
      );
    }
    /** @type {Map<string, import('yauzl').Entry>} */
    const entries = new Map();
    let unpacked = 0;
    let packed = 0;
    try {
      for await (const entry of zip.eachEntry()) {
        checkEntry(entry, entries, limits);
        unpacked += entry.uncompressedSize;
        packed += entry.compressedSize;
        entries.set(entry.fileName, entry);
      }
    } catch (error) {
      throw error instanceof Refused ? error : damaged();
    }
    const swollen = unpacked > limits.ratioFromBytes && unpacked > limits.ratio * packed;
    if (unpacked > limits.unpackedBytes || swollen) throw new Refused('WORKBOOK_TOO_LARGE', TOO_LARGE);
    return new Archive(zip, entries, limits);
  }

  /** @param {string} name */
  has(name) {
    return this.#entries.has(name);
  }

  /**
   * Unpacks one part, counting what comes out.
   *
   * @param {string} name
   * @returns {AsyncGenerator<string>}
   */
  async *text(name) {
    const entry = this.#entries.get(name);
    if (!entry) throw damaged();
    const decoder = new TextDecoder('utf-8');
    try {
      const stream = await this.#zip.openReadStreamPromise(entry);
      for await (const chunk of stream) {
        this.#inflated += chunk.length;
        if (this.#inflated > this.#limits.unpackedBytes) throw new Refused('WORKBOOK_TOO_LARGE', TOO_LARGE);
        yield decoder.decode(chunk, { stream: true });
      }
      yield decoder.decode();
    } catch (error) {
      throw error instanceof Refused ? error : damaged();
    }
  }
}

/** @param {Buffer} bytes */
async function openZip(bytes) {
  try {
    return await yauzl.fromBufferPromise(bytes, { lazyEntries: true, validateEntrySizes: true, strictFileNames: true });
  } catch {
    throw damaged();
  }
}

/**
 * @param {import('yauzl').Entry} entry
 * @param {Map<string, unknown>} seen
 * @param {ArchiveLimits} limits
 */
function checkEntry(entry, seen, limits) {
  if (entry.isEncrypted()) throw new Refused('WORKBOOK_UNSAFE', 'The workbook is locked by a password.');
  if (((entry.externalFileAttributes >>> 16) & FILE_TYPE) === SYMBOLIC_LINK) throw damaged();
  if (seen.has(entry.fileName) || ![0, 8].includes(entry.compressionMethod)) throw damaged();
  if (/(^|\/)vbaProject\.bin$/i.test(entry.fileName)) {
    throw new Refused('WORKBOOK_UNSAFE', 'The workbook holds macros. Save it as a workbook without macros.');
  }
  const { uncompressedSize: unpacked, compressedSize: packed } = entry;
  if (unpacked > limits.ratioFromBytes && unpacked > limits.ratio * packed) {
    throw new Refused('WORKBOOK_TOO_LARGE', TOO_LARGE);
  }
}

export const damaged = () =>
  new Refused('WORKBOOK_DAMAGED', 'The file is not a workbook that can be read, or it is damaged.');
