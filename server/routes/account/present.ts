import { and, eq, isNotNull, isNull } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { GuestPlace, Person } from '#shared/api/people.ts';
import type { PersonRow } from '../../auth/sessions.ts';
import type { Db, Tx } from '../../db/client.ts';
import { brewery, membership } from '../../db/schema/brewery.ts';
import { chain } from '../../db/schema/chain.ts';
import { chainGuest } from '../../db/schema/sharing.ts';

/** A person as they see themselves, with the breweries they belong to and the chains they are a guest of. */
export async function presentPerson(db: Db | Tx, row: PersonRow): Promise<Person> {
  const breweries = await db
    .select({
      brewery: { id: brewery.id, slug: brewery.slug, name: brewery.name },
      role: membership.role,
    })
    .from(membership)
    .innerJoin(brewery, eq(brewery.id, membership.breweryId))
    .where(eq(membership.personId, row.id))
    .orderBy(membership.joinedAt, brewery.name);
  const { id, version, name, email, units, theme } = row;
  const guestOf = await guestPlaces(db, row.id);
  return { id, version, name, email, units, theme, breweries, guestOf };
}

const own = alias(brewery, 'own');

/** Where the guest no longer belongs to the brewery on whose board a shelf stood, it stands nowhere. */
async function guestPlaces(db: Db | Tx, personId: string): Promise<GuestPlace[]> {
  return db
    .select({
      guestId: chainGuest.id,
      chainName: chain.name,
      fromBrewery: brewery.name,
      onBoardOf: own.slug,
    })
    .from(chainGuest)
    .innerJoin(brewery, eq(brewery.id, chainGuest.breweryId))
    .innerJoin(chain, eq(chain.id, chainGuest.chainId))
    .innerJoin(own, eq(own.id, chainGuest.guestBreweryId))
    .innerJoin(
      membership,
      and(eq(membership.breweryId, own.id), eq(membership.personId, chainGuest.personId)),
    )
    .where(
      and(
        eq(chainGuest.personId, personId),
        isNotNull(chainGuest.joinedAt),
        isNull(chainGuest.withdrawnAt),
      ),
    )
    .orderBy(chainGuest.joinedAt, chainGuest.id);
}
