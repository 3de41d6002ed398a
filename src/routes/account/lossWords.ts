import type { BreweryLoss } from '#shared/api/account.ts';

type Counted = Exclude<keyof BreweryLoss, 'id' | 'name'>;

const WORDS: readonly [Counted, string, string][] = [
  ['seasons', 'season', 'seasons'],
  ['chains', 'chain', 'chains'],
  ['batches', 'batch', 'batches'],
  ['yeasts', 'yeast', 'yeasts'],
  ['vessels', 'vessel', 'vessels'],
  ['comments', 'comment', 'comments'],
  ['shared', 'link or guest of a chain', 'links and guests of chains'],
];

/** "1 season, 3 chains and 12 batches": what there is none of is left out. */
export function lossWords(loss: BreweryLoss): string {
  const parts = WORDS.flatMap(([key, one, many]) => {
    const count = loss[key];
    return count === 0 ? [] : [`${count} ${count === 1 ? one : many}`];
  });
  return new Intl.ListFormat('en-GB').format([...parts, 'the whole record']);
}
