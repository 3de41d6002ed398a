import { and, desc, eq, gt, inArray, ne, sql } from 'drizzle-orm';
import type { SignInPlace } from '#shared/api/account.ts';
import type { SignedIn } from '../../auth/sessions.ts';
import { hashToken } from '../../auth/tokens.ts';
import type { Db, Tx } from '../../db/client.ts';
import { session } from '../../db/schema/people.ts';
import { tell } from '../../live/note.ts';

/** Names a sign-in to its owner: a hash of what is stored, so that the list tells nothing of use to others. */
const markOf = (tokenHash: string) => hashToken(tokenHash);

export async function listSignIns(
  db: Db,
  { person, tokenHash }: SignedIn,
  now: Date,
): Promise<SignInPlace[]> {
  const seenAt = sql<Date>`coalesce(${session.seenAt}, ${session.createdAt})`.mapWith(
    session.createdAt,
  );
  const rows = await db
    .select({
      tokenHash: session.tokenHash,
      device: session.device,
      since: session.createdAt,
      seenAt,
    })
    .from(session)
    .where(and(eq(session.personId, person.id), gt(session.expiresAt, now)))
    .orderBy(desc(seenAt));
  return rows.map((row) => ({
    mark: markOf(row.tokenHash),
    device: row.device,
    since: row.since.toISOString(),
    seenAt: row.seenAt.toISOString(),
    isThisOne: row.tokenHash === tokenHash,
  }));
}

/** @returns false where there is no such sign-in of this person */
export async function endSignIn(db: Db, { person }: SignedIn, mark: string): Promise<boolean> {
  return db.transaction(async (tx) => {
    const rows = await tx
      .select({ tokenHash: session.tokenHash })
      .from(session)
      .where(eq(session.personId, person.id));
    const asked = rows.map((row) => row.tokenHash).filter((hash) => markOf(hash) === mark);
    if (asked.length === 0) return false;
    await tx.delete(session).where(inArray(session.tokenHash, asked));
    await tell(tx, { kind: 'person', personId: person.id });
    return true;
  });
}

/** Ends all but the one that asks, and the streams that hang on them. */
export async function endOtherSignIns(tx: Db | Tx, { person, tokenHash }: SignedIn): Promise<void> {
  await tx
    .delete(session)
    .where(and(eq(session.personId, person.id), ne(session.tokenHash, tokenHash)));
  await tell(tx, { kind: 'person', personId: person.id });
}
