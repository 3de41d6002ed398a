import type { BoardFacts } from '#shared/chain/board.ts';
import type { Member } from '../../auth/whoAsks.ts';
import type { Tx } from '../../db/client.ts';
import type { BoardRows } from './load.ts';

/** What a command has in hand: the transaction, and the board as it stands under the locks. */
export interface Hand {
  tx: Tx;
  member: Member;
  board: BoardNow;
  now: Date;
}

export type BoardNow = BoardRows & Pick<BoardFacts, 'today'>;
