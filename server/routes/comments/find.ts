import { and, eq, sql } from 'drizzle-orm';
import type { Member } from '../../auth/whoAsks.ts';
import type { Db, Tx } from '../../db/client.ts';
import { chain } from '../../db/schema/chain.ts';
import { season } from '../../db/schema/season.ts';
import { comment } from '../../db/schema/talk.ts';
import { person } from '../../db/schema/people.ts';
import { notFound } from '../../problems.ts';

/** The chain that is talked about, in whatever season of this brewery. */
export async function findChain(db: Db | Tx, { brewery }: Member, id: string | undefined) {
  const [row] = await db
    .select({
      id: chain.id,
      name: chain.name,
      seasonId: chain.seasonId,
      isArchived: sql<boolean>`${season.archivedAt} is not null`,
    })
    .from(chain)
    .innerJoin(season, eq(season.id, chain.seasonId))
    .where(and(eq(chain.breweryId, brewery.id), eq(chain.id, id ?? '')));
  if (!row) throw notFound();
  return row;
}
export type TalkedChain = Awaited<ReturnType<typeof findChain>>;

/** Comments with who wrote them. */
export const selectComments = (db: Db | Tx) =>
  db
    .select({ row: comment, name: person.name })
    .from(comment)
    .innerJoin(person, eq(person.id, comment.personId));
export type CommentRow = Awaited<ReturnType<typeof selectComments>>[number];

export async function findComment(tx: Tx, chainId: string, id: string): Promise<CommentRow> {
  const [found] = await selectComments(tx)
    .where(and(eq(comment.chainId, chainId), eq(comment.id, id)))
    .for('update', { of: comment });
  if (!found) throw notFound();
  return found;
}
