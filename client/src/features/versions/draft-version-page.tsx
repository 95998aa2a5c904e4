import { useMutation, useQuery } from '@apollo/client/react';
import { zodResolver } from '@hookform/resolvers/zod';
import { chakra } from '@chakra-ui/react';
import { useForm } from 'react-hook-form';
import { Link, useNavigate } from 'react-router-dom';
import { DraftVersionDocument, FitToDraftDocument, type FitToDraftQuery } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { applyProblems } from '../../lib/form-problems';
import { pairTitle } from '../../lib/pair-title';
import { paths } from '../../lib/paths';
import { fitStrings } from '../../strings/fits';
import { versionStrings } from '../../strings/versions';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { Actions, Button } from '../../ui/form/button';
import { AreaField, FormError } from '../../ui/form/field';
import { StateMark, stateOf } from '../../ui/marks/state-mark';
import { MarginBlock } from '../../ui/page/margin-block';
import { Page } from '../../ui/page/page';
import { Opening } from '../../ui/page/section';
import { openVersions, wasReleased, wordsSchema } from './version-words';

const words = versionStrings.draft;
type Fit = NonNullable<FitToDraftQuery['fit']>;

/** A new version of the pair's sheet from a kept fit: its summary, and what changed. */
export function DraftVersionPage({ fitId }: { readonly fitId: string }) {
  const { data, error, refetch } = useQuery(FitToDraftDocument, {
    variables: { id: fitId },
    fetchPolicy: 'cache-and-network',
  });
  const fit = data?.fit;
  const name = fit ? pairTitle(fit.pair.substances) : '';
  const title = fit ? fill(words.title, { number: fit.number }) : versionStrings.path.draft;
  const path = fit
    ? [
        { name: fitStrings.path.pairs, to: paths.pairs() },
        { name, to: paths.pair(fit.pair.id) },
        { name: fill(fitStrings.fitTitle, { number: fit.number }), to: paths.fit(fit.id) },
        { name: versionStrings.path.draft },
      ]
    : [{ name: versionStrings.path.draft }];
  return (
    <Page title={title} path={path}>
      <Opening
        small
        title={title}
        lead={fit ? fill(words.lead, { pair: `${name.charAt(0).toLowerCase()}${name.slice(1)}` }) : undefined}
        margin={fit && <SheetBlock fit={fit} />}
      >
        {error && <Failed what={versionStrings.failed} why={errorMessage(error)} onRetry={() => void refetch()} />}
        {!error && !data && <Loading what={versionStrings.what} />}
        {data && !fit && <Empty sentence={words.missing} />}
        {fit && <DraftForm fit={fit} />}
      </Opening>
    </Page>
  );
}

function SheetBlock({ fit: { pair, number } }: { readonly fit: Fit }) {
  const { dataSheet } = pair;
  return (
    <MarginBlock
      entries={[
        [words.sheet, dataSheet?.code ?? words.newSheet],
        [words.current, dataSheet?.current && <StateMark state="released">{dataSheet.current.number}</StateMark>],
        [words.fit, fill(fitStrings.fit, { number })],
        ...openVersions(dataSheet?.versions ?? []).map(
          (version) =>
            [
              words.openDrafts,
              <StateMark key={version.id} state={stateOf(version.status)}>
                <Link
                  to={paths.version(dataSheet?.code ?? '', version.number)}
                >{`${version.number}, ${stateOf(version.status)}`}</Link>
              </StateMark>,
            ] as const,
        ),
      ]}
    />
  );
}

function DraftForm({ fit }: { readonly fit: Fit }) {
  const navigate = useNavigate();
  const before = wasReleased(fit.pair.dataSheet?.versions ?? []);
  const [draft, { loading }] = useMutation(DraftVersionDocument, { errorPolicy: 'all' });
  const { control, handleSubmit, setError, formState } = useForm({
    resolver: zodResolver(wordsSchema(before === null)),
    defaultValues: { summary: '', changeNote: '' },
  });
  const submit = handleSubmit(async ({ summary, changeNote }) => {
    const { data, error } = await draft({
      variables: { input: { fitId: fit.id, summary, changeNote: changeNote || null } },
    });
    const outcome = data?.draftDataSheet;
    if (outcome?.version) return navigate(paths.editVersion(outcome.version.id));
    if (error) setError('root', { message: errorMessage(error) });
    applyProblems(setError, outcome?.problems ?? [], (path) =>
      path === 'summary' || path === 'changeNote' ? path : null,
    );
  });
  return (
    <chakra.form
      noValidate
      onSubmit={(event) => void submit(event)}
      maxWidth="640px"
      display="grid"
      gap="18px"
      marginTop="24px"
    >
      <AreaField control={control} name="summary" label={words.summary} hint={words.summaryHint} />
      {before !== null && (
        <AreaField
          control={control}
          name="changeNote"
          label={words.changeNote}
          hint={fill(words.changeNoteHint, { number: before })}
        />
      )}
      <FormError message={formState.errors.root?.message} />
      <Actions>
        <Button kind="primary" type="submit" busy={loading}>
          {loading ? words.making : words.make}
        </Button>
        <Link to={paths.fit(fit.id)}>{words.back}</Link>
      </Actions>
    </chakra.form>
  );
}
