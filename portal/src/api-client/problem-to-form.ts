import type { FieldValues, Path, UseFormSetError } from 'react-hook-form';
import { ProblemError } from './problem-error';

/** '#/items/0/startsAt' becomes 'items.0.startsAt', the path react-hook-form uses. */
const fieldPath = (pointer: string): string => pointer.replace(/^#?\/?/, '').replaceAll('/', '.');

/**
 * Puts the field errors of a refusal on the fields of a form, and the first of them in focus.
 *
 * @param fields - names of the fields the form shows; an error on any other is not lost but left to the alert.
 * @returns true when every error found its field, so that no alert is needed beside them.
 * @example onError: (error) => setShowAlert(!applyProblemToForm(form.setError, error, ['note', 'endsAt']))
 */
export function applyProblemToForm<T extends FieldValues>(
  setError: UseFormSetError<T>,
  error: unknown,
  fields: readonly Path<T>[],
): boolean {
  if (!(error instanceof ProblemError) || error.errors.length === 0) return false;
  const named = error.errors.map(({ pointer, detail }) => ({ path: fieldPath(pointer), detail }));
  const known = named.filter(({ path }) => fields.includes(path as Path<T>));
  known.forEach(({ path, detail }, index) =>
    setError(path as Path<T>, { type: 'server', message: detail }, { shouldFocus: index === 0 }),
  );
  return known.length === named.length;
}
