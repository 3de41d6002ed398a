import { indexBoard, type BoardFacts, type BoardIndex } from '#shared/chain/board.ts';

const known = new WeakMap<BoardFacts, BoardIndex>();

/** The board's index, made once for each board: every sentence about a place asks for it. */
export function indexed(board: BoardFacts): BoardIndex {
  const index = known.get(board) ?? indexBoard(board);
  known.set(board, index);
  return index;
}
