import { and, asc, eq, sql } from 'drizzle-orm';
import type { Talk } from '#shared/api/comment.ts';
import type { Member } from '../../auth/whoAsks.ts';
import type { Db } from '../../db/client.ts';
import { oncePer } from '../../db/oncePer.ts';
import { comment, commentSeen } from '../../db/schema/talk.ts';
import { findChain, selectComments } from './find.ts';
import { presentComment } from './present.ts';

/** A chain's talk, with how far one has read it. */
export async function readTalk(db: Db, member: Member, chainId: string | undefined): Promise<Talk> {
  const chain = await findChain(db, member, chainId);
  const [rows, marks] = await Promise.all([
    selectComments(db).where(eq(comment.chainId, chain.id)).orderBy(asc(comment.seq)),
    db
      .select({ seq: commentSeen.seq })
      .from(commentSeen)
      .where(and(eq(commentSeen.personId, member.person.id), eq(commentSeen.chainId, chain.id))),
  ]);
  const comments = rows.map(presentComment);
  const seen = marks[0]?.seq ?? 0;
  const isNew = (one: (typeof comments)[number]) =>
    one.seq > seen && one.text !== null && one.by.personId !== member.person.id;
  return { comments, seen, unread: comments.filter(isNew).length };
}

const unreadQuery = oncePer((db: Db) =>
  db
    .select({ chainId: comment.chainId, unread: sql<number>`count(*)::int` })
    .from(comment)
    .leftJoin(
      commentSeen,
      and(
        eq(commentSeen.chainId, comment.chainId),
        eq(commentSeen.personId, sql.placeholder('personId')),
      ),
    )
    .where(
      sql`${comment.breweryId} = ${sql.placeholder('breweryId')}
        and ${comment.personId} <> ${sql.placeholder('reader')}
        and ${comment.deletedAt} is null
        and ${comment.seq} > coalesce(${commentSeen.seq}, 0)`,
    )
    .groupBy(comment.chainId)
    .prepare('unread'),
);

/** How many comments of others one has not seen, by chain; chains without any are left out. */
export async function unreadByChain(
  db: Db,
  breweryId: string,
  personId: string,
): Promise<Record<string, number>> {
  const rows = await unreadQuery(db).execute({ breweryId, personId, reader: personId });
  return Object.fromEntries(rows.map(({ chainId, unread }) => [chainId, unread]));
}
