import type { MoveRequest } from '#shared/api/move.ts';
import { chainAlone } from '#shared/chain/chainAlone.ts';
import { lapses } from '#shared/chain/lapses.ts';
import { moveBatch, withRows, type MoveResult } from '#shared/chain/move.ts';
import type { GuestChains } from '../../auth/guests.ts';
import { notFound, problem } from '../../problems.ts';
import type { BoardNow, Hand } from '../board/hand.ts';
import { one } from '../board/find.ts';
import { demandBrews, seenBy } from './seen.ts';

/**
 * A guest's move: within one chain. It is worked out on that chain alone, so that no date of
 * another shelf is pulled along; acceptances elsewhere that hang on it lapse all the same.
 */
export function moveAsGuest(
  { member, board }: Hand,
  guestOf: GuestChains,
  wish: MoveRequest,
): Extract<MoveResult, { ok: true }> {
  const row = one(board.batches, wish.batchId);
  demandBrews(guestOf, row.chainId);
  const alone = row.chainId === null ? null : chainAlone(board, row.chainId);
  if (!alone || wish.toChainId !== row.chainId) throw notFound();
  const { chain, batches } = alone;
  const result = moveBatch({ ...board, chains: [chain], batches }, wish);
  if (!result.ok) {
    const kind = result.why === 'moved-elsewhere' ? result.why : 'place-taken';
    const current = one(seenBy(member, board).batches, row.id);
    throw problem(kind, { detail: result.detail, current });
  }
  return { ...result, batches: [...result.batches, ...lapsedElsewhere(board, result.batches)] };
}

function lapsedElsewhere(board: BoardNow, rows: BoardNow['batches']): BoardNow['batches'] {
  const moved = new Set(rows.map(({ id }) => id));
  const lapsed = new Set(lapses(board, withRows(board, rows)));
  return board.batches
    .filter(({ id }) => lapsed.has(id) && !moved.has(id))
    .map((row) => ({ ...row, link: { ...row.link, acceptance: null } }));
}

/** A guest takes back only what was done on the chains that they are still a guest of. */
export function demandOwnTouches(
  guestOf: GuestChains,
  board: BoardNow,
  touches: readonly string[],
): void {
  const chainOf = new Map(board.batches.map(({ id, chainId }) => [id, chainId]));
  const isOwn = (id: string) => guestOf.get(chainOf.get(id) ?? id) === 'brewer';
  if (!touches.every(isOwn))
    throw problem('not-undoable', {
      detail: 'It reaches beyond the chain that you are a guest of',
    });
}
