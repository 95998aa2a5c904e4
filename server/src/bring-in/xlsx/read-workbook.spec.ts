import ExcelJS from 'exceljs';
import { type ArchivePart, archiveOf, sheetOf, workbookParts } from '../../../test/builders/archive.js';
import { WORKBOOK_LIMITS } from '../limits.js';
import { UnreadableTable } from '../table.js';
import { readWorkbook, type WorkbookOptions } from './read-workbook.js';

async function written(fill: (workbook: ExcelJS.Workbook) => void): Promise<Buffer> {
  const workbook = new ExcelJS.Workbook();
  fill(workbook);
  return Buffer.from(await workbook.xlsx.writeBuffer());
}

const refusal = (bytes: Buffer, options?: WorkbookOptions): Promise<UnreadableTable> =>
  readWorkbook(bytes, options).then(
    () => Promise.reject(new Error('was read')),
    (error: UnreadableTable) => error,
  );

describe('a workbook written by another program', () => {
  it('comes out with its numbers, texts, dates, formulas and errors', async () => {
    const bytes = await written((workbook) => {
      workbook.addWorksheet('notes', { state: 'hidden' }).addRow(['not this one']);
      workbook.addWorksheet('empty');
      const sheet = workbook.addWorksheet('Reihe 7');
      sheet.addRow(['T / °C', 'p / kPa', 'D / cm²/s', 'when']);
      sheet.addRow([25, 101.3, 0.1249, new Date(Date.UTC(2019, 1, 27))]);
      sheet.addRow([]);
      sheet.addRow(['30,1', { formula: 'B2', result: 101.3 }, { formula: 'C2*1.02', result: 0.1274 }, null]);
      sheet.addRow([35, { formula: 'B9' }, { error: '#DIV/0!' }, { richText: [{ text: 'a' }, { text: 'b & c' }] }]);
    });

    const table = await readWorkbook(bytes);

    expect(table).toMatchObject({ origin: 'WORKBOOK', sheet: 'Reihe 7', sheets: ['empty', 'Reihe 7'], columnCount: 4 });
    expect(table.rows).toEqual([
      { number: 1, cells: ['T / °C', 'p / kPa', 'D / cm²/s', 'when'] },
      {
        number: 2,
        cells: [25, 101.3, 0.1249, '2019-02-27'],
        marks: [{ column: 3, kind: 'DATE', detail: '2019-02-27' }],
      },
      {
        number: 4,
        cells: ['30,1', 101.3, 0.1274],
        marks: [
          { column: 1, kind: 'FORMULA', detail: 'B2' },
          { column: 2, kind: 'FORMULA', detail: 'C2*1.02' },
        ],
      },
      {
        number: 5,
        cells: [35, null, '#DIV/0!', 'ab & c'],
        marks: [
          { column: 1, kind: 'FORMULA', detail: 'B9' },
          { column: 2, kind: 'ERROR', detail: '#DIV/0!' },
        ],
      },
    ]);
  });

  it('is read sheet by sheet', async () => {
    const bytes = await written((workbook) => {
      workbook.addWorksheet('one').addRow([1]);
      workbook.addWorksheet('two').addRow([2]);
    });

    expect((await readWorkbook(bytes, { sheet: 'two' })).rows[0]?.cells).toEqual([2]);
    expect(await refusal(bytes, { sheet: 'three' })).toMatchObject({ code: 'NO_SUCH_SHEET' });
  });

  it('holds 100,000 rows', async () => {
    const rows = Array.from(
      { length: 100_000 },
      (_, i) => `<row r="${i + 1}"><c><v>${300 + i / 1000}</v></c><c><v>0.12</v></c></row>`,
    );
    const table = await readWorkbook(archiveOf(workbookParts(sheetOf(rows.join('')))));

    expect(table.rows).toHaveLength(100_000);
    expect(table.rows.at(-1)).toEqual({ number: 100_000, cells: [399.999, 0.12] });
  });

  it('with no cell filled is empty', async () => {
    expect(await refusal(await written((workbook) => workbook.addWorksheet('a')))).toMatchObject({ code: 'EMPTY' });
  });
});

describe('a workbook made to harm', () => {
  const harmless = sheetOf('<row r="1"><c r="A1"><v>1</v></c></row>');
  const withPart = (part: ArchivePart): Buffer => archiveOf([...workbookParts(harmless), part]);
  const swollen = (mebibytes: number): string =>
    sheetOf(`<row r="1"><c r="A1"><v>${' '.repeat(mebibytes * 1024 * 1024)}</v></c></row>`);

  it('that unpacks to 300 MB is refused before anything is unpacked', async () => {
    const bomb = archiveOf(workbookParts(swollen(300)));

    expect(bomb.length).toBeLessThan(1024 * 1024);
    expect(await refusal(bomb)).toMatchObject({ code: 'WORKBOOK_TOO_LARGE' });
  });

  it('that claims to unpack to little is refused when more comes out', async () => {
    const parts = workbookParts(swollen(5)).map((part) =>
      part.name.endsWith('sheet1.xml') ? { ...part, claims: { unpackedBytes: 2000 } } : part,
    );

    expect(await refusal(archiveOf(parts))).toBeInstanceOf(UnreadableTable);
  });

  it('of too many parts is refused', async () => {
    const parts = Array.from({ length: 60 }, (_, i) => ({ name: `xl/media/${i}.png`, content: '' }));

    expect(await refusal(archiveOf([...workbookParts(harmless), ...parts]))).toMatchObject({
      code: 'WORKBOOK_TOO_LARGE',
    });
  });

  it.each([
    ['fetches a file', '<!DOCTYPE a [<!ENTITY x SYSTEM "file:///etc/passwd">]>'],
    ['multiplies a word', '<!DOCTYPE a [<!ENTITY x "ha"><!ENTITY y "&x;&x;&x;&x;">]>'],
  ])('whose document type %s is refused', async (_, doctype) => {
    const spoilt = workbookParts(`${doctype}${sheetOf('<row><c t="inlineStr"><is><t>&x;</t></is></c></row>')}`);

    expect(await refusal(archiveOf(spoilt))).toMatchObject({ code: 'WORKBOOK_UNSAFE' });
  });

  it.each<[string, ArchivePart, string]>([
    ['with macros', { name: 'xl/vbaProject.bin', content: 'x' }, 'WORKBOOK_UNSAFE'],
    ['behind a password', { name: 'xl/a.xml', content: 'x', encrypted: true }, 'WORKBOOK_UNSAFE'],
    ['with a part outside itself', { name: '../../etc/cron.d/x', content: 'x' }, 'WORKBOOK_DAMAGED'],
    ['with a link', { name: 'xl/link', content: '/etc/passwd', mode: 0o120777 }, 'WORKBOOK_DAMAGED'],
    ['with a part twice', { name: 'xl/workbook.xml', content: '<x/>' }, 'WORKBOOK_DAMAGED'],
  ])('%s is refused', async (_, part, code) => {
    expect(await refusal(withPart(part))).toMatchObject({ code });
  });

  it.each([
    ['an archive of something else', archiveOf([{ name: 'letter.txt', content: 'dear' }]), 'NOT_A_TABLE'],
    ['half a workbook', archiveOf(workbookParts(harmless)).subarray(0, 300), 'WORKBOOK_DAMAGED'],
    ['broken XML', archiveOf(workbookParts('<worksheet><sheetData><row>')), 'WORKBOOK_DAMAGED'],
    [
      'too wide a row',
      archiveOf(workbookParts(sheetOf('<row r="1"><c r="XFD1"><v>1</v></c></row>'))),
      'TOO_MANY_COLUMNS',
    ],
    [
      'a cell as long as a book',
      archiveOf(workbookParts(sheetOf(`<row><c t="inlineStr"><is><t>${'x'.repeat(5000)}</t></is></c></row>`))),
      'CELL_TOO_LONG',
    ],
  ])('%s is refused', async (_, bytes, code) => {
    expect(await refusal(bytes)).toMatchObject({ code });
  });

  it('of more rows than allowed is refused', async () => {
    const rows = '<row><c><v>1</v></c></row>'.repeat(200);

    expect(
      await refusal(archiveOf(workbookParts(sheetOf(rows))), { limits: { ...WORKBOOK_LIMITS, rows: 100 } }),
    ).toMatchObject({ code: 'TOO_MANY_ROWS' });
  });

  it('that exhausts the memory of its process, or its time, leaves this process alive', async () => {
    const texts = Array.from({ length: 400_000 }, (_, i) => `<si><t>${i}${'y'.repeat(200)}</t></si>`).join('');
    const greedy = archiveOf([
      ...workbookParts(harmless),
      { name: 'xl/sharedStrings.xml', content: `<sst>${texts}</sst>` },
    ]);
    const limits = { ...WORKBOOK_LIMITS, ratio: 10_000 };

    expect(await refusal(greedy, { limits, heapMiB: 24 })).toMatchObject({ code: 'WORKBOOK_TOO_LARGE' });
    expect(await refusal(greedy, { limits, wallMs: 100 })).toMatchObject({ code: 'WORKBOOK_TOO_SLOW' });
    expect((await readWorkbook(archiveOf(workbookParts(harmless)))).rows).toHaveLength(1);
  });
});
