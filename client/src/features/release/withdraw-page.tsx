import { useMutation, useQuery } from '@apollo/client/react';
import { zodResolver } from '@hookform/resolvers/zod';
import { chakra } from '@chakra-ui/react';
import { useForm, useWatch } from 'react-hook-form';
import { Link, useNavigate } from 'react-router-dom';
import { type VersionToWithdrawQuery, VersionToWithdrawDocument, WithdrawVersionDocument } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { applyProblems } from '../../lib/form-problems';
import { formatDate } from '../../lib/format-quantity';
import { pairTitle } from '../../lib/pair-title';
import { paths } from '../../lib/paths';
import { usePerson } from '../../lib/session';
import { versionStrings } from '../../strings/versions';
import { Empty, Failed, Loading, Progress } from '../../ui/feedback/states';
import { Actions, Button } from '../../ui/form/button';
import { AreaField, FormError, PasswordField, SelectField } from '../../ui/form/field';
import { StateMark, stateOf } from '../../ui/marks/state-mark';
import { MarginBlock } from '../../ui/page/margin-block';
import { Page } from '../../ui/page/page';
import { Opening, Section } from '../../ui/page/section';
import { withdrawalReason, withdrawReasons, withdrawSchema } from './withdraw-form';

const words = versionStrings.withdraw;
const sheets = { name: versionStrings.path.sheets, to: paths.catalogue() };
type Version = Extract<NonNullable<VersionToWithdrawQuery['node']>, { __typename?: 'DataSheetVersion' }>;

/** Taking a released version out of use: reason, words for readers, password. */
export function WithdrawPage({ id }: { readonly id: string }) {
  const { data, error, refetch } = useQuery(VersionToWithdrawDocument, {
    variables: { id },
    fetchPolicy: 'network-only',
    nextFetchPolicy: 'cache-first',
  });
  const version = data?.node?.__typename === 'DataSheetVersion' ? data.node : null;
  const name = version ? pairTitle(version.sheet.pair.substances) : '';
  const title = version
    ? fill(words.title, { title: `${name.charAt(0).toLowerCase()}${name.slice(1)}`, number: version.number })
    : versionStrings.path.withdraw;
  const open = version?.status === 'RELEASED' || version?.status === 'SUPERSEDED';
  return (
    <Page
      title={title}
      path={[
        sheets,
        ...(version
          ? [
              { name, to: paths.sheet(version.sheet.code) },
              {
                name: fill(versionStrings.path.version, { number: version.number }),
                to: paths.version(version.sheet.code, version.number),
              },
            ]
          : []),
        { name: versionStrings.path.withdraw },
      ]}
      folio={
        version && (
          <>
            <StateMark state={stateOf(version.status)}>
              {fill(versionStrings.folio, { number: version.number, state: stateOf(version.status) })}
            </StateMark>
            {version.releasedAt && <span>{formatDate(version.releasedAt)}</span>}
          </>
        )
      }
    >
      <Opening small title={title} lead={open ? words.lead : undefined}>
        {error && <Failed what={versionStrings.failed} why={errorMessage(error)} onRetry={() => void refetch()} />}
        {!error && !data && <Loading what={versionStrings.what} />}
        {data && !version && <Empty sentence={versionStrings.missing} />}
        {version && !open && (
          <Empty sentence={fill(versionStrings.closed, { state: stateOf(version.status), cannot: words.cannot })}>
            <Link to={paths.version(version.sheet.code, version.number)}>{versionStrings.toSheet}</Link>
          </Empty>
        )}
      </Opening>
      {version && open && <WithdrawSection version={version} />}
    </Page>
  );
}

function WithdrawSection({ version }: { readonly version: Version }) {
  const { number, sheet } = version;
  const person = usePerson();
  const navigate = useNavigate();
  const [withdraw, { loading, client }] = useMutation(WithdrawVersionDocument, { errorPolicy: 'all' });
  const { control, handleSubmit, setError, resetField, formState } = useForm({
    resolver: zodResolver(withdrawSchema),
    defaultValues: { reason: '' as 'other', words: '', password: '' },
  });
  const typed = useWatch({ control });
  const missing = !typed.reason || !typed.words?.trim() || !typed.password;
  const submit = handleSubmit(async (fields) => {
    const { data, error } = await withdraw({
      variables: { id: version.id, reason: withdrawalReason(fields), password: fields.password },
    });
    const outcome = data?.withdrawDataSheet;
    if (outcome?.version) {
      await client.clearStore();
      return navigate(paths.version(sheet.code, outcome.version.number));
    }
    resetField('password');
    if (error) setError('root', { message: errorMessage(error) });
    applyProblems(setError, outcome?.problems ?? [], (path) =>
      path === 'password' ? path : path === 'reason' ? 'words' : null,
    );
  });
  return (
    <Section
      title={words.section}
      id="withdraw"
      tight
      margin={
        <MarginBlock title={words.or}>
          <p>{words.orNote}</p>
        </MarginBlock>
      }
    >
      <chakra.form
        noValidate
        onSubmit={(event) => void submit(event)}
        borderTop="1.5px solid"
        borderColor="warn"
        paddingTop="18px"
        display="grid"
        gap="18px"
      >
        <SelectField
          control={control}
          name="reason"
          label={words.reason}
          width="420px"
          choices={[
            { value: '', label: words.choose },
            ...withdrawReasons.map((value) => ({ value, label: words.reasons[value] })),
          ]}
        />
        <chakra.div maxWidth="640px">
          <AreaField control={control} name="words" label={words.words} hint={words.wordsHint} rows={4} />
        </chakra.div>
        <PasswordField
          control={control}
          name="password"
          label={fill(versionStrings.release.password, { name: person?.name ?? '' })}
          autoComplete="current-password"
          width="300px"
        />
        {loading && <Progress label={words.withdrawing} share={null} />}
        <FormError message={formState.errors.root?.message} />
        <Actions>
          <Button kind="primary" type="submit" busy={loading} waitingFor={missing && words.missing}>
            {loading ? words.withdrawing : fill(words.button, { number })}
          </Button>
          <Link to={paths.version(sheet.code, number)}>{versionStrings.toSheet}</Link>
        </Actions>
      </chakra.form>
    </Section>
  );
}
