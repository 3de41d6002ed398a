import { eq, getTableColumns, sql } from 'drizzle-orm';
import type { Board, HouseRuleChanges } from '#shared/api/board.ts';
import type { Db, Tx } from '../../db/client.ts';
import { jsonRows } from '../../db/jsonRows.ts';
import { cake } from '../../db/schema/cake.ts';
import { batch, chain } from '../../db/schema/chain.ts';
import { blockedDay, season } from '../../db/schema/season.ts';
import { vessel, yeast } from '../../db/schema/stock.ts';
import { presentBatch } from '../batches/present.ts';
import { presentChain } from '../chains/present.ts';
import { presentMember, type MemberRow } from '../people/present.ts';
import { presentSeason } from '../season/present.ts';
import { presentVessel } from '../vessels/present.ts';
import { presentYeast } from '../yeasts/present.ts';

export type BoardRows = Pick<
  Board,
  'season' | 'houseRules' | 'members' | 'yeasts' | 'vessels' | 'chains' | 'batches'
>;

/**
 * Everything that stands on a season's board, in two queries whatever its size: the season with
 * the small tables around it, and the batches with their cakes.
 */
export async function loadBoardRows(
  db: Db | Tx,
  breweryId: string,
  seasonId: string,
): Promise<BoardRows | null> {
  const { head, batches } = queriesOn(db);
  const ids = { breweryId, seasonId };
  // In turn on a transaction's one connection, side by side on a pool's.
  const [[found], rows] = await Promise.all([head.execute(ids), batches.execute(ids)]);
  if (!found) return null;
  return {
    season: presentSeason(found.season, found.blockedDays),
    houseRules: found.houseRules ?? {},
    members: found.members.map(presentMember),
    yeasts: found.yeasts.map(presentYeast),
    vessels: found.vessels.map(presentVessel),
    chains: found.chains.map(presentChain),
    batches: rows.map((row) => presentBatch(row.batch, row.cake)),
  };
}

type Queries = ReturnType<typeof prepare>;
const prepared = new WeakMap<object, Queries>();

/** The statements are put together once for a pool, and once for each transaction. */
function queriesOn(db: Db | Tx): Queries {
  const known = prepared.get(db);
  if (known) return known;
  const made = prepare(db);
  prepared.set(db, made);
  return made;
}

function prepare(db: Db | Tx) {
  const breweryId = sql.placeholder('breweryId');
  const seasonId = sql.placeholder('seasonId');
  const head = db
    .select({
      season: getTableColumns(season),
      blockedDays: sql<
        string[]
      >`(select coalesce(json_agg(${blockedDay.day} order by ${blockedDay.day}), '[]'::json) from ${blockedDay} where ${blockedDay.seasonId} = ${seasonId})`,
      houseRules: sql<HouseRuleChanges | null>`(select changes from house_rules where brewery_id = ${breweryId})`,
      members: sql<MemberRow[]>`(
        select coalesce(json_agg(json_build_object('personId', p.id, 'name', p.name, 'role', m.role) order by m.joined_at, p.name), '[]'::json)
        from membership m join person p on p.id = m.person_id where m.brewery_id = ${breweryId})`,
      yeasts: jsonRows(
        yeast,
        sql`${yeast.breweryId} = ${breweryId}`,
        sql`${yeast.name}, ${yeast.id}`,
      ),
      vessels: jsonRows(
        vessel,
        sql`${vessel.breweryId} = ${breweryId}`,
        sql`${vessel.name}, ${vessel.id}`,
      ),
      chains: jsonRows(chain, sql`${chain.seasonId} = ${seasonId}`, sql`${chain.position}`),
    })
    .from(season)
    .where(sql`${season.breweryId} = ${breweryId} and ${season.id} = ${seasonId}`)
    .prepare('board_head');
  const batches = db
    .select({ batch: getTableColumns(batch), cake: getTableColumns(cake) })
    .from(batch)
    .leftJoin(cake, eq(cake.batchId, batch.id))
    .where(sql`${batch.breweryId} = ${breweryId} and ${batch.seasonId} = ${seasonId}`)
    .orderBy(batch.chainId, batch.place)
    .prepare('board_batches');
  return { head, batches };
}
