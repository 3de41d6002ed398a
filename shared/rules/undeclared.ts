import { hold, PASSED, unchecked, type Outcome } from './outcome.ts';

/** What travelled down with the yeast and is not declared on the new beer. */
export interface Undeclared<T> {
  left: T[];
}

/**
 * @param inherited what the earlier beers are known to hand down
 * @param more some earlier beer's are unknown
 * @param declared B's own; undefined where unknown
 * @param all the closed set: a beer that declares all of it has nothing left to declare
 */
export function undeclared<T>(
  inherited: readonly T[],
  more: boolean,
  declared: readonly T[] | undefined,
  all: readonly T[],
  field: string,
): Outcome<Undeclared<T>> {
  if (declared === undefined) return inherited.length === 0 && !more ? PASSED : unchecked([field]);
  if (!holdsAll(declared, inherited))
    return hold({ left: inherited.filter((one) => !declared.includes(one)) });
  return more && !holdsAll(declared, all) ? unchecked([field]) : PASSED;
}

/** Asked for every line of every gap: makes nothing that has to be cleared away. */
function holdsAll<T>(declared: readonly T[], asked: readonly T[]): boolean {
  for (const one of asked) if (!declared.includes(one)) return false;
  return true;
}
