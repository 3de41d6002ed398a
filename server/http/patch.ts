import type { z } from 'zod';

/**
 * A row's fields with a patch over them, checked together: the patch alone cannot tell whether the
 * final gravity is above the original one that is stored.
 * @throws ZodError
 */
export function merged<T extends { id: string }>(
  schema: z.ZodType<T>,
  fields: readonly string[],
  row: { id: string },
  patch: object,
): T {
  const known = Object.fromEntries(fields.map((field) => [field, Reflect.get(row, field)]));
  return schema.parse({ ...known, ...patch, id: row.id });
}
