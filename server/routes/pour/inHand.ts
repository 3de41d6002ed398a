import { and, eq } from 'drizzle-orm';
import type { BoardFacts } from '#shared/chain/board.ts';
import { indexedBoard } from '#shared/chain/indexedBoard.ts';
import type { Tx } from '../../db/client.ts';
import { person } from '../../db/schema/people.ts';
import { pourRun } from '../../db/schema/pour.ts';
import { problem } from '../../problems.ts';
import type { BoardNow, Hand } from '../board/hand.ts';

/** A pour that somebody is at, and who. */
export interface PourInHand {
  batchId: string;
  heldBy: string;
}

/** The pours in hand on a board. Asked before anything is changed: a run goes with its batch. */
export const poursInHand = (tx: Tx, { season }: BoardNow): Promise<PourInHand[]> =>
  tx
    .select({ batchId: pourRun.batchId, heldBy: person.name })
    .from(pourRun)
    .innerJoin(person, eq(person.id, pourRun.openedBy))
    .where(and(eq(pourRun.seasonId, season.id), eq(pourRun.state, 'open')));

/**
 * While a pour is in hand its wort goes onto the cake that it was opened for: the batch keeps its
 * shelf, the batch before it, and that one is brewed still. A guest hears of nobody by name.
 */
export function demandNotInHand(
  { member, board }: Pick<Hand, 'member' | 'board'>,
  pours: readonly PourInHand[],
  after: BoardFacts,
): void {
  for (const { batchId, heldBy } of pours) {
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
