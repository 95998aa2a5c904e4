import { useMutation } from '@apollo/client/react';
import { zodResolver } from '@hookform/resolvers/zod';
import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Link } from 'react-router-dom';
import { z } from 'zod';
import { AcceptFromWorkspaceDocument, ReturnFromWorkspaceDocument, WorkspaceDocument } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { paths } from '../../lib/paths';
import { hasRole, usePerson } from '../../lib/session';
import { fitStrings } from '../../strings/fits';
import { Actions, Button, WordButton } from '../../ui/form/button';
import { AreaField, FormError } from '../../ui/form/field';
import { SeriesKey } from '../../ui/marks/series-key';
import { ledgerRecipe } from '../../ui/recipes/table.recipe';
import { DataTable } from '../../ui/table/data-table';
import { type PairSeries } from './pair-series';

const words = fitStrings.waiting;

/** Submitted series: seen in the picture, and accepted or returned by an editor who did not submit them. */
export function WaitingSeries({ series }: { readonly series: readonly PairSeries[] }) {
  const isEditor = hasRole(usePerson(), 'EDITOR');
  const [returning, setReturning] = useState<string | null>(null);
  const rows = series.filter(({ status }) => status === 'SUBMITTED');
  if (rows.length === 0) return null;
  return (
    <>
      <chakra.h3 textStyle="subsection" marginTop="28px">
        {words.title}
      </chakra.h3>
      <chakra.p textStyle="small" color="ink2" marginBottom="8px">
        {words.note}
      </chakra.p>
      <DataTable
        label={words.title}
        rows={rows}
        rowId={(row) => row.id}
        file="waiting-series"
        filterable={false}
        columns={[
          {
            id: 'series',
            head: fitStrings.ledger.series,
            name: fitStrings.ledger.series,
            value: (row) => `${row.letter}, ${row.title}`,
            cell: (row) => (
              <>
                <SeriesKey index={row.mark} open />
                {row.letter}, <Link to={paths.series(row.id)}>{row.title}</Link>
              </>
            ),
          },
          {
            id: 'method',
            head: fitStrings.ledger.method,
            name: fitStrings.ledger.method,
            wideOnly: true,
            value: (row) => row.method,
          },
          {
            id: 'by',
            head: fitStrings.ledger.state,
            name: fitStrings.ledger.state,
            wideOnly: true,
            value: (row) => fill(words.by, { person: row.submittedBy?.name ?? '' }),
          },
          ...(isEditor
            ? [
                {
                  id: 'act',
                  head: '',
                  name: '',
                  sortable: false,
                  value: () => null,
                  cell: (row: PairSeries) => <Decide series={row} onReturn={() => setReturning(row.id)} />,
                },
              ]
            : []),
        ]}
        secondLine={(row) => returning === row.id && <ReturnForm series={row} onDone={() => setReturning(null)} />}
      />
    </>
  );
}

function Decide({ series, onReturn }: { readonly series: PairSeries; readonly onReturn: () => void }) {
  const styles = useSlotRecipe({ recipe: ledgerRecipe })();
  const person = usePerson();
  const [accept, { loading, data, error }] = useMutation(AcceptFromWorkspaceDocument, {
    refetchQueries: [WorkspaceDocument],
    errorPolicy: 'all',
  });
  const refused = data?.acceptSeries.problems[0]?.message ?? (error ? errorMessage(error) : undefined);
  if (series.submittedBy?.id === person?.id) return <chakra.span css={styles.reason}>{words.own}</chakra.span>;
  return (
    <chakra.span display="inline-flex" flexWrap="wrap" gap="4px 14px" alignItems="baseline">
      <WordButton
        aria-label={`${words.accept} ${series.letter}, ${series.title}`}
        aria-busy={loading}
        onClick={() => void accept({ variables: { id: series.id } })}
      >
        {words.accept}
      </WordButton>
      <WordButton aria-label={`${words.return} ${series.letter}, ${series.title}`} onClick={onReturn}>
        {words.return}
      </WordButton>
      <FormError message={refused} />
    </chakra.span>
  );
}

const returnSchema = z.object({ remark: z.string().trim().min(1, words.needsRemark) });

function ReturnForm({ series, onDone }: { readonly series: PairSeries; readonly onDone: () => void }) {
  const [giveBack, { loading }] = useMutation(ReturnFromWorkspaceDocument, {
    refetchQueries: [WorkspaceDocument],
    errorPolicy: 'all',
  });
  const form = useForm({ resolver: zodResolver(returnSchema), defaultValues: { remark: '' } });
  const submit = form.handleSubmit(async ({ remark }) => {
    const { data, error } = await giveBack({ variables: { id: series.id, remark } });
    const refused = data?.returnSeries.problems[0]?.message ?? (error ? errorMessage(error) : undefined);
    if (refused === undefined) onDone();
    else form.setError('root', { message: refused });
  });
  return (
    <chakra.form noValidate onSubmit={(event) => void submit(event)} maxWidth="640px" paddingBottom="12px">
      <AreaField control={form.control} name="remark" label={words.remark} />
      <FormError message={form.formState.errors.root?.message} />
      <Actions>
        <Button type="submit" size="small" busy={loading}>
          {words.returnNow}
        </Button>
        <WordButton onClick={onDone}>{words.cancel}</WordButton>
      </Actions>
    </chakra.form>
  );
}
