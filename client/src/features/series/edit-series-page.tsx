import { useMutation, useQuery } from '@apollo/client/react';
import { zodResolver } from '@hookform/resolvers/zod';
import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Link, useNavigate } from 'react-router-dom';
import { OneSeriesDocument, type SeriesDetailFragment, UpdateSeriesDocument } from '../../gql/graphql';
import { errorCode, errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { applyProblems } from '../../lib/form-problems';
import { paths } from '../../lib/paths';
import { useReaderUnits } from '../../lib/units';
import { seriesStrings } from '../../strings/series';
import { Banner } from '../../ui/feedback/banner';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { Actions, Button, WordButton } from '../../ui/form/button';
import { AreaField, Fields, FormError, NumberField, SelectField, TextField } from '../../ui/form/field';
import { WarnMark } from '../../ui/marks/marks';
import { StateMark, stateOf } from '../../ui/marks/state-mark';
import { Page } from '../../ui/page/page';
import { Opening, Section } from '../../ui/page/section';
import { PointsGrid } from './points-grid';
import { dataOrigins, seriesFields, seriesFormSchema, updateInput, type SeriesFields } from './series-form';

const words = seriesStrings.edit;
const list = { name: seriesStrings.path.series, to: paths.seriesList() };

/** Most points that are edited one by one. */
const MOST_POINTS = 200;

/** Header and points of a draft or returned series. */
export function EditSeriesPage({ id }: { readonly id: string }) {
  const { data, error, refetch } = useQuery(OneSeriesDocument, {
    variables: { id },
    fetchPolicy: 'network-only',
    nextFetchPolicy: 'cache-first',
  });
  const series = data?.oneSeries;
  const title = series ? fill(words.title, { title: series.title }) : seriesStrings.path.edit;
  const open = series?.status === 'DRAFT' || series?.status === 'RETURNED';
  return (
    <Page
      title={title}
      path={[
        list,
        ...(series ? [{ name: series.title, to: paths.series(id) }] : []),
        { name: seriesStrings.path.edit },
      ]}
      folio={series && <StateMark state={stateOf(series.status)} />}
    >
      <Opening small title={title} lead={open ? words.lead : undefined}>
        {error && <Failed what={seriesStrings.failed.one} why={errorMessage(error)} onRetry={() => void refetch()} />}
        {!error && !data && <Loading what={seriesStrings.what.one} />}
        {data && !series && <Empty sentence={seriesStrings.missing} />}
        {series && !open && <Empty sentence={fill(words.closed, { state: stateOf(series.status) })} />}
      </Opening>
      {series && open && <SeriesForm key={series.lockVersion} series={series} onReload={() => void refetch()} />}
    </Page>
  );
}

function SeriesForm({ series, onReload }: { readonly series: SeriesDetailFragment; readonly onReload: () => void }) {
  // The units the form began with: what is typed keeps its meaning when the reader chooses others.
  const [units] = useState(useReaderUnits());
  const navigate = useNavigate();
  const [update, { loading }] = useMutation(UpdateSeriesDocument, { errorPolicy: 'all' });
  const [conflict, setConflict] = useState(false);
  const form = useForm<SeriesFields>({
    resolver: zodResolver(seriesFormSchema(units)),
    defaultValues: seriesFields(series, units),
  });
  const { control, formState } = form;
  const submit = form.handleSubmit(async (fields) => {
    const { data, error } = await update({ variables: { input: updateInput(series, fields, units) } });
    if (errorCode(error) === 'CONFLICT') return setConflict(true);
    if (error) return form.setError('root', { message: errorMessage(error) });
    const outcome = data?.updateSeries;
    if (outcome?.series) await navigate(paths.series(series.id));
    else applyProblems(form.setError, outcome?.problems ?? [], fieldOf);
  });
  return (
    <chakra.form noValidate onSubmit={(event) => void submit(event)}>
      <Section title={words.header} id="header" tight>
        <Fields columns={2}>
          <TextField control={control} name="title" label={words.titleField} />
          <SelectField
            control={control}
            name="dataOrigin"
            label={words.origin}
            choices={dataOrigins.map((value) => ({ value, label: seriesStrings.origins[value] }))}
          />
          <TextField control={control} name="method" label={words.method} />
          <TextField control={control} name="apparatus" label={words.apparatus} />
          <NumberField control={control} name="common" label={words.common} hint={words.commonHint} unit="%" />
        </Fields>
        <chakra.div maxWidth="760px" marginTop="18px">
          <AreaField control={control} name="source" label={words.source} hint={words.sourceHint} rows={2} />
        </chakra.div>
      </Section>
      <Section title={words.points} id="points" tight>
        {series.points.length > MOST_POINTS ? (
          <p>{fill(words.many, { n: series.points.length })}</p>
        ) : (
          <PointsGrid form={form} units={units} />
        )}
        <FormError message={formState.errors.root?.message} />
        {conflict && (
          <Banner
            tone="warning"
            live
            mark={
              <chakra.b color="warn">
                <WarnMark />
                {words.conflict}
              </chakra.b>
            }
          >
            {words.conflictWhy} <WordButton onClick={onReload}>{words.reload}</WordButton>
          </Banner>
        )}
        <Actions>
          <Button kind="primary" type="submit" busy={loading} waitingFor={!formState.isDirty && words.unchanged}>
            {loading ? words.saving : words.save}
          </Button>
          <Link to={paths.series(series.id)}>{words.back}</Link>
        </Actions>
      </Section>
    </chakra.form>
  );
}

const HEADER = ['title', 'source', 'method', 'apparatus', 'dataOrigin'] as const;
const POINT = {
  temperature: 'temperature',
  pressure: 'pressure',
  diffusivity: 'diffusivity',
  diffusivityUncertainty: 'uncertainty',
} as const;

/** The field that a path of the input stands for. */
function fieldOf(path: string) {
  const header = HEADER.find((name) => name === path);
  if (header) return header;
  if (path === 'commonRelativeUncertainty') return 'common' as const;
  const [, index, name] = /^points\.(\d+)\.(\w+)$/.exec(path) ?? [];
  const field = name === undefined ? undefined : POINT[name as keyof typeof POINT];
  return field === undefined ? null : (`points.${Number(index)}.${field}` as const);
}
