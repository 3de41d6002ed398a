import { and, eq, isNull } from 'drizzle-orm';
import type { Tx } from '../../db/client.ts';
import { joinLink } from '../../db/schema/brewery.ts';
import { chainGuest } from '../../db/schema/sharing.ts';

/**
 * Invitations that somebody made and that nobody used yet: without this, who was removed could come
 * back by a link of their own.
 */
export async function withdrawOpenLinks(
  tx: Tx,
  breweryId: string,
  personId: string,
): Promise<void> {
  await tx
    .delete(joinLink)
    .where(
      and(
        eq(joinLink.breweryId, breweryId),
        eq(joinLink.createdBy, personId),
        isNull(joinLink.usedAt),
      ),
    );
  await tx
    .delete(chainGuest)
    .where(
      and(
        eq(chainGuest.breweryId, breweryId),
        eq(chainGuest.createdBy, personId),
        isNull(chainGuest.joinedAt),
      ),
    );
}
