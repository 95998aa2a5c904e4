import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useState } from 'react';
import { Link, NavLink, useNavigate } from 'react-router-dom';
import { toggleEdition, useEdition } from '../lib/edition';
import { paths } from '../lib/paths';
import { signOut, usePerson } from '../lib/session';
import { appStrings } from '../strings/app';
import { mastheadRecipe } from '../ui/recipes/page.recipe';
import { navigationFor } from './navigation';
import { UnitsMenu } from './units-menu';

const words = appStrings.masthead;

/** Wordmark, words, search, units, edition, person. No icons. */
export function Masthead() {
  const styles = useSlotRecipe({ recipe: mastheadRecipe })();
  const person = usePerson();
  const edition = useEdition();
  const [menuOpen, setMenuOpen] = useState(false);
  const open = menuOpen ? '' : undefined;
  const close = () => setMenuOpen(false);
  return (
    <chakra.header css={styles.root}>
      <chakra.a asChild css={styles.word}>
        <Link to={paths.catalogue()} aria-label={words.home} onClick={close}>
          <i>D</i>iffolio
        </Link>
      </chakra.a>
      <chakra.nav css={styles.nav} aria-label={words.main} data-open={open}>
        {navigationFor(person).map(({ to, name, end }) => (
          <chakra.a asChild css={styles.link} key={to}>
            <NavLink to={to} end={end ?? false} onClick={close}>
              {name}
            </NavLink>
          </chakra.a>
        ))}
      </chakra.nav>
      <Find open={open} onFound={close} />
      <chakra.div css={styles.preferences} data-open={open}>
        <UnitsMenu />
        <chakra.button type="button" css={styles.preference} onClick={toggleEdition}>
          {edition === 'day' ? words.nightEdition : words.dayEdition}
        </chakra.button>
        {person === null ? (
          <chakra.a asChild css={styles.preference}>
            <Link to={paths.signIn()} onClick={close}>
              {words.signIn}
            </Link>
          </chakra.a>
        ) : (
          <SignedIn name={person.name} onDone={close} />
        )}
      </chakra.div>
      <chakra.button type="button" css={styles.menu} aria-expanded={menuOpen} onClick={() => setMenuOpen(!menuOpen)}>
        {words.contents}
      </chakra.button>
    </chakra.header>
  );
}

function Find({ open, onFound }: { readonly open: string | undefined; readonly onFound: () => void }) {
  const styles = useSlotRecipe({ recipe: mastheadRecipe })();
  const navigate = useNavigate();
  const find = (form: FormData) => {
    const text = form.get('find');
    if (typeof text !== 'string' || text.trim() === '') return;
    onFound();
    void navigate(paths.catalogue(text.trim()));
  };
  return (
    <chakra.search css={styles.find} data-open={open}>
      <form action={find}>
        <input type="search" name="find" aria-label={words.find} placeholder={words.find} autoComplete="off" />
      </form>
    </chakra.search>
  );
}

function SignedIn({ name, onDone }: { readonly name: string; readonly onDone: () => void }) {
  const styles = useSlotRecipe({ recipe: mastheadRecipe })();
  const navigate = useNavigate();
  const leave = async () => {
    onDone();
    await signOut();
    await navigate(paths.catalogue());
  };
  return (
    <>
      <chakra.a asChild css={styles.preference}>
        <Link to={paths.home()} onClick={onDone}>
          {name}
        </Link>
      </chakra.a>
      <chakra.button type="button" css={styles.preference} onClick={() => void leave()}>
        {words.signOut}
      </chakra.button>
    </>
  );
}
