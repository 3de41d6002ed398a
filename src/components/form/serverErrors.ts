import type { FieldValues, Path, UseFormReturn } from 'react-hook-form';
import { sortErrors } from './sortErrors.ts';

/**
 * Puts what the server refused at the fields it named. Answers the sentence that belongs to the
 * form as a whole: of errors without a field, or of a failure of another kind.
 */
export function showServerErrors<V extends FieldValues, C, O extends FieldValues>(
  form: UseFormReturn<V, C, O>,
  error: unknown,
): string | null {
  const { fields, rest } = sortErrors(error, Object.keys(form.getValues()));
  fields.forEach(({ path, detail }, place) =>
    form.setError(
      path as Path<V>,
      { type: 'server', message: detail },
      { shouldFocus: place === 0 },
    ),
  );
  return rest;
}
