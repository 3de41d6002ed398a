import type { Batch } from '../../api/batch.ts';
import type { Chain } from '../../api/chain.ts';
import type { Day } from '../../rules/vocabulary.ts';
import { dayNumber } from '../../units/day.ts';
import { isPencilled, type BoardIndex } from '../board.ts';
import { isScheduled } from '../dates.ts';
import { vesselIdOf } from '../vesselUse.ts';
import { at, column, NONE } from './numbers.ts';

/** Which batch stands where and when. By the number of the batch, but `first` by the chain's. */
export interface Standing {
  /** Number of the chain. */
  readonly shelf: Int32Array;
  /** The batch whose cake goes under this one, in the chain or as the source of the chain. */
  readonly before: Int32Array;
  /** The next in the chain. */
  readonly after: Int32Array;
  /** First batch of a chain. */
  readonly first: Int32Array;
  readonly brewDay: Int32Array;
  /** The day named for taking the yeast from the batch before. */
  readonly takenDay: Int32Array;
  readonly vessel: Int32Array;
}

/** A board as plain numbers, without scrapped batches. Made once, never changed. */
export interface Roster {
  readonly index: BoardIndex;
  readonly batches: readonly Batch[];
  numberOf(batchId: string): number;
  shelfNumberOf(chainId: string): number;
  vesselNumberOf(vesselId: string | null): number;
  readonly standing: Standing;
  /** By batch. */
  readonly rackedDay: Int32Array;
  readonly daysUnderBeer: Int32Array;
  readonly pencilled: readonly boolean[];
  /** Brewed or planned, as far as that does not hang on a shelf. */
  readonly scheduled: readonly boolean[];
  /** Chains that start from the cake of the batch. */
  readonly branches: readonly (readonly number[])[];
  /** By chain: the batch whose cake starts it. */
  readonly source: Int32Array;
  /** By vessel: the batches brewed in it, and the day it was cleaned. */
  readonly inVessel: readonly (readonly number[])[];
  readonly cleanedDay: Int32Array;
}

/** The shelf that a move would make has the number after the last. */
export const newShelfOf = (roster: Roster): number => roster.index.chains.length;

export function rosterOf(index: BoardIndex): Roster {
  const batches = index.board.batches.filter(({ stage }) => stage !== 'scrapped');
  const numberOf = numbering(batches.map(({ id }) => id));
  const shelfNumberOf = numbering(index.chains.map(({ id }) => id));
  const vessels = [...new Set(batches.flatMap((batch) => vesselIdOf(batch, index) ?? []))];
  for (const { id } of index.vessels.values()) if (!vessels.includes(id)) vessels.push(id);
  const vesselNumberOf = numbering(vessels);
  const source = Int32Array.from(index.chains, ({ start }) =>
    start.kind === 'cake' ? numberOf(start.batchId) : NONE,
  );
  const standing = standingOf(index, batches, source, numberOf, (batch) =>
    vesselNumberOf(vesselIdOf(batch, index)),
  );
  return {
    index,
    batches,
    numberOf,
    shelfNumberOf,
    vesselNumberOf,
    standing,
    rackedDay: Int32Array.from(batches, ({ read }) => dayOr(read.rackedOn)),
    daysUnderBeer: Int32Array.from(batches, (batch) => batch.daysUnderBeer ?? NONE),
    pencilled: batches.map(isPencilled),
    scheduled: batches.map(isScheduled),
    branches: batches.map(({ id }) => index.branchesOf(id).map((chain) => shelfNumberOf(chain.id))),
    source,
    inVessel: grouped(standing.vessel, vessels.length),
    cleanedDay: Int32Array.from(vessels, (id) => dayOr(index.vessels.get(id)?.cleanedOn ?? null)),
  };
}

function standingOf(
  index: BoardIndex,
  batches: readonly Batch[],
  source: Int32Array,
  numberOf: (id: string) => number,
  vesselOf: (batch: Batch) => number,
): Standing {
  const first = column(index.chains.length + 1);
  const standing = {
    shelf: column(batches.length),
    before: column(batches.length),
    after: column(batches.length),
    first,
    brewDay: Int32Array.from(batches, ({ brewOn }) => dayOr(brewOn)),
    takenDay: Int32Array.from(batches, ({ link }) => dayOr(link.takenOn)),
    vessel: Int32Array.from(batches, vesselOf),
  };
  index.chains.forEach((chain: Chain, number) => {
    let last = NONE;
    for (const { id } of index.batchesOf(chain.id)) {
      const batch = numberOf(id);
      standing.shelf[batch] = number;
      standing.before[batch] = last === NONE ? at(source, number) : last;
      if (last === NONE) first[number] = batch;
      else standing.after[last] = batch;
      last = batch;
    }
  });
  return standing;
}

const dayOr = (day: Day | null): number => (day === null ? NONE : dayNumber(day));

function numbering(ids: readonly string[]): (id: string | null) => number {
  const numbers = new Map(ids.map((id, number) => [id, number]));
  return (id) => (id === null ? NONE : (numbers.get(id) ?? NONE));
}

/** The batches of each group. */
function grouped(groupOf: Int32Array, groups: number): number[][] {
  const members: number[][] = Array.from({ length: groups }, () => []);
  groupOf.forEach((group, batch) => members[group]?.push(batch));
  return members;
}
