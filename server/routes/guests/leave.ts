import { and, eq, isNotNull, isNull, type SQL } from 'drizzle-orm';
import { api } from '#shared/api/urls.ts';
import type { PersonRow } from '../../auth/sessions.ts';
import type { Tx } from '../../db/client.ts';
import { inTransaction } from '../../db/inTransaction.ts';
import { brewery } from '../../db/schema/brewery.ts';
import { chain } from '../../db/schema/chain.ts';
import { chainGuest } from '../../db/schema/sharing.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forSignedIn } from '../../http/route.ts';
import { tell } from '../../live/note.ts';
import { notFound } from '../../problems.ts';
import { raiseRevision, tellBrewery, writeEntry } from '../board/record.ts';

type Guest = Pick<PersonRow, 'id'>;

/** The guest goes of their own accord; what they did stays, and stays in the record. */
export async function leaveChain(tx: Tx, who: Guest, guestId: string, now: Date): Promise<void> {
  const [left] = await end(tx, who, eq(chainGuest.id, guestId), now);
  if (!left) throw notFound();
  // One's own board first, as everywhere: a guest's change locks the season that it is made in last.
  if (left.guestBreweryId !== null) await tellBrewery(tx, left.guestBreweryId);
  await recordLeft(tx, who, left, now);
  await tell(tx, { kind: 'person', personId: who.id });
}

/** Who leaves a brewery leaves the chains of others that stood on its boards for them. */
export async function leaveChainsOn(
  tx: Tx,
  who: Guest,
  breweryId: string,
  now: Date,
): Promise<void> {
  const left = await end(tx, who, eq(chainGuest.guestBreweryId, breweryId), now);
  for (const row of left) await recordLeft(tx, who, row, now);
}

type GuestRow = typeof chainGuest.$inferSelect;

const end = (tx: Tx, who: Guest, which: SQL, now: Date): Promise<GuestRow[]> =>
  tx
    .update(chainGuest)
    .set({ withdrawnAt: now })
    .where(
      and(
        which,
        eq(chainGuest.personId, who.id),
        isNotNull(chainGuest.joinedAt),
        isNull(chainGuest.withdrawnAt),
      ),
    )
    .returning();

/** In the record of those whose chain it is. */
async function recordLeft(tx: Tx, who: Guest, left: GuestRow, now: Date): Promise<void> {
  const [place] = await tx
    .select({ brewery, seasonId: chain.seasonId, name: chain.name })
    .from(chain)
    .innerJoin(brewery, eq(brewery.id, chain.breweryId))
    .where(eq(chain.id, left.chainId));
  if (!place) throw notFound();
  await raiseRevision(tx, place.seasonId);
  await writeEntry(tx, { ...place, person: who }, now, {
    kind: 'edit',
    what: `Left ${place.name}, as its guest`,
    before: { role: left.role },
    after: null,
    touches: [left.chainId],
  });
}

export const leaveChainRoute = forSignedIn(
  {
    name: 'leaveGuestShelf',
    method: 'delete',
    path: pathOf(api.guestShelf(':id')),
    summary: 'Leave a chain of another brewery that one is a guest of',
    answer: null,
    status: 204,
    problems: ['not-found'],
  },
  async ({ db, clock, params }, { person }) => {
    await inTransaction(db, (tx) => leaveChain(tx, person, params.id ?? '', clock.now()));
    return {};
  },
);
