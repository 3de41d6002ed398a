import { and, eq, inArray, isNotNull, isNull, sql } from 'drizzle-orm';
import type { Ended } from '#shared/api/live.ts';
import type { Clock } from '../clock.ts';
import type { Db } from '../db/client.ts';
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

/** The seasons of other breweries whose chains stand on these breweries' boards. */
export async function guestSeasons(
  db: Db,
  breweryIds: readonly string[],
): Promise<Map<string, Set<string>>> {
  const found = new Map<string, Set<string>>();
  if (breweryIds.length === 0) return found;
  const rows = await db
    .selectDistinct({ breweryId: chainGuest.guestBreweryId, seasonId: chain.seasonId })
    .from(chainGuest)
    .innerJoin(chain, eq(chain.id, chainGuest.chainId))
    .where(
      and(
        inArray(chainGuest.guestBreweryId, [...breweryIds]),
        isNotNull(chainGuest.joinedAt),
        isNull(chainGuest.withdrawnAt),
      ),
    );
  for (const { breweryId, seasonId } of rows) {
    if (breweryId === null) continue;
    found.set(breweryId, (found.get(breweryId) ?? new Set()).add(seasonId));
  }
  return found;
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
