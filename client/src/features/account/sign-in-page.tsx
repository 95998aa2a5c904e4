import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { Link, useNavigate } from 'react-router-dom';
import { HttpProblem } from '../../lib/http';
import { paths, safeNext } from '../../lib/paths';
import { signIn } from '../../lib/session';
import { accountStrings } from '../../strings/account';
import { Actions, Button } from '../../ui/form/button';
import { Fields, FormError, PasswordField, TextField } from '../../ui/form/field';
import { MarginBlock } from '../../ui/page/margin-block';
import { Page } from '../../ui/page/page';
import { Opening } from '../../ui/page/section';
import { signInSchema } from './account-schemas';
import { refusalWords } from './refusals';

const words = accountStrings.signIn;

/** E-mail and password; then on to where the person was going. */
export function SignInPage({ next }: { readonly next: string | null }) {
  return (
    <Page title={words.title} path={[{ name: words.title }]}>
      <Opening
        small
        title={words.title}
        margin={
          <>
            <MarginBlock title={words.noAccount}>
              <p>
                {words.noAccountWords} <Link to={paths.catalogue()}>{words.toSheets}</Link>
              </p>
            </MarginBlock>
            <MarginBlock title={words.staying}>
              <p>{words.stayingWords}</p>
            </MarginBlock>
          </>
        }
      >
        <SignInForm next={next} />
      </Opening>
    </Page>
  );
}

export function SignInForm({ next }: { readonly next: string | null }) {
  const navigate = useNavigate();
  const form = useForm({ resolver: zodResolver(signInSchema), defaultValues: { email: '', password: '' } });
  const attempt = useMutation({
    mutationFn: (pair: { email: string; password: string }) => signIn(pair.email, pair.password),
  });
  const submit = form.handleSubmit(async (pair) => {
    try {
      await attempt.mutateAsync(pair);
      await navigate(safeNext(next, paths.home()), { replace: true });
    } catch (error) {
      const wrong = error instanceof HttpProblem && error.status === 401;
      form.setError('root', { type: 'server', message: wrong ? words.wrong : refusalWords(error) });
      if (wrong) form.setFocus('password');
    }
  });
  return (
    <form onSubmit={submit} noValidate aria-label={words.title}>
      <Fields>
        <TextField control={form.control} name="email" label={words.email} type="email" autoComplete="username" />
        <PasswordField control={form.control} name="password" label={words.password} autoComplete="current-password" />
        <FormError message={form.formState.errors.root?.message} />
      </Fields>
      <Actions>
        <Button type="submit" kind="primary" busy={attempt.isPending}>
          {words.action}
        </Button>
        <Link to={paths.forgottenPassword()}>{words.forgotten}</Link>
      </Actions>
    </form>
  );
}
