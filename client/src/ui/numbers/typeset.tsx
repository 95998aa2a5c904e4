import { chakra } from '@chakra-ui/react';
import { formulaRuns, typeset, type TextRun } from '../../lib/typeset';

/** Typeset text: quantities italic, labels below and exponents above the line. */
export const Runs = ({ runs }: { readonly runs: readonly TextRun[] }) => (
  <>
    {runs.map((run, i) => (
      <Run key={i} run={run} />
    ))}
  </>
);

function Run({ run: { text, style } }: { readonly run: TextRun }) {
  switch (style) {
    case 'PLAIN':
      return <>{text}</>;
    case 'STRONG':
      return <chakra.b fontWeight={600}>{text}</chakra.b>;
    case 'QUANTITY':
      return <i>{text}</i>;
    case 'SUBSCRIPT':
      return <sub>{text}</sub>;
    case 'SUPERSCRIPT':
      return <sup>{text}</sup>;
  }
}

interface TypesetProps {
  /** With the marks of `typeset`. */
  readonly children: string;
  readonly values?: Readonly<Record<string, string | number>>;
}

/** One of the client's own sentences, set. */
export const Typeset = ({ children, values }: TypesetProps) => <Runs runs={typeset(children, values)} />;

/** A formula: C₂H₆O. */
export const Formula = ({ children }: { readonly children: string }) => <Runs runs={formulaRuns(children)} />;
