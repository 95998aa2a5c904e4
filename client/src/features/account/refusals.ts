import { type FieldPath, type FieldValues, type UseFormSetError } from 'react-hook-form';
import { fill } from '../../lib/fill';
import { applyProblems } from '../../lib/form-problems';
import { HttpProblem } from '../../lib/http';
import { accountStrings } from '../../strings/account';

/** Shows a refused request at the fields it names, or at the form. */
export function showRefusal<V extends FieldValues>(
  setError: UseFormSetError<V>,
  error: unknown,
  fields: readonly FieldPath<V>[],
): void {
  const field = (path: string) => fields.find((name) => name === path) ?? null;
  if (error instanceof HttpProblem && error.fields.length > 0) applyProblems(setError, error.fields, field);
  else setError('root', { type: 'server', message: refusalWords(error) });
}

export function refusalWords(error: unknown): string {
  if (!(error instanceof HttpProblem)) return accountStrings.problems.failed;
  if (error.status === 429) return fill(accountStrings.signIn.throttled, { seconds: error.retryAfterSeconds ?? 60 });
  return error.message;
}
