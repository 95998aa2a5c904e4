import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { type ReactNode } from 'react';
import { sectionRecipe } from '../recipes/page.recipe';

interface OpeningProps {
  readonly title: ReactNode;
  /** The smaller title of pages one works on. */
  readonly small?: boolean;
  readonly lead?: ReactNode;
  /** Blocks of the margin. */
  readonly margin?: ReactNode;
  readonly children?: ReactNode;
}

/** The first leaf of a page: its title and lead, and the first blocks of the margin. */
export function Opening({ title, small = false, lead, margin, children }: OpeningProps) {
  const styles = useSlotRecipe({ recipe: sectionRecipe })({ gap: small ? 'small' : 'title' });
  return (
    <chakra.section css={styles.root}>
      <chakra.div css={styles.column}>
        <chakra.h1
          textStyle={
            small ? { base: 'heading1Small', md: 'heading1' } : { base: 'titleSmall', md: 'titleMedium', lg: 'title' }
          }
          marginLeft={{ base: '-2px', md: small ? '-2px' : '-3px' }}
        >
          {title}
        </chakra.h1>
        {lead !== undefined && (
          <chakra.p
            css={{ '&&': { maxWidth: '760px' } }}
            textStyle={{ base: 'leadSmall', md: 'lead' }}
            color="ink2"
            marginTop={{ base: '12px', md: small ? '10px' : '18px' }}
          >
            {lead}
          </chakra.p>
        )}
        {children}
      </chakra.div>
      {margin !== undefined && <chakra.aside css={styles.margin}>{margin}</chakra.aside>}
    </chakra.section>
  );
}

interface SectionProps {
  /** Hangs left of the column; sections of forms have none. */
  readonly number?: number;
  readonly title: string;
  /** Of the address: `#correlation`. */
  readonly id: string;
  readonly tight?: boolean;
  readonly margin?: ReactNode;
  readonly children: ReactNode;
}

/** A section: hanging number, title, content, and in the margin where it came from. */
export function Section({ number, title, id, tight = false, margin, children }: SectionProps) {
  const styles = useSlotRecipe({ recipe: sectionRecipe })({ gap: tight ? 'tight' : 'normal' });
  const named = number === undefined ? title : `${number} ${title}`;
  return (
    <chakra.section css={styles.root} id={id} aria-labelledby={`${id}-title`} data-section={named}>
      {number !== undefined && (
        <chakra.span css={styles.number} aria-hidden>
          {number}
        </chakra.span>
      )}
      <chakra.div css={styles.column}>
        <chakra.h2 css={styles.heading} id={`${id}-title`}>
          <a href={`#${id}`}>{title}</a>
        </chakra.h2>
        {children}
      </chakra.div>
      {margin !== undefined && <chakra.aside css={styles.margin}>{margin}</chakra.aside>}
    </chakra.section>
  );
}
