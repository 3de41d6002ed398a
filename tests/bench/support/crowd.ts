import type pg from 'pg';

interface Copied {
  table: string;
  /** Columns that name rows which are copied too. */
  names: readonly string[];
}

/** In the order in which one refers to the other. */
const COPIED: readonly Copied[] = [
  { table: 'season', names: ['id', 'brewery_id'] },
  { table: 'yeast', names: ['id', 'brewery_id'] },
  { table: 'vessel', names: ['id', 'brewery_id'] },
  { table: 'yeast_line', names: ['id', 'brewery_id', 'yeast_id'] },
  {
    table: 'chain',
    names: ['id', 'brewery_id', 'season_id', 'yeast_id', 'vessel_id', 'line_id'],
  },
  {
    table: 'batch',
    names: ['id', 'brewery_id', 'season_id', 'chain_id', 'yeast_id', 'vessel_id'],
  },
];

/**
 * Copies the one brewery of a database so many times, with its season's whole board. The id of a
 * copied row is made from the first one's and the copy's number, so that references hold.
 */
export async function copyBrewery(pool: pg.Pool, copies: number): Promise<void> {
  const other = (column: string) => `md5(${column}::text || n)::uuid`;
  await pool.query(
    `insert into brewery (id, slug, name, time_zone, currency, units)
     select ${other('id')}, 'crowd-' || n, name, time_zone, currency, units
     from brewery, generate_series(1, $1::int) n`,
    [copies],
  );
  for (const { table, names } of COPIED) {
    const columns = await columnsOf(pool, table);
    const values = columns.map((each) =>
      names.includes(each) ? other(`first.${each}`) : `first.${each}`,
    );
    await pool.query(
      `with first as materialized (select * from ${table})
       insert into ${table} (${columns.join()}) select ${values.join()}
       from first, generate_series(1, $1::int) n`,
      [copies],
    );
  }
  await pool.query(
    `update brewery set current_season_id = season.id from season
     where season.brewery_id = brewery.id and brewery.slug like 'crowd-%'`,
  );
  await pool.query('vacuum analyze');
}

async function columnsOf(pool: pg.Pool, table: string): Promise<string[]> {
  const { rows } = await pool.query<{ name: string }>(
    `select quote_ident(column_name) as name from information_schema.columns
     where table_schema = 'public' and table_name = $1 and is_generated = 'NEVER'
       and is_identity = 'NO' order by ordinal_position`,
    [table],
  );
  return rows.map(({ name }) => name);
}
