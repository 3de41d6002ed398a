import type { Batch } from '../api/batch.ts';
import { apparentAttenuation } from '../fermentation/attenuation.ts';
import { lagAtLeast, lagAtMost } from '../fermentation/lag.ts';
import { daysBetween } from '../units/day.ts';
import type { BoardIndex } from './board.ts';
import type { JudgedBoard } from './judgeBoard.ts';

/** What was read of one batch of a line; null: it was not read. Never planned, never estimated. */
export interface DriftPoint {
  batchId: string;
  name: string;
  generation: number | null;
  /** Apparent attenuation, share, from both gravities as read. */
  attenuation: number | null;
  /** Hours to the first fall of gravity: at least and at most, as the readings lie. */
  lagHours: { least: number | null; most: number | null };
  /** Living share of its cake, as counted. */
  viability: number | null;
  /** Brew day to racking day, both read. */
  days: number | null;
}

/** How a line of yeast changes from beer to beer: its chain's brewed batches, in order. */
export function driftOf(
  index: BoardIndex,
  { generation }: Pick<JudgedBoard, 'generation'>,
  chainId: string,
): DriftPoint[] {
  return index
    .batchesOf(chainId)
    .filter(({ stage }) => stage !== 'pencilled')
    .map((batch) => ({
      batchId: batch.id,
      name: batch.name,
      generation: generation.get(batch.id) ?? null,
      ...readOf(batch),
    }));
}

function readOf({ read, followed, cake, brewOn }: Batch) {
  const { og, fg, rackedOn } = read;
  const watched = followed && { followed, og };
  return {
    attenuation: og === null || fg === null ? null : apparentAttenuation(og, fg),
    lagHours: {
      least: watched && lagAtLeast(watched),
      most: watched && lagAtMost(watched),
    },
    viability: cake?.measured?.viability ?? null,
    days: brewOn === null || rackedOn === null ? null : daysBetween(brewOn, rackedOn),
  };
}

/** True where there is anything to see. */
export const hasDrift = (points: readonly DriftPoint[]): boolean =>
  points.some(
    ({ attenuation, lagHours, viability, days }) =>
      attenuation !== null || lagHours.most !== null || viability !== null || days !== null,
  );
