import type { MoveRefusal } from '#shared/chain/move.ts';
import { isProblem, OfflineError, sentenceOf } from '../../../api/errors.ts';
import { BehindFailure } from '../../../api/moveQueue.ts';
import { NothingToUndo } from '../../../api/nothingToUndo.ts';

export const OFFLINE_WORDS =
  'You are offline. The board can be read; batches move again when the connection is back.';

/** Why a move, an undo or a redo did not happen. */
export function failureWords(error: unknown, name: string | null): string {
  // "Keep my dates" is an undo and a move: what stopped the undo is the reason of both.
  if (error instanceof BehindFailure) return failureWords(error.cause, null);
  if (error instanceof NothingToUndo) return 'There is nothing of yours left to undo or redo.';
  if (error instanceof OfflineError)
    return name
      ? `No connection to the server. ${name} is back where it was.`
      : 'No connection to the server. Nothing was changed.';
  const sentence = sentenceOf(error);
  const conflict = CONFLICTS.find((why) => isProblem(error, why));
  return conflict ? refusalWords(conflict, sentence) : sentence;
}

const CONFLICTS = ['moved-elsewhere', 'place-taken'] as const;

/** Why the board itself refuses a move. */
export const refusalWords = (why: MoveRefusal, detail: string): string =>
  CONFLICTS.some((each) => each === why) ? `${detail} Nothing of yours was lost.` : detail;
