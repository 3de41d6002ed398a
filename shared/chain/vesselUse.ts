import type { Batch } from '../api/batch.ts';
import type { Day } from '../rules/vocabulary.ts';
import { isScheduled, rackDay } from './dates.ts';
import { push, type BoardIndex, type Layout } from './board.ts';

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
  takenBy?: string;
  /** This batch is the nth beer since the vessel was cleaned. */
  beersSinceCleaning?: number;
}

/** The vessel a batch is brewed in: its own, else the chain's. */
export const vesselIdOf = (batch: Batch, layout: Pick<Layout, 'chain'>): string | null =>
  batch.vesselId ??
  (batch.chainId === null ? null : (layout.chain(batch.chainId)?.vesselId ?? null));

export function stayOf(batch: Batch): Stay | null {
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
  // The two longest stays among those begun so far: one of them is never the batch itself.
  let longest: Stay | null = null;
  let second: Stay | null = null;
  let beers = 0;
  for (let at = 0; at < stays.length;) {
    const day = stays[at]?.from ?? '';
    const together = stays.slice(at, endOfDay(stays, at, day));
    for (const stay of together) {
      if (stay.until !== null && outlasts(stay, longest)) [longest, second] = [stay, longest];
      else if (stay.until !== null && outlasts(stay, second)) second = stay;
    }
    const counted = cleanedOn !== null && day >= cleanedOn;
    for (const stay of together) {
      const other: Stay | null = longest?.batchId === stay.batchId ? second : longest;
      uses.set(stay.batchId, {
        ...(other?.until && other.until > day ? { takenBy: other.name } : {}),
        ...(counted ? { beersSinceCleaning: beers + 1 } : {}),
      });
    }
    if (counted) beers += together.length;
    at += together.length;
  }
  return uses;
}

const outlasts = (stay: Stay, other: Stay | null): boolean =>
  other === null || (stay.until ?? '') > (other.until ?? '');

function endOfDay(stays: readonly Stay[], from: number, day: Day): number {
  let end = from;
  while (stays[end]?.from === day) end += 1;
  return end;
}
