import { type FieldPath, type FieldValues, type UseFormSetError } from 'react-hook-form';

/** A refusal of the API: where in the input, and why. */
export interface Refusal {
  readonly message: string;
  readonly path?: string | null;
}

/**
 * Shows each refusal at the field its path names; what names no field of this form stands at the form as a whole.
 *
 * @param fieldOf the form's field for a path of the input, or null
 */
export function applyProblems<V extends FieldValues>(
  setError: UseFormSetError<V>,
  problems: readonly Refusal[],
  fieldOf: (path: string) => FieldPath<V> | null,
): void {
  const homeless: string[] = [];
  for (const { message, path } of problems) {
    const field = path ? fieldOf(path) : null;
    if (field === null) homeless.push(message);
    else setError(field, { type: 'server', message });
  }
  if (homeless.length > 0) setError('root', { type: 'server', message: homeless.join(' ') });
}
