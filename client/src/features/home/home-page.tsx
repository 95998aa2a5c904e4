import { useQuery } from '@apollo/client/react';
import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { HomeDocument } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { formatDate } from '../../lib/format-quantity';
import { paths } from '../../lib/paths';
import { hasRole, usePerson, type SignedInPerson } from '../../lib/session';
import { accountStrings } from '../../strings/account';
import { homeStrings } from '../../strings/home';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { ButtonLink } from '../../ui/form/button';
import { Filter } from '../../ui/form/views';
import { StateMark } from '../../ui/marks/state-mark';
import { MarginBlock } from '../../ui/page/margin-block';
import { Page } from '../../ui/page/page';
import { Opening, Section } from '../../ui/page/section';
import { agendaRecipe } from '../../ui/recipes/content.recipe';
import { DataTable, type DataColumn } from '../../ui/table/data-table';
import { taskView, type TaskView } from './task-view';

const words = homeStrings;
type Shown = 'ALL' | 'RESEARCHER' | 'EDITOR';

/** What waits for the person signed in, and what that person waits for. */
export function HomePage() {
  const person = usePerson();
  const { data, error, refetch } = useQuery(HomeDocument, { fetchPolicy: 'cache-and-network' });
  const [shown, setShown] = useState<Shown>('ALL');
  const tasks = data?.home.tasks.map(taskView) ?? [];
  const visible = tasks.filter((task) => shown === 'ALL' || task.role === shown);
  const title = data ? waitingTitle(tasks.length) : words.path;
  return (
    <Page title={words.path} path={[{ name: words.path }]} folio={<span>{formatDate(new Date().toISOString())}</span>}>
      <Opening small title={title} margin={<HomeMargin person={person} />}>
        {tasks.length > 0 && <RoleFilter person={person} tasks={tasks} value={shown} onChange={setShown} />}
      </Opening>
      <Section number={1} title={words.decide} id="decide" tight>
        {error && !data && <Failed what={words.failed} why={errorMessage(error)} onRetry={() => void refetch()} />}
        {!data && !error && <Loading what={words.what} />}
        {data && (visible.length === 0 ? <Empty sentence={words.nothingToDecide} /> : <Agenda tasks={visible} />)}
      </Section>
      {data && (
        <Section number={2} title={words.waiting} id="waiting">
          {data.home.waiting.length === 0 ? (
            <Empty sentence={words.nothingWaiting} />
          ) : (
            <DataTable
              label={words.waiting}
              columns={waitingColumns}
              rows={data.home.waiting.map(taskView)}
              rowId={(task) => task.key}
              file="diffolio-waiting"
            />
          )}
        </Section>
      )}
    </Page>
  );
}

function waitingTitle(count: number): string {
  if (count === 0 || count === 1) return words.waits[count];
  return fill(words.waits.many, { count: words.counted[count - 2] ?? count });
}

interface RoleFilterProps {
  readonly person: SignedInPerson | null;
  readonly tasks: readonly TaskView[];
  readonly value: Shown;
  readonly onChange: (shown: Shown) => void;
}

function RoleFilter({ person, tasks, value, onChange }: RoleFilterProps) {
  const roles = (['RESEARCHER', 'EDITOR'] as const).filter((role) => hasRole(person, role));
  if (roles.length < 2) return null;
  const of = (role: 'RESEARCHER' | 'EDITOR') => tasks.filter((task) => task.role === role).length;
  return (
    <Filter
      lead={words.rolesShown}
      options={[
        { value: 'ALL', label: fill(words.asRole.all, { count: tasks.length }) },
        ...roles.map((role) => ({ value: role, label: fill(words.asRole[role], { count: of(role) }) })),
      ]}
      value={value}
      onChange={onChange}
    />
  );
}

/** Oldest first; the first one has the one filled button. */
function Agenda({ tasks }: { readonly tasks: readonly TaskView[] }) {
  const styles = useSlotRecipe({ recipe: agendaRecipe })();
  return (
    <chakra.ol css={styles.root}>
      {tasks.map((task, i) => (
        <chakra.li key={task.key} css={styles.item}>
          <chakra.p css={styles.when}>{fill(words.since, { date: formatDate(task.since) })}</chakra.p>
          <div>
            <chakra.p css={styles.what}>
              <Link to={task.to}>{task.what}</Link>
            </chakra.p>
            <chakra.p css={styles.why}>{task.why}</chakra.p>
          </div>
          <chakra.div css={styles.action}>
            <ButtonLink
              to={task.to}
              size="small"
              kind={i === 0 ? 'primary' : 'plain'}
              aria-label={`${task.act}: ${task.what}`}
            >
              {task.act}
            </ButtonLink>
          </chakra.div>
        </chakra.li>
      ))}
    </chakra.ol>
  );
}

function HomeMargin({ person }: { readonly person: SignedInPerson | null }) {
  if (person === null) return null;
  const links = [
    hasRole(person, 'RESEARCHER', 'EDITOR') && { to: paths.newSeries(), name: words.bringIn },
    hasRole(person, 'RESEARCHER', 'EDITOR') && { to: paths.pairs(), name: words.toPairs },
    { to: paths.catalogue(), name: words.readSheets },
    { to: paths.apiGuide(), name: words.apiKeys },
  ].filter((link) => link !== false);
  return (
    <>
      <MarginBlock
        entries={[
          [words.signedInAs, person.name],
          [words.roles, person.roles.map((role) => accountStrings.roles[role]).join(', ')],
        ]}
      />
      <MarginBlock title={words.start}>
        {links.map(({ to, name }) => (
          <p key={to}>
            <Link to={to}>{name}</Link>
          </p>
        ))}
      </MarginBlock>
    </>
  );
}

const waitingColumns: DataColumn<TaskView>[] = [
  {
    id: 'what',
    head: words.columns.what,
    name: words.columns.what,
    value: (task) => task.thing,
    cell: (task) => <Link to={task.to}>{task.thing}</Link>,
  },
  {
    id: 'state',
    head: words.columns.state,
    name: words.columns.state,
    value: (task) => task.state,
    cell: (task) => <StateMark state={task.state} />,
  },
  {
    id: 'since',
    head: words.columns.since,
    name: words.columns.since,
    numeric: true,
    value: (task) => task.since,
    cell: (task) => formatDate(task.since),
  },
];
