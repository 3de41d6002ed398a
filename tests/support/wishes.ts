import { indexBoard, type BoardFacts } from '#shared/chain/board.ts';
import { moveBatch, withRows, type MoveResult, type MoveWish } from '#shared/chain/move.ts';
import { newShelfFor } from '#shared/chain/newShelf.ts';
import type { RandomWish } from './randomBoards.ts';
import { idOf } from './boards.ts';

/** The wish that a random choice stands for on this board; null where there is no batch. */
export function wishOn(board: BoardFacts, { batch, place, dates }: RandomWish): MoveWish | null {
  const lifted = board.batches[batch % Math.max(1, board.batches.length)];
  if (!lifted) return null;
  const targets = targetsOn(board, lifted.id);
  const target = targets[place % targets.length];
  if (!target) return null;
  return { batchId: lifted.id, expectedChainId: lifted.chainId, dates, ...target };
}

type Target = Pick<MoveWish, 'toChainId' | 'afterBatchId' | 'newChain'>;

function targetsOn(board: BoardFacts, batchId: string): Target[] {
  const index = indexBoard(board);
  const afters = (toChainId: string, ids: readonly string[]): Target[] =>
    [null, ...ids.filter((id) => id !== batchId)].map((afterBatchId) => ({
      toChainId,
      afterBatchId,
    }));
  const made = newShelfFor(board, batchId, idOf('chain', 50 + board.chains.length));
  return [
    ...index.chains.flatMap(({ id }) =>
      afters(
        id,
        index.batchesOf(id).map((mate) => mate.id),
      ),
    ),
    ...afters(
      'bench',
      index.bench.map((mate) => mate.id),
    ),
    ...(made ? [{ toChainId: 'new' as const, afterBatchId: null, newChain: made }] : []),
  ];
}

/** The board after a move; as it was where the move was refused. */
export const after = (board: BoardFacts, result: MoveResult): BoardFacts =>
  result.ok ? withRows(board, result.batches, result.chains) : board;

export function moved(board: BoardFacts, wish: MoveWish | null): BoardFacts {
  return wish ? after(board, moveBatch(board, wish)) : board;
}
