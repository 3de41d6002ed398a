import type { Batch } from '../../api/batch.ts';
import { countRules, type Counts } from '../../rules/counts.ts';
import type { LinkInput } from '../../rules/linkInput.ts';
import { LinkState } from '../../rules/linkState.ts';
import type { LinkTimes } from '../../rules/linkTimes.ts';
import { PAIR_RULES } from '../../rules/list.ts';
import { dayOf } from '../../units/day.ts';
import { UNSETTLED_LINK } from '../board.ts';
import { unsharedLink, type LinkSight, type Sight } from '../boardLink.ts';
import { NOTHING_INHERITED } from '../inherit.ts';
import { at, NONE } from './numbers.ts';
import { sharedIn, startsChains, wishOf, type CakeWish } from './parts.ts';
import type { Trial } from './trial.ts';

/** Two beers that stand together, judged by the rules that read nothing else. */
export interface Pair {
  /** What it was judged by beside the two batches. */
  readonly meeting: Meeting;
  readonly counts: Counts;
  /** Without descent and vessel days. */
  readonly input: LinkInput;
  readonly times: LinkTimes;
  readonly blendedSrm: number | undefined;
  /** ΔE00 once it was asked for; null: not known. */
  shift: number | null | undefined;
  /** What the later beer asks of the cake, once another takes of it too. */
  wish: CakeWish | undefined;
  /** The same two beers where others get of the cake, by what these get. */
  sharing: Map<string, Pair> | undefined;
}

/** How two batches meet. What else is read of a link belongs to the batches themselves. */
interface Meeting {
  cakeShelf: number;
  shelf: number;
  /** Days from the earlier brew day; where there is none, the day itself, far off. */
  brewedAfter: number;
  takenAfter: number;
}

/**
 * Judges pairs, each once: two batches that meet again on the same shelves with the same days
 * between them get the same answer, wherever in the calendar they stand. The link facts of a pair
 * need no look: they go exactly when it is not the one that stands on the board. Where a cake
 * goes under several worts each gets its own part, so their pairs are also told apart by that.
 */
export class Pairs {
  readonly #trial: Trial;
  readonly #sight: LinkSight;
  /** By both batches' numbers, in one. */
  #known = new Map<number, Pair[]>();

  constructor(trial: Trial, sight: Sight) {
    this.#trial = trial;
    this.#sight = pairSight(trial, sight);
  }

  /** Lets go of what was judged: other batches' trials seldom meet it again. */
  forget(): void {
    this.#known.clear();
  }

  /** Null where the yeast is not on the board. */
  judge(cake: number, batch: number): Pair | null {
    const alone = this.#alone(cake, batch);
    if (!alone || !startsChains(this.#trial, cake)) return alone;
    const others = sharedIn(this.#trial, cake, batch, (taker) => this.#wish(cake, taker));
    if (others.length === 0) return alone;
    const parts = others.map(({ name, litres }) => `${name} ${litres}`).join();
    const sharing = (alone.sharing ??= new Map<string, Pair>());
    const known = sharing.get(parts);
    if (known) return known;
    const { meeting, input } = alone;
    const pair = judged(meeting, { ...input, pour: { ...input.pour, sharedWith: others } });
    sharing.set(parts, pair);
    return pair;
  }

  /** As if nobody else got of the cake. */
  #alone(cake: number, batch: number): Pair | null {
    const key = cake * this.#trial.roster.batches.length + batch;
    const known = this.#known.get(key);
    for (const pair of known ?? []) if (isStill(pair, this.#trial, cake, batch)) return pair;
    const pair = this.#judged(cake, batch, meetingOf(this.#trial, cake, batch));
    if (pair && known) known.push(pair);
    else if (pair) this.#known.set(key, [pair]);
    return pair;
  }

  #judged(cake: number, batch: number, meeting: Meeting): Pair | null {
    const [earlier, later] = this.#rowsOf(cake, batch, meeting);
    const input = earlier && later ? unsharedLink(earlier, later, this.#sight) : null;
    return input && judged(meeting, input);
  }

  #wish(cake: number, batch: number): CakeWish | null {
    const pair = this.#alone(cake, batch);
    return pair && (pair.wish ??= wishOf(pair.input));
  }

  /** The two rows, shifted so that the earlier has its day on the board if it has one there. */
  #rowsOf(cake: number, batch: number, { brewedAfter, takenAfter }: Meeting) {
    const { roster, now, relinked } = this.#trial;
    const planned = at(roster.standing.brewDay, cake);
    const from = planned === NONE ? at(now.brewDay, cake) : planned;
    const [earlier, later] = [roster.batches[cake], roster.batches[batch]];
    if (!earlier || !later) return [];
    const link = relinked.includes(batch) ? UNSETTLED_LINK : later.link;
    const takenOn = dayAfter(from, takenAfter);
    return [
      withRow(earlier, this.#chainId(cake), dayAfter(from, 0), earlier.link),
      withRow(
        later,
        this.#chainId(batch),
        dayAfter(from, brewedAfter),
        link.takenOn === takenOn ? link : { ...link, takenOn },
      ),
    ];
  }

  #chainId(batch: number): string | null {
    const { now, roster } = this.#trial;
    const shelf = at(now.shelf, batch);
    if (shelf === NONE) return null;
    return this.#trial.chain(shelf)?.id ?? roster.batches[batch]?.chainId ?? null;
  }
}

function judged(meeting: Meeting, input: LinkInput): Pair {
  const link = new LinkState(input);
  return {
    meeting,
    counts: countRules(PAIR_RULES, link),
    input,
    times: link.times,
    blendedSrm: link.blend.srm,
    shift: undefined,
    wish: undefined,
    sharing: undefined,
  };
}

/** Nothing of descent and vessel days is seen; of a batch's facts a trial changes only its day. */
function pairSight(trial: Trial, sight: Sight): LinkSight {
  const { index } = sight;
  return {
    ...sight,
    layout: {
      chain: (id) => index.chain(id) ?? (trial.added?.id === id ? trial.added : undefined),
      predecessor: () => null,
    },
    descent: () => ({ generation: null, inherited: NOTHING_INHERITED }),
    use: () => undefined,
    facts(row) {
      const was = index.batch(row.id) ?? row;
      const facts = sight.facts(was);
      return row.brewOn === null || row.brewOn === was.brewOn
        ? facts
        : { ...facts, brewOn: row.brewOn };
    },
  };
}

function meetingOf({ now }: Trial, cake: number, batch: number): Meeting {
  const from = at(now.brewDay, cake);
  return {
    cakeShelf: at(now.shelf, cake),
    shelf: at(now.shelf, batch),
    brewedAfter: daysFrom(from, at(now.brewDay, batch)),
    takenAfter: daysFrom(from, at(now.takenDay, batch)),
  };
}

/** True where two batches meet in a trial as they did before, whoever else gets of the cake. */
export function isStill({ meeting }: Pair, { now }: Trial, cake: number, batch: number): boolean {
  const from = at(now.brewDay, cake);
  return (
    meeting.brewedAfter === daysFrom(from, at(now.brewDay, batch)) &&
    meeting.shelf === now.shelf[batch] &&
    meeting.cakeShelf === now.shelf[cake] &&
    meeting.takenAfter === daysFrom(from, at(now.takenDay, batch))
  );
}

/** Further than any two days lie apart. */
const FAR = 10_000_000;

const daysFrom = (from: number, day: number): number =>
  day === NONE ? NONE : from === NONE ? day + FAR : day - from;

function dayAfter(from: number, days: number): string | null {
  if (days === NONE) return null;
  if (from === NONE) return days === 0 ? null : dayOf(days - FAR);
  return dayOf(from + days);
}

function withRow(
  row: Batch,
  chainId: string | null,
  brewOn: string | null,
  link: Batch['link'],
): Batch {
  return row.chainId === chainId && row.brewOn === brewOn && row.link === link
    ? row
    : { ...row, chainId, brewOn, link };
}
