import { chakra } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { fill } from '../../lib/fill';
import { formatDate } from '../../lib/format-quantity';
import { HttpProblem } from '../../lib/http';
import { adminStrings } from '../../strings/admin';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { WordButton } from '../../ui/form/button';
import { MarginBlock } from '../../ui/page/margin-block';
import { Page } from '../../ui/page/page';
import { Opening, Section } from '../../ui/page/section';
import { DataTable, type DataColumn } from '../../ui/table/data-table';
import { AdminMargin } from './admin-margin';
import { listMail, readLetter, type MailEntry } from './mail-requests';

const words = adminStrings.mail;
const LOOKED_UP_EVERY_MS = 10_000;
const clock = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });
const dateAndTime = (sentAt: string): string => `${formatDate(sentAt)}, ${clock.format(new Date(sentAt))}`;
const whyOf = (error: unknown): string => (error instanceof HttpProblem ? error.message : '');

/** The letters the service sent, and one of them to read. */
export function MailPage() {
  const { data, error, refetch } = useQuery({
    queryKey: ['mail'],
    queryFn: ({ signal }) => listMail(signal),
    refetchInterval: LOOKED_UP_EVERY_MS,
  });
  const [reading, setReading] = useState<string | null>(null);
  return (
    <Page title={words.title} path={[{ name: words.title }]}>
      <Opening small title={words.title} lead={words.lead} margin={<AdminMargin />} />
      <Section title={words.list} id="letters" tight>
        {error && <Failed what={words.failed} why={whyOf(error)} onRetry={() => void refetch()} />}
        {!data && !error && <Loading what={words.what} />}
        {data && (
          <DataTable
            label={words.list}
            columns={columnsOf(setReading)}
            rows={data}
            rowId={({ id }) => id}
            file="mail"
            onOpen={({ id }) => setReading(id)}
            emphasised={({ id }) => id === reading}
            empty={words.empty}
          />
        )}
      </Section>
      <LetterSection id={reading} />
    </Page>
  );
}

function LetterSection({ id }: { readonly id: string | null }) {
  const { data, error, refetch } = useQuery({
    queryKey: ['mail', id],
    queryFn: ({ signal }) => readLetter(id ?? '', signal),
    enabled: id !== null,
    staleTime: Infinity,
  });
  const margin = data && (
    <MarginBlock
      entries={[
        [words.sent, dateAndTime(data.sentAt)],
        [words.to, data.to],
        [words.id, data.messageId],
      ]}
    />
  );
  return (
    <Section title={data?.subject ?? words.letter} id="letter" margin={margin}>
      {id === null && <Empty sentence={words.choose} />}
      {error && <Failed what={words.failed} why={whyOf(error)} onRetry={() => void refetch()} />}
      {id !== null && !data && !error && <Loading what={words.letter} />}
      {data && (
        <chakra.p
          whiteSpace="pre-wrap"
          overflowWrap="anywhere"
          textStyle="small"
          role="document"
          aria-label={data.subject}
        >
          {data.text}
        </chakra.p>
      )}
    </Section>
  );
}

const columnsOf = (onRead: (id: string) => void): DataColumn<MailEntry>[] => [
  {
    id: 'sent',
    head: words.sent,
    name: words.sent,
    value: ({ sentAt }) => new Date(sentAt).toISOString(),
    cell: ({ sentAt }) => dateAndTime(sentAt),
  },
  { id: 'to', head: words.to, name: words.to, value: ({ to }) => to },
  {
    id: 'subject',
    head: words.subject,
    name: words.subject,
    value: ({ subject }) => subject,
    cell: ({ id, subject }) => (
      <WordButton aria-label={fill(words.read, { subject })} onClick={() => onRead(id)} style={{ textAlign: 'left' }}>
        {subject}
      </WordButton>
    ),
  },
];
