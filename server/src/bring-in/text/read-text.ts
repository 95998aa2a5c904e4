import { Readable } from 'node:stream';
import { CsvError, parse } from 'csv-parse';
import { MAX_CELL_CHARACTERS, MAX_COLUMNS, MAX_DATA_ROWS, MAX_ROWS } from '../limits.js';
import {
  type ByteSource,
  type DecimalSign,
  type Delimiter,
  isBlank,
  type RawTable,
  type TableRow,
  UnreadableTable,
} from '../table.js';
import { type Dialect, sniffDialect } from './dialect.js';
import { decoded, detectEncoding } from './encoding.js';

/** What the person corrected about how the text is to be read, and who follows the reading. */
export interface TextOptions {
  /** told how many rows were read so far */
  onRows?: ((rows: number) => void) | undefined;
  signal?: AbortSignal | undefined;
  delimiter?: Delimiter | undefined;
  decimal?: DecimalSign | undefined;
}

const ROWS_PER_REPORT = 5_000;
const HEAD_CHARACTERS = 64 * 1024;

/**
 * Reads a delimited text as a stream: the bytes pass once to find the encoding and once to be parsed.
 *
 * @throws {UnreadableTable}
 */
export async function readText(source: ByteSource, options: TextOptions = {}): Promise<RawTable> {
  const encoding = await detectEncoding(source);
  const { dialect, text } = await withDialect(decoded(source, encoding), options);
  const rows = await parseRows(text, dialect.delimiter, options);
  if (rows.length === 0) throw new UnreadableTable('EMPTY', 'There is nothing in it but empty lines.');
  return {
    origin: 'TEXT',
    rows,
    columnCount: rows.reduce((most, row) => Math.max(most, row.cells.length), 0),
    decimal: dialect.decimal,
    decimalCertain: dialect.decimalCertain,
    encoding,
    delimiter: dialect.delimiter,
    sheet: null,
    sheets: [],
  };
}

/** Looks at the beginning of the text, then gives it back together with the rest. */
async function withDialect(
  pieces: AsyncGenerator<string>,
  options: TextOptions,
): Promise<{ dialect: Dialect; text: AsyncGenerator<string> }> {
  let head = '';
  while (head.length < HEAD_CHARACTERS) {
    const next = await pieces.next();
    if (next.done) break;
    head += next.value;
  }
  const sniffed = sniffDialect(head.slice(0, HEAD_CHARACTERS));
  const dialect = {
    delimiter: options.delimiter ?? sniffed.delimiter,
    decimal: options.decimal ?? sniffed.decimal,
    decimalCertain: options.decimal !== undefined || sniffed.decimalCertain,
  };
  async function* text(): AsyncGenerator<string> {
    yield head;
    yield* pieces;
  }
  return { dialect, text: text() };
}

async function parseRows(
  text: AsyncGenerator<string>,
  delimiter: Delimiter,
  { onRows, signal }: TextOptions,
): Promise<TableRow[]> {
  const parser = parse({
    delimiter,
    relax_column_count: true,
    relax_quotes: true,
    // A quote that is never closed would swallow the rest of the file.
    max_record_size: MAX_COLUMNS * MAX_CELL_CHARACTERS,
  });
  const input = Readable.from(text);
  input.on('error', (error) => parser.destroy(error));
  const rows: TableRow[] = [];
  let number = 0;
  try {
    for await (const record of input.pipe(parser) as AsyncIterable<string[]>) {
      number++;
      if (record.every(isBlank)) continue;
      if (rows.length >= MAX_ROWS) throw tooManyRows();
      rows.push({ number, cells: checked(record, number) });
      if (rows.length % ROWS_PER_REPORT > 0) continue;
      signal?.throwIfAborted();
      onRows?.(rows.length);
    }
  } catch (error) {
    throw error instanceof CsvError ? unreadable(error, number + 1) : error;
  } finally {
    input.destroy();
  }
  return rows;
}

function checked(cells: string[], number: number): string[] {
  while (cells.length > 0 && isBlank(cells.at(-1))) cells.pop();
  if (cells.length > MAX_COLUMNS) {
    throw new UnreadableTable(
      'TOO_MANY_COLUMNS',
      `Row ${number} has ${cells.length} columns; a table of measurements may have ${MAX_COLUMNS}.`,
    );
  }
  if (cells.some((cell) => cell.length > MAX_CELL_CHARACTERS)) {
    throw new UnreadableTable(
      'CELL_TOO_LONG',
      `A cell of row ${number} has more than ${MAX_CELL_CHARACTERS} characters.`,
    );
  }
  return cells;
}

export const tooManyRows = (): UnreadableTable =>
  new UnreadableTable(
    'TOO_MANY_ROWS',
    `The table has more than ${MAX_DATA_ROWS.toLocaleString('en')} rows. Bring it in as several series.`,
  );

function unreadable(error: CsvError, row: number): UnreadableTable {
  return error.code === 'CSV_QUOTE_NOT_CLOSED' || error.code === 'CSV_MAX_RECORD_SIZE'
    ? new UnreadableTable('QUOTE_NOT_CLOSED', `A quotation mark in row ${row} is never closed.`)
    : new UnreadableTable('NOT_A_TABLE', `Row ${row} cannot be split into columns.`);
}
