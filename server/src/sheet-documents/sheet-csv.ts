import type { SheetContent } from './sheet-content.types.js';
import { sheetStrings } from './sheet-strings.js';
import { plainText } from './typeset.js';

const { csv } = sheetStrings;

/**
 * The recommended values as CSV (RFC 4180, UTF-8): first what the numbers are, a label and a text on each line, then an empty
 * line, the head, and the columns with every digit, in SI.
 */
export function sheetCsv(content: SheetContent): string {
  const { recommended } = content;
  const columns: readonly (readonly [string, readonly number[]])[] = [
    [csv.columns.temperature, recommended.temperatures],
    [csv.columns.pressure, recommended.temperatures.map(() => recommended.pressure)],
    [csv.columns.diffusivity, recommended.diffusivities],
    [csv.columns.standardUncertainty, recommended.standardUncertainties],
    [csv.columns.expandedUncertainty, recommended.expandedUncertainties],
    ...(recommended.newLaboratoryHalfWidths === null
      ? []
      : [[csv.columns.newLaboratory, recommended.newLaboratoryHalfWidths] as const]),
  ];
  const rows: readonly (readonly (string | number)[])[] = [
    ...identityOf(content),
    [],
    columns.map(([name]) => name),
    ...recommended.temperatures.map((_, i) => columns.map(([, values]) => values[i] ?? '')),
  ];
  return rows.map(csvLine).join('');
}

function identityOf(content: SheetContent): (readonly [string, string])[] {
  const { standing, citation, range, uncertainty } = content;
  const state = standing.banner === null ? standing.word : `${standing.word}. ${standing.banner}`;
  const optional = (label: string, value: string | null): (readonly [string, string])[] =>
    value === null ? [] : [[label, value]];
  return [
    [csv.sheet, content.code],
    [csv.version, content.number],
    [csv.state, state],
    [csv.pair, content.title],
    ...content.substances.flatMap(({ name, casNumber }) => optional(`${csv.casNumber} ${name}`, casNumber)),
    [csv.correlation, content.correlation.expression],
    [csv.temperature, range.temperaturePrinted],
    [csv.pressure, range.pressurePrinted],
    ...uncertainty.statement.map((paragraph) => [csv.statement, plainText(paragraph)] as const),
    ...uncertainty.notIncluded.map((paragraph) => [csv.notIncluded, plainText(paragraph)] as const),
    ...content.cautions.map((caution) => [csv.caution, plainText(caution)] as const),
    ...optional(csv.doi, citation.doi),
    ...optional(csv.hash, standing.contentHash),
  ];
}

/** One record: numbers bare, texts quoted where they must be, and never able to run as a formula. */
export const csvLine = (cells: readonly (string | number)[]): string =>
  `${cells.map((cell) => (typeof cell === 'number' ? String(cell) : csvText(cell))).join(',')}\r\n`;

/**
 * A text cell. A spreadsheet takes a text that begins with one of `= + - @`, a tab or a return for a formula; an apostrophe
 * before it keeps it a text (OWASP, CSV Injection). Numbers are written as numbers and need no such care.
 */
function csvText(text: string): string {
  const safe = /^[=+\-@\t\r]/.test(text) ? `'${text}` : text;
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}
