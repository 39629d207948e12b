import { type FieldPath, type FieldValues, type UseFormSetError } from 'react-hook-form';
import { ApiProblem } from './api-problem';
import { problemInWords } from './bench/problem';

/**
 * Puts what the service refused at the fields it belongs to.
 *
 * @param error whatever the request threw.
 * @param setError the form's own.
 * @param fields names of the form's fields; `/email` and `/email/0` belong to `email`.
 * @param elsewhere other pointers and the field that stands for them.
 */
export function showProblem<Values extends FieldValues>(
  error: unknown,
  setError: UseFormSetError<Values>,
  fields: readonly FieldPath<Values>[],
  elsewhere: Record<string, FieldPath<Values>> = {},
): void {
  const placed = new Set<string>();
  for (const { pointer, message, line } of error instanceof ApiProblem ? error.errors : []) {
    const first = pointer?.split('/')[1] ?? '';
    const field = elsewhere[first] ?? fields.find((name) => name === first);
    if (!field) continue;
    // The first thing said about a field is shown; the next one follows when it is mended.
    if (!placed.has(field)) {
      const isPlaced = !line || message.startsWith(`Line ${line}:`);
      const text = isPlaced ? message : `Line ${line}: ${message}`;
      setError(field, { message: text }, { shouldFocus: placed.size === 0 });
    }
    placed.add(field);
  }
  if (placed.size === 0) setError('root', { message: problemInWords(error) });
}
