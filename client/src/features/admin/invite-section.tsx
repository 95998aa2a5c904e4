import { useMutation } from '@apollo/client/react';
import { zodResolver } from '@hookform/resolvers/zod';
import { Controller, useForm } from 'react-hook-form';
import { z } from 'zod';
import { InvitePersonDocument } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { applyProblems } from '../../lib/form-problems';
import { adminStrings } from '../../strings/admin';
import { Actions, Button } from '../../ui/form/button';
import { Fields, FormError, TextField } from '../../ui/form/field';
import { TickMark } from '../../ui/marks/marks';
import { Section } from '../../ui/page/section';
import { RoleChoice, ROLES } from './role-choice';

const words = adminStrings.invite;

const inviteSchema = z.object({
  email: z.string().trim().pipe(z.email(words.emailWrong)),
  roles: z.array(z.enum(ROLES)),
});

/** Sends an invitation by e-mail. */
export function InviteSection() {
  const form = useForm({ resolver: zodResolver(inviteSchema), defaultValues: { email: '', roles: [] } });
  const [invite, { data, loading }] = useMutation(InvitePersonDocument, { refetchQueries: ['People'] });
  const sentTo = data?.invitePerson.person?.email;
  const submit = form.handleSubmit(async (input) => {
    try {
      const { data: answer } = await invite({ variables: { input } });
      const problems = answer?.invitePerson.problems ?? [];
      if (problems.length === 0) form.reset();
      else applyProblems(form.setError, problems, (path) => (path === 'email' || path === 'roles' ? path : null));
    } catch (error) {
      form.setError('root', { type: 'server', message: `${words.failed} ${errorMessage(error)}` });
    }
  });
  const { errors } = form.formState;
  return (
    <Section title={words.title} id="invite">
      <form onSubmit={(event) => void submit(event)} noValidate aria-label={words.title}>
        <Fields>
          <TextField control={form.control} name="email" label={words.email} type="email" hint={words.note} />
          <Controller
            control={form.control}
            name="roles"
            render={({ field }) => <RoleChoice legend={words.roles} roles={field.value} onChange={field.onChange} />}
          />
          <FormError message={errors.roles?.message ?? errors.root?.message} />
        </Fields>
        <Actions>
          <Button type="submit" kind="primary" busy={loading}>
            {words.action}
          </Button>
        </Actions>
      </form>
      <p role="status">
        {sentTo && (
          <>
            <TickMark />
            {fill(words.sent, { email: sentTo })}
          </>
        )}
      </p>
    </Section>
  );
}
