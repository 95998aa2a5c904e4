import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation, useQuery } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { useNavigate } from 'react-router-dom';
import { fill } from '../../lib/fill';
import { formatDate } from '../../lib/format-quantity';
import { paths } from '../../lib/paths';
import { accountStrings } from '../../strings/account';
import { Failed, Loading } from '../../ui/feedback/states';
import { Actions, Button } from '../../ui/form/button';
import { Fields, FormError, PasswordField, TextField } from '../../ui/form/field';
import { MarginBlock } from '../../ui/page/margin-block';
import { Page } from '../../ui/page/page';
import { Opening } from '../../ui/page/section';
import { acceptInvitation, readInvitation, type Invitation } from './account-requests';
import { invitationSchema } from './account-schemas';
import { refusalWords, showRefusal } from './refusals';

const words = accountStrings.invitation;

/** The page a letter of invitation leads to. */
export function InvitationPage({ token }: { readonly token: string }) {
  const { data, error } = useQuery({
    queryKey: ['invitation', token],
    queryFn: () => readInvitation(token),
    retry: false,
  });
  return (
    <Page title={words.title} path={[{ name: words.title }]}>
      <Opening small title={words.title} lead={words.lead} margin={data && <InvitationFacts invitation={data} />}>
        {error && <Failed what={words.gone} why={`${refusalWords(error)} ${words.ask}`} />}
        {!data && !error && <Loading what={words.what} />}
        {data && <InvitationForm token={token} />}
      </Opening>
    </Page>
  );
}

const InvitationFacts = ({ invitation: { email, roles, expiresAt } }: { readonly invitation: Invitation }) => (
  <MarginBlock
    entries={[
      [words.as, roles.map((role) => accountStrings.roles[role]).join(', ')],
      [words.email, email],
      ['', fill(words.until, { date: formatDate(expiresAt) })],
    ]}
  />
);

function InvitationForm({ token }: { readonly token: string }) {
  const navigate = useNavigate();
  const form = useForm({ resolver: zodResolver(invitationSchema), defaultValues: { name: '', password: '' } });
  const acceptance = useMutation({ mutationFn: acceptInvitation });
  const submit = form.handleSubmit(async (account) => {
    try {
      await acceptance.mutateAsync({ token, ...account });
      await navigate(paths.home(), { replace: true });
    } catch (error) {
      showRefusal(form.setError, error, ['name', 'password']);
    }
  });
  return (
    <form onSubmit={submit} noValidate aria-label={words.title}>
      <Fields>
        <TextField control={form.control} name="name" label={words.name} autoComplete="name" />
        <PasswordField control={form.control} name="password" label={words.password} autoComplete="new-password" />
        <FormError message={form.formState.errors.root?.message} />
      </Fields>
      <Actions>
        <Button type="submit" kind="primary" busy={acceptance.isPending}>
          {words.action}
        </Button>
        <span>{words.note}</span>
      </Actions>
    </form>
  );
}
