import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { codeRecipe } from './recipes/content.recipe';

interface CodeProps {
  readonly children: string;
  /** Words set in iodine: the sheet and the version. */
  readonly marked?: readonly string[];
  readonly label: string;
}

const COMMENT = /^(\s*)((?:#|\/\/|%) .*)$/;

/** Code as it is copied: comments in second ink, what it is about in iodine. Scrolls inside itself. */
export function Code({ children, marked = [], label }: CodeProps) {
  const styles = useSlotRecipe({ recipe: codeRecipe })();
  return (
    <chakra.pre css={styles.root} tabIndex={0} role="region" aria-label={label}>
      <chakra.code fontSize="inherit" lineHeight="inherit">
        {children.split('\n').map((line, i) => (
          <Line key={i} line={line} marked={marked} isFirst={i === 0} />
        ))}
      </chakra.code>
    </chakra.pre>
  );
}

function Line({
  line,
  marked,
  isFirst,
}: {
  readonly line: string;
  readonly marked: readonly string[];
  readonly isFirst: boolean;
}) {
  const [, indent = '', comment] = COMMENT.exec(line) ?? [];
  const start = isFirst ? '' : '\n';
  if (comment !== undefined) {
    return (
      <>
        {start + indent}
        <span className="comment">{comment}</span>
      </>
    );
  }
  const parts =
    marked.length === 0
      ? [line]
      : line.split(new RegExp(`(${marked.map((word) => word.replace(/[.*+?^${}()|[\]\\]/g, '\\$&')).join('|')})`));
  return (
    <>
      {start}
      {parts.map((part, i) => (i % 2 === 1 ? <b key={i}>{part}</b> : part))}
    </>
  );
}
