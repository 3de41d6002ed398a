import type { BoardPlan } from './board.ts';

const SHELVES = 25;
const ON_EACH = 8;
const ON_BENCH = 100;
const LONGEST = 60;

/** As long as a name may be: every other one without a place to break it. */
function longName(what: string, number: number): string {
  const words =
    number % 2 === 0
      ? `${what} ${number} of the long evenings at the far end of the estuary`
      : `${what}${number}${'w'.repeat(LONGEST)}`;
  return words.slice(0, LONGEST).trim().padEnd(LONGEST, 'n');
}

/** 200 batches on 25 shelves and a hundred on the bench, with every name as long as it may be. */
export function largeSeason(): BoardPlan {
  const shelves = Array.from({ length: SHELVES }, (_, shelf) => ({
    name: longName('Shelf', shelf),
    batches: Array.from({ length: ON_EACH }, (_each, place) => ({
      ...beer(shelf * ON_EACH + place),
      brewOn: `2027-${String(place + 2).padStart(2, '0')}-06`,
    })),
  }));
  const bench = Array.from({ length: ON_BENCH }, (_, number) => beer(SHELVES * ON_EACH + number));
  return { shelves, bench };
}

const beer = (number: number) => ({
  name: longName('Beer', number),
  style: longName('Style', number),
  og: 1.04 + (number % 9) * 0.006,
  fg: 1.01 + (number % 9) * 0.0015,
  srm: 3 + ((number * 7) % 40),
  ibu: 12 + ((number * 11) % 60),
});
