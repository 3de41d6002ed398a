import type { BatchFacts, Inheritance } from '../rules/facts.ts';

/** A fresh yeast hands nothing down. */
export const NOTHING_INHERITED: Inheritance = {
  allergens: [],
  cultures: [],
  strongestOg: undefined,
  ogUnknown: false,
  allergensUnknown: false,
  culturesUnknown: false,
};

/**
 * What a yeast hands down after one more beer: allergens and cultures travel with it for ever.
 * Taking in the same batch twice changes nothing.
 */
export function inherit(before: Inheritance, batch: BatchFacts): Inheritance {
  return {
    allergens: union(before.allergens, batch.allergens),
    cultures: union(before.cultures, batch.cultures),
    strongestOg: higher(before.strongestOg, batch.og),
    ogUnknown: before.ogUnknown === true || batch.og === undefined,
    allergensUnknown: before.allergensUnknown === true || batch.allergens === undefined,
    culturesUnknown: before.culturesUnknown === true || batch.cultures === undefined,
  };
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
