import { eq } from 'drizzle-orm';
import type { Moved, MoveRequest } from '#shared/api/move.ts';
import { linkChange } from '#shared/chain/linkChanges.ts';
import { moveBatch, withRows, type MoveResult } from '#shared/chain/move.ts';
import type { Member } from '../../auth/whoAsks.ts';
import { inTransaction } from '../../db/inTransaction.ts';
import { change } from '../../db/schema/change.ts';
import type { Deps } from '../../deps.ts';
import { readBoard, type Hand } from '../board/changeBoard.ts';
import { lockSeason, lockShelves } from '../board/locks.ts';
import { raiseRevision, writeEntry } from '../board/record.ts';
import { insertChain } from '../chains/commands.ts';
import { moveAsGuest } from '../guests/move.ts';
import { answerAgain, answerMove } from './answer.ts';
import { refused } from './refused.ts';
import { sidesOf, touchesOf } from './standing.ts';
import { storeRows } from './store.ts';

/** One move: order and dates together, in one transaction under the locks of its shelves. */
export function move(
  deps: Pick<Deps, 'db' | 'clock'>,
  member: Member,
  wish: MoveRequest,
): Promise<Moved> {
  return inTransaction(deps.db, async (tx) => {
    const { seasonId } = member;
    await lockShelves(tx, seasonId, shelvesOf(wish));
    // The bench and the order of the shelves have no row of their own: the season's stands for them.
    if (touchesSeason(wish)) await lockSeason(tx, seasonId);
    const now = deps.clock.now();
    const board = await readBoard(tx, member, now);
    const hand = { tx, member, board, now };
    const [again] = await tx.select().from(change).where(eq(change.id, wish.id));
    if (again) return answerAgain(hand, again);
    const result = member.guestOf
      ? moveAsGuest(hand, member.guestOf, wish)
      : moveBatch(board, wish);
    if (!result.ok) throw await refused(hand, wish, result);
    return result.batches.length === 0
      ? answerMove(hand, { changeId: wish.id, what: result.what, revision: board.season.revision })
      : store(hand, wish, result);
  });
}

const shelvesOf = ({ toChainId, expectedChainId }: MoveRequest): string[] =>
  [toChainId, expectedChainId].filter(
    (id): id is string => id !== null && id !== 'bench' && id !== 'new',
  );

const touchesSeason = ({ toChainId, expectedChainId }: MoveRequest): boolean =>
  toChainId === 'bench' || toChainId === 'new' || expectedChainId === null;

type Granted = Extract<MoveResult, { ok: true }>;

async function store(hand: Hand, wish: MoveRequest, result: Granted): Promise<Moved> {
  const { tx, member, board, now } = hand;
  const revision = await raiseRevision(tx, member.seasonId);
  if (wish.newChain && result.chains.length > 0)
    await insertChain(hand, wish.newChain, '/newChain');
  const batches = await storeRows(hand, result.batches);
  const after = withRows(board, result.batches, result.chains);
  const sides = sidesOf(board, after, wish.batchId);
  await writeEntry(tx, member, now, {
    id: wish.id,
    kind: 'move',
    what: result.what,
    before: sides.before,
    after: { ...sides.after, links: [linkChange(board, after, wish.batchId)] },
    touches: touchesOf(sides),
  });
  const { chains, shifted, cleared, what } = result;
  const own = { undo: { id: wish.id, what }, redo: null };
  return answerMove(hand, {
    changeId: wish.id,
    what,
    revision,
    batches,
    chains,
    shifted,
    cleared,
    own,
  });
}
