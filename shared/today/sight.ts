import type { Batch } from '../api/batch.ts';
import type { TodayFacts } from '../api/today.ts';
import { isPencilled, type BoardIndex } from '../chain/board.ts';
import { takersOf } from '../chain/takers.ts';

/** What the duties of a day are made of. */
export interface Sight {
  index: BoardIndex;
  facts: TodayFacts;
  timeZone: string;
}

/** Pencilled batches that are to go onto a batch's cake, its own chain's first. */
export const successorsOf = (batch: Batch, index: BoardIndex): Batch[] =>
  takersOf(index, batch).filter(isPencilled);
