import { addDays, daysBetween } from '../units/day.ts';
import { survival } from '../yeast/storage.ts';
import type { BatchFacts, PourFacts } from './facts.ts';
import { withoutNoise } from './rounding.ts';
import type { Day } from './vocabulary.ts';

export interface LinkTimes {
  /** The day on which A's yeast is taken: racking, or earlier on a day of its own. */
  takenOn: Day | undefined;
  /** Days from A's brew day until its yeast is taken. */
  underBeerDays: number | undefined;
  /** B's brew day less the day the yeast was taken; may be negative. */
  waitDays: number | undefined;
  /** Temperature at which the cake waits, °C: as told, else the cold store's for a crop, else A's. */
  waitC: number | undefined;
  /** Share of the living cells that outlives the wait, 0–1. */
  survival: number | undefined;
}

export function linkTimes(a: BatchFacts, b: BatchFacts, pour: PourFacts): LinkTimes {
  const rackOn = rackDay(a);
  const takenOn = pour.takenOn ?? rackOn;
  const waitDays =
    takenOn === undefined || b.brewOn === undefined ? undefined : daysBetween(takenOn, b.brewOn);
  const waitC = pour.cakeC ?? usualWaitC(a, pour, rackOn);
  return {
    takenOn,
    underBeerDays: underBeer(a, pour),
    waitDays,
    waitC,
    survival: survivalOf(waitDays, waitC),
  };
}

/**
 * Yeast that is cropped from under the beer leaves the vessel and goes into the cold, °C; a cake that
 * is bared by racking stays where it fermented. Common practice (2–4 °C, Quain).
 */
const CROP_STORE_C = 4;

/** Where it cannot be told whether the yeast is a crop or a bare cake, it is not known. */
function usualWaitC(
  a: BatchFacts,
  { takenOn }: PourFacts,
  rackOn: Day | undefined,
): number | undefined {
  if (takenOn === undefined) return a.fermentC;
  if (rackOn === undefined) return undefined;
  return takenOn < rackOn ? CROP_STORE_C : a.fermentC;
}

/** Racking day: brew day and the days under beer. */
export function rackDay(batch: BatchFacts): Day | undefined {
  return batch.brewOn === undefined || batch.daysUnderBeer === undefined
    ? undefined
    : addDays(batch.brewOn, batch.daysUnderBeer);
}

function underBeer(a: BatchFacts, pour: PourFacts): number | undefined {
  if (pour.takenOn === undefined) return a.daysUnderBeer;
  return a.brewOn === undefined ? undefined : daysBetween(a.brewOn, pour.takenOn);
}

/** A cake that does not wait loses nothing, whatever its temperature. */
function survivalOf(days: number | undefined, c: number | undefined): number | undefined {
  if (days === undefined) return undefined;
  if (days <= 0) return 1;
  return c === undefined ? undefined : withoutNoise(survival(days, c));
}
