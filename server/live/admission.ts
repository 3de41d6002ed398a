import { and, eq, inArray, isNotNull, isNull, sql } from 'drizzle-orm';
import type { Ended } from '#shared/api/live.ts';
import type { Clock } from '../clock.ts';
import type { Db } from '../db/client.ts';
import { brewery, membership } from '../db/schema/brewery.ts';
import { chain } from '../db/schema/chain.ts';
import { season } from '../db/schema/season.ts';
import { chainGuest } from '../db/schema/sharing.ts';
import type { Watcher } from './stream.ts';

/** Which of the watchers may no longer watch, and why. One query, however many there are. */
export async function outcasts(
  db: Db,
  clock: Clock,
  watchers: readonly Watcher[],
): Promise<Map<string, Ended>> {
  if (watchers.length === 0) return new Map();
  const asked = JSON.stringify(
    watchers.map(({ streamId, personId, tokenHash, breweryId }) => ({
      id: streamId,
      person: personId,
      token: tokenHash,
      brewery: breweryId,
    })),
  );
  const { rows } = await db.execute<{ id: string; signed_in: boolean }>(sql`
    select v.id, s.token_hash is not null as signed_in
    from jsonb_to_recordset(${asked}::jsonb) as v(id uuid, person uuid, token text, brewery uuid)
    left join session s on s.token_hash = v.token and s.expires_at > ${clock.now().toISOString()}
    left join membership m on m.person_id = v.person and m.brewery_id = v.brewery
    where s.token_hash is null or m.person_id is null`);
  return new Map(rows.map(({ id, signed_in }) => [id, signed_in ? 'not-a-member' : 'signed-out']));
}

/** A chain of another brewery on somebody's board. */
export interface GuestChain {
  personId: string;
  /** The guest's own brewery. */
  boardOf: string;
  chainId: string;
  seasonId: string;
  ownerId: string;
  ownerName: string;
}

/** The chains that these people are guests of. Who left the brewery with the board is no guest. */
export async function guestChains(db: Db, people: readonly string[]): Promise<GuestChain[]> {
  if (people.length === 0) return [];
  return db
    .select({
      personId: membership.personId,
      boardOf: membership.breweryId,
      chainId: chain.id,
      seasonId: chain.seasonId,
      ownerId: brewery.id,
      ownerName: brewery.name,
    })
    .from(chainGuest)
    .innerJoin(chain, eq(chain.id, chainGuest.chainId))
    .innerJoin(brewery, eq(brewery.id, chainGuest.breweryId))
    .innerJoin(
      membership,
      and(
        eq(membership.breweryId, chainGuest.guestBreweryId),
        eq(membership.personId, chainGuest.personId),
      ),
    )
    .where(
      and(
        inArray(chainGuest.personId, [...people]),
        isNotNull(chainGuest.joinedAt),
        isNull(chainGuest.withdrawnAt),
      ),
    );
}

export async function revisionsOf(
  db: Db,
  seasonIds: readonly string[],
): Promise<{ id: string; revision: number }[]> {
  if (seasonIds.length === 0) return [];
  return db
    .select({ id: season.id, revision: season.revision })
    .from(season)
    .where(inArray(season.id, [...seasonIds]));
}
