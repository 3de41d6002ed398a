import type { z } from 'zod';

/**
 * Adds a rule across keys that is asked even where other keys are faulty, so that every issue comes
 * out at once. `fits` may meet keys of the wrong type: where it cannot tell, it answers true.
 */
export function alsoWhenFaulty<T extends z.ZodType>(
  schema: T,
  path: PropertyKey[],
  message: string,
  fits: (value: z.output<T>) => boolean,
): T {
  return schema.refine((value) => typeof value !== 'object' || value === null || fits(value), {
    path,
    message,
    when: () => true,
  });
}

/** Both ends of a range or neither, and in order. Null counts as not given. */
export function bothEnds<T extends z.ZodType<Record<string, unknown>>>(
  schema: T,
  min: string,
  max: string,
): T {
  const given = (value: unknown) => value !== undefined && value !== null;
  const lacks =
    (one: string, other: string) =>
    (range: Record<string, unknown>): boolean =>
      !(given(range[other]) && !given(range[one]));
  const inOrder = (range: Record<string, unknown>): boolean => {
    const low = range[min];
    const high = range[max];
    return typeof low !== 'number' || typeof high !== 'number' || low <= high;
  };
  const ends = 'Give both ends of the range or neither';
  const withMin = alsoWhenFaulty(schema, [min], ends, lacks(min, max));
  const withMax = alsoWhenFaulty(withMin, [max], ends, lacks(max, min));
  return alsoWhenFaulty(withMax, [max], 'Must not be below the lower end', inOrder);
}
