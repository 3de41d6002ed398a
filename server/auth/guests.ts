import { and, desc, eq, isNotNull, isNull, sql } from 'drizzle-orm';
import type { GuestRole } from '#shared/api/guest.ts';
import type { Db } from '../db/client.ts';
import { oncePer } from '../db/oncePer.ts';
import { brewery, membership } from '../db/schema/brewery.ts';
import { chain } from '../db/schema/chain.ts';
import { season } from '../db/schema/season.ts';
import { chainGuest } from '../db/schema/sharing.ts';

/** The chains of a brewery that somebody of another one may see, and as what. */
export type GuestChains = ReadonlyMap<string, GuestRole>;

export interface GuestIn {
  brewery: typeof brewery.$inferSelect;
  seasonId: string;
  isArchived: boolean;
  chains: GuestChains;
}

/**
 * What somebody who does not belong to a brewery is a guest of there: the chains of the season that
 * is asked for, else of the one they came to last. Who has left the brewery on whose board the shelf stood is no guest.
 */
export async function findGuest(
  db: Db,
  slug: string,
  asked: string | null,
  personId: string,
): Promise<GuestIn | null> {
  const rows = await guestQuery(db).execute({ slug, personId });
  const newest = rows.find((row) => asked === null || row.seasonId === asked);
  if (!newest) return null;
  const { brewery: owner, seasonId, archivedAt } = newest;
  const here = rows.filter((row) => row.seasonId === seasonId);
  return {
    brewery: owner,
    seasonId,
    isArchived: archivedAt !== null,
    chains: new Map(here.map(({ chainId, role }) => [chainId, role])),
  };
}

const guestQuery = oncePer((db: Db) =>
  db
    .select({
      brewery,
      seasonId: chain.seasonId,
      archivedAt: season.archivedAt,
      chainId: chainGuest.chainId,
      role: chainGuest.role,
    })
    .from(chainGuest)
    .innerJoin(brewery, eq(brewery.id, chainGuest.breweryId))
    .innerJoin(chain, eq(chain.id, chainGuest.chainId))
    .innerJoin(season, eq(season.id, chain.seasonId))
    .innerJoin(
      membership,
      and(
        eq(membership.breweryId, chainGuest.guestBreweryId),
        eq(membership.personId, chainGuest.personId),
      ),
    )
    .where(
      and(
        eq(brewery.slug, sql.placeholder('slug')),
        eq(chainGuest.personId, sql.placeholder('personId')),
        isNotNull(chainGuest.joinedAt),
        isNull(chainGuest.withdrawnAt),
      ),
    )
    .orderBy(desc(chainGuest.joinedAt))
    .prepare('guest'),
);
