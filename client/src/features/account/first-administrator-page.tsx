import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { useNavigate } from 'react-router-dom';
import { paths } from '../../lib/paths';
import { accountStrings } from '../../strings/account';
import { Actions, Button } from '../../ui/form/button';
import { Fields, FormError, PasswordField, TextField } from '../../ui/form/field';
import { Page } from '../../ui/page/page';
import { Opening } from '../../ui/page/section';
import { createFirstAdministrator } from './account-requests';
import { firstAdministratorSchema } from './account-schemas';
import { showRefusal } from './refusals';

const words = accountStrings.first;

/** Where the one-time link of a new service leads. */
export function FirstAdministratorPage({ token }: { readonly token: string }) {
  const navigate = useNavigate();
  const form = useForm({
    resolver: zodResolver(firstAdministratorSchema),
    defaultValues: { email: '', name: '', password: '' },
  });
  const making = useMutation({ mutationFn: createFirstAdministrator });
  const submit = form.handleSubmit(async (account) => {
    try {
      await making.mutateAsync({ token, ...account });
      await navigate(paths.home(), { replace: true });
    } catch (error) {
      showRefusal(form.setError, error, ['email', 'name', 'password']);
    }
  });
  return (
    <Page title={words.title} path={[{ name: words.title }]}>
      <Opening small title={words.title} lead={words.lead}>
        <form onSubmit={submit} noValidate aria-label={words.title}>
          <Fields>
            <TextField
              control={form.control}
              name="email"
              label={accountStrings.signIn.email}
              type="email"
              autoComplete="username"
            />
            <TextField control={form.control} name="name" label={accountStrings.invitation.name} autoComplete="name" />
            <PasswordField
              control={form.control}
              name="password"
              label={accountStrings.invitation.password}
              autoComplete="new-password"
            />
            <FormError message={form.formState.errors.root?.message} />
          </Fields>
          <Actions>
            <Button type="submit" kind="primary" busy={making.isPending}>
              {words.action}
            </Button>
          </Actions>
        </form>
      </Opening>
    </Page>
  );
}
