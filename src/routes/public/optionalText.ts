import { z } from 'zod';

/** A text field that may stay empty: an empty one counts as absent. */
export const optionalText = <T>(schema: z.ZodType<T>) =>
  z.preprocess(
    (value) => (typeof value === 'string' && value.trim() === '' ? undefined : value),
    schema,
  );
