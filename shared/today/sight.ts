import type { Batch } from '../api/batch.ts';
import type { TodayFacts } from '../api/today.ts';
import { isPencilled, type BoardIndex } from '../chain/board.ts';

/** What the duties of a day are made of. */
export interface Sight {
  index: BoardIndex;
  facts: TodayFacts;
  timeZone: string;
}

/** Pencilled batches that are to go onto a batch's cake, its own chain's first. */
export function successorsOf(batch: Batch, index: BoardIndex): Batch[] {
  const mates = batch.chainId === null ? [] : index.batchesOf(batch.chainId);
  const next = mates[mates.findIndex(({ id }) => id === batch.id) + 1];
  const branches = index.branchesOf(batch.id).flatMap(({ id }) => index.batchesOf(id).slice(0, 1));
  return [...(next ? [next] : []), ...branches].filter(isPencilled);
}
