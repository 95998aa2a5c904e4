import fc from 'fast-check';
import { MAX_DATA_ROWS } from '../limits.js';
import type { ByteSource, DecimalSign, Delimiter, UnreadableTable } from '../table.js';
import { sniffDialect } from './dialect.js';
import { readText } from './read-text.js';

const bytesOf = (bytes: Uint8Array, pieces = 1): ByteSource =>
  async function* () {
    const size = Math.max(1, Math.ceil(bytes.length / pieces));
    for (let i = 0; i < bytes.length; i += size) yield await Promise.resolve(bytes.subarray(i, i + size));
  };
const textOf = (text: string): ByteSource => bytesOf(Buffer.from(text));

const ENCODERS = {
  'UTF-8': (text: string) => Buffer.from(text, 'utf8'),
  'UTF-8 with byte order mark': (text: string) => Buffer.from(`\ufeff${text}`, 'utf8'),
  'UTF-16 LE with byte order mark': (text: string) => Buffer.from(`\ufeff${text}`, 'utf16le'),
  'UTF-16 BE with byte order mark': (text: string) => Buffer.from(`\ufeff${text}`, 'utf16le').swap16(),
  'UTF-16 LE without mark': (text: string) => Buffer.from(text, 'utf16le'),
  'Latin-1': (text: string) => Buffer.from(text, 'latin1'),
};

const quoted = (cell: string, delimiter: string): string =>
  cell.includes(delimiter) || /["\r\n]/.test(cell) ? `"${cell.replaceAll('"', '""')}"` : cell;

describe('a table of text, whatever its encoding, delimiter and decimal sign', () => {
  const measured = fc.record({
    temperature: fc.integer({ min: 200_00, max: 900_00 }).map((n) => (n / 100).toFixed(2)),
    pressure: fc.integer({ min: 10_0, max: 900_0 }).map((n) => (n / 10).toFixed(1)),
    diffusivity: fc.integer({ min: 1, max: 99_999 }).map((n) => (n / 10_000).toFixed(4)),
    remark: fc.constantFrom('', 'Röhre 2', 'tube “a”', 'was 3 °C', 'ran; twice, or so', 'said "no"'),
  });
  const layouts = fc
    .record({
      encoding: fc.constantFrom(...(Object.keys(ENCODERS) as (keyof typeof ENCODERS)[])),
      delimiter: fc.constantFrom<Delimiter>(',', ';', '\t'),
      decimal: fc.constantFrom<DecimalSign>('.', ','),
      lineEnd: fc.constantFrom('\n', '\r\n'),
      pieces: fc.integer({ min: 1, max: 7 }),
    })
    // A comma for both leaves quotes as the only difference; see the example below.
    .filter(({ delimiter, decimal }) => !(delimiter === ',' && decimal === ','));

  it('comes out as it went in', async () => {
    await fc.assert(
      fc.asyncProperty(fc.array(measured, { minLength: 2, maxLength: 20 }), layouts, async (rows, layout) => {
        const header = ['T / °C', 'p / kPa', 'D / cm²/s', 'remark'];
        const withSign = (number: string): string => number.replace('.', layout.decimal);
        const clean = (text: string): string => (layout.encoding === 'Latin-1' ? text.replace(/[“”]/g, "'") : text);
        const cells = [
          header,
          ...rows.map((row) => [
            withSign(row.temperature),
            withSign(row.pressure),
            withSign(row.diffusivity),
            clean(row.remark),
          ]),
        ];
        const text = cells.map((row) => row.map((cell) => quoted(cell, layout.delimiter)).join(layout.delimiter));
        const bytes = ENCODERS[layout.encoding](`${text.join(layout.lineEnd)}${layout.lineEnd}`);

        const table = await readText(bytesOf(bytes, layout.pieces));

        const trimmed = cells.map((row) => (row.at(-1) === '' ? row.slice(0, -1) : row));
        expect(table.rows.map((row) => row.cells)).toEqual(trimmed);
        expect(table).toMatchObject({ delimiter: layout.delimiter, decimal: layout.decimal });
      }),
      { numRuns: 200 },
    );
  });

  it('reads decimal commas between quoted columns', async () => {
    const table = await readText(textOf('T,D\n"25,0","0,1249"\n"30,0","0,1281"\n'));

    expect(table).toMatchObject({ delimiter: ',', decimal: ',', columnCount: 2 });
    expect(table.rows[1]?.cells).toEqual(['25,0', '0,1249']);
  });

  it('counts empty lines as a spreadsheet does and leaves them out', async () => {
    const table = await readText(textOf('T;D\n\n25;0,12\n;\n30;0,13\n'));

    expect(table.rows.map(({ number }) => number)).toEqual([1, 3, 5]);
  });

  it('reads a table of one column', async () => {
    expect((await readText(textOf('D\n0.12\n0.13\n'))).columnCount).toBe(1);
  });
});

describe('the decimal sign', () => {
  it.each<[string, DecimalSign, boolean]>([
    ['T;D\n25,0;0,1249', ',', true],
    ['T;D\n25.0;0.1249', '.', true],
    ['T;p\n300;1,013', ',', false],
    ['T;p\n300;1.013', '.', false],
    ['T;p\n300;1,013\n25,5;1,1', ',', true],
    ['T;p\n300;101325', '.', true],
  ])('of %j is %s, certain: %s', (text, decimal, certain) => {
    expect(sniffDialect(text)).toMatchObject({ decimal, decimalCertain: certain });
  });
});

describe('what is no table', () => {
  const refusal = (source: ByteSource): Promise<UnreadableTable> =>
    readText(source).then(
      () => Promise.reject(new Error('was read')),
      (error: UnreadableTable) => error,
    );

  it.each([
    ['an empty file', Buffer.alloc(0), 'EMPTY'],
    ['empty lines', Buffer.from('\n\n ; \n'), 'EMPTY'],
    ['a byte order mark alone', Buffer.from('\ufeff'), 'EMPTY'],
    ['a program', Buffer.from('7f454c4602010100000000000000000003003e00', 'hex'), 'NOT_A_TABLE'],
    ['a picture', Buffer.from('89504e470d0a1a0a0000000d49484452', 'hex'), 'NOT_A_TABLE'],
    ['a PDF', Buffer.from('%PDF-1.7\n'), 'NOT_A_TABLE'],
    ['an archive', Buffer.from('504b030414000000', 'hex'), 'NOT_A_TABLE'],
    ['an open quote', Buffer.from(`T,D\n25,"0.12\n${'30,0.13\n'.repeat(20_000)}`), 'QUOTE_NOT_CLOSED'],
    ['too many columns', Buffer.from(`${'1;'.repeat(80)}1\n`), 'TOO_MANY_COLUMNS'],
    ['a cell as long as a book', Buffer.from(`T;D\n25;${'x'.repeat(2000)}\n`), 'CELL_TOO_LONG'],
  ])('refuses %s', async (_, bytes, code) => {
    expect((await refusal(bytesOf(bytes))).code).toBe(code);
  });

  it('refuses binary data that begins like a table', async () => {
    const bytes = Buffer.concat([Buffer.from('T;D\n25;0.12\n'.repeat(1000)), Buffer.from([0, 1, 2, 3])]);

    expect(await refusal(bytesOf(bytes))).toMatchObject({ code: 'NOT_A_TABLE' });
  });

  it('reads 100,000 rows and stops reading soon after', async () => {
    let linesGiven = 0;
    const lines: ByteSource = async function* () {
      linesGiven = 0;
      while (linesGiven < 3 * MAX_DATA_ROWS) {
        linesGiven += 1000;
        yield await Promise.resolve(Buffer.from('25.0;101.3;0.1249\n'.repeat(1000)));
      }
    };

    expect(await refusal(lines)).toMatchObject({ code: 'TOO_MANY_ROWS' });
    expect(linesGiven).toBeLessThan(2 * MAX_DATA_ROWS);
  });
});
