import { and, eq, isNotNull, isNull } from 'drizzle-orm';
import type { GuestShelf } from '#shared/api/guest.ts';
import type { Member } from '../../auth/whoAsks.ts';
import type { Db } from '../../db/client.ts';
import { brewery } from '../../db/schema/brewery.ts';
import { chain } from '../../db/schema/chain.ts';
import { chainGuest } from '../../db/schema/sharing.ts';

/** The shelves of other breweries that stand on somebody's board here. */
export async function guestShelves(db: Db, member: Member): Promise<GuestShelf[]> {
  if (member.guestOf) return [];
  return db
    .select({
      guestId: chainGuest.id,
      role: chainGuest.role,
      fromBrewery: brewery.name,
      ownerSlug: brewery.slug,
      seasonId: chain.seasonId,
      chainId: chain.id,
      chainName: chain.name,
    })
    .from(chainGuest)
    .innerJoin(brewery, eq(brewery.id, chainGuest.breweryId))
    .innerJoin(chain, eq(chain.id, chainGuest.chainId))
    .where(
      and(
        eq(chainGuest.guestBreweryId, member.brewery.id),
        eq(chainGuest.personId, member.person.id),
        isNotNull(chainGuest.joinedAt),
        isNull(chainGuest.withdrawnAt),
      ),
    )
    .orderBy(chainGuest.joinedAt, chainGuest.id);
}
