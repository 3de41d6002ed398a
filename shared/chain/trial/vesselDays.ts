import { at, NONE } from './numbers.ts';
import type { Trial } from './trial.ts';

/**
 * What a beer finds in its vessel, as one number: twice the count of beers since the cleaning
 * (0: none is recorded), and 1 more where another beer still lies in it.
 */
export type VesselFind = number;

export const isTaken = (find: VesselFind): boolean => find % 2 === 1;
export const beersSinceCleaning = (find: VesselFind): number => Math.floor(find / 2);

/** What `useOfVessel` says of one batch, as the trial stands. 0 for a batch that is in no vessel. */
export function findIn(trial: Trial, members: readonly number[], batch: number): VesselFind {
  const { now, roster } = trial;
  const [vessel, day] = [at(now.vessel, batch), at(now.brewDay, batch)];
  if (!lies(trial, batch, vessel)) return 0;
  const cleaned = at(roster.cleanedDay, vessel);
  let taken = 0;
  let beers = 1;
  for (const other of members) {
    if (other === batch || !lies(trial, other, vessel)) continue;
    const from = at(now.brewDay, other);
    if (from < day && from >= cleaned) beers += 1;
    if (from <= day && trial.rackDay(other) > day) taken = 1;
  }
  return (cleaned === NONE || day < cleaned ? 0 : 2 * beers) + taken;
}

/** True of a batch that is brewed in the vessel on a day. The bench only keeps wishes. */
function lies({ now, roster, moved }: Trial, batch: number, vessel: number): boolean {
  if (vessel === NONE || now.vessel[batch] !== vessel || now.brewDay[batch] === NONE) return false;
  return batch === moved ? now.shelf[batch] !== NONE : roster.scheduled[batch] === true;
}

/** The batches that may lie in a vessel: the board's, and the moved one. */
export function membersOf({ roster, now, moved }: Trial, vessel: number): readonly number[] {
  const members = roster.inVessel[vessel] ?? [];
  const isGuest = now.vessel[moved] === vessel && roster.standing.vessel[moved] !== vessel;
  return isGuest ? [...members, moved] : members;
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
