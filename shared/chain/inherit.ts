import type { BatchFacts, Inheritance } from '../rules/facts.ts';

/** A fresh yeast hands nothing down. */
export const NOTHING_INHERITED: Inheritance = { allergens: [], cultures: [] };

/**
 * What a yeast hands down after one more beer: allergens and cultures travel with it for ever.
 * Taking in the same batch twice changes nothing.
 */
export function inherit(before: Inheritance, batch: BatchFacts): Inheritance {
  const after: Inheritance = {
    allergens: union(before.allergens, batch.allergens),
    cultures: union(before.cultures, batch.cultures),
  };
  const strongest = higher(before.strongestOg, batch.og);
  if (strongest !== undefined) after.strongestOg = strongest;
  if (before.ogUnknown || batch.og === undefined) after.ogUnknown = true;
  if (before.allergensUnknown || batch.allergens === undefined) after.allergensUnknown = true;
  if (before.culturesUnknown || batch.cultures === undefined) after.culturesUnknown = true;
  return after;
}

function union<T>(before: readonly T[], more: readonly T[] = []): readonly T[] {
  for (const one of more)
    if (!before.includes(one)) return [...before, ...more.filter((each) => !before.includes(each))];
  return before;
}

function higher(a: number | undefined, b: number | undefined): number | undefined {
  if (a === undefined || b === undefined) return a ?? b;
  return Math.max(a, b);
}
