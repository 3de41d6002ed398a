import type { Inheritance } from '../rules/facts.ts';

/** Inheritances kept once each, so that equal ones are the same object and bear one number. */
export interface Inheritances {
  /** What follows on `before` after one beer, made once for each beer. */
  after(before: Inheritance, batchId: string, make: () => Inheritance): Inheritance;
  number(inheritance: Inheritance): number;
}

export function inheritances(): Inheritances {
  const byContent = new Map<string, Inheritance>();
  const numbers = new Map<Inheritance, number>();
  const followers = new Map<Inheritance, Map<string, Inheritance>>();

  const only = (inheritance: Inheritance): Inheritance => {
    const content = contentOf(inheritance);
    const known = byContent.get(content);
    if (known) return known;
    byContent.set(content, inheritance);
    return inheritance;
  };
  const followersOf = (before: Inheritance): Map<string, Inheritance> => {
    const known = followers.get(before) ?? new Map<string, Inheritance>();
    followers.set(before, known);
    return known;
  };
  return {
    after(before, batchId, make) {
      const known = followersOf(before);
      const after = known.get(batchId) ?? only(make());
      known.set(batchId, after);
      return after;
    },
    number(inheritance) {
      const number = numbers.get(inheritance) ?? numbers.size;
      numbers.set(inheritance, number);
      return number;
    },
  };
}

/** The order in which allergens and cultures came in does not matter. */
const contentOf = ({ allergens, cultures, ...rest }: Inheritance): string =>
  JSON.stringify([
    allergens.toSorted(),
    cultures.toSorted(),
    rest.strongestOg ?? null,
    rest.ogUnknown ?? false,
    rest.allergensUnknown ?? false,
    rest.culturesUnknown ?? false,
  ]);
