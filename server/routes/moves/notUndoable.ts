import { and, desc, eq, gt, sql } from 'drizzle-orm';
import { change } from '../../db/schema/change.ts';
import { person } from '../../db/schema/people.ts';
import { problem, type ProblemError } from '../../problems.ts';
import type { Refused } from '../../record/refused.ts';
import type { Hand } from '../board/hand.ts';

export type Way = 'undo' | 'redo';
export type ChangeRow = typeof change.$inferSelect;

/** Names who changed the same thing since, and what they did. */
export async function notUndoable(
  { tx, board }: Hand,
  row: ChangeRow,
  { detail, touched }: Pick<Refused, 'detail' | 'touched'>,
): Promise<ProblemError> {
  const [since] = await tx
    .select({ who: person.name, what: change.what })
    .from(change)
    .innerJoin(person, eq(person.id, change.personId))
    .where(
      and(
        eq(change.seasonId, board.season.id),
        gt(change.seq, row.seq),
        sql`${touched}::uuid = any(${change.touches})`,
      ),
    )
    .orderBy(desc(change.seq))
    .limit(1);
  const current = board.batches.find(({ id }) => id === touched);
  const said = since ? `${detail}. ${since.who}: ${since.what}` : detail;
  return problem('not-undoable', { detail: said, current });
}
