import { and, asc, eq, inArray, sql } from 'drizzle-orm';
import type { Tx } from '../../db/client.ts';
import { brewery } from '../../db/schema/brewery.ts';
import { chain } from '../../db/schema/chain.ts';
import { season } from '../../db/schema/season.ts';

/**
 * Locks shelves, always in the order of their ids, and then the season, so that no two commands wait
 * for each other. Readers, and writers of other shelves, go on.
 */
export async function lockBoard(
  tx: Tx,
  seasonId: string,
  chainIds: readonly string[] | 'all',
): Promise<void> {
  if (chainIds.length === 0) return lockSeason(tx, seasonId);
  const shelves = tx.$with('shelves').as(shelvesLocked(tx, seasonId, chainIds));
  await tx
    .with(shelves)
    .select({ id: season.id })
    .from(season)
    // The season is looked for only once they have all been counted, so they are locked by then.
    .where(and(eq(season.id, seasonId), sql`(select count(*) from ${shelves}) >= 0`))
    .for('no key update');
}

function shelvesLocked(tx: Tx, seasonId: string, chainIds: readonly string[] | 'all') {
  const which = chainIds === 'all' ? undefined : inArray(chain.id, [...chainIds]);
  return tx
    .select({ id: chain.id })
    .from(chain)
    .where(and(eq(chain.seasonId, seasonId), which))
    .orderBy(asc(chain.id))
    .for('no key update');
}

/** Locks the season's own row, and with it the bench, the order of the shelves and the revision. */
export async function lockSeason(tx: Tx, seasonId: string): Promise<void> {
  await tx
    .select({ id: season.id })
    .from(season)
    .where(eq(season.id, seasonId))
    .for('no key update');
}

/** Locks what every change of a membership, and of what all seasons share, takes first. */
export async function lockBrewery(tx: Tx, breweryId: string): Promise<void> {
  await tx
    .select({ id: brewery.id })
    .from(brewery)
    .where(eq(brewery.id, breweryId))
    .for('no key update');
}

/** What a change reaches: one season's board, or also what the boards of all seasons show. */
export type Reach = 'season' | 'all-seasons';

/**
 * The locks of a change, in the one order in which all take them: brewery, shelves, then seasons by
 * their ids.
 */
export async function lockFor(
  tx: Tx,
  { breweryId, seasonId }: { breweryId: string; seasonId: string },
  shelves: readonly string[] | 'all',
  reach: Reach,
): Promise<void> {
  if (reach === 'all-seasons') await lockBrewery(tx, breweryId);
  if (reach === 'season') return lockBoard(tx, seasonId, shelves);
  if (shelves.length > 0) await shelvesLocked(tx, seasonId, shelves);
  await tx
    .select({ id: season.id })
    .from(season)
    .where(eq(season.breweryId, breweryId))
    .orderBy(asc(season.id))
    .for('no key update');
}
