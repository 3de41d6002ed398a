import { countRules, type Counts } from '../../rules/counts.ts';
import { DESCENT_RULES, VESSEL_RULES } from '../../rules/list.ts';
import type { Pair } from './pairs.ts';
import { beersSinceCleaning, isTaken } from './vesselDays.ts';
import { NONE } from './numbers.ts';
import type { Surroundings } from './judgement.ts';

/** Where the rules on descent stand for a pair of beers in some line. */
export function countDescent({ input }: Pair, { generation, inherited }: Surroundings): Counts {
  return countRules(DESCENT_RULES, {
    b: input.later,
    yeast: input.yeast,
    rules: input.rules,
    generation: generation === NONE ? undefined : generation,
    inherited,
  });
}

/** Where the rules on the vessel's days stand for a pair. */
export function countVessel({ input, times }: Pair, { find }: Surroundings): Counts {
  const beers = beersSinceCleaning(find);
  return countRules(VESSEL_RULES, {
    a: input.earlier,
    b: input.later,
    pour: beers === 0 ? NEVER_CLEANED : { beersSinceCleaning: beers },
    times,
    rules: input.rules,
    board: isTaken(find) ? TAKEN : undefined,
  });
}

const NEVER_CLEANED = {};
const TAKEN = { vesselTakenBy: 'another beer' };
