import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { NoteMark, TickMark, WarnMark } from '../../ui/marks/marks';
import { statementsRecipe } from '../../ui/recipes/content.recipe';
import { type Statement } from './statements';

const MARKS = { met: TickMark, note: NoteMark, warning: WarnMark } as const;

/** In the margin: each a short paragraph behind its mark. */
export const MarginStatements = ({ statements }: { readonly statements: readonly Statement[] }) => (
  <>
    {statements.map(({ tone, verdict, reason }) => {
      const Mark = MARKS[tone];
      return (
        <chakra.p key={verdict} color={tone === 'warning' ? 'warn' : 'ink2'} paddingLeft="20px" textIndent="-20px">
          <Mark />
          {[verdict, reason].filter(Boolean).join(' ')}
        </chakra.p>
      );
    })}
  </>
);

/** Tests as sentences: mark, verdict, reason. */
export function Statements({ statements }: { readonly statements: readonly Statement[] }) {
  const styles = useSlotRecipe({ recipe: statementsRecipe })({ kind: 'verdicts' });
  return (
    <chakra.ul css={styles.root}>
      {statements.map(({ tone, verdict, reason }) => {
        const Mark = MARKS[tone];
        return (
          <chakra.li css={styles.item} key={verdict}>
            <span>
              <Mark />
            </span>
            <span>
              <b>{verdict}</b> {reason}
            </span>
          </chakra.li>
        );
      })}
    </chakra.ul>
  );
}
