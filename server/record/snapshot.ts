import { sql, type SQL } from 'drizzle-orm';
import type { Tx } from '../db/client.ts';
import { TABLE_NAMES, TABLES, type TableName } from './tables.ts';

/** A row with all its columns, as the database writes it as JSON. */
export type Row = Readonly<Record<string, unknown>>;

/** Where a batch stands: its shelf (null: the bench) and the batch before it there. */
export interface Stand {
  shelf: string | null;
  after: string | null;
}

/**
 * Every row of a season's board with every column, so that what a change did can be told, and
 * written back, without knowing who made it. A batch says after which one it `stands` (null:
 * scrapped) in place of its number; a season bears its `blocked_days`.
 */
export interface Snapshot {
  rows: Readonly<Record<TableName, ReadonlyMap<string, Row>>>;
  /** Ids of the shelves, in order. */
  shelves: readonly string[];
}

interface Where {
  breweryId: string;
  seasonId: string;
}

function rowsOf(name: TableName, { breweryId, seasonId }: Where): SQL {
  switch (name) {
    case 'brewery':
      return sql`r.id = ${breweryId}::uuid`;
    case 'season':
      return sql`r.id = ${seasonId}::uuid`;
    case 'house_rules':
    case 'yeast':
    case 'yeast_line':
    case 'vessel':
      return sql`r.brewery_id = ${breweryId}::uuid`;
    case 'chain':
    case 'batch':
      return sql`r.brewery_id = ${breweryId}::uuid and r.season_id = ${seasonId}::uuid`;
    case 'cake':
    case 'cake_check':
      return sql`r.batch_id in (select b.id from batch b
        where b.brewery_id = ${breweryId}::uuid and b.season_id = ${seasonId}::uuid)`;
  }
}

type Lists = Record<TableName, Row[]> & { blocked_days: string[] };

export async function takeSnapshot(tx: Tx, where: Where): Promise<Snapshot> {
  const lists = TABLE_NAMES.map(
    (name) => sql`(select coalesce(json_agg(to_jsonb(r)), '[]') from ${sql.identifier(name)} r
      where ${rowsOf(name, where)}) as ${sql.identifier(name)}`,
  );
  const { rows } = await tx.execute<Lists>(sql`select ${sql.join(lists, sql`, `)},
    (select coalesce(json_agg(d.day order by d.day), '[]') from blocked_day d
      where d.season_id = ${where.seasonId}::uuid) as blocked_days`);
  const [found] = rows;
  if (!found) throw new Error('A select without from answers one row');
  return snapshotOf(found);
}

function snapshotOf(lists: Lists): Snapshot {
  const byKey = (name: TableName, rows: readonly Row[]) =>
    new Map(rows.map((row) => [String(row[TABLES[name].key]), row]));
  const maps = TABLE_NAMES.map((name) => [name, byKey(name, lists[name])] as const);
  const rows = Object.fromEntries(maps) as Record<TableName, Map<string, Row>>;
  rows.season = byKey(
    'season',
    lists.season.map((row) => ({ ...row, blocked_days: lists.blocked_days })),
  );
  rows.batch = byKey('batch', withStands(lists.batch));
  return { rows, shelves: lists.chain.toSorted(by('position')).map(({ id }) => String(id)) };
}

const by = (column: string) => (a: Row, b: Row) => Number(a[column]) - Number(b[column]);

const textOrNull = (value: unknown): string | null => (typeof value === 'string' ? value : null);

function withStands(batches: readonly Row[]): Row[] {
  const last = new Map<string | null, string>();
  return batches.toSorted(by('place')).map((row) => {
    if (row.stage === 'scrapped') return { ...row, stands: null };
    const shelf = textOrNull(row.chain_id);
    const stands: Stand = { shelf, after: last.get(shelf) ?? null };
    last.set(shelf, String(row.id));
    return { ...row, stands };
  });
}

/** Ids of the batches on each shelf (null: the bench), in order. */
export function ordersOf(snapshot: Snapshot): Map<string | null, string[]> {
  const orders = new Map<string | null, string[]>();
  for (const row of [...snapshot.rows.batch.values()].toSorted(by('place'))) {
    const stand = standOf(row);
    if (!stand) continue;
    const order = orders.get(stand.shelf) ?? [];
    order.push(String(row.id));
    orders.set(stand.shelf, order);
  }
  return orders;
}

export const standOf = (row: Row | null | undefined): Stand | null =>
  (row?.stands as Stand | null | undefined) ?? null;
