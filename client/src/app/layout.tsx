import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { Outlet, ScrollRestoration, useNavigation } from 'react-router-dom';
import { appStrings } from '../strings/app';
import { uiStrings } from '../strings/ui';
import { footerRecipe } from '../ui/recipes/page.recipe';
import { Masthead } from './masthead';

/** Masthead, the page, footer. */
export function Layout() {
  const { state } = useNavigation();
  return (
    <>
      <chakra.a
        href="#main"
        position="absolute"
        left="-9999px"
        zIndex={10}
        background="paper"
        padding="8px 16px"
        _focus={{ left: '8px', top: '8px' }}
        onClick={(event) => {
          event.preventDefault();
          document.getElementById('main')?.focus();
        }}
      >
        {uiStrings.skip}
      </chakra.a>
      <Masthead />
      <div aria-busy={state === 'loading'}>
        <Outlet />
      </div>
      <Footer />
      <ScrollRestoration />
    </>
  );
}

function Footer() {
  const styles = useSlotRecipe({ recipe: footerRecipe })();
  return (
    <chakra.footer css={styles.root}>
      <p>{appStrings.footer.invented}</p>
      <p>
        Diffolio <span>{appStrings.footer.advice}</span>
      </p>
    </chakra.footer>
  );
}
