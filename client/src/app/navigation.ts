import { paths } from '../lib/paths';
import { hasRole, type SignedInPerson } from '../lib/session';
import { appStrings } from '../strings/app';

interface NavigationEntry {
  readonly to: string;
  readonly name: string;
  /** Only this address, not those below it. */
  readonly end?: boolean;
}

const words = appStrings.navigation;

/** The words of the masthead: what everyone reads, and what a person's roles add. */
export function navigationFor(person: SignedInPerson | null): NavigationEntry[] {
  const sheets = { to: paths.catalogue(), name: words.sheets, end: true };
  const substances = { to: paths.substances(), name: words.substances };
  if (person === null) return [sheets, substances, { to: paths.apiGuide(), name: words.apiGuide }];
  const entries: NavigationEntry[] = [{ to: paths.home(), name: words.home }, sheets];
  if (hasRole(person, 'RESEARCHER', 'EDITOR')) {
    entries.push({ to: paths.pairs(), name: words.pairs }, { to: paths.seriesList(), name: words.series });
  }
  entries.push(substances, { to: paths.apiGuide(), name: words.api });
  if (hasRole(person, 'ADMINISTRATOR')) {
    entries.push({ to: paths.people(), name: words.people }, { to: paths.mail(), name: words.mail });
  }
  return entries;
}
