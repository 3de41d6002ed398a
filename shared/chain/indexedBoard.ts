import { indexBoard, type BoardFacts, type BoardIndex } from './board.ts';

const indexes = new WeakMap<BoardFacts, BoardIndex>();

/** The order of a board, found once for each board and kept as long as it: a board never changes. */
export function indexedBoard(board: BoardFacts): BoardIndex {
  const known = indexes.get(board);
  if (known) return known;
  const index = indexBoard(board);
  indexes.set(board, index);
  return index;
}
