import { parse } from 'csv-parse/sync';
import { sampleSheetFacts } from '../../test/builders/sheet-facts.js';
import { buildSheetContent } from './sheet-content.js';
import { csvLine, sheetCsv } from './sheet-csv.js';

const facts = sampleSheetFacts();
const content = buildSheetContent(facts);

function read(text: string): { identity: Map<string, string>; head: string[]; rows: number[][] } {
  const records: string[][] = parse(text, { relax_column_count: true, skip_empty_lines: true });
  const start = records.findIndex(([first]) => first === 'temperature_k');
  return {
    identity: new Map(records.slice(0, start).map(([label = '', value = '']) => [label, value])),
    head: records[start] ?? [],
    rows: records.slice(start + 1).map((row) => row.map(Number)),
  };
}

describe('CSV of a sheet', () => {
  const { identity, head, rows } = read(sheetCsv(content));

  it('says first what the numbers are, where they hold, and what U is', () => {
    expect(identity.get('Data sheet')).toBe('DS-0042');
    expect(identity.get('State')).toBe('released');
    expect(identity.get('CAS RN Ethanol')).toBe('64-17-5');
    expect(identity.get('Range in P')).toContain('stated');
    expect(identity.get('SHA-256')).toBe(facts.standing.contentHash);
  });

  it('names the unit in each column and keeps every digit', () => {
    expect(head).toEqual([
      'temperature_k',
      'pressure_pa',
      'diffusivity_m2_s',
      'standard_uncertainty_m2_s',
      'expanded_uncertainty_m2_s',
      'new_laboratory_half_width_m2_s',
    ]);
    expect(rows.map(([T]) => T)).toEqual(content.recommended.temperatures);
    expect(rows.map((row) => row[2])).toEqual(content.recommended.diffusivities);
    expect(rows.map((row) => row[4])).toEqual(content.recommended.expandedUncertainties);
  });

  it('says so in its state when the version is withdrawn', () => {
    const withdrawn = sampleSheetFacts({
      standing: {
        ...facts.standing,
        status: 'WITHDRAWN',
        withdrawnAt: '2026-12-01T00:00:00.000Z',
        withdrawalReason: 'Wrong unit',
      },
    });
    expect(read(sheetCsv(buildSheetContent(withdrawn))).identity.get('State')).toContain('Do not use its numbers');
  });
});

describe('a line of CSV', () => {
  it('keeps a text that a spreadsheet would run as a formula a text', () => {
    expect(csvLine(['=1+1', '+A1', '-2', '@x', '\tx'])).toBe("'=1+1,'+A1,'-2,'@x,'\tx\r\n");
  });

  it('leaves negative numbers numbers', () => {
    expect(csvLine([-1.5e-7, 2])).toBe('-1.5e-7,2\r\n');
  });

  it('quotes commas, quotes and line ends (RFC 4180, section 2)', () => {
    expect(csvLine(['a,b', 'say "D"', 'two\r\nlines'])).toBe('"a,b","say ""D""","two\r\nlines"\r\n');
  });
});
