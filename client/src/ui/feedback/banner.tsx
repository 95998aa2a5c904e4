import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { type ReactNode } from 'react';
import { bannerRecipe } from '../recipes/content.recipe';

interface BannerProps {
  /** `ruled` for what is merely older; `warning` for what must not be used as it stands. */
  readonly tone?: 'ruled' | 'warning';
  /** The mark and its word. */
  readonly mark: ReactNode;
  /** Announced as soon as it appears. */
  readonly live?: boolean;
  readonly children: ReactNode;
}

/** What the reader must know before the content: superseded, withdrawn, outside the range. */
export function Banner({ tone = 'ruled', mark, live = false, children }: BannerProps) {
  const styles = useSlotRecipe({ recipe: bannerRecipe })({ tone });
  return (
    <chakra.div css={styles.root} role={live ? 'status' : 'note'}>
      <chakra.div css={styles.mark}>{mark}</chakra.div>
      <chakra.div css={styles.words}>{children}</chakra.div>
    </chakra.div>
  );
}
