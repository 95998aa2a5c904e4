import type { TextRun, TextStyle } from './typeset.types.js';

/** `**strong**`, `*quantity*`, `_{sub}`, `^{super}`, `{name of a value}` */
const MARK = /\*\*([^*]+)\*\*|\*([^*]+)\*|_\{([^}]*)\}|\^\{([^}]*)\}|\{(\w+)\}/g;
const STYLE_OF_GROUP: readonly TextStyle[] = ['STRONG', 'QUANTITY', 'SUBSCRIPT', 'SUPERSCRIPT'];

/**
 * Runs of a marked-up sentence. What people typed comes in as a value, is never read as mark-up and stays plain.
 *
 * @param markup sentence of the project's own strings
 * @param values for each `{name}`: a text, or runs set before
 * @throws {RangeError} when a value is missing
 */
export function typeset(markup: string, values: Readonly<Record<string, string | TextRun[]>> = {}): TextRun[] {
  const runs: TextRun[] = [];
  let end = 0;
  for (const match of markup.matchAll(MARK)) {
    append(runs, { text: markup.slice(end, match.index), style: 'PLAIN' });
    end = match.index + match[0].length;
    const name = match[5];
    if (name === undefined) {
      const group = match.slice(1, 5).findIndex((text) => text !== undefined);
      append(runs, { text: match[group + 1] ?? '', style: STYLE_OF_GROUP[group] ?? 'PLAIN' });
      continue;
    }
    const value = values[name];
    if (value === undefined) throw new RangeError(`no value for {${name}}`);
    for (const run of typeof value === 'string' ? plain(value) : value) append(runs, run);
  }
  append(runs, { text: markup.slice(end), style: 'PLAIN' });
  return runs;
}

export const plain = (text: string): TextRun[] => (text === '' ? [] : [{ text, style: 'PLAIN' }]);

/** The runs as one plain text. */
export const plainText = (runs: readonly TextRun[]): string => runs.map((run) => run.text).join('');

/** A chemical formula with its digits as subscripts: C2H6O. */
export function typesetFormula(formula: string): TextRun[] {
  const runs: TextRun[] = [];
  for (const [text] of formula.matchAll(/\d+|\D+/g)) {
    append(runs, { text, style: /\d/.test(text) ? 'SUBSCRIPT' : 'PLAIN' });
  }
  return runs;
}

function append(runs: TextRun[], run: TextRun): void {
  if (run.text === '') return;
  const last = runs.at(-1);
  if (last?.style === run.style) runs[runs.length - 1] = { text: last.text + run.text, style: run.style };
  else runs.push(run);
}
