import { and, desc, eq } from 'drizzle-orm';
import type { Moved } from '#shared/api/move.ts';
import { linkChange } from '#shared/chain/linkChanges.ts';
import { withRows } from '#shared/chain/move.ts';
import type { Member } from '../../auth/whoAsks.ts';
import { inTransaction } from '../../db/inTransaction.ts';
import { change } from '../../db/schema/change.ts';
import type { Deps } from '../../deps.ts';
import { problem } from '../../problems.ts';
import { demandOpen, readScene } from '../board/changeBoard.ts';
import type { Hand } from '../board/hand.ts';
import { demandNothingHangs } from '../board/hanging.ts';
import { lockFor } from '../board/locks.ts';
import { reachOf } from '../board/otherSeasons.ts';
import { raiseRevision, writeEntry } from '../board/record.ts';
import { insertChainRow } from '../chains/commands.ts';
import { demandOwnTouches } from '../guests/move.ts';
import { untold } from '../guests/seen.ts';
import { answerAgain, answerMove, shiftedBetween } from './answer.ts';
import { demandNotInHand } from '../pour/inHand.ts';
import { takeEditBack } from './undoEdit.ts';
import { newestOwn } from './newest.ts';
import { notUndoable, type ChangeRow, type Way } from './notUndoable.ts';
import { revert, type Reverted } from './revert.ts';
import { sidesOf, touchesOf, type Side } from './standing.ts';
import { dropChain, storeRows, withNewVersions } from './store.ts';

/** Takes one's newest change back, or does the one again that was taken back last. */
export function takeBack(
  deps: Pick<Deps, 'db' | 'clock'>,
  member: Member,
  way: Way,
  changeId: string,
): Promise<Moved> {
  return inTransaction(deps.db, async (tx) => {
    const where = { breweryId: member.brewery.id, seasonId: member.seasonId };
    await lockFor(tx, where, 'all', await reachOf(tx, changeId));
    const now = deps.clock.now();
    const { board, inHand } = await readScene(tx, member, now);
    const hand = { tx, member, board, inHand, now };
    demandOpen(hand.board);
    const newest = await newestOwn(tx, member.seasonId, member.person.id);
    if (newest[way]?.id === changeId) return carryOut(hand, way, await rowOf(hand, changeId));
    const done = await doneAlready(hand, way, changeId);
    if (done) return answerAgain(hand, done);
    throw problem('not-undoable', { detail: notNewest(way, newest[way]?.what) });
  });
}

const notNewest = (way: Way, what: string | undefined) =>
  what === undefined ? `There is nothing to ${way}` : `The newest change to ${way} is: ${what}`;

async function rowOf({ tx }: Hand, id: string): Promise<ChangeRow> {
  const [row] = await tx.select().from(change).where(eq(change.id, id));
  if (!row) throw problem('not-undoable');
  return row;
}

/** The same request again: its answer was lost, and what it asked for stands. */
async function doneAlready({ tx, member }: Hand, way: Way, changeId: string) {
  const [last] = await tx
    .select()
    .from(change)
    .where(and(eq(change.ofChange, changeId), eq(change.personId, member.person.id)))
    .orderBy(desc(change.seq))
    .limit(1);
  return last?.kind === way ? last : null;
}

async function carryOut(hand: Hand, way: Way, row: ChangeRow): Promise<Moved> {
  const { guestOf } = hand.member;
  if (!guestOf) return turn(hand, way, row);
  demandOwnTouches(guestOf, hand.board, row.touches);
  try {
    return await turn(hand, way, row);
  } catch (error) {
    throw untold(error);
  }
}

function turn(hand: Hand, way: Way, row: ChangeRow): Promise<Moved> {
  return row.kind === 'edit' ? takeEditBack(hand, way, row) : takeMoveBack(hand, way, row);
}

async function takeMoveBack(hand: Hand, way: Way, row: ChangeRow): Promise<Moved> {
  const [before, after] = [row.before as Side, row.after as Side];
  const [from, to] = way === 'undo' ? [after, before] : [before, after];
  const result = revert(hand.board, from, to);
  if (!result.ok) throw await notUndoable(hand, row, result);
  return store(hand, way, row, result);
}

type Granted = Extract<Reverted, { ok: true }>;

async function store(hand: Hand, way: Way, row: ChangeRow, result: Granted): Promise<Moved> {
  const { tx, member, board, now } = hand;
  const { rows, added, removedChainId } = result;
  const withAdded = withRows(board, rows, added ? [added] : []);
  demandNotInHand(hand, withAdded);
  if (removedChainId !== null) await demandNothingHangs(hand, [removedChainId], 'not-undoable');
  const revision = await raiseRevision(tx, member.seasonId);
  if (added) await insertChainRow(hand, added);
  const batches = withNewVersions(board, rows);
  await storeRows(hand, batches);
  if (removedChainId !== null) await dropChain(hand, removedChainId);
  const after = {
    ...withAdded,
    chains: withAdded.chains.filter(({ id }) => id !== removedChainId),
  };
  const sides = sidesOf(board, after, row.touches[0] ?? '');
  const what = `${way === 'undo' ? 'Undone' : 'Redone'}: ${row.what}`;
  await writeEntry(tx, member, now, {
    kind: way,
    what,
    before: sides.before,
    after: { ...sides.after, links: [linkChange(board, after, row.touches[0] ?? '')] },
    touches: touchesOf(sides),
    ofChange: row.id,
  });
  return answerMove(hand, {
    changeId: row.id,
    what,
    revision,
    batches,
    chains: added ? [added] : [],
    removedChainIds: removedChainId === null ? [] : [removedChainId],
    shifted: shiftedBetween(sides.before, sides.after),
  });
}
