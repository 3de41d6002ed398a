import type { BoardFacts } from '#shared/chain/board.ts';
import type { Member } from '../../auth/whoAsks.ts';
import type { Tx } from '../../db/client.ts';
import type { BoardRows, PourInHand } from './load.ts';

/** What a command has in hand: the transaction, and the board as it stands under the locks. */
export interface Hand {
  tx: Tx;
  member: Member;
  board: BoardNow;
  /** Asked before anything is changed: a pour goes with its batch. */
  inHand: readonly PourInHand[];
  now: Date;
}

/** Who writes, and when. */
export type Writer = Pick<Hand, 'tx' | 'member' | 'now'>;

export type BoardNow = BoardRows & Pick<BoardFacts, 'today'>;
