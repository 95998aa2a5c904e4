/** How a piece of text is set: quantities are italic, units, numbers and labels upright. */
export type TextStyle = 'PLAIN' | 'STRONG' | 'QUANTITY' | 'SUBSCRIPT' | 'SUPERSCRIPT';

/** A piece of text in one style. */
export interface TextRun {
  readonly text: string;
  readonly style: TextStyle;
}

/** `**strong**`, `*quantity*`, `_{sub}`, `^{super}`, `{name of a value}` */
const MARK = /\*\*([^*]+)\*\*|\*([^*]+)\*|_\{([^}]*)\}|\^\{([^}]*)\}|\{(\w+)\}/g;
const STYLES: readonly TextStyle[] = ['STRONG', 'QUANTITY', 'SUBSCRIPT', 'SUPERSCRIPT'];

/**
 * The runs of one of the client's own sentences. What people typed comes in as a value and is never read as mark-up.
 *
 * @param markup sentence with marks as above
 * @param values for each `{name}`; one that is missing stays empty
 */
export function typeset(markup: string, values: Readonly<Record<string, string | number>> = {}): TextRun[] {
  const runs: TextRun[] = [];
  let end = 0;
  for (const match of markup.matchAll(MARK)) {
    runs.push({ text: markup.slice(end, match.index), style: 'PLAIN' });
    end = match.index + match[0].length;
    const group = match.slice(1, 5).findIndex((text) => text !== undefined);
    const style = STYLES[group];
    if (style === undefined) runs.push({ text: String(values[match[5] ?? ''] ?? ''), style: 'PLAIN' });
    else runs.push({ text: match[group + 1] ?? '', style });
  }
  runs.push({ text: markup.slice(end), style: 'PLAIN' });
  return runs.filter((run) => run.text !== '');
}

/** The runs as one plain text. */
export const plainText = (runs: readonly TextRun[]): string => runs.map((run) => run.text).join('');

/** A chemical formula with its digits below the line. */
export const formulaRuns = (formula: string): TextRun[] =>
  formula
    .split(/(\d+)/)
    .map((text, i): TextRun => ({ text, style: i % 2 === 1 ? 'SUBSCRIPT' : 'PLAIN' }))
    .filter((run) => run.text !== '');
