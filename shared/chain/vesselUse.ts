import type { Batch } from '../api/batch.ts';
import type { Day } from '../rules/vocabulary.ts';
import { push, type BoardIndex, type Layout } from './board.ts';
import { isScheduled, rackDay } from './dates.ts';

/** A beer in a vessel from its brew day until the day it is racked, when the vessel is free. */
export interface Stay {
  batchId: string;
  name: string;
  from: Day;
  /** Null: nobody knows when it is racked, so it is in nobody's way. */
  until: Day | null;
}

export interface VesselUse {
  /** Name of the batch that still lies in the vessel on this batch's brew day. */
  takenBy: string | undefined;
  /** This batch is the nth beer since the vessel was cleaned. */
  beersSinceCleaning: number | undefined;
}

/** The vessel a batch is brewed in: its own, else the chain's. */
export const vesselIdOf = (batch: Batch, layout: Pick<Layout, 'chain'>): string | null =>
  batch.vesselId ??
  (batch.chainId === null ? null : (layout.chain(batch.chainId)?.vesselId ?? null));

function stayOf(batch: Batch): Stay | null {
  if (batch.brewOn === null || !isScheduled(batch)) return null;
  return { batchId: batch.id, name: batch.name, from: batch.brewOn, until: rackDay(batch) };
}

/** Every stay on the board, by vessel. */
export function staysByVessel(index: BoardIndex): Map<string, Stay[]> {
  const stays = new Map<string, Stay[]>();
  for (const batch of index.board.batches) {
    const vesselId = vesselIdOf(batch, index);
    const stay = vesselId === null ? null : stayOf(batch);
    if (vesselId !== null && stay) push(stays, vesselId, stay);
  }
  return stays;
}

const byDay = (a: Stay, b: Stay): number =>
  a.from < b.from ? -1 : a.from > b.from ? 1 : a.batchId < b.batchId ? -1 : 1;

/**
 * What each beer of one vessel finds on its brew day. Two beers brewed into it on one day are in
 * each other's way. Beers before a cleaning, or where none is recorded, are not counted.
 */
export function useOfVessel(
  unordered: readonly Stay[],
  cleanedOn: Day | null,
): Map<string, VesselUse> {
  const stays = [...unordered].sort(byDay);
  const uses = new Map<string, VesselUse>();
  const longest = new LongestStays();
  let beers = 0;
  for (let at = 0; at < stays.length;) {
    const day = stays[at]?.from ?? '';
    const end = endOfDay(stays, at, day);
    for (let i = at; i < end; i += 1) longest.add(stays[i]);
    const counted = cleanedOn !== null && day >= cleanedOn;
    for (const stay of stays.slice(at, end))
      uses.set(stay.batchId, {
        takenBy: longest.inTheWayOf(stay),
        beersSinceCleaning: counted ? beers + 1 : undefined,
      });
    if (counted) beers += end - at;
    at = end;
  }
  return uses;
}

/** The two longest stays of those begun so far: one of them is never the batch itself. */
class LongestStays {
  #first: Stay | null = null;
  #second: Stay | null = null;

  add(stay: Stay | undefined): void {
    if (!stay || stay.until === null) return;
    if (outlasts(stay, this.#first)) [this.#first, this.#second] = [stay, this.#first];
    else if (outlasts(stay, this.#second)) this.#second = stay;
  }

  inTheWayOf(stay: Stay): string | undefined {
    const other = this.#first?.batchId === stay.batchId ? this.#second : this.#first;
    return other?.until && other.until > stay.from ? other.name : undefined;
  }
}

const outlasts = (stay: Stay, other: Stay | null): boolean =>
  other === null || (stay.until ?? '') > (other.until ?? '');

function endOfDay(stays: readonly Stay[], from: number, day: Day): number {
  let end = from;
  while (stays[end]?.from === day) end += 1;
  return end;
}
