import { useQuery } from '@apollo/client/react';
import { useState } from 'react';
import { type AccountRowFragment, PeopleDocument } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { formatShortDate } from '../../lib/format-quantity';
import { adminStrings } from '../../strings/admin';
import { Failed, Loading } from '../../ui/feedback/states';
import { WordButton } from '../../ui/form/button';
import { Page } from '../../ui/page/page';
import { Opening, Section } from '../../ui/page/section';
import { DataTable, type DataColumn } from '../../ui/table/data-table';
import { AdminMargin } from './admin-margin';
import { ChangePerson } from './change-person';
import { InviteSection } from './invite-section';

const words = adminStrings.people;

/** Who has an account, with which roles; inviting, changing roles, disabling. */
export function PeoplePage() {
  const { data, error, refetch } = useQuery(PeopleDocument, { fetchPolicy: 'cache-and-network' });
  const [changing, setChanging] = useState<string | null>(null);
  const person = data?.people.find(({ id }) => id === changing);
  const columns = columnsOf(setChanging);
  return (
    <Page title={words.title} path={[{ name: words.title }]}>
      <Opening small title={words.title} lead={words.lead} margin={<AdminMargin />} />
      <Section title={words.list} id="accounts" tight>
        {error && <Failed what={words.failed} why={errorMessage(error)} onRetry={() => void refetch()} />}
        {!data && !error && <Loading what={words.what} />}
        {data && (
          <DataTable
            label={words.list}
            columns={columns}
            rows={data.people}
            rowId={({ id }) => id}
            file="people"
            onOpen={({ id }) => setChanging(id)}
            emphasised={({ id }) => id === changing}
            empty={words.empty}
          />
        )}
      </Section>
      {person && <ChangePerson key={person.id} person={person} onClose={() => setChanging(null)} />}
      <InviteSection />
    </Page>
  );
}

const rolesText = ({ roles }: AccountRowFragment): string =>
  roles.map((role) => adminStrings.roles[role]).join(', ') || words.noRoles;
const stateText = ({ accountStatus }: AccountRowFragment): string => (accountStatus ? words.states[accountStatus] : '');

function columnsOf(onChange: (id: string) => void): DataColumn<AccountRowFragment>[] {
  return [
    { id: 'name', head: words.name, name: words.name, value: ({ name }) => name },
    { id: 'email', head: words.email, name: words.email, value: ({ email }) => email ?? '' },
    { id: 'roles', head: words.rolesHead, name: words.rolesHead, value: rolesText },
    { id: 'state', head: words.state, name: words.state, value: stateText, wideOnly: true },
    {
      id: 'seen',
      head: words.seen,
      name: words.seen,
      value: ({ lastSeenAt }) => lastSeenAt ?? null,
      cell: ({ lastSeenAt }) => (lastSeenAt ? formatShortDate(lastSeenAt) : words.never),
      wideOnly: true,
    },
    {
      id: 'change',
      head: words.change,
      name: words.change,
      value: () => null,
      sortable: false,
      cell: ({ id, name, email }) => (
        <WordButton aria-label={fill(words.changeOf, { name: name || (email ?? '') })} onClick={() => onChange(id)}>
          {words.change}
        </WordButton>
      ),
    },
  ];
}
