/** Comparing a row as it was, as one wants it, and as somebody else left it. Pure. */

const same = (a: unknown, b: unknown) => JSON.stringify(a) === JSON.stringify(b);

/** What differs from the row as it was opened; `typed` comes along with any change. */
export function changesFrom<Facts extends object>(base: Facts, next: Facts): Partial<Facts> {
  const changed: Partial<Facts> = {};
  for (const key of Object.keys(next) as (keyof Facts)[])
    if (!same(base[key], next[key])) changed[key] = next[key];
  return changed;
}

/** Fields that both changed, and differently. */
export function conflictsOf<Facts extends object>(
  base: Facts,
  mine: Partial<Facts>,
  theirs: Facts,
): (keyof Facts)[] {
  const keys = Object.keys(mine) as (keyof Facts)[];
  return keys.filter(
    (key) => key !== 'typed' && !same(base[key], theirs[key]) && !same(mine[key], theirs[key]),
  );
}

/** Texts as typed: theirs, but for the fields that are mine. */
export function mergeTyped(
  theirs: Record<string, { text: string; unit: string }>,
  mine: Record<string, { text: string; unit: string }>,
  myKeys: readonly string[],
) {
  const isMine = (path: string) => myKeys.includes(path.split('.')[0] ?? '');
  return Object.fromEntries([
    ...Object.entries(theirs).filter(([path]) => !isMine(path)),
    ...Object.entries(mine).filter(([path]) => isMine(path)),
  ]);
}
