import { useQuery } from '@apollo/client/react';
import { chakra } from '@chakra-ui/react';
import { type ReactNode } from 'react';
import { Link, useNavigate, useSearchParams } from 'react-router-dom';
import { SeriesListDocument, type SeriesRowFragment, type SeriesStatus } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { formatNumber, formatShortDate } from '../../lib/format-quantity';
import { pairTitle } from '../../lib/pair-title';
import { paths } from '../../lib/paths';
import { fromSi, type ReaderUnits, unitLabel, useReaderUnits } from '../../lib/units';
import { seriesStrings } from '../../strings/series';
import { Failed, Loading } from '../../ui/feedback/states';
import { WordButton } from '../../ui/form/button';
import { Filter } from '../../ui/form/views';
import { StateMark, stateOf } from '../../ui/marks/state-mark';
import { Typeset } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Page } from '../../ui/page/page';
import { Opening } from '../../ui/page/section';
import { DataTable, type DataColumn } from '../../ui/table/data-table';

const words = seriesStrings.list;
const STATES = ['DRAFT', 'SUBMITTED', 'RETURNED', 'ACCEPTED', 'RETIRED'] as const satisfies readonly SeriesStatus[];

/** The series the reader may see, of all pairs; whose and in which state stands in the address. */
export function SeriesListPage() {
  const [search, setSearch] = useSearchParams();
  const mine = search.get('of') === 'me';
  const state = STATES.find((status) => status === search.get('state')) ?? null;
  const choose = (key: string, value: string | null) =>
    setSearch(
      (before) => {
        const after = new URLSearchParams(before);
        if (value === null) after.delete(key);
        else after.set(key, value);
        return after;
      },
      { replace: true },
    );
  return (
    <Page title={words.title} path={[{ name: words.title }]}>
      <Opening
        small
        title={words.title}
        lead={words.lead}
        margin={
          <MarginBlock>
            <p>
              <Link to={paths.newSeries()}>{words.bringIn}</Link>
            </p>
          </MarginBlock>
        }
      >
        <chakra.div display="flex" flexWrap="wrap" gap="2px 36px" marginTop="22px" textStyle="small">
          <Filter
            lead={words.whose}
            value={mine ? 'me' : 'all'}
            onChange={(value) => choose('of', value === 'me' ? value : null)}
            options={[
              { value: 'all', label: words.everyone },
              { value: 'me', label: words.mine },
            ]}
          />
          <Filter
            lead={words.state}
            value={state ?? 'ANY'}
            onChange={(value) => choose('state', value === 'ANY' ? null : value)}
            options={[
              { value: 'ANY', label: words.any },
              ...STATES.map((status) => ({ value: status, label: seriesStrings.states[status] })),
            ]}
          />
        </chakra.div>
        <List mine={mine} state={state} />
      </Opening>
    </Page>
  );
}

function List({ mine, state }: { readonly mine: boolean; readonly state: SeriesStatus | null }) {
  const units = useReaderUnits();
  const navigate = useNavigate();
  const { data, previousData, error, refetch, fetchMore, loading } = useQuery(SeriesListDocument, {
    variables: { mine, status: state === null ? null : [state] },
    fetchPolicy: 'cache-and-network',
    notifyOnNetworkStatusChange: true,
  });
  const found = (data ?? previousData)?.allSeries;
  if (error)
    return <Failed what={seriesStrings.failed.list} why={errorMessage(error)} onRetry={() => void refetch()} />;
  if (!found) return <Loading what={seriesStrings.what.list} />;
  const rows = found.edges.map(({ node }) => node);
  const more = () =>
    void fetchMore({
      variables: { after: found.pageInfo.endCursor ?? null },
      updateQuery: (before, { fetchMoreResult: { allSeries } }) => ({
        allSeries: { ...allSeries, edges: [...before.allSeries.edges, ...allSeries.edges] },
      }),
    });
  return (
    <chakra.div marginTop="14px">
      <DataTable
        label={words.title}
        columns={columnsOf(units)}
        rows={rows}
        rowId={({ id }) => id}
        file="series"
        onOpen={({ id }) => void navigate(paths.series(id))}
        empty={words.empty}
        tools={
          <>
            <span>{fill(words.shown, { shown: rows.length, total: found.totalCount })}</span>
            {found.pageInfo.hasNextPage && (
              <WordButton onClick={more}>{loading ? words.loading : words.more}</WordButton>
            )}
          </>
        }
      />
    </chakra.div>
  );
}

function columnsOf(units: ReaderUnits): DataColumn<SeriesRowFragment>[] {
  const unit = unitLabel('temperature', units.temperature);
  const kelvin = (value: number) => formatNumber(fromSi('temperature', value, units.temperature), 0);
  const lowest = ({ points }: SeriesRowFragment) => Math.min(...points.map(({ temperature }) => temperature));
  const highest = ({ points }: SeriesRowFragment) => Math.max(...points.map(({ temperature }) => temperature));
  return [
    {
      id: 'series',
      head: words.series,
      name: words.series,
      value: ({ title }) => title,
      cell: ({ id, title, pair, method }) => (
        <>
          <Link to={paths.series(id)}>{title}</Link>
          <Under>
            <chakra.span hideFrom="md">{`${pairTitle(pair.substances)}, `}</chakra.span>
            {method}
          </Under>
        </>
      ),
    },
    {
      id: 'pair',
      head: words.pair,
      name: words.pair,
      wideOnly: true,
      value: ({ pair }) => pairTitle(pair.substances),
      cell: ({ pair }) => <Link to={paths.pair(pair.id)}>{pairTitle(pair.substances)}</Link>,
    },
    {
      id: 'n',
      head: <Typeset>{words.points}</Typeset>,
      name: 'n',
      numeric: true,
      wideOnly: true,
      value: ({ points }) => points.length,
    },
    {
      id: 'T',
      head: <Typeset>{words.temperature}</Typeset>,
      unit,
      name: `T / ${unit}`,
      numeric: true,
      wideOnly: true,
      value: lowest,
      cell: (row) => `${kelvin(lowest(row))}–${kelvin(highest(row))}`,
    },
    {
      id: 'since',
      head: words.since,
      name: words.since,
      wideOnly: true,
      value: ({ createdAt }) => createdAt,
      cell: ({ createdAt, createdBy }) => (
        <>
          <chakra.span whiteSpace="nowrap">{formatShortDate(createdAt)}</chakra.span>
          <Under>{createdBy?.name}</Under>
        </>
      ),
    },
    {
      id: 'state',
      head: words.stateHead,
      name: words.stateHead,
      value: ({ status }) => seriesStrings.states[status],
      cell: ({ status }) => <StateMark state={stateOf(status)} />,
    },
  ];
}

/** A second, smaller line of a cell. */
const Under = ({ children }: { readonly children: ReactNode }) => (
  <chakra.span display="block" color="ink2" fontSize="13px" lineHeight="18px">
    {children}
  </chakra.span>
);
