import { useQuery } from '@apollo/client/react';
import { chakra } from '@chakra-ui/react';
import { JobsDocument, type JobsQuery } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { formatShortDate } from '../../lib/format-quantity';
import { adminStrings } from '../../strings/admin';
import { Failed, Loading } from '../../ui/feedback/states';
import { Page } from '../../ui/page/page';
import { Opening, Section } from '../../ui/page/section';
import { DataTable, type DataColumn } from '../../ui/table/data-table';
import { AdminMargin } from './admin-margin';

const words = adminStrings.jobs;
const LOOKED_UP_EVERY_S = 5;

type Queue = JobsQuery['jobs']['queues'][number];
type Failure = JobsQuery['jobs']['failures'][number];

/** What runs behind the pages, and what failed for good. */
export function JobsPage() {
  const { data, error, refetch } = useQuery(JobsDocument, {
    fetchPolicy: 'cache-and-network',
    pollInterval: 1000 * LOOKED_UP_EVERY_S,
  });
  return (
    <Page title={words.title} path={[{ name: words.title }]}>
      <Opening small title={words.title} lead={words.lead} margin={<AdminMargin />} />
      <Section title={words.queues} id="queues" tight>
        {error && <Failed what={words.failed} why={errorMessage(error)} onRetry={() => void refetch()} />}
        {!data && !error && <Loading what={words.what} />}
        {data && (
          <DataTable
            label={words.queues}
            columns={queueColumns}
            rows={data.jobs.queues}
            rowId={({ queue }) => queue}
            file="jobs"
            empty={words.emptyQueues}
          />
        )}
        <chakra.p textStyle="caption" color="ink2" marginTop="8px">
          {fill(words.current, { seconds: LOOKED_UP_EVERY_S })}
        </chakra.p>
      </Section>
      {data && (
        <Section title={words.failures} id="failures">
          <DataTable
            label={words.failures}
            columns={failureColumns}
            rows={data.jobs.failures}
            rowId={({ id }) => id}
            file="failed-jobs"
            empty={words.noFailures}
          />
        </Section>
      )}
    </Page>
  );
}

const count = (id: 'waiting' | 'active' | 'completed' | 'failed', head: string): DataColumn<Queue> => ({
  id,
  head,
  name: head,
  numeric: true,
  value: (queue) => queue[id],
});

const queueColumns: DataColumn<Queue>[] = [
  { id: 'queue', head: words.queue, name: words.queue, value: ({ queue }) => queue },
  count('waiting', words.waiting),
  count('active', words.active),
  count('completed', words.completed),
  count('failed', words.failedHead),
];

const failureColumns: DataColumn<Failure>[] = [
  {
    id: 'when',
    head: words.when,
    name: words.when,
    value: ({ failedAt }) => failedAt,
    cell: ({ failedAt }) => formatShortDate(failedAt),
  },
  { id: 'queue', head: words.queue, name: words.queue, value: ({ queue }) => queue },
  { id: 'attempts', head: words.attempts, name: words.attempts, numeric: true, value: ({ attempts }) => attempts },
  { id: 'reason', head: words.reason, name: words.reason, value: ({ reason }) => reason },
];
