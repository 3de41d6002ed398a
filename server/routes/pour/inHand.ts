import type { BoardFacts } from '#shared/chain/board.ts';
import { indexedBoard } from '#shared/chain/indexedBoard.ts';
import { problem } from '../../problems.ts';
import type { Hand } from '../board/hand.ts';

/**
 * While a pour is in hand its wort goes onto the cake that it was opened for: the batch keeps its
 * shelf, the batch before it, and that one is brewed still. A guest hears of nobody by name.
 */
export function demandNotInHand(
  { member, board, inHand }: Pick<Hand, 'member' | 'board' | 'inHand'>,
  after: BoardFacts,
): void {
  for (const { batchId, heldBy } of inHand) {
    const was = placeOf(board, batchId);
    const is = placeOf(after, batchId);
    if (was === null || (is?.on === was.on && (is.brewed || !was.brewed))) continue;
    const who = member.guestOf ? 'Somebody' : heldBy;
    throw problem('in-use', {
      detail: `${who} has the pour of ${was.name} in hand: let it be finished or left first`,
    });
  }
}

/** Onto whose cake a wort goes, and whether it can; null: the batch stands on no shelf. */
function placeOf(board: BoardFacts, batchId: string) {
  const index = indexedBoard(board);
  const batch = index.batch(batchId);
  if (!batch || batch.chainId === null || batch.stage === 'scrapped') return null;
  const before = index.predecessor(batchId);
  return {
    name: batch.name,
    on: `${batch.chainId} ${before?.id ?? ''}`,
    brewed: before?.stage !== 'pencilled',
  };
}
