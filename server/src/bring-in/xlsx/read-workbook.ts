import { type ChildProcess, fork } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { WORKBOOK_HEAP_MIB, WORKBOOK_LIMITS, WORKBOOK_WALL_MS, type WorkbookLimits } from '../limits.js';
import { cellText, type RawTable, type TableRow, type UnreadableCode, UnreadableTable } from '../table.js';
import { sniffDecimal } from '../text/dialect.js';

/** The reader stays plain JavaScript: it stands beside this file both in the sources and in the build. */
const CHILD = fileURLToPath(new URL('./child.mjs', import.meta.url));

type Report =
  | { rows: TableRow[] }
  | { done: { sheet: string; sheets: string[] } }
  | { refused: { code: UnreadableCode; message: string } };

export interface WorkbookOptions {
  sheet?: string | null | undefined;
  limits?: Readonly<WorkbookLimits>;
  heapMiB?: number;
  wallMs?: number;
  /** told how many rows were read so far */
  onRows?: ((rows: number) => void) | undefined;
  signal?: AbortSignal | undefined;
}

/**
 * Reads a workbook (XLSX) in a process of its own, with limits on entries, unpacked bytes, memory and time. Whatever the
 * workbook does to that process, this one lives on.
 *
 * @throws {UnreadableTable}
 */
export async function readWorkbook(bytes: Uint8Array, options: WorkbookOptions = {}): Promise<RawTable> {
  const { rows, sheet, sheets } = await inChild(bytes, options);
  const texts = rows.flatMap(({ cells }) => cells.filter((cell) => typeof cell === 'string').map(cellText));
  return {
    origin: 'WORKBOOK',
    rows,
    columnCount: rows.reduce((most, row) => Math.max(most, row.cells.length), 0),
    ...sniffDecimal(texts),
    encoding: null,
    delimiter: null,
    sheet,
    sheets,
  };
}

interface WorkbookRows {
  rows: TableRow[];
  sheet: string;
  sheets: string[];
}

function inChild(bytes: Uint8Array, options: WorkbookOptions): Promise<WorkbookRows> {
  const { sheet = null, limits = WORKBOOK_LIMITS, heapMiB = WORKBOOK_HEAP_MIB, wallMs = WORKBOOK_WALL_MS } = options;
  const child = fork(CHILD, [], {
    // Nothing of the server's environment, secrets least of all, goes along.
    env: {},
    execArgv: [`--max-old-space-size=${heapMiB}`, '--disable-proto=delete', '--no-warnings'],
    serialization: 'advanced',
    stdio: ['ignore', 'ignore', 'ignore', 'ipc'],
  });
  return new Promise<WorkbookRows>((resolve, reject) => {
    const rows: TableRow[] = [];
    const timer = setTimeout(() => reject(tooSlow()), wallMs);
    child.on('message', (report: Report) => {
      if ('rows' in report) {
        for (const row of report.rows) rows.push(row);
        options.onRows?.(rows.length);
      } else if ('done' in report) resolve({ rows, ...report.done });
      else reject(new UnreadableTable(report.refused.code, report.refused.message));
    });
    options.signal?.addEventListener('abort', () => reject(options.signal?.reason as Error), { once: true });
    child.on('error', () => reject(died()));
    child.on('exit', () => reject(died()));
    child.on('exit', () => clearTimeout(timer));
    child.send({ bytes, sheet, limits }, (error) => error && reject(died()));
  }).finally(() => end(child));
}

function end(child: ChildProcess): void {
  child.removeAllListeners('message');
  child.kill('SIGKILL');
}

const tooSlow = (): UnreadableTable =>
  new UnreadableTable(
    'WORKBOOK_TOO_SLOW',
    'Reading the workbook took too long. Save the table as CSV and bring that in.',
  );

const died = (): UnreadableTable =>
  new UnreadableTable(
    'WORKBOOK_TOO_LARGE',
    'The workbook could not be read within the memory allowed. Save the table as CSV and bring that in.',
  );
