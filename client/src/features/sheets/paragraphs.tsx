import { type TextRun } from '../../lib/typeset';
import { Runs } from '../../ui/numbers/typeset';

/** Typeset paragraphs. */
export const Paragraphs = ({ paragraphs }: { readonly paragraphs: readonly (readonly TextRun[])[] }) => (
  <>
    {paragraphs.map((runs, i) => (
      <p key={i}>
        <Runs runs={runs} />
      </p>
    ))}
  </>
);
