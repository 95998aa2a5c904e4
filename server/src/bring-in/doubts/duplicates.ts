import { doubt, type Issue } from '../issues.js';
import { cellText } from '../table.js';
import type { Judged } from './judged.js';

/** Rows that are the same in every column but the row number. The same T and P with another D is a replicate instead. */
export function duplicateDoubts(judged: Judged): Issue[] {
  const compared = judged.mapping.columns.flatMap(({ role }, column) => (role === 'ROW_NUMBER' ? [] : [column]));
  const seen = new Map<string, number>();
  return judged.rows.flatMap((row) => {
    const key = compared.map((column) => cellText(row.cells[column])).join('\0');
    const first = seen.get(key);
    if (first === undefined) {
      seen.set(key, row.number);
      return [];
    }
    const message = `The same as row ${first} in every column; nothing is wrong with the cells.`;
    return [
      doubt('DUPLICATE_ROW', { row: row.number, column: null }, message, {
        choices: [{ id: 'KEEP', label: 'keep both, two runs' }],
        suggested: 'LEAVE_OUT',
        sameAsRow: first,
      }),
    ];
  });
}
