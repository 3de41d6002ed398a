import type { BatchFacts, PourFacts } from './facts.ts';
import type { KeptCake } from './keptCake.ts';

/** Names of unknown facts, as the check contract calls them. */

/** The part of a link that says how much of the cake is kept. */
interface Kept {
  a: BatchFacts;
  b: BatchFacts;
  pour: PourFacts;
  kept: Pick<KeptCake, 'share'>;
}

type Key = 'volumeL' | 'og' | 'fg' | 'srm' | 'ibu' | 'fermentC' | 'daysUnderBeer' | 'brewOn';

export function missingOf(facts: BatchFacts, ...keys: Key[]): string[] {
  return keys.filter((key) => facts[key] === undefined);
}

/** What a cake's size is worked out from. */
export const missingForCake = (earlier: BatchFacts): string[] =>
  missingOf(earlier, 'volumeL', 'og', 'fg');

/** What a kept part is worked out from. */
export const missingForKept = ({ a, b, pour, kept }: Kept): string[] =>
  together(
    missingForCake(a),
    pour.keepL === 'recommended' && kept.share === undefined
      ? together(missingOf(b, 'volumeL', 'og'), missingForSurvival(a, b, pour))
      : [],
  );

/** What a blend is worked out from. */
export const missingForBlend = (link: Kept): string[] =>
  together(missingForKept(link), missingOf(link.b, 'volumeL'));

/** What the day on which the yeast is taken is worked out from. */
export const missingForTaking = (earlier: BatchFacts, pour: PourFacts): string[] =>
  pour.takenOn === undefined ? missingOf(earlier, 'brewOn', 'daysUnderBeer') : [];

/** What the wait of a cake is worked out from. */
export const missingForWait = (earlier: BatchFacts, later: BatchFacts, pour: PourFacts): string[] =>
  together(missingForTaking(earlier, pour), missingOf(later, 'brewOn'));

/** What the survival of that wait is worked out from. */
export const missingForSurvival = (
  earlier: BatchFacts,
  later: BatchFacts,
  pour: PourFacts,
): string[] =>
  together(
    missingForWait(earlier, later, pour),
    // A day of its own may be a crop, kept cold, or a bare cake: the racking day tells.
    pour.cakeC === undefined ? missingOf(earlier, 'brewOn', 'daysUnderBeer', 'fermentC') : [],
  );

/** Each name once. */
export function together(...lists: string[][]): string[] {
  return [...new Set(lists.flat())];
}
