import type { Board } from '#shared/api/board.ts';
import type { MoveRequest } from '#shared/api/move.ts';
import type { Mover } from '../../../api/moves.ts';

/** What lifting needs of the page around it. */
export interface LiftPorts extends Mover {
  /** The board as it is shown now. */
  board(): Board;
  /** Works out what the board will be after a wish, before it is shown. */
  foresee(wish: MoveRequest): void;
  isOnline(): boolean;
  /** Keeps what arrives from elsewhere off the board, but for a look at it; the answer ends it. */
  holdStill(look: (arrived: Board) => void): () => void;
  say(words: string): void;
  /** Says it unless something else is to be said soon: for a pointer on its way. */
  sayAtRest(words: string): void;
  /** Gives the focus back to a batch's handle once it is drawn. */
  focusBatch(batchId: string): void;
  newId(): string;
  /** Keys of the gaps on shelves in sight, those of the nearest shelf to the batch first. */
  gapsInSight(batchId: string): string[];
  /** Calls when shelves may have come into sight; the answer ends it. */
  onScroll(run: (at: number) => void): () => void;
  /** Calls once, with the time of that frame in milliseconds. */
  nextFrame(run: (at: number) => void): void;
}
