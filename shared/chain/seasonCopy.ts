import type { Batch } from '../api/batch.ts';
import type { SeasonCopy } from '../api/brewery.ts';
import type { Chain, ChainStart } from '../api/chain.ts';
import type { Yeast } from '../api/yeast.ts';
import type { Day } from '../rules/vocabulary.ts';
import { addDays } from '../units/day.ts';
import { UNSETTLED_LINK } from './board.ts';
import { seasonShift, shiftToStart } from './seasonShift.ts';

/** What is copied from: a season's shelves and batches, and the brewery's yeasts. */
export interface CopiedFrom {
  chains: readonly Chain[];
  batches: readonly Batch[];
  yeasts: readonly Pick<Yeast, 'id' | 'packPrice'>[];
}

/** A shelf with what stands on it, still under the ids that it has in the old season. */
export interface CopiedShelf {
  chain: Chain;
  batches: Batch[];
}

export interface CopiedSeason {
  /** A shelf that starts from another's cake comes after it. */
  shelves: CopiedShelf[];
  bench: Batch[];
  /** Days by which every date moved. */
  shift: number;
}

/**
 * A season's plan for another one: pencilled batches, their dates shifted alike. What was read, what
 * was accepted and what was scrapped stays behind; so does a link whose earlier batch does.
 */
export function copiedSeason(
  from: CopiedFrom,
  wish: Omit<SeasonCopy, 'seasonId'>,
  weekdays: readonly number[],
): CopiedSeason {
  const goes = ({ stage }: Batch) =>
    stage === 'pencilled' || (wish.brewed === 'pencilled' && stage !== 'scrapped');
  const standing = (chainId: string | null) =>
    from.batches
      .filter((batch) => batch.chainId === chainId && batch.stage !== 'scrapped')
      .toSorted((a, b) => a.place - b.place);
  const chains = from.chains.filter(({ id }) => wish.chainIds.includes(id));
  const bench = wish.bench ? standing(null).filter(goes) : [];
  const copied = [...chains.flatMap(({ id }) => standing(id).filter(goes)), ...bench];
  const shift = shiftOf(copied, wish.dates, weekdays);
  const ids = new Set(copied.map(({ id }) => id));
  const shelves = chains.map((chain) => {
    const mates = standing(chain.id);
    const start = startOf(chain, ids, from.yeasts);
    const batches = mates.filter(goes).map((batch) => {
      const before = mates[mates.indexOf(batch) - 1];
      const isSettled = before ? ids.has(before.id) : start.kind === 'cake';
      return pencilled(batch, shift, isSettled);
    });
    return { chain: { ...chain, start }, batches };
  });
  return {
    shelves: sourcesFirst(shelves),
    bench: bench.map((batch) => pencilled(batch, shift, false)),
    shift,
  };
}

function shiftOf(
  batches: readonly Batch[],
  dates: SeasonCopy['dates'],
  weekdays: readonly number[],
): number {
  const days = batches.flatMap(({ brewOn }) => (brewOn === null ? [] : [brewOn]));
  const wished = 'shiftDays' in dates ? dates.shiftDays : shiftToStart(days, dates.startOn);
  return seasonShift(days, wished, weekdays);
}

/** A cake that stays behind cannot start anything: its shelf starts from a fresh pack. */
function startOf(
  { start, yeastId }: Chain,
  ids: ReadonlySet<string>,
  yeasts: CopiedFrom['yeasts'],
): ChainStart {
  if (start.kind !== 'cake' || ids.has(start.batchId)) return start;
  const price = yeasts.find(({ id }) => id === yeastId)?.packPrice ?? null;
  return { kind: 'pack', price };
}

function pencilled(batch: Batch, shift: number, isSettled: boolean): Batch {
  const later = (day: Day | null) => (day === null ? null : addDays(day, shift));
  const link = isSettled
    ? { ...batch.link, takenOn: later(batch.link.takenOn), acceptance: null }
    : UNSETTLED_LINK;
  return {
    ...batch,
    stage: 'pencilled',
    brewOn: later(batch.brewOn),
    wantedOn: later(batch.wantedOn),
    read: { volumeL: null, og: null, fg: null, rackedOn: null },
    followed: null,
    cake: null,
    link,
  };
}

function sourcesFirst(shelves: readonly CopiedShelf[]): CopiedShelf[] {
  const made: CopiedShelf[] = [];
  const known = new Set<string>();
  let waiting = [...shelves];
  while (waiting.length > 0) {
    const ready = waiting.filter(
      ({ chain: { start } }) => start.kind !== 'cake' || known.has(start.batchId),
    );
    // A circle cannot be drawn on a board; were one stored, its shelves are made in their order.
    const next = ready.length > 0 ? ready : waiting;
    for (const { batches } of next) for (const { id } of batches) known.add(id);
    made.push(...next);
    waiting = waiting.filter((shelf) => !next.includes(shelf));
  }
  return made;
}
