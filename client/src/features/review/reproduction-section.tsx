import { useLazyQuery } from '@apollo/client/react';
import { chakra } from '@chakra-ui/react';
import { ReproduceVersionDocument, type ReproduceVersionQuery } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { versionStrings } from '../../strings/versions';
import { Failed, Progress } from '../../ui/feedback/states';
import { Actions, Button } from '../../ui/form/button';
import { TickMark, WarnMark } from '../../ui/marks/marks';
import { Num } from '../../ui/numbers/num';
import { DataTable, type DataColumn } from '../../ui/table/data-table';

const words = versionStrings.review;
type Reproduced = ReproduceVersionQuery['reproduceVersion'][number];

/** Fits again from the stored points, and lays every number beside the stored one. */
export function ReproductionSection({ versionId, file }: { readonly versionId: string; readonly file: string }) {
  const [reproduce, { data, loading, error }] = useLazyQuery(ReproduceVersionDocument, { fetchPolicy: 'network-only' });
  const rows = data?.reproduceVersion;
  const differing = rows?.filter(({ agrees }) => !agrees).length ?? 0;
  return (
    <>
      <chakra.p textStyle="small" color="ink2">
        {words.note}
      </chakra.p>
      <Actions>
        <Button size="small" busy={loading} onClick={() => void reproduce({ variables: { id: versionId } })}>
          {rows ? words.again : words.reproduce}
        </Button>
      </Actions>
      <div role="status">
        {loading && <Progress label={words.reproducing} share={null} />}
        {rows && !loading && (
          <chakra.p textStyle="small" marginBlock="10px">
            {differing === 0 ? <TickMark /> : <WarnMark />}
            <chakra.b fontWeight={600}>
              {differing === 0 ? words.reproduced : fill(words.differs, { n: differing })}
            </chakra.b>
          </chakra.p>
        )}
      </div>
      {error && <Failed what={words.failed} why={errorMessage(error)} />}
      {rows && (
        <DataTable
          label={words.reproduction}
          columns={columns}
          rows={rows}
          rowId={({ name }) => name}
          file={`${file}-reproduction`}
          filterable={false}
          tools={<span>{words.si}</span>}
        />
      )}
    </>
  );
}

/** Twelve digits, and the power of ten by itself. */
function Twelve({ value }: { readonly value: number }) {
  const [mantissa = '', exponent = '0'] = value.toExponential(11).split('e');
  return (
    <Num>
      {mantissa.replace('-', '−')}
      {Number(exponent) !== 0 && (
        <>
          {' × 10'}
          <sup>{String(Number(exponent)).replace('-', '−')}</sup>
        </>
      )}
    </Num>
  );
}

const columns: DataColumn<Reproduced>[] = [
  { id: 'name', head: words.quantity, name: words.quantity, sortable: false, value: ({ name }) => name },
  {
    id: 'stored',
    head: words.stored,
    name: words.stored,
    numeric: true,
    sortable: false,
    value: ({ stored }) => stored,
    cell: ({ stored }) => <Twelve value={stored} />,
  },
  {
    id: 'recomputed',
    head: words.recomputed,
    name: words.recomputed,
    numeric: true,
    sortable: false,
    wideOnly: true,
    value: ({ recomputed }) => recomputed,
    cell: ({ recomputed }) => <Twelve value={recomputed} />,
  },
  {
    id: 'agrees',
    head: words.agrees,
    name: words.agrees,
    sortable: false,
    value: ({ agrees }) => (agrees ? words.yes : words.no),
    cell: ({ agrees }) => (
      <chakra.span whiteSpace="nowrap">
        {agrees ? <TickMark /> : <WarnMark />}
        {agrees ? words.yes : words.no}
      </chakra.span>
    ),
  },
];
