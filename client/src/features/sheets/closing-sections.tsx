import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { type SheetTextFragment } from '../../gql/graphql';
import { paths } from '../../lib/paths';
import { sheetStrings } from '../../strings/sheets';
import { WordButton } from '../../ui/form/button';
import { StateMark, stateOf } from '../../ui/marks/state-mark';
import { Runs } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Section } from '../../ui/page/section';
import { statementsRecipe } from '../../ui/recipes/content.recipe';
import { DataTable, type DataColumn } from '../../ui/table/data-table';
import { Paragraphs } from './paragraphs';

interface SectionProps {
  readonly number: number;
  readonly title: string;
  readonly content: SheetTextFragment;
}

/** What the uncertainty is, in full, and what D is. */
export const UncertaintySection = ({ number, title, content }: SectionProps) => (
  <Section number={number} title={title} id="uncertainty">
    <Paragraphs
      paragraphs={[content.definition, ...content.uncertainty.statement, ...content.uncertainty.notIncluded]}
    />
  </Section>
);

export function CautionsSection({ number, title, content }: SectionProps) {
  const styles = useSlotRecipe({ recipe: statementsRecipe })({ kind: 'cautions' });
  return (
    <Section number={number} title={title} id="cautions">
      <chakra.ul css={styles.root}>
        {content.cautions.map((runs, i) => (
          <chakra.li key={i} css={styles.item}>
            <Runs runs={runs} />
          </chakra.li>
        ))}
      </chakra.ul>
    </Section>
  );
}

export function CitationSection({ number, title, content }: SectionProps) {
  const words = sheetStrings.citation;
  const [copied, setCopied] = useState(false);
  const copy = async () => {
    await navigator.clipboard.writeText(content.citation.plain);
    setCopied(true);
  };
  return (
    <Section
      number={number}
      title={title}
      id="citation"
      margin={
        <MarginBlock>
          <p>
            <WordButton onClick={() => void copy()}>{words.copy}</WordButton>{' '}
            <span role="status">{copied ? words.copied : ''}</span>
          </p>
        </MarginBlock>
      }
    >
      <chakra.p borderLeft="1.5px solid" borderColor="control" paddingLeft="18px">
        <Runs runs={content.citation.runs} />
      </chakra.p>
    </Section>
  );
}

type VersionRow = SheetTextFragment['versions'][number];

/** All versions the reader may see, newest first; this one in weight 600. */
export function VersionsSection({
  number,
  title,
  content,
  code,
  file,
}: SectionProps & { readonly code: string; readonly file: string }) {
  const words = sheetStrings.versions;
  const columns: DataColumn<VersionRow>[] = [
    {
      id: 'number',
      head: words.version,
      name: words.version,
      value: (row) => row.number,
      cell: (row) => (row.isThis ? row.number : <Link to={paths.version(code, row.number)}>{row.number}</Link>),
    },
    {
      id: 'state',
      head: words.state,
      name: words.state,
      value: (row) => row.word,
      cell: (row) => <StateMark state={stateOf(row.status as Uppercase<string>)}>{row.word}</StateMark>,
    },
    {
      id: 'date',
      head: words.date,
      name: words.date,
      value: (row) => row.date ?? '',
      cell: (row) => <chakra.span whiteSpace="nowrap">{row.datePrinted || words.notYet}</chakra.span>,
    },
    {
      id: 'change',
      head: words.change,
      name: words.change,
      value: (row) => row.change,
      cell: (row) => <chakra.span fontWeight={400}>{row.change}</chakra.span>,
    },
  ];
  return (
    <Section number={number} title={title} id="versions">
      <DataTable
        label={title}
        columns={columns}
        rows={content.versions}
        rowId={(row) => row.number}
        file={`${file}-versions`}
        filterable={false}
        emphasised={(row) => row.isThis}
      />
    </Section>
  );
}
