import { and, eq, isNull } from 'drizzle-orm';
import type { JoinPreview, JoinRequest } from '#shared/api/people.ts';
import { hashToken } from '../../auth/tokens.ts';
import type { PersonRow } from '../../auth/sessions.ts';
import type { Db, Tx } from '../../db/client.ts';
import { brewery, joinLink, membership } from '../../db/schema/brewery.ts';
import { person } from '../../db/schema/people.ts';
import { notFound, problem } from '../../problems.ts';
import { lockBrewery } from '../board/locks.ts';
import { tellBrewery } from '../board/record.ts';

type Found = {
  link: typeof joinLink.$inferSelect;
  brewery: typeof brewery.$inferSelect;
  by: string;
};

/** A link that may still be used. */
export async function findJoinLink(db: Db | Tx, token: string, now: Date): Promise<Found> {
  const [found] = await db
    .select({ link: joinLink, brewery, by: person.name })
    .from(joinLink)
    .innerJoin(brewery, eq(brewery.id, joinLink.breweryId))
    .innerJoin(person, eq(person.id, joinLink.createdBy))
    .where(eq(joinLink.tokenHash, hashToken(token)));
  if (!found) throw notFound();
  if (found.link.usedAt !== null)
    throw problem('link-used', { detail: 'It has been used: ask for a new one' });
  if (found.link.expiresAt <= now)
    throw problem('link-used', { detail: 'It has run out: ask for a new one' });
  return found;
}

export const presentPreview = (
  { link, brewery: itsBrewery, by }: Found,
  isMember: boolean,
): JoinPreview => ({
  breweryName: itsBrewery.name,
  role: link.role,
  invitedBy: by,
  expiresAt: link.expiresAt.toISOString(),
  memberOf: isMember ? itsBrewery.slug : null,
});

/** @param personId null: nobody is signed in */
export async function belongs(
  db: Db | Tx,
  breweryId: string,
  personId: string | null,
): Promise<boolean> {
  if (personId === null) return false;
  const found = await db
    .select({ role: membership.role })
    .from(membership)
    .where(and(eq(membership.breweryId, breweryId), eq(membership.personId, personId)));
  return found.length > 0;
}

/**
 * Uses the link up: of two at once, one joins. Under the lock of every change of a membership, so
 * that nobody comes in by the link of a head brewer who is gone by then.
 */
export async function join(tx: Tx, token: string, who: PersonRow, now: Date): Promise<string> {
  const { brewery: asked } = await findJoinLink(tx, token, now);
  await lockBrewery(tx, asked.id);
  const { link, brewery: itsBrewery } = await findJoinLink(tx, token, now);
  const used = await tx
    .update(joinLink)
    .set({ usedAt: now, usedBy: who.id })
    .where(and(eq(joinLink.id, link.id), isNull(joinLink.usedAt)))
    .returning({ id: joinLink.id });
  if (used.length === 0) throw problem('link-used');
  const joined = await tx
    .insert(membership)
    .values({ breweryId: itsBrewery.id, personId: who.id, role: link.role, joinedAt: now })
    .onConflictDoNothing()
    .returning({ role: membership.role });
  if (joined.length === 0)
    throw problem('already-exists', {
      detail: `You belong to ${itsBrewery.name} already; the link stays good for somebody else.`,
    });
  await tellBrewery(tx, itsBrewery.id);
  return itsBrewery.slug;
}

/** A visitor makes an account by joining, so all three are needed. */
export function demandNewPerson(body: JoinRequest): {
  name: string;
  email: string;
  password: string;
} {
  const { name, email, password } = body;
  if (name !== undefined && email !== undefined && password !== undefined)
    return { name, email, password };
  const missing = { name, email, password };
  const errors = Object.entries(missing)
    .filter(([, value]) => value === undefined)
    .map(([field]) => ({ detail: 'Needed for a new account', pointer: `/${field}` }));
  throw problem('invalid-request', { errors });
}
