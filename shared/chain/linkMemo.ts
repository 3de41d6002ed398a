import type { Batch } from '../api/batch.ts';
import type { Verdict } from '../rules/vocabulary.ts';
import { daysBetween } from '../units/day.ts';
import type { Sight } from './boardLink.ts';
import { judgeLink, type LinkVerdict } from './checkLink.ts';
import type { Inheritances } from './inheritances.ts';
import { linkBetween } from './linkInput.ts';
import { sharedWith } from './shares.ts';

/** A link's verdict of which the reason and the colour shift are worked out when first asked. */
export class Judgement {
  readonly verdict: Verdict;
  readonly holds: number;
  readonly minds: number;
  #link: LinkVerdict;
  #reason: string | null | undefined;
  #deltaE00: number | null | undefined;

  constructor(link: LinkVerdict) {
    this.verdict = link.verdict;
    this.holds = link.holds;
    this.minds = link.minds;
    this.#link = link;
  }

  /** Title of the worst finding; null on a pour. */
  get reason(): string | null {
    return (this.#reason ??= this.#link.reason);
  }

  /** Shift of the later beer's colour; null where unknown. */
  get deltaE00(): number | null {
    return (this.#deltaE00 ??= this.#link.deltaE00);
  }
}

/**
 * Judges links of one board's layouts, each once: two batches that meet again with the same days
 * between them, generation, inheritance, vessel and shares of the cake get the same answer. All other facts of a link
 * come from its two batches, of which layouts change only days, chain and link facts; the link
 * facts go exactly when the pair is not the one that stands on the board.
 */
export class LinkMemo {
  readonly #inheritances: Inheritances;
  readonly #pairs = new Map<string, Map<string, Map<string, Judgement | null>>>();
  readonly #shelves = new Map<string | null, number>();

  constructor(inheritances: Inheritances) {
    this.#inheritances = inheritances;
  }

  judge(earlier: Batch, later: Batch, sight: Sight): Judgement | null {
    const known = this.#knownOf(earlier.id, later.id);
    const key = this.#keyOf(earlier, later, sight);
    const judged = known.get(key);
    if (judged !== undefined) return judged;
    const input = linkBetween(earlier, later, sight);
    const judgement = input ? new Judgement(judgeLink(input)) : null;
    known.set(key, judgement);
    return judgement;
  }

  #knownOf(earlierId: string, laterId: string): Map<string, Judgement | null> {
    const ofEarlier = getOrMake(this.#pairs, earlierId);
    return getOrMake(ofEarlier, laterId);
  }

  #keyOf(earlier: Batch, later: Batch, sight: Sight): string {
    const { generation, inherited } = sight.descent(later);
    const use = sight.use(later.id);
    const handed = this.#inheritances.number(inherited);
    const taken = use?.takenBy === undefined ? 0 : 1;
    const days = `${daysFrom(earlier, later.brewOn)},${daysFrom(earlier, later.link.takenOn)}`;
    const shelves = `${this.#shelf(earlier)},${this.#shelf(later)}`;
    const parts = sharesText(earlier, later.id, sight);
    return `${shelves},${generation},${handed},${taken},${use?.beersSinceCleaning},${days},${parts}`;
  }

  /** A number for the batch's chain: yeast and vessel go with it. */
  #shelf({ chainId }: Batch): number {
    const known = this.#shelves.get(chainId);
    if (known !== undefined) return known;
    this.#shelves.set(chainId, this.#shelves.size);
    return this.#shelves.size - 1;
  }
}

/** What others get of the cake, as text; empty where nobody does. */
export const sharesText = (earlier: Batch, laterId: string, sight: Sight): string =>
  sharedWith(earlier, laterId, sight)
    .map(({ name, litres }) => `${name} ${litres}`)
    .join();

/** Days from the earlier brew day; the day itself where there is none to count from. */
export function daysFrom({ brewOn }: Batch, day: string | null): number | string | null {
  return day === null || brewOn === null ? day : daysBetween(brewOn, day);
}

function getOrMake<V>(maps: Map<string, Map<string, V>>, key: string): Map<string, V> {
  const known = maps.get(key);
  if (known) return known;
  const made = new Map<string, V>();
  maps.set(key, made);
  return made;
}
