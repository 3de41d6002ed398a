import { ProblemError, sentenceOf } from '../../api/errors.ts';

/** `/dryHops/0/gramsPerLitre` as the form names it: `dryHops.0.gramsPerLitre`. */
export function pathOf(pointer: string): string {
  return pointer
    .replace(/^#?\//, '')
    .split('/')
    .map((part) => part.replaceAll('~1', '/').replaceAll('~0', '~'))
    .join('.');
}

export interface SortedErrors {
  /** What is wrong with one field each. */
  fields: { path: string; detail: string }[];
  /** What belongs to the form as a whole. */
  rest: string | null;
}

/** What the server refused, by the fields that a form has. */
export function sortErrors(error: unknown, names: readonly string[]): SortedErrors {
  if (!(error instanceof ProblemError) || !error.problem.errors?.length)
    return { fields: [], rest: sentenceOf(error) };
  const all = error.problem.errors.map(({ pointer, detail }) => ({
    path: pathOf(pointer),
    detail,
  }));
  const isField = ({ path }: { path: string }) => names.includes(path.split('.')[0] ?? '');
  const elsewhere = all.filter((each) => !isField(each)).map(({ detail }) => detail);
  return { fields: all.filter(isField), rest: elsewhere.length > 0 ? elsewhere.join(' ') : null };
}
