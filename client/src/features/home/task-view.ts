import { type TaskFieldsFragment } from '../../gql/graphql';
import { fill } from '../../lib/fill';
import { paths } from '../../lib/paths';
import { homeStrings } from '../../strings/home';
import { stateOf, type State } from '../../ui/marks/state-mark';

/** A task as it is read: what, why, and where it is done. */
export interface TaskView {
  readonly key: string;
  readonly role: 'RESEARCHER' | 'EDITOR';
  readonly since: string;
  readonly what: string;
  readonly why: string;
  readonly act: string;
  readonly to: string;
  /** The thing itself, for lists of what waits on others. */
  readonly thing: string;
  readonly state: State;
}

const pairName = (substances: readonly { readonly name: string }[] = []): string =>
  substances.map(({ name }) => name).join(' + ');

export function taskView(task: TaskFieldsFragment): TaskView {
  const { series, version } = task;
  const words = homeStrings.tasks[task.kind];
  const pair = pairName(series?.pair.substances ?? version?.sheet.pair.substances);
  const values = {
    pair,
    title: series?.title ?? '',
    number: version?.number ?? '',
    by: series?.submittedBy?.name ?? version?.preparedBy?.name ?? homeStrings.unknown,
    remark: task.remark ?? '',
  };
  return {
    key: `${task.kind} ${series?.id ?? version?.id ?? ''}`,
    role: words.role,
    since: task.since,
    what: fill(words.what, values),
    why: fill(words.why, values),
    act: words.act,
    to: placeOf(task),
    thing: series ? fill(homeStrings.series, values) : fill(homeStrings.version, { ...values, pair: capital(pair) }),
    state: stateOf(series?.status ?? version?.status ?? 'DRAFT'),
  };
}

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

/** Where the task is done. */
function placeOf({ kind, series, version }: TaskFieldsFragment): string {
  if (series) return paths.series(series.id);
  if (!version) return paths.home();
  if (kind === 'REVIEW_VERSION') return paths.review(version.id);
  if (kind === 'RELEASE_VERSION') return paths.releaseVersion(version.id);
  return paths.editVersion(version.id);
}
