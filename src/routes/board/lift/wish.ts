import type { Batch } from '#shared/api/batch.ts';
import type { MoveRequest } from '#shared/api/move.ts';
import type { BoardFacts } from '#shared/chain/board.ts';
import type { Gap } from '#shared/chain/gaps.ts';
import { newShelfFor } from '#shared/chain/newShelf.ts';

export interface Drop {
  batch: Batch;
  gap: Pick<Gap, 'key' | 'toChainId' | 'afterBatchId'>;
  /** Where whoever drops it believes it to be; null: on the bench. */
  from: string | null;
  dates: MoveRequest['dates'];
  /** The yeast of a new shelf, where the batch itself asks for none. */
  yeastId: string | null;
}

/** A new shelf for the batch, as it would be if it asked for this yeast. */
function newShelf(board: BoardFacts, batch: Batch, yeastId: string, id: string) {
  const asking = board.batches.map((row) => (row.id === batch.id ? { ...row, yeastId } : row));
  return newShelfFor({ ...board, batches: asking }, batch.id, id);
}

/** The wish that a drop stands for; null where a new shelf has no yeast yet. */
export function wishOf(board: BoardFacts, drop: Drop, newId: () => string): MoveRequest | null {
  const { batch, gap, from, dates } = drop;
  const shared = {
    id: newId(),
    batchId: batch.id,
    afterBatchId: gap.afterBatchId,
    expectedChainId: from,
    dates,
  };
  if (gap.key === 'bench') return { ...shared, toChainId: 'bench' };
  if (gap.key !== 'new') return { ...shared, toChainId: gap.toChainId };
  const yeastId = batch.yeastId ?? drop.yeastId;
  const newChain = yeastId && newShelf(board, batch, yeastId, newId());
  return newChain ? { ...shared, toChainId: 'new', newChain } : null;
}
