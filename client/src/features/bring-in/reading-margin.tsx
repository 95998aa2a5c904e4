import { counted } from '../../lib/counted';
import { fill } from '../../lib/fill';
import { formatBytes } from '../../lib/format-quantity';
import { bringInStrings } from '../../strings/bring-in';
import { MarginBlock, type MarginEntry } from '../../ui/page/margin-block';
import { DELIMITERS, type ReadAnswer } from './answer';
import { type Draft, readAgain, withMapping } from './draft';
import { HeadSelect } from './head-select';

const words = bringInStrings.margin;
const choiceOf = bringInStrings.understood;
/** Titles and remarks may stand above a header. */
const HEADER_ROWS = 12;

interface ReadingMarginProps {
  readonly draft: Draft;
  readonly onDraft: (draft: Draft) => void;
  readonly answer: ReadAnswer;
}

/** How the table was read; each finding can be corrected, and the table is then read again. */
export function ReadingMargin({ draft, onDraft, answer }: ReadingMarginProps) {
  const { source } = answer;
  const entries: MarginEntry[] = [
    [words.brought, broughtWords(draft)],
    [words.found, `${counted(words.columns, source.columnCount)}, ${counted(words.rows, source.rowCount)}`],
    [words.header, <HeaderChoice key="header" draft={draft} onDraft={onDraft} answer={answer} />],
    [
      words.decimals,
      <HeadSelect
        key="decimal"
        label={choiceOf.decimalOf}
        value={source.decimal}
        choices={[
          ['.', words.point],
          [',', words.comma],
        ]}
        onChange={(decimal) => onDraft(readAgain(draft, { decimal }))}
      />,
    ],
    [
      words.between,
      source.delimiter !== null && draft.way !== 'TYPE' && (
        <HeadSelect
          label={choiceOf.betweenOf}
          value={source.delimiter}
          choices={DELIMITERS.map((one) => [one, bringInStrings.delimiters[one]] as const)}
          onChange={(delimiter) => onDraft(readAgain(draft, { delimiter }))}
        />
      ),
    ],
    [
      words.sheet,
      source.sheets.length > 1 && (
        <HeadSelect
          label={choiceOf.sheetOf}
          value={source.sheet ?? ''}
          choices={source.sheets.map((one) => [one, one] as const)}
          onChange={(sheet) => onDraft(readAgain(draft, { sheet }))}
        />
      ),
    ],
    [words.encoding, draft.way === 'UPLOAD' && source.encoding],
    [words.sha, draft.way === 'UPLOAD' && draft.file?.sha256.slice(0, 16)],
  ];
  return <MarginBlock entries={entries} />;
}

function broughtWords({ way, file, text }: Draft): string {
  if (way === 'TYPE') return words.typed;
  if (way === 'PASTE') return fill(words.pasted, { size: formatBytes(new Blob([text]).size) });
  return file === null ? '' : fill(words.file, { name: file.name, size: formatBytes(file.size) });
}

function HeaderChoice({ draft, onDraft, answer: { mapping, rows } }: ReadingMarginProps) {
  const last = Math.max(HEADER_ROWS, mapping.headerRow ?? 0, rows[0]?.number ?? 0);
  const rowNumbers = Array.from({ length: last }, (_, i) => String(i + 1));
  return (
    <HeadSelect
      label={choiceOf.headerOf}
      value={String(mapping.headerRow ?? 0)}
      choices={[['0', words.noHeader] as const, ...rowNumbers.map((n) => [n, fill(words.headerRow, { n })] as const)]}
      onChange={(row) =>
        onDraft({
          ...withMapping(draft, { ...mapping, headerRow: row === '0' ? null : Number(row) }, null),
          decisions: {},
        })
      }
    />
  );
}
