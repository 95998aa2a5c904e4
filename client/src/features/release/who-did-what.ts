import { type VersionAtReleaseFragment } from '../../gql/graphql';
import { fill } from '../../lib/fill';
import { versionStrings } from '../../strings/versions';

const words = versionStrings.release;

/** One act on the way to release. */
export interface Act {
  readonly id: string;
  readonly act: string;
  readonly person: string;
  /** ISO; null for the act that is about to happen. */
  readonly at: string | null;
  /** What is sound about it; null where there is nothing to check. */
  readonly check: string | null;
}

type Version = Pick<VersionAtReleaseFragment, 'events' | 'preparedBy'>;

/** Everything that was done to the version, changes in a row once, and last the release by the reader. */
export function acts(
  { events, preparedBy }: Version,
  reader: { readonly id: string; readonly name: string } | null,
): Act[] {
  const told = events.filter((event, i) => event.action !== 'change' || events[i + 1]?.action !== 'change');
  const names: Readonly<Record<string, string>> = versionStrings.actions;
  const done = told.map((event, i): Act => ({
    id: `${i} ${event.at}`,
    act: names[event.action] ?? event.action,
    person: event.person.name,
    at: event.at,
    check: event.action === 'approve' && event.person.id !== preparedBy?.id ? words.independentReview : null,
  }));
  if (reader === null) return done;
  const check = reader.id === preparedBy?.id ? null : words.independentRelease;
  return [...done, { id: 'now', act: words.releases, person: fill(words.you, { name: reader.name }), at: null, check }];
}
