import type { Board } from '#shared/api/board.ts';
import type { Moved, MoveRequest } from '#shared/api/move.ts';
import { moveBatch } from '#shared/chain/move.ts';
import { equalDeep } from './equalDeep.ts';

interface Row {
  id: string;
}

/**
 * The rows with the given ones in the place of their namesakes; new ones come last. A row that says
 * the same stays the same object, and so do the rows where that holds for all.
 */
function withRows<T extends Row>(rows: T[], changed: readonly T[]): T[] {
  if (changed.length === 0) return rows;
  const left = new Map(changed.map((row) => [row.id, row]));
  const kept = rows.map((row) => {
    const next = left.get(row.id);
    left.delete(row.id);
    return next === undefined || equalDeep(row, next) ? row : next;
  });
  if (left.size > 0) return [...kept, ...left.values()];
  return kept.every((row, at) => row === rows[at]) ? rows : kept;
}

/** The board as one wish would leave it, or as it is where the wish no longer fits. */
function withWish(board: Board, wish: MoveRequest): Board {
  const isMade = wish.newChain && board.chains.some((chain) => chain.id === wish.newChain?.id);
  if (isMade) return board;
  const result = moveBatch(board, wish);
  if (!result.ok) return board;
  return {
    ...board,
    batches: withRows(board.batches, result.batches),
    chains: withRows(board.chains, result.chains),
  };
}

const overlaid = new WeakMap<Board, WeakMap<MoveRequest, Board>>();

/** The same board for the same wish: many parts of a page ask, and a drop is worked out beforehand. */
function withWishOnce(board: Board, wish: MoveRequest): Board {
  const known = overlaid.get(board) ?? new WeakMap<MoveRequest, Board>();
  overlaid.set(board, known);
  const result = known.get(wish) ?? withWish(board, wish);
  known.set(wish, result);
  return result;
}

/**
 * What the page shows: the board as the server last told it, with the wishes that are on their way
 * laid over it in order. A wish that fails is left out the next time, so that nobody else's change
 * is ever rolled back with it.
 */
export function withPending(board: Board, pending: readonly MoveRequest[]): Board {
  return pending.reduce(withWishOnce, board);
}

/** The board after the server's answer to a move, an undo or a redo. */
export function withMoved(board: Board, moved: Moved): Board {
  if (moved.revision <= board.season.revision) return board;
  const removed = new Set(moved.removedChainIds);
  const chains = withRows(board.chains, moved.chains);
  return {
    ...board,
    season: { ...board.season, revision: moved.revision },
    batches: withRows(board.batches, moved.batches),
    chains: removed.size === 0 ? chains : chains.filter((chain) => !removed.has(chain.id)),
    undo: moved.undo,
    redo: moved.redo,
  };
}
