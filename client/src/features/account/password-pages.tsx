import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { Link } from 'react-router-dom';
import { paths } from '../../lib/paths';
import { accountStrings } from '../../strings/account';
import { Actions, Button } from '../../ui/form/button';
import { Fields, FormError, PasswordField, TextField } from '../../ui/form/field';
import { TickMark } from '../../ui/marks/marks';
import { Page } from '../../ui/page/page';
import { Opening } from '../../ui/page/section';
import { requestPasswordReset, resetPassword } from './account-requests';
import { forgottenSchema, resetSchema } from './account-schemas';
import { showRefusal } from './refusals';

const forgotten = accountStrings.forgotten;
const reset = accountStrings.reset;
const signIn = { name: accountStrings.signIn.title, to: paths.signIn() };

/** Asks for a letter with a link; says the same whether or not there is such an account. */
export function ForgottenPasswordPage() {
  const form = useForm({ resolver: zodResolver(forgottenSchema), defaultValues: { email: '' } });
  const letter = useMutation({ mutationFn: requestPasswordReset });
  const submit = form.handleSubmit(async ({ email }) => {
    try {
      await letter.mutateAsync(email);
    } catch (error) {
      showRefusal(form.setError, error, ['email']);
    }
  });
  return (
    <Page title={forgotten.title} path={[signIn, { name: forgotten.title }]}>
      <Opening small title={forgotten.title} lead={forgotten.note}>
        <form onSubmit={submit} noValidate aria-label={forgotten.title}>
          <Fields>
            <TextField
              control={form.control}
              name="email"
              label={forgotten.email}
              type="email"
              autoComplete="username"
              placeholder={forgotten.placeholder}
            />
            <FormError message={form.formState.errors.root?.message} />
          </Fields>
          <Actions>
            <Button type="submit" kind="primary" busy={letter.isPending}>
              {forgotten.action}
            </Button>
          </Actions>
        </form>
        <p role="status">
          {letter.isSuccess && (
            <>
              <TickMark />
              {forgotten.sent}
            </>
          )}
        </p>
      </Opening>
    </Page>
  );
}

/** The page a letter leads to: a new password. */
export function ResetPasswordPage({ token }: { readonly token: string }) {
  const form = useForm({ resolver: zodResolver(resetSchema), defaultValues: { password: '' } });
  const setting = useMutation({ mutationFn: resetPassword });
  const submit = form.handleSubmit(async ({ password }) => {
    try {
      await setting.mutateAsync({ token, password });
    } catch (error) {
      showRefusal(form.setError, error, ['password']);
    }
  });
  return (
    <Page title={reset.title} path={[signIn, { name: reset.title }]}>
      <Opening small title={reset.title}>
        {setting.isSuccess ? (
          <p role="status">
            <TickMark />
            {reset.done} <Link to={paths.signIn()}>{reset.signIn}</Link>
          </p>
        ) : (
          <form onSubmit={submit} noValidate aria-label={reset.title}>
            <Fields>
              <PasswordField
                control={form.control}
                name="password"
                label={reset.password}
                autoComplete="new-password"
              />
              <FormError message={form.formState.errors.root?.message} />
            </Fields>
            <Actions>
              <Button type="submit" kind="primary" busy={setting.isPending}>
                {reset.action}
              </Button>
              <Link to={paths.forgottenPassword()}>{reset.again}</Link>
            </Actions>
          </form>
        )}
      </Opening>
    </Page>
  );
}
