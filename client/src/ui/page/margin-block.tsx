import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { type ReactNode } from 'react';
import { marginBlockRecipe } from '../recipes/page.recipe';

/** Label and value of a margin block; entries without a value are left away. */
export type MarginEntry = readonly [label: ReactNode, value: ReactNode];

interface MarginBlockProps {
  readonly title?: string;
  readonly entries?: readonly MarginEntry[];
  /** `files`: a link at the left and its size at the right. `news`: a date at the left. */
  readonly kind?: 'facts' | 'files' | 'news';
  readonly children?: ReactNode;
}

/** Where a thing came from: state, people, dates, provenance, downloads, hash. */
export function MarginBlock({ title, entries, kind = 'facts', children }: MarginBlockProps) {
  const styles = useSlotRecipe({ recipe: marginBlockRecipe })({ kind });
  const shown = entries?.filter(([, value]) => value !== null && value !== undefined && value !== false);
  return (
    <chakra.div css={styles.root}>
      {title !== undefined && <chakra.h3 css={styles.heading}>{title}</chakra.h3>}
      {shown !== undefined && shown.length > 0 && (
        <chakra.dl css={styles.list}>
          {shown.map(([label, value], i) => (
            <Entry key={i} label={label} value={value} />
          ))}
        </chakra.dl>
      )}
      {children}
    </chakra.div>
  );
}

const Entry = ({ label, value }: { readonly label: ReactNode; readonly value: ReactNode }) => (
  <>
    <dt>{label}</dt>
    <dd>{value}</dd>
  </>
);
