import type { z } from 'zod';

export type EntryContract<O> = z.ZodType<O>;

/** What is wrong, by the name of the field. */
export type Faults = Readonly<Record<string, string>>;

type Judged<O> = { ok: true; values: O } | { ok: false; faults: Faults };

/** What was typed, in the order of the fields. */
export const textsOf = (form: HTMLFormElement): Record<string, string> =>
  Object.fromEntries(
    [...new FormData(form)].map(([name, value]) => [name, typeof value === 'string' ? value : '']),
  );

/** Judges a form of texts by its contract: all issues, the first of each field. */
export function judged<O>(contract: EntryContract<O>, texts: Record<string, string>): Judged<O> {
  const parsed = contract.safeParse(texts);
  if (parsed.success) return { ok: true, values: parsed.data };
  const faults: Record<string, string> = {};
  for (const { path, code, message } of parsed.error.issues)
    faults[path.join('.')] ??= code === 'invalid_type' ? 'Fill this in' : message;
  return { ok: false, faults };
}
