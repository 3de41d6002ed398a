import { toNestErrors } from '@hookform/resolvers';
import type { FieldErrors, FieldValues, Resolver } from 'react-hook-form';
import type { z } from 'zod';
import { issueWords } from './issueWords.ts';
import { collect } from './written.ts';

export interface ContractOptions {
  /** The contract has a `typed` record, which the number fields fill. */
  typed?: boolean;
  /** Turns what the fields hold into what the contract wants, where the two differ. */
  shape?: ((body: Record<string, unknown>) => Record<string, unknown>) | undefined;
}

/**
 * Judges a form by the same contract as its route does. A number that could not be read is named
 * in the words of its field; all issues come back, not the first.
 */
export function contractResolver<Values extends FieldValues, Output extends FieldValues>(
  schema: z.ZodType<Output>,
  { typed: hasTyped = false, shape = (body) => body }: ContractOptions = {},
): Resolver<Values, unknown, Output> {
  return (values, _context, options) => {
    const { body, typed, faults } = collect(values);
    const shaped = shape(body as Record<string, unknown>);
    const parsed = schema.safeParse(hasTyped ? { ...shaped, typed } : shaped);
    const flat: Record<string, { type: string; message: string }> = {};
    if (!parsed.success)
      for (const issue of parsed.error.issues)
        flat[issue.path.join('.')] ??= { type: issue.code, message: issueWords(issue, values) };
    for (const fault of faults) flat[fault.path] = { type: 'unreadable', message: fault.why };
    if (parsed.success && faults.length === 0) return { values: parsed.data, errors: {} };
    const errors = toNestErrors(flat as FieldErrors<Values>, options);
    return { values: {}, errors };
  };
}
