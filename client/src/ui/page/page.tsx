import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { Fragment, type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { runningHeadRecipe, sectionRecipe } from '../recipes/page.recipe';
import { useCurrentSection } from './use-current-section';

export interface Crumb {
  readonly name: string;
  readonly to?: string;
}

interface PageProps {
  /** Of the browser's window; the name of the service is added. */
  readonly title: string;
  /** From the top to this page; the last one is this page. */
  readonly path: readonly Crumb[];
  /** Right in the running head: the state, then a date. */
  readonly folio?: ReactNode;
  readonly children: ReactNode;
}

/** One page: its running head and its leaf of sections. */
export function Page({ title, path, folio, children }: PageProps) {
  const styles = useSlotRecipe({ recipe: sectionRecipe })();
  const [current, ref] = useCurrentSection();
  return (
    <>
      <title>{`${title} · Diffolio`}</title>
      <RunningHead path={path} guide={current} folio={folio} />
      <chakra.main id="main" tabIndex={-1} css={styles.leaf} ref={ref}>
        {children}
      </chakra.main>
    </>
  );
}

interface RunningHeadProps {
  readonly path: readonly Crumb[];
  readonly guide: string;
  readonly folio: ReactNode;
}

function RunningHead({ path, guide, folio }: RunningHeadProps) {
  const styles = useSlotRecipe({ recipe: runningHeadRecipe })();
  const narrow = Math.max(0, path.length - 2);
  return (
    <chakra.div css={styles.root}>
      <chakra.nav css={styles.path} aria-label="Where you are">
        <ol>
          {path.map(({ name, to }, i) => (
            <li key={`${i} ${name}`} data-narrow={i === narrow ? '' : undefined}>
              {i < path.length - 1 && to !== undefined ? (
                <Link to={to}>{name}</Link>
              ) : (
                <span aria-current={i === path.length - 1 ? 'page' : undefined}>{name}</span>
              )}
            </li>
          ))}
        </ol>
      </chakra.nav>
      <chakra.p css={styles.guide} aria-hidden>
        {guide}
      </chakra.p>
      <chakra.div css={styles.folio}>{folio ?? <Fragment />}</chakra.div>
    </chakra.div>
  );
}
