import type { Inheritance } from '#shared/rules/facts.ts';
import { ALLERGEN_WORDS, CULTURE_WORDS } from './traitWords.ts';

/** What may be in a beer by what went before it, in plain words: told wherever beers are. */
export const allergensLine = (carried: Pick<Inheritance, 'allergens' | 'allergensUnknown'>) =>
  listed(
    carried.allergens.map((one) => ALLERGEN_WORDS[one]),
    carried.allergensUnknown ?? false,
  );

export const culturesLine = (carried: Pick<Inheritance, 'cultures' | 'culturesUnknown'>) =>
  listed(
    carried.cultures.map((one) => CULTURE_WORDS[one]),
    carried.culturesUnknown ?? false,
  );

/** "Gluten, milk; not known of every beer." */
function listed(words: readonly string[], isUnknown: boolean): string {
  const known = words.map((word, at) => (at === 0 ? word : word.toLowerCase())).join(', ');
  if (!isUnknown) return known === '' ? 'None declared.' : `${known}.`;
  return known === '' ? 'Not known.' : `${known}; not known of every beer.`;
}
