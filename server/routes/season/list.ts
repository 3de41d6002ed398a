import { asc, eq, sql } from 'drizzle-orm';
import type { ListedSeason } from '#shared/api/brewery.ts';
import type { Db, Tx } from '../../db/client.ts';
import { brewery } from '../../db/schema/brewery.ts';
import { season } from '../../db/schema/season.ts';
import { notFound } from '../../problems.ts';
import { presentListed } from './present.ts';

const counted = (table: 'chain' | 'batch') =>
  sql<number>`(select count(*)::int from ${sql.identifier(table)} r
    where r.brewery_id = "season"."brewery_id" and r.season_id = "season"."id")`;

/** All seasons of a brewery: the current one first, then the newest, the archived last. */
export async function listSeasons(db: Db | Tx, breweryId: string): Promise<ListedSeason[]> {
  const rows = await db
    .select({
      row: season,
      currentId: brewery.currentSeasonId,
      chains: counted('chain'),
      batches: counted('batch'),
    })
    .from(season)
    .innerJoin(brewery, eq(brewery.id, season.breweryId))
    .where(eq(season.breweryId, breweryId))
    .orderBy(asc(season.createdAt), asc(season.id));
  const currentId = rows[0]?.currentId ?? rows[0]?.row.id;
  const all = rows.map(({ row, chains, batches }) =>
    presentListed(row, { isCurrent: row.id === currentId, chains, batches }),
  );
  const rank = ({ isCurrent, isArchived }: ListedSeason) => (isCurrent ? 0 : isArchived ? 2 : 1);
  return all.toReversed().toSorted((a, b) => rank(a) - rank(b));
}

export async function listedSeason(
  db: Db | Tx,
  breweryId: string,
  id: string,
): Promise<ListedSeason> {
  const found = (await listSeasons(db, breweryId)).find((each) => each.id === id);
  if (!found) throw notFound();
  return found;
}
