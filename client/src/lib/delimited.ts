/** A table's cells as text, ready for a spreadsheet. */
export interface PlainTable {
  readonly head: readonly string[];
  readonly rows: readonly (readonly (string | number | null)[])[];
}

/** CSV after RFC 4180: comma, CRLF, quotes doubled. A text that a spreadsheet would run as a formula is preceded by an apostrophe. */
export const toCsv = (table: PlainTable): string =>
  [table.head, ...table.rows].map((row) => row.map(csvCell).join(',')).join('\r\n') + '\r\n';

/** Tab-separated, as a spreadsheet takes it from the clipboard. */
export const toTabs = (table: PlainTable): string =>
  [table.head, ...table.rows]
    .map((row) => row.map((cell) => harmless(cell).replace(/[\t\r\n]+/g, ' ')).join('\t'))
    .join('\n');

function csvCell(cell: string | number | null): string {
  const text = harmless(cell);
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}

function harmless(cell: string | number | null): string {
  if (cell === null) return '';
  if (typeof cell === 'number') return String(cell);
  return /^[=+\-@\t\r]/.test(cell) && Number.isNaN(Number(cell)) ? `'${cell}` : cell;
}

/** Hands `content` to the reader as a file. */
export function saveFile(name: string, content: Blob | string, type = 'text/plain;charset=utf-8'): void {
  const url = URL.createObjectURL(typeof content === 'string' ? new Blob([content], { type }) : content);
  const link = document.createElement('a');
  link.href = url;
  link.download = name;
  link.click();
  // The browser may still be reading the blob when click() returns.
  setTimeout(() => URL.revokeObjectURL(url), 60_000);
}

export const saveCsv = (name: string, table: PlainTable): void =>
  saveFile(`${name}.csv`, toCsv(table), 'text/csv;charset=utf-8');
