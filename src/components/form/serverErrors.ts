import type { FieldValues, Path, UseFormReturn } from 'react-hook-form';
import { ProblemError, sentenceOf } from '../../api/errors.ts';

/** `/dryHops/0/gramsPerLitre` as the form names it: `dryHops.0.gramsPerLitre`. */
export function pathOf(pointer: string): string {
  return pointer
    .replace(/^#?\//, '')
    .split('/')
    .map((part) => part.replaceAll('~1', '/').replaceAll('~0', '~'))
    .join('.');
}

/**
 * Puts what the server refused at the fields it named. Answers the sentence that belongs to the
 * form as a whole: of errors without a field, or of a failure of another kind.
 */
export function showServerErrors<V extends FieldValues, C, O extends FieldValues>(
  form: UseFormReturn<V, C, O>,
  error: unknown,
): string | null {
  if (!(error instanceof ProblemError) || !error.problem.errors?.length) return sentenceOf(error);
  const values = form.getValues() as Record<string, unknown>;
  const elsewhere: string[] = [];
  let first = true;
  for (const { pointer, detail } of error.problem.errors) {
    const path = pathOf(pointer);
    if ((path.split('.')[0] ?? '') in values) {
      form.setError(path as Path<V>, { type: 'server', message: detail }, { shouldFocus: first });
      first = false;
    } else elsewhere.push(detail);
  }
  return elsewhere.length > 0 ? elsewhere.join(' ') : null;
}
