import { and, asc, eq, inArray } from 'drizzle-orm';
import type { Tx } from '../../db/client.ts';
import { chain } from '../../db/schema/chain.ts';
import { season } from '../../db/schema/season.ts';

/**
 * Locks shelves, always in the order of their ids and before the season, so that no two commands
 * wait for each other. Readers, and writers of other shelves, go on.
 */
export async function lockShelves(
  tx: Tx,
  seasonId: string,
  chainIds: readonly string[] | 'all',
): Promise<void> {
  if (chainIds.length === 0) return;
  const which = chainIds === 'all' ? undefined : inArray(chain.id, [...chainIds]);
  await tx
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
