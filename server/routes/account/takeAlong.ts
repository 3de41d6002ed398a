import { sql, type SQL } from 'drizzle-orm';
import type { Db, Tx } from '../../db/client.ts';

/**
 * All that is stored of a brewery, by table. Which tables there are is asked of the database, so
 * that what is added later comes along by itself.
 */

/** Of no use to whoever takes the data along, or of people and not of a brewery. */
export const LEFT_OUT = ['person', 'session', 'presence', 'try_count', 'comment_seen'];
/** What a row hangs on, where it names no brewery; the first of them that it has. */
const PARENTS = [
  ['batch_id', 'batch'],
  ['chain_id', 'chain'],
  ['season_id', 'season'],
  ['run_id', 'pour_run'],
] as const;

export async function dataOf(db: Db | Tx, breweryId: string): Promise<Record<string, unknown[]>> {
  const data: Record<string, unknown[]> = {};
  for (const { table, rows } of await tablesOf(db, breweryId)) {
    if (rows === null || LEFT_OUT.includes(table)) continue;
    const found = await db.execute<{ row: unknown }>(
      sql`select to_jsonb(t) - 'token_hash' as row from ${sql.identifier(table)} t where ${rows}`,
    );
    data[table] = found.rows.map(({ row }) => row);
  }
  return { ...data, people: await namesIn(db, breweryId) };
}

/** Each table with what picks a brewery's rows; null: its rows belong to no brewery. */
export async function tablesOf(
  db: Db | Tx,
  breweryId: string,
): Promise<{ table: string; rows: SQL | null }[]> {
  const { rows } = await db.execute<{ table: string; columns: string[] }>(sql`
    select c.table_name as table, json_agg(c.column_name::text) as columns
    from information_schema.columns c
    join information_schema.tables t using (table_schema, table_name)
    where c.table_schema = 'public' and t.table_type = 'BASE TABLE'
    group by c.table_name order by c.table_name`);
  return rows.map(({ table, columns }) => ({
    table,
    rows: belonging(table, columns, breweryId),
  }));
}

function belonging(table: string, columns: readonly string[], breweryId: string): SQL | null {
  if (table === 'brewery') return sql`t.id = ${breweryId}`;
  if (columns.includes('brewery_id')) return sql`t.brewery_id = ${breweryId}`;
  const hung = PARENTS.find(([column]) => columns.includes(column));
  if (hung === undefined) return null;
  const [column, parent] = hung;
  return sql`t.${sql.identifier(column)} in
    (select id from ${sql.identifier(parent)} where brewery_id = ${breweryId})`;
}

/** Names of those whom the rows mention by their ids, as others of the brewery see them. */
async function namesIn(db: Db | Tx, breweryId: string): Promise<unknown[]> {
  const { rows } = await db.execute(sql`
    select id, name from person where id in (
      select person_id from membership where brewery_id = ${breweryId}
      union select person_id from change where brewery_id = ${breweryId}
      union select person_id from comment where brewery_id = ${breweryId}
    ) order by name, id`);
  return rows;
}
