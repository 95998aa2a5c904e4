import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { type ReactNode } from 'react';
import { SeriesKey } from '../marks/series-key';
import { figureRecipe } from '../recipes/content.recipe';

interface SeriesKeyEntry {
  readonly index: number;
  readonly open: boolean;
  readonly name: ReactNode;
}

export type LineKeyKind = 'fit' | 'band' | 'prediction' | 'estimate1' | 'estimate2' | 'estimate3';

interface FigureKeysProps {
  readonly series?: readonly SeriesKeyEntry[];
  readonly lines?: readonly { readonly kind: LineKeyKind; readonly name: ReactNode }[];
}

/** What the shapes and lines of a figure stand for. */
export function FigureKeys({ series = [], lines = [] }: FigureKeysProps) {
  const styles = useSlotRecipe({ recipe: figureRecipe })();
  return (
    <>
      {series.length > 0 && (
        <chakra.ul css={styles.keys}>
          {series.map(({ index, open, name }, i) => (
            <li key={i}>
              <SeriesKey index={index} open={open} />
              {name}
            </li>
          ))}
        </chakra.ul>
      )}
      {lines.length > 0 && (
        <chakra.ul css={styles.keys}>
          {lines.map(({ kind, name }) => (
            <li key={kind}>
              <chakra.span css={styles.line} data-kind={kind} aria-hidden />
              {name}
            </li>
          ))}
        </chakra.ul>
      )}
    </>
  );
}
