// @ts-check
/**
 * The process that reads one workbook and ends. It is given the bytes and the limits over IPC and answers with batches of
 * rows, then with what it read, or with the reason why it refuses. It has no environment, no network and no database.
 */
import { Archive, Refused } from './archive.mjs';
import { readSheet } from './sheet.mjs';
import { readWorkbook } from './workbook.mjs';

/** @param {unknown} message */
const send = (message) =>
  new Promise((resolve, reject) =>
    process.send?.(message, undefined, {}, (error) => (error ? reject(error) : resolve(null))),
  );

/** @param {{ bytes: Uint8Array, sheet: string | null, limits: import('./archive.mjs').ArchiveLimits & import('./sheet.mjs').SheetLimits }} task */
async function read({ bytes, sheet, limits }) {
  const archive = await Archive.open(Buffer.from(bytes), limits);
  const workbook = await readWorkbook(archive);
  const sheets = workbook.sheets.map(({ name }) => name);
  const asked = workbook.sheets.filter(({ name }) => sheet === null || name === sheet);
  if (asked.length === 0) throw new Refused('NO_SUCH_SHEET', `The workbook has no sheet named “${sheet}”.`);
  for (const { name, path } of asked) {
    let rows = 0;
    await readSheet(archive, path, workbook, limits, (batch) => {
      rows += batch.length;
      return send({ rows: batch });
    });
    if (rows > 0) return send({ done: { sheet: name, sheets } });
  }
  throw new Refused('EMPTY', 'The workbook has no cell with anything in it.');
}

/** @param {Parameters<typeof read>[0]} task */
async function answer(task) {
  try {
    await read(task);
  } catch (error) {
    if (!(error instanceof Refused)) throw error;
    await send({ refused: { code: error.code, message: error.message } });
  }
}

// The server ends this process when it has the answer; should the server end first, so does this.
process.on('message', (task) => void answer(/** @type {Parameters<typeof read>[0]} */ (task)));
process.on('disconnect', () => process.exit());
