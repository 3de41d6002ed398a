import { colourShift } from '../../rules/colourShift.ts';
import { holdsIn, mindsIn, verdictOf, type Counts } from '../../rules/counts.ts';
import type { Inheritance } from '../../rules/facts.ts';
import type { LinkInput } from '../../rules/linkInput.ts';
import type { Verdict } from '../../rules/vocabulary.ts';
import { judgeLink } from '../checkLink.ts';
import type { Pair } from './pairs.ts';
import { beersSinceCleaning, isTaken, type VesselFind } from './vesselDays.ts';
import { NONE } from './numbers.ts';

/** What a link has beside its two beers. */
export interface Surroundings {
  generation: number;
  inherited: Inheritance;
  find: VesselFind;
}

/** A link's verdict of which the reason and the colour shift are worked out when they are asked. */
export class Judgement {
  readonly counts: Counts;
  readonly verdict: Verdict;
  readonly holds: number;
  readonly minds: number;
  readonly #pair: Pair;
  readonly #around: Surroundings;

  constructor(counts: Counts, pair: Pair, around: Surroundings) {
    this.counts = counts;
    this.verdict = verdictOf(counts);
    this.holds = holdsIn(counts);
    this.minds = mindsIn(counts);
    this.#pair = pair;
    this.#around = around;
  }

  /** Title of the worst finding; null on a pour. */
  get reason(): string | null {
    return this.verdict === 'pour' ? null : judgeLink(this.#input()).reason;
  }

  /** Shift of the later beer's colour in the glass; null where unknown. */
  get deltaE00(): number | null {
    const { input, blendedSrm } = this.#pair;
    return (this.#pair.shift ??= colourShift(input.later.srm, blendedSrm) ?? null);
  }

  #input(): LinkInput {
    const { input } = this.#pair;
    const { generation, inherited, find } = this.#around;
    const beers = beersSinceCleaning(find);
    return {
      ...input,
      inherited,
      ...(generation === NONE ? {} : { generation }),
      pour: beers === 0 ? input.pour : { ...input.pour, beersSinceCleaning: beers },
      board: isTaken(find) ? { ...input.board, vesselTakenBy: ANOTHER } : { ...input.board },
    };
  }
}

/** Who it is does not matter to a title. */
const ANOTHER = 'another beer';
