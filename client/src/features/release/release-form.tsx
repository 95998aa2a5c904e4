import { useMutation } from '@apollo/client/react';
import { zodResolver } from '@hookform/resolvers/zod';
import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Link, useNavigate } from 'react-router-dom';
import { z } from 'zod';
import { ReleaseVersionDocument, type VersionAtReleaseFragment } from '../../gql/graphql';
import { errorCode, errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { applyProblems } from '../../lib/form-problems';
import { paths } from '../../lib/paths';
import { usePerson } from '../../lib/session';
import { versionStrings } from '../../strings/versions';
import { Progress } from '../../ui/feedback/states';
import { Actions, Button, WordButton } from '../../ui/form/button';
import { FormError, PasswordField } from '../../ui/form/field';

const words = versionStrings.release;
const schema = z.object({ password: z.string().min(1, words.needsPassword) });

interface ReleaseFormProps {
  readonly version: VersionAtReleaseFragment;
  readonly onReload: () => void;
}

/** The password, and the one button that cannot be taken back. */
export function ReleaseForm({ version, onReload }: ReleaseFormProps) {
  const { number, sheet, preparedBy } = version;
  const person = usePerson();
  const navigate = useNavigate();
  const [conflict, setConflict] = useState(false);
  const [release, { loading, client }] = useMutation(ReleaseVersionDocument, { errorPolicy: 'all' });
  const { control, handleSubmit, setError, resetField, formState } = useForm({
    resolver: zodResolver(schema),
    defaultValues: { password: '' },
  });
  const own = preparedBy?.id === person?.id;
  const submit = handleSubmit(async ({ password }) => {
    const { data, error } = await release({ variables: { id: version.id, password } });
    const outcome = data?.releaseDataSheet;
    if (outcome?.version) {
      // The sheet, its older versions and every list know of it now.
      await client.clearStore();
      return navigate(paths.version(sheet.code, outcome.version.number));
    }
    resetField('password');
    if (errorCode(error) === 'CONFLICT') return setConflict(true);
    if (error) setError('root', { message: errorMessage(error) });
    applyProblems(setError, outcome?.problems ?? [], (path) => (path === 'password' ? path : null));
  });
  return (
    <chakra.form noValidate onSubmit={(event) => void submit(event)}>
      <chakra.div display="flex" flexWrap="wrap" gap="12px 24px" alignItems="flex-end">
        <PasswordField
          control={control}
          name="password"
          label={fill(words.password, { name: person?.name ?? '' })}
          autoComplete="current-password"
          width="300px"
        />
        <Button kind="primary" type="submit" busy={loading} waitingFor={own && words.own}>
          {loading ? words.releasing : fill(words.button, { number })}
        </Button>
      </chakra.div>
      {loading && <Progress label={words.releasing} share={null} />}
      <FormError message={formState.errors.root?.message} />
      {conflict && (
        <Actions>
          <FormError message={words.conflict} />
          <WordButton onClick={onReload}>{words.reload}</WordButton>
        </Actions>
      )}
      <chakra.p textStyle="small" color="ink2" marginTop="10px">
        {words.final} <Link to={paths.version(sheet.code, number)}>{words.notYet}</Link>
      </chakra.p>
    </chakra.form>
  );
}
