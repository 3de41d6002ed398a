import { isDeepStrictEqual } from 'node:util';
import { problem } from '../problems.ts';

/**
 * A create whose id exists already: the answer of the first time was lost, so the same content is
 * answered again. Other content under the same id is refused, showing what is there.
 * @returns true where `row` is what was asked for.
 */
export function isRepeated<T extends { id: string }>(row: T | undefined, body: object): row is T {
  if (!row) return false;
  const asked = Object.entries(body);
  const same = asked.every(([key, value]) => isDeepStrictEqual(Reflect.get(row, key), value));
  if (same) return true;
  throw problem('already-exists', { current: row });
}

/** The id is taken by something that is not to be seen from here. */
export function demandMade(made: readonly unknown[]): void {
  if (made.length === 0)
    throw problem('already-exists', { detail: 'This id is in use: make a new one' });
}
