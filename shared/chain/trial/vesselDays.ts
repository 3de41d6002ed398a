import { at, NONE } from './numbers.ts';
import type { Trial } from './trial.ts';

/**
 * What a beer finds in its vessel, as one number: twice the count of beers since the cleaning
 * (0: none is recorded), and 1 more where another beer still lies in it.
 */
export type VesselFind = number;

export const isTaken = (find: VesselFind): boolean => find % 2 === 1;
export const beersSinceCleaning = (find: VesselFind): number => Math.floor(find / 2);

/** A batch lies in a vessel from its brew day until it is racked; `NONE`: not known. */
export interface Stay {
  batch: number;
  from: number;
  until: number;
}

/**
 * What `useOfVessel` says of one batch, as the trial stands. 0 for a batch that is in no vessel.
 * @param stays all that lie in its vessel
 */
export function findIn(trial: Trial, stays: readonly Stay[], batch: number): VesselFind {
  const { now, roster } = trial;
  const vessel = at(now.vessel, batch);
  if (!lies(trial, batch, vessel)) return 0;
  const day = at(now.brewDay, batch);
  const cleaned = at(roster.cleanedDay, vessel);
  let taken = 0;
  let beers = 1;
  for (const { batch: other, from, until } of stays) {
    if (from > day || other === batch) continue;
    if (from < day && from >= cleaned) beers += 1;
    if (until > day) taken = 1;
  }
  return (cleaned === NONE || day < cleaned ? 0 : 2 * beers) + taken;
}

/** True of a batch that is brewed in the vessel on a day. The bench only keeps wishes. */
function lies({ now, roster, moved }: Trial, batch: number, vessel: number): boolean {
  if (vessel === NONE || now.vessel[batch] !== vessel || now.brewDay[batch] === NONE) return false;
  return batch === moved ? now.shelf[batch] !== NONE : roster.scheduled[batch] === true;
}

/** What lies in a vessel: of the board's batches, and the moved one. */
export function staysIn(trial: Trial, vessel: number): Stay[] {
  const { roster, now, moved } = trial;
  const own = roster.inVessel[vessel] ?? [];
  const comes = now.vessel[moved] === vessel && roster.standing.vessel[moved] !== vessel;
  const stays: Stay[] = [];
  for (const batch of comes ? [...own, moved] : own)
    if (lies(trial, batch, vessel))
      stays.push({ batch, from: at(now.brewDay, batch), until: trial.rackDay(batch) });
  return stays;
}

/** The vessels whose days a trial changes. */
export function vesselsChanged({ roster, now, moved, redated }: Trial): number[] {
  const changed: number[] = [];
  for (const vessel of [at(now.vessel, moved), at(roster.standing.vessel, moved)])
    if (vessel !== NONE && !changed.includes(vessel)) changed.push(vessel);
  for (const batch of redated) {
    const vessel = at(now.vessel, batch);
    if (vessel !== NONE && !changed.includes(vessel)) changed.push(vessel);
  }
  return changed;
}
