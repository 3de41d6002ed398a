import { and, desc, eq, isNull } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { JoinLink, JoinLinkMade, Role } from '#shared/api/people.ts';
import { hashToken, newToken } from '../../auth/tokens.ts';
import type { Member } from '../../auth/whoAsks.ts';
import type { Clock } from '../../clock.ts';
import type { Db, Tx } from '../../db/client.ts';
import { inTransaction } from '../../db/inTransaction.ts';
import { joinLink } from '../../db/schema/brewery.ts';
import { person } from '../../db/schema/people.ts';
import { problem } from '../../problems.ts';
import { demandStillHead, membersUnderLock } from './underLock.ts';

const GOOD_FOR_MS = 7 * 24 * 60 * 60 * 1000;

const maker = alias(person, 'maker');
const user = alias(person, 'user_of_it');

export async function listJoinLinks(db: Db, { brewery }: Member): Promise<JoinLink[]> {
  const rows = await db
    .select({ link: joinLink, createdBy: maker.name, usedBy: user.name })
    .from(joinLink)
    .innerJoin(maker, eq(maker.id, joinLink.createdBy))
    .leftJoin(user, eq(user.id, joinLink.usedBy))
    .where(eq(joinLink.breweryId, brewery.id))
    .orderBy(desc(joinLink.createdAt));
  return rows.map(({ link, createdBy, usedBy }) => ({
    id: link.id,
    role: link.role,
    createdBy,
    expiresAt: link.expiresAt.toISOString(),
    usedAt: link.usedAt?.toISOString() ?? null,
    usedBy,
  }));
}

/**
 * Asked again under the same id (the answer was lost), it gives a new token for the same link: the
 * first one cannot be told again, since only its hash is stored. Whoever makes it is still head
 * brewer: of one who is not, the open links were taken away with the role.
 */
export function makeJoinLink(
  db: Db,
  clock: Clock,
  { brewery, person: head }: Member,
  wish: { id: string; role: Role },
): Promise<JoinLinkMade> {
  return inTransaction(db, async (tx) => {
    demandStillHead(await membersUnderLock(tx, brewery.id), head.id);
    const token = newToken();
    const expiresAt = await store(tx, { ...wish, token, brewery, head, now: clock.now() });
    return {
      ...wish,
      createdBy: head.name,
      expiresAt: expiresAt.toISOString(),
      usedAt: null,
      usedBy: null,
      token,
    };
  });
}

interface NewLink {
  id: string;
  role: Role;
  token: string;
  brewery: Member['brewery'];
  head: Member['person'];
  now: Date;
}

/** @returns when it runs out */
async function store(tx: Tx, { id, role, token, brewery, head, now }: NewLink): Promise<Date> {
  const [made] = await tx
    .insert(joinLink)
    .values({
      id,
      role,
      breweryId: brewery.id,
      tokenHash: hashToken(token),
      createdBy: head.id,
      createdAt: now,
      expiresAt: new Date(now.getTime() + GOOD_FOR_MS),
    })
    .onConflictDoUpdate({
      target: joinLink.id,
      set: { tokenHash: hashToken(token) },
      setWhere: and(
        eq(joinLink.breweryId, brewery.id),
        eq(joinLink.createdBy, head.id),
        eq(joinLink.role, role),
        isNull(joinLink.usedAt),
      ),
    })
    .returning({ expiresAt: joinLink.expiresAt });
  if (!made) throw problem('already-exists', { detail: 'This id is in use: make a new one' });
  return made.expiresAt;
}

export async function withdrawJoinLink(db: Db, { brewery }: Member, id: string): Promise<boolean> {
  const gone = await db
    .delete(joinLink)
    .where(and(eq(joinLink.breweryId, brewery.id), eq(joinLink.id, id)))
    .returning({ id: joinLink.id });
  return gone.length > 0;
}
