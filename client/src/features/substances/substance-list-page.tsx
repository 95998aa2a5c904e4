import { useQuery } from '@apollo/client/react';
import { chakra } from '@chakra-ui/react';
import { useEffect } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { SubstanceListDocument, type SubstanceListQuery } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { formatNumber } from '../../lib/format-quantity';
import { paths } from '../../lib/paths';
import { hasRole, usePerson } from '../../lib/session';
import { substanceStrings } from '../../strings/substances';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { Button } from '../../ui/form/button';
import { Formula, Typeset } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Page } from '../../ui/page/page';
import { Opening, Section } from '../../ui/page/section';
import { DataTable, type DataColumn } from '../../ui/table/data-table';

const words = substanceStrings;
type Row = SubstanceListQuery['substances']['edges'][number]['node'];

/** The library: found by name, synonym, formula or CAS number. */
export function SubstanceListPage({ search }: { readonly search: string }) {
  const { data, error, refetch } = useAllSubstances(search);
  const mayAdd = hasRole(usePerson(), 'RESEARCHER', 'EDITOR');
  return (
    <Page
      title={words.title}
      path={[{ name: words.title }]}
      folio={data && <span>{fill(words.count, { count: data.substances.totalCount })}</span>}
    >
      <Opening
        small
        title={words.title}
        lead={words.lead}
        margin={
          mayAdd && (
            <MarginBlock>
              <p>
                <Link to={paths.newSubstance()}>{words.add}</Link>
              </p>
            </MarginBlock>
          )
        }
      >
        <SearchForm key={search} search={search} />
      </Opening>
      <Section number={1} title={words.section} id="library" tight>
        {error && !data && <Failed what={words.failed} why={errorMessage(error)} onRetry={() => void refetch()} />}
        {!data && !error && <Loading what={words.what} />}
        {data?.substances.edges.length === 0 && <Empty sentence={words.nothing} />}
        {data && data.substances.edges.length > 0 && (
          <DataTable
            label={words.title}
            columns={columns}
            rows={data.substances.edges.map(({ node }) => node)}
            rowId={(row) => row.id}
            file="diffolio-substances"
          />
        )}
      </Section>
    </Page>
  );
}

/** Page after page: the table is sorted and filtered as a whole. */
function useAllSubstances(search: string) {
  const { data, error, refetch, fetchMore } = useQuery(SubstanceListDocument, {
    variables: { search: search || null },
  });
  const page = data?.substances.pageInfo;
  const next = page?.hasNextPage ? (page.endCursor ?? null) : null;
  useEffect(() => {
    if (next === null) return;
    void fetchMore({
      variables: { after: next },
      updateQuery: (before, { fetchMoreResult: after }) => ({
        substances: { ...after.substances, edges: [...before.substances.edges, ...after.substances.edges] },
      }),
    });
  }, [next, fetchMore]);
  return { data, error, refetch };
}

function SearchForm({ search }: { readonly search: string }) {
  const navigate = useNavigate();
  const find = (form: FormData) => {
    const text = form.get('search');
    void navigate(paths.substances(typeof text === 'string' ? text.trim() : ''));
  };
  return (
    <chakra.search display="block" marginTop="20px">
      <chakra.form action={find} display="flex" gap="18px" alignItems="flex-end" maxWidth="640px">
        <chakra.input
          type="search"
          name="search"
          aria-label={words.findLabel}
          placeholder={words.findLabel}
          defaultValue={search}
          autoComplete="off"
          flex={1}
          minWidth={0}
          background="none"
          fontSize="17px"
          lineHeight="30px"
          borderBottom="1.5px solid"
          borderColor="control"
          _focusVisible={{ outline: 'none', borderColor: 'accent', boxShadow: '0 1px 0 var(--dfl-colors-accent)' }}
        />
        <Button type="submit">{words.find}</Button>
      </chakra.form>
    </chakra.search>
  );
}

const columns: DataColumn<Row>[] = [
  {
    id: 'name',
    head: words.columns.name,
    name: words.columns.name,
    value: (row) => row.name,
    cell: (row) => <Link to={paths.substance(row.id)}>{row.name}</Link>,
  },
  {
    id: 'formula',
    head: words.columns.formula,
    name: words.columns.formula,
    value: (row) => row.formula,
    cell: (row) => <Formula>{row.formula}</Formula>,
  },
  {
    id: 'cas',
    head: words.columns.cas,
    name: words.columns.cas,
    value: (row) => row.casNumber ?? '',
    cell: (row) => <span style={{ whiteSpace: 'nowrap' }}>{row.casNumber}</span>,
  },
  {
    id: 'M',
    head: <Typeset>{words.columns.molarMass}</Typeset>,
    unit: 'g/mol',
    name: words.columns.molarMassName,
    numeric: true,
    value: (row) => 1000 * row.molarMass,
    cell: (row) => formatNumber(1000 * row.molarMass, 3),
  },
  {
    id: 'also',
    head: words.columns.synonyms,
    name: words.columns.synonyms,
    wideOnly: true,
    sortable: false,
    value: (row) => row.synonyms.join('; '),
    cell: (row) => row.synonyms.join(', '),
  },
];
