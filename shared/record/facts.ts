/** A fact that changed, in words: "24 IBU" became "28 IBU". Null: it was not known, or is not now. */
export interface FactChange {
  /** As it reads within a sentence: "bitterness". */
  label: string;
  from: string | null;
  to: string | null;
}

/** How a field is called, and how its value reads. Null is a value that is not there. */
export interface FactWords {
  label: string;
  say: (value: unknown) => string | null;
}

export type FactTable = Readonly<Record<string, FactWords>>;

/** What differs between two versions of a row, in the order of the table; fields without words are left out. */
export function factChanges(table: FactTable, before: object, after: object): FactChange[] {
  return Object.entries(table).flatMap(([key, { label, say }]) => {
    const [from, to] = [say(Reflect.get(before, key)), say(Reflect.get(after, key))];
    return from === to ? [] : [{ label, from, to }];
  });
}

/** More than these are counted, not named: the sentence also stands on a button. */
const NAMED = 2;

/**
 * "Set the bitterness of Keel from 24 to 28 IBU".
 * @param of what the facts belong to, as it follows them: "of Keel", "of the cake under Keel".
 * @param whole what is said where nothing else can be: "Changed Keel".
 */
export function factSentence(of: string, whole: string, changes: readonly FactChange[]): string {
  const [first, ...rest] = changes;
  if (!first) return whole;
  if (rest.length === 0) return single(of, first);
  const named = changes
    .slice(0, NAMED)
    .map(({ label, from, to }) => `${label} ${fromTo(from, to)}`);
  const more = changes.length - NAMED;
  if (more <= 0) return `${whole}: ${named.join(', ')}`;
  return `${whole}: ${named.join(', ')} and ${more} more`;
}

function single(of: string, { label, from, to }: FactChange): string {
  if (to === null) return `Took out the ${label} ${of}, which was ${from ?? 'not known'}`;
  return `Set the ${label} ${of} ${fromTo(from, to)}`;
}

/** "from 24 to 28 IBU": a unit that both share is said once. */
export function fromTo(from: string | null, to: string | null): string {
  if (from === null) return `to ${to ?? 'not known'}`;
  if (to === null) return `from ${from} to not known`;
  const unit = /^[\d.,−-]+( .+)$/u;
  const [a, b] = [unit.exec(from)?.[1], unit.exec(to)?.[1]];
  return a !== undefined && a === b
    ? `from ${from.slice(0, -a.length)} to ${to}`
    : `from ${from} to ${to}`;
}
