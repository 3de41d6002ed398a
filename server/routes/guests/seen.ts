import type { Batch } from '#shared/api/batch.ts';
import type { Moved } from '#shared/api/move.ts';
import type { GuestChains } from '../../auth/guests.ts';
import type { Member } from '../../auth/whoAsks.ts';
import { notFound, problem, ProblemError } from '../../problems.ts';
import type { Command } from '../board/changeBoard.ts';
import type { BoardNow } from '../board/hand.ts';
import { demandStock, one } from '../board/find.ts';
import { guestBatch, guestView } from './view.ts';

/** The board as its reader may see it. */
export function seenBy<B extends BoardNow>({ guestOf, brewery }: Member, board: B): B {
  return guestOf ? guestView(board, guestOf.keys(), brewery.name) : board;
}

/** A chain of which somebody is no guest does not exist; in one that they may only taste nothing is changed. */
export function demandBrews(chains: GuestChains, chainId: string | null): void {
  const role = chainId === null ? undefined : chains.get(chainId);
  if (role === undefined) throw notFound();
  if (role !== 'brewer') throw problem('not-allowed');
}

/** An edit of one batch, kept within the guest's chain; what it answers with is kept within it too. */
export function withinChain(
  { guestOf }: Member,
  batchId: string,
  patch: { yeastId?: string | null | undefined; vesselId?: string | null | undefined },
  command: Command,
): Command {
  if (!guestOf) return command;
  return async (hand) => {
    const seen = seenBy(hand.member, hand.board);
    const row = one(seen.batches, batchId);
    demandBrews(guestOf, row.chainId);
    demandStock(seen, patch);
    try {
      return await command(hand);
    } catch (error) {
      throw withCurrent(error, row);
    }
  };
}

/** A conflict shows the row as the guest may see it. */
export function withCurrent(error: unknown, row: Batch): unknown {
  if (!(error instanceof ProblemError) || error.options.current === undefined) return error;
  return new ProblemError(error.kind, { ...error.options, current: row });
}

/**
 * Why something cannot be taken back may lie on shelves that a guest does not see, and names who
 * did it: they hear that it is so, and no more.
 */
export function untold(error: unknown): unknown {
  if (!(error instanceof ProblemError) || !['not-undoable', 'in-use'].includes(error.kind))
    return error;
  return problem('not-undoable', { detail: 'Something that it hangs on was changed since' });
}

/** What a change did, as far as it is on the guest's chains. Shelves are read anew with the board. */
export function seenMoved({ guestOf, brewery }: Member, moved: Moved): Moved {
  if (!guestOf) return moved;
  const batches = moved.batches
    .filter(({ chainId }) => chainId !== null && guestOf.has(chainId))
    .map((row) => guestBatch(row, brewery.name));
  const own = new Set(batches.map(({ id }) => id));
  return {
    ...moved,
    batches,
    chains: [],
    removedChainIds: [],
    shifted: moved.shifted.filter(({ batchId }) => own.has(batchId)),
    cleared: moved.cleared.filter((id) => own.has(id)),
  };
}
