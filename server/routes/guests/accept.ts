import { and, eq, isNotNull, isNull } from 'drizzle-orm';
import type { PersonRow } from '../../auth/sessions.ts';
import type { Tx } from '../../db/client.ts';
import { brewery, membership } from '../../db/schema/brewery.ts';
import { chainGuest } from '../../db/schema/sharing.ts';
import { invalidField, problem } from '../../problems.ts';
import { tell } from '../../live/note.ts';
import { raiseRevision, tellBrewery } from '../board/record.ts';
import { belongs } from '../join/commands.ts';
import { findInvitation } from './find.ts';

/** Uses an invitation up: of two at once, one becomes the guest. */
export async function acceptInvitation(
  tx: Tx,
  token: string,
  who: PersonRow,
  brewerySlug: string,
  now: Date,
): Promise<string> {
  const { row, brewery: owner, chain } = await findInvitation(tx, token, now);
  if (await belongs(tx, owner.id, who.id))
    throw problem('already-exists', { detail: `You belong to ${owner.name} already` });
  if (await isGuest(tx, who, row.chainId))
    throw problem('already-exists', { detail: `${chain.name} stands on your board already` });
  const own = await ownBrewery(tx, who, brewerySlug);
  const used = await tx
    .update(chainGuest)
    .set({ personId: who.id, guestBreweryId: own, joinedAt: now })
    .where(
      and(eq(chainGuest.id, row.id), isNull(chainGuest.joinedAt), isNull(chainGuest.withdrawnAt)),
    )
    .returning({ id: chainGuest.id });
  if (used.length === 0) throw problem('link-used');
  await raiseRevision(tx, chain.seasonId);
  await tellBrewery(tx, own);
  await tell(tx, { kind: 'person', personId: who.id });
  return row.id;
}

async function isGuest(tx: Tx, who: PersonRow, chainId: string): Promise<boolean> {
  const found = await tx
    .select({ id: chainGuest.id })
    .from(chainGuest)
    .where(
      and(
        eq(chainGuest.chainId, chainId),
        eq(chainGuest.personId, who.id),
        isNotNull(chainGuest.joinedAt),
        isNull(chainGuest.withdrawnAt),
      ),
    );
  return found.length > 0;
}

async function ownBrewery(tx: Tx, who: PersonRow, slug: string): Promise<string> {
  const [own] = await tx
    .select({ id: brewery.id })
    .from(brewery)
    .innerJoin(membership, eq(membership.breweryId, brewery.id))
    .where(and(eq(brewery.slug, slug), eq(membership.personId, who.id)));
  if (!own) throw invalidField('/brewerySlug', 'Choose one of your own breweries');
  return own.id;
}
