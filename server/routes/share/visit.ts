import { and, eq, notExists, sql } from 'drizzle-orm';
import type { Db } from '../../db/client.ts';
import { membership } from '../../db/schema/brewery.ts';
import { shareLink } from '../../db/schema/sharing.ts';

/** Counts a look at a link, unless it is somebody of the brewery that looks. */
export async function countVisit(
  db: Db,
  link: typeof shareLink.$inferSelect,
  personId: string | null,
  now: Date,
): Promise<void> {
  const isMember = db
    .select({ role: membership.role })
    .from(membership)
    .where(and(eq(membership.breweryId, link.breweryId), eq(membership.personId, personId ?? '')));
  await db
    .update(shareLink)
    .set({ visits: sql`${shareLink.visits} + 1`, lastVisitAt: now })
    .where(and(eq(shareLink.id, link.id), personId === null ? undefined : notExists(isMember)));
}
