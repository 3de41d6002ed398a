import { and, eq, getTableColumns, sql, type SQL } from 'drizzle-orm';
import type { Board, HouseRuleChanges } from '#shared/api/board.ts';
import type { Db, Tx } from '../../db/client.ts';
import { jsonList, jsonObject } from '../../db/jsonRows.ts';
import { oncePer } from '../../db/oncePer.ts';
import { cake } from '../../db/schema/cake.ts';
import { change } from '../../db/schema/change.ts';
import { batch, chain } from '../../db/schema/chain.ts';
import { season } from '../../db/schema/season.ts';
import { vessel, yeast } from '../../db/schema/stock.ts';
import { presentBatch, type BatchRow, type CakeRow, type CheckSaid } from '../batches/present.ts';
import { presentChain, type ChainRow } from '../chains/present.ts';
import { presentMember, type MemberRow } from '../people/present.ts';
import { presentSeason } from '../season/present.ts';
import { presentVessel } from '../vessels/present.ts';
import { presentYeast } from '../yeasts/present.ts';

export type BoardRows = Pick<
  Board,
  'season' | 'houseRules' | 'members' | 'yeasts' | 'vessels' | 'chains' | 'batches'
>;

/** Everything that stands on a season's board, in one query whatever its size. */
export async function loadBoardRows(
  db: Db | Tx,
  breweryId: string,
  seasonId: string,
): Promise<BoardRows | null> {
  const [found] = await boardQuery(db).execute({ breweryId, seasonId });
  return found ? presentRows(found) : null;
}

/** A pour that somebody is at, and who. */
export interface PourInHand {
  batchId: string;
  heldBy: string;
}

/** A board under a command's locks. */
export interface SceneRows {
  board: BoardRows;
  inHand: PourInHand[];
  /** Of the changes asked for, those that were made already: the requests are repeated ones. */
  made: string[];
}

/** All that a command reads before it changes anything, in one query too. */
export async function loadScene(
  tx: Tx,
  breweryId: string,
  seasonId: string,
  changeIds: readonly string[],
): Promise<SceneRows | null> {
  const [found] = await sceneQuery(tx).execute({ breweryId, seasonId, changeIds });
  if (!found) return null;
  return { board: presentRows(found), inHand: found.inHand, made: found.made };
}

function presentRows(found: FoundBoard): BoardRows {
  return {
    season: presentSeason(found.season, found.blockedDays),
    houseRules: found.houseRules ?? {},
    members: found.members.map(presentMember),
    yeasts: found.yeasts.map(presentYeast),
    vessels: found.vessels.map(presentVessel),
    chains: found.chains.map(presentChain),
    batches: found.batches.map((row) => presentBatch(row.batch, row.cake, row.check)),
  };
}

/** Columns that a board does not show. */
const UNSEEN = ['breweryId', 'seasonId', 'shelfId', 'createdAt'];

/** Of a cake's judgement only what the links read. */
const CHECK = "json_build_object('judged', q.judged, 'tasted', q.tasted)";

const LISTS = {
  blockedDays: jsonList<string>('d.day', 'blocked_day d where d.season_id = season.id', 'd.day'),
  members: jsonList<MemberRow>(
    "json_build_object('personId', p.id, 'name', p.name, 'role', m.role, 'version', m.version)",
    'membership m join person p on p.id = m.person_id where m.brewery_id = season.brewery_id',
    'm.joined_at, p.name',
  ),
  yeasts: jsonList<typeof yeast.$inferSelect>(
    jsonObject(yeast, 'y'),
    'yeast y where y.brewery_id = season.brewery_id',
    'y.name, y.id',
  ),
  vessels: jsonList<typeof vessel.$inferSelect>(
    jsonObject(vessel, 'v'),
    'vessel v where v.brewery_id = season.brewery_id',
    'v.name, v.id',
  ),
  chains: jsonList<ChainRow>(
    jsonObject(chain, 'c'),
    'chain c where c.brewery_id = season.brewery_id and c.season_id = season.id',
    'c.position',
  ),
  batches: jsonList<{ batch: BatchRow; cake: CakeRow | null; check: CheckSaid | null }>(
    `json_build_object('batch', ${jsonObject(batch, 'b', UNSEEN)}, 'cake',
      case when k.batch_id is not null then ${jsonObject(cake, 'k')} end, 'check',
      case when q.batch_id is not null then ${CHECK} end)`,
    `batch b left join cake k on k.batch_id = b.id
      left join cake_check q on q.batch_id = b.id
      where b.brewery_id = season.brewery_id and b.season_id = season.id`,
    'b.chain_id, b.place',
  ),
};

const SHOWN = {
  season: getTableColumns(season),
  houseRules: sql.raw(
    '(select h.changes from house_rules h where h.brewery_id = season.brewery_id)',
  ) as SQL<HouseRuleChanges | null>,
  ...LISTS,
};

const UNDER_LOCKS = {
  inHand: jsonList<PourInHand>(
    "json_build_object('batchId', r.batch_id, 'heldBy', p.name)",
    `pour_run r join person p on p.id = r.opened_by
      where r.brewery_id = season.brewery_id and r.season_id = season.id and r.state = 'open'`,
    'r.id',
  ),
  made: sql<string[]>`(select coalesce(json_agg(made.id), '[]'::json) from ${change} made
    where made.id = any(${sql.placeholder('changeIds')}::uuid[]))`,
};

const isAsked = () =>
  and(
    eq(season.breweryId, sql.placeholder('breweryId')),
    eq(season.id, sql.placeholder('seasonId')),
  );

/** Prepared; tests read its plan. */
export const boardQuery = oncePer((db: Db | Tx) =>
  db.select(SHOWN).from(season).where(isAsked()).prepare('board'),
);
type FoundBoard = Awaited<ReturnType<ReturnType<typeof boardQuery>['execute']>>[number];

/** Prepared; tests read its plan. */
export const sceneQuery = (db: Db | Tx) =>
  db
    .select({ ...SHOWN, ...UNDER_LOCKS })
    .from(season)
    .where(isAsked())
    .prepare('scene');
