import { useMutation } from '@apollo/client/react';
import { zodResolver } from '@hookform/resolvers/zod';
import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import {
  AcceptSeriesDocument,
  RetireSeriesDocument,
  ReturnSeriesDocument,
  type SeriesDetailFragment,
  type SeriesOutcomeFragment,
  SubmitSeriesDocument,
} from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { paths } from '../../lib/paths';
import { hasRole, usePerson } from '../../lib/session';
import { seriesStrings } from '../../strings/series';
import { Actions, Button, ButtonLink, WordButton } from '../../ui/form/button';
import { AreaField, FormError } from '../../ui/form/field';

const words = seriesStrings.act;

interface Props {
  readonly series: SeriesDetailFragment;
}

/** Why an action did not happen: what was refused, or why the service could not be asked. */
const refusal = (outcome: SeriesOutcomeFragment | undefined, error: unknown): string | undefined =>
  outcome?.problems.map(({ message }) => message).join(' ') || (error ? errorMessage(error) : undefined);

/** What the reader may do with the series in its state: its owner edits and submits, an editor accepts, returns, retires. */
export function SeriesActions({ series }: Props) {
  const person = usePerson();
  const isEditor = hasRole(person, 'EDITOR');
  const isOwn = series.createdBy?.id === person?.id;
  switch (series.status) {
    case 'DRAFT':
    case 'RETURNED':
      return isOwn || isEditor ? <Prepare series={series} /> : null;
    case 'SUBMITTED':
      return isEditor ? <Judge series={series} own={series.submittedBy?.id === person?.id} /> : null;
    case 'ACCEPTED':
      return isEditor ? <Retire series={series} /> : null;
    case 'RETIRED':
      return null;
  }
}

function Prepare({ series }: Props) {
  const [submit, { loading, data, error }] = useMutation(SubmitSeriesDocument, { errorPolicy: 'all' });
  return (
    <>
      <Actions>
        <Button kind="primary" busy={loading} onClick={() => void submit({ variables: { id: series.id } })}>
          {loading ? words.submitting : words.submit}
        </Button>
        <ButtonLink to={paths.editSeries(series.id)}>{words.edit}</ButtonLink>
        <chakra.span textStyle="small" color="ink2">
          {words.submitNote}
        </chakra.span>
      </Actions>
      <FormError message={refusal(data?.submitSeries, error)} />
    </>
  );
}

function Judge({ series, own }: Props & { readonly own: boolean }) {
  const [returning, setReturning] = useState(false);
  const [accept, { loading, data, error }] = useMutation(AcceptSeriesDocument, { errorPolicy: 'all' });
  return (
    <>
      <Actions>
        <Button
          kind="primary"
          busy={loading}
          waitingFor={own && words.own}
          onClick={() => void accept({ variables: { id: series.id } })}
        >
          {words.accept}
        </Button>
        <Button aria-expanded={returning} onClick={() => setReturning(!returning)}>
          {words.return}
        </Button>
        {!own && (
          <chakra.span textStyle="small" color="ink2">
            {words.acceptNote}
          </chakra.span>
        )}
      </Actions>
      <FormError message={refusal(data?.acceptSeries, error)} />
      {returning && <ReturnForm series={series} onDone={() => setReturning(false)} />}
    </>
  );
}

function Retire({ series }: Props) {
  const [asking, setAsking] = useState(false);
  return (
    <>
      <Actions>
        <Button aria-expanded={asking} onClick={() => setAsking(!asking)}>
          {words.retire}
        </Button>
      </Actions>
      {asking && <RetireForm series={series} onDone={() => setAsking(false)} />}
    </>
  );
}

interface FormProps extends Props {
  readonly onDone: () => void;
}

function ReturnForm({ series, onDone }: FormProps) {
  const [run, { loading }] = useMutation(ReturnSeriesDocument, { errorPolicy: 'all' });
  const give = async (remark: string) => {
    const { data, error } = await run({ variables: { id: series.id, remark } });
    return refusal(data?.returnSeries, error);
  };
  return <RemarkForm label={words.remarkReturn} button={words.returnNow} busy={loading} give={give} onDone={onDone} />;
}

function RetireForm({ series, onDone }: FormProps) {
  const [run, { loading }] = useMutation(RetireSeriesDocument, { errorPolicy: 'all' });
  const give = async (remark: string) => {
    const { data, error } = await run({ variables: { id: series.id, remark } });
    return refusal(data?.retireSeries, error);
  };
  return <RemarkForm label={words.remarkRetire} button={words.retireNow} busy={loading} give={give} onDone={onDone} />;
}

export const remarkSchema = z.object({ remark: z.string().trim().min(1, words.needsRemark) });

interface RemarkFormProps {
  readonly label: string;
  readonly button: string;
  readonly busy: boolean;
  /** Sends the remark; answers why it was refused, or nothing. */
  readonly give: (remark: string) => Promise<string | undefined>;
  readonly onDone: () => void;
}

/** A remark without which nothing happens. */
function RemarkForm({ label, button, busy, give, onDone }: RemarkFormProps) {
  const { control, handleSubmit, setError, formState } = useForm({
    resolver: zodResolver(remarkSchema),
    defaultValues: { remark: '' },
  });
  const submit = handleSubmit(async ({ remark }) => {
    const refused = await give(remark);
    if (refused === undefined) onDone();
    else setError('root', { message: refused });
  });
  return (
    <chakra.form noValidate onSubmit={(event) => void submit(event)} maxWidth="640px" marginTop="14px">
      <AreaField control={control} name="remark" label={label} />
      <FormError message={formState.errors.root?.message} />
      <Actions>
        <Button type="submit" busy={busy}>
          {button}
        </Button>
        <WordButton onClick={onDone}>{words.cancel}</WordButton>
      </Actions>
    </chakra.form>
  );
}
