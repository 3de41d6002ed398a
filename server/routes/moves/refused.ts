import { and, desc, eq, sql } from 'drizzle-orm';
import type { MoveRequest } from '#shared/api/move.ts';
import type { MoveRefusal } from '#shared/chain/move.ts';
import type { Member } from '../../auth/whoAsks.ts';
import { change } from '../../db/schema/change.ts';
import { person } from '../../db/schema/people.ts';
import { notFound, problem, type ProblemError } from '../../problems.ts';
import type { Hand } from '../board/hand.ts';
import type { Entry } from '../board/record.ts';

/** A move that is made together with the refused one, and not on the record yet. */
export interface MadeMove {
  member: Member;
  entry: Entry & { id: string };
}

/**
 * Why a move no longer fits, who is behind it and what they did, and where the batch is now.
 * @param made moves that came first in the same transaction, in order.
 */
export async function refused(
  hand: Hand,
  wish: MoveRequest,
  { why, detail }: { why: MoveRefusal; detail: string },
  made: readonly MadeMove[],
): Promise<ProblemError> {
  const current = hand.board.batches.find(({ id }) => id === wish.batchId);
  const movedElsewhere = why === 'moved-elsewhere';
  const touched = movedElsewhere || !current ? wish.batchId : (wish.afterBatchId ?? wish.toChainId);
  const since = lastMade(made, touched) ?? (await lastChange(hand, touched));
  const said = since && `${since.who}: ${since.what}`;
  if (!current) return said ? problem('not-found', { detail: said }) : notFound();
  return problem(movedElsewhere ? why : 'place-taken', {
    detail: said ? `${detail.replace(/\.$/, '')}. ${said}.` : detail,
    current: { ...current, changedBy: since?.who ?? null },
  });
}

function lastMade(made: readonly MadeMove[], rowId: string) {
  const found = made.findLast(({ entry }) => entry.touches.includes(rowId));
  return found && { who: found.member.person.name, what: found.entry.what };
}

/** What happened last to a row. Null: nothing that is on the record. */
async function lastChange({ tx, board }: Hand, rowId: string) {
  if (rowId === 'bench' || rowId === 'new') return null;
  const [found] = await tx
    .select({ who: person.name, what: change.what })
    .from(change)
    .innerJoin(person, eq(person.id, change.personId))
    .where(
      and(eq(change.seasonId, board.season.id), sql`${change.touches} @> array[${rowId}::uuid]`),
    )
    .orderBy(desc(change.seq))
    .limit(1);
  return found ?? null;
}
