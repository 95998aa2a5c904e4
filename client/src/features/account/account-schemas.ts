import { z } from 'zod';
import { accountStrings } from '../../strings/account';

const problems = accountStrings.problems;
const email = z.string().trim().pipe(z.email(problems.email));
const name = z.string().trim().min(1, problems.name);
/** Length is all that is asked here; the service also refuses what is commonly guessed. */
const newPassword = z.string().min(12, problems.passwordShort);

export const signInSchema = z.object({ email, password: z.string().min(1, problems.passwordMissing) });
export const invitationSchema = z.object({ name, password: newPassword });
export const forgottenSchema = z.object({ email });
export const resetSchema = z.object({ password: newPassword });
export const firstAdministratorSchema = z.object({ email, name, password: newPassword });
