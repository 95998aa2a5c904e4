import { chakra, type SystemStyleObject } from '@chakra-ui/react';
import { useId, useState, type ReactNode } from 'react';
import { saveCsv, toTabs, type PlainTable } from '../../lib/delimited';
import { uiStrings } from '../../strings/ui';
import { WordButton } from '../form/button';

interface TableToolsProps {
  readonly styles: Readonly<Record<'foot' | 'filter', SystemStyleObject>>;
  readonly label: string;
  readonly file: string;
  readonly plain: () => PlainTable;
  /** Null where the table is too short to be filtered. */
  readonly filter: string | null;
  readonly onFilter: (text: string) => void;
  readonly allColumns?: boolean;
  readonly onAllColumns?: (all: boolean) => void;
  readonly children?: ReactNode;
}

/** Filter, copy and CSV under a table. */
export function TableTools({
  styles,
  label,
  file,
  plain,
  filter,
  onFilter,
  allColumns,
  onAllColumns,
  children,
}: TableToolsProps) {
  const id = useId();
  const [copied, setCopied] = useState(false);
  const copy = async () => {
    await navigator.clipboard.writeText(toTabs(plain()));
    setCopied(true);
  };
  return (
    <chakra.div css={styles.foot}>
      {filter !== null && (
        <chakra.span css={styles.filter}>
          <label htmlFor={id}>{uiStrings.filter}</label>
          <chakra.input
            id={id}
            type="search"
            value={filter}
            onChange={(event) => onFilter(event.target.value)}
            background="none"
            borderBottom="1px solid"
            borderColor="control"
            width="150px"
          />
        </chakra.span>
      )}
      <WordButton onClick={() => void copy()} aria-label={`${uiStrings.copy}: ${label}`}>
        {uiStrings.copy}
      </WordButton>
      <WordButton onClick={() => saveCsv(file, plain())} aria-label={`CSV: ${label}`}>
        CSV
      </WordButton>
      {onAllColumns !== undefined && (
        <chakra.span hideFrom="md">
          <WordButton aria-pressed={allColumns} onClick={() => onAllColumns(!allColumns)}>
            {allColumns ? uiStrings.fewerColumns : uiStrings.allColumns}
          </WordButton>
        </chakra.span>
      )}
      {children}
      <span role="status">{copied ? uiStrings.copied : ''}</span>
    </chakra.div>
  );
}
