import { useQuery } from '@apollo/client/react';
import { chakra } from '@chakra-ui/react';
import { useDeferredValue, useState } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { PairsDocument, type PairRowFragment } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { pairTitle } from '../../lib/pair-title';
import { paths } from '../../lib/paths';
import { useDebounced } from '../../lib/use-debounced';
import { pairStrings } from '../../strings/pairs';
import { Failed, Loading } from '../../ui/feedback/states';
import { WordButton } from '../../ui/form/button';
import { StateMark, stateOf } from '../../ui/marks/state-mark';
import { Formula } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Page } from '../../ui/page/page';
import { Opening } from '../../ui/page/section';
import { DataTable, type DataColumn } from '../../ui/table/data-table';
import { SearchField } from './search-field';

const words = pairStrings;
const TYPING_MS = 250;

/** Every gas pair, to be found by a name and opened to its workspace. */
export function PairsPage() {
  const [typed, setTyped] = useState('');
  const search = useDebounced(useDeferredValue(typed.trim()), TYPING_MS);
  const { data, previousData, error, refetch, fetchMore, loading } = useQuery(PairsDocument, {
    variables: { search: search || null },
    fetchPolicy: 'cache-and-network',
    notifyOnNetworkStatusChange: true,
  });
  const navigate = useNavigate();
  const found = (data ?? previousData)?.gasPairs;
  const rows = found?.edges.map(({ node }) => node) ?? [];
  const more = () =>
    void fetchMore({
      variables: { after: found?.pageInfo.endCursor ?? null },
      updateQuery: (before, { fetchMoreResult: { gasPairs } }) => ({
        gasPairs: { ...gasPairs, edges: [...before.gasPairs.edges, ...gasPairs.edges] },
      }),
    });
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
        <SearchField value={typed} onChange={setTyped} />
        {error && <Failed what={words.failed} why={errorMessage(error)} onRetry={() => void refetch()} />}
        {!error && !found && <Loading what={words.what} />}
        {found && (
          <chakra.div marginTop="16px">
            <DataTable
              label={words.label}
              columns={columns}
              rows={rows}
              rowId={({ id }) => id}
              file="gas-pairs"
              filterable={false}
              onOpen={({ id }) => void navigate(paths.pair(id))}
              empty={search === '' ? words.begin : words.empty}
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
        )}
      </Opening>
    </Page>
  );
}

const OPEN: readonly string[] = ['DRAFT', 'IN_REVIEW', 'RETURNED', 'APPROVED'];
const openVersions = ({ dataSheet }: PairRowFragment) =>
  dataSheet?.versions.filter(({ status }) => OPEN.includes(status)) ?? [];

const columns: DataColumn<PairRowFragment>[] = [
  {
    id: 'pair',
    head: words.pair,
    name: words.pair,
    value: ({ substances }) => pairTitle(substances),
    cell: ({ id, substances }) => (
      <>
        <chakra.span fontWeight={500}>
          <Link to={paths.pair(id)}>{pairTitle(substances)}</Link>
        </chakra.span>
        <chakra.span
          color="ink3"
          fontSize="12.5px"
          marginLeft="8px"
          whiteSpace="nowrap"
          display={{ base: 'none', md: 'inline' }}
        >
          {substances.map(({ id: substance, formula }, i) => (
            <span key={substance}>
              {i > 0 && ' + '}
              <Formula>{formula}</Formula>
            </span>
          ))}
        </chakra.span>
      </>
    ),
  },
  {
    id: 'accepted',
    head: words.series,
    unit: words.accepted,
    name: `${words.series}, ${words.accepted}`,
    numeric: true,
    value: ({ accepted }) => accepted.totalCount,
  },
  {
    id: 'waiting',
    head: words.series,
    unit: words.waiting,
    name: `${words.series}, ${words.waiting}`,
    numeric: true,
    value: ({ waiting }) => waiting.totalCount,
    cell: ({ waiting }) => waiting.totalCount || words.none,
  },
  {
    id: 'fits',
    head: words.fits,
    name: words.fits,
    numeric: true,
    wideOnly: true,
    value: ({ fits }) => fits.length,
    cell: ({ fits }) => fits.length || words.none,
  },
  {
    id: 'sheet',
    head: words.sheet,
    name: words.sheet,
    value: ({ dataSheet }) => dataSheet?.current?.number ?? null,
    cell: ({ dataSheet }) =>
      dataSheet?.current ? (
        <StateMark state="released">
          <Link
            to={paths.version(dataSheet.code, dataSheet.current.number)}
          >{`${dataSheet.code}, ${dataSheet.current.number}`}</Link>
        </StateMark>
      ) : (
        words.none
      ),
  },
  {
    id: 'open',
    head: words.open,
    name: words.open,
    wideOnly: true,
    value: (row) =>
      openVersions(row)
        .map(({ number, status }) => `${number}, ${stateOf(status)}`)
        .join('; '),
    cell: (row) =>
      openVersions(row).map(({ id, number, status }) => (
        <chakra.span key={id} display="block">
          <StateMark state={stateOf(status)}>
            <Link to={paths.version(row.dataSheet?.code ?? '', number)}>{`${number}, ${stateOf(status)}`}</Link>
          </StateMark>
        </chakra.span>
      )),
  },
];
