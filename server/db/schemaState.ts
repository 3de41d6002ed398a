import { fileURLToPath } from 'node:url';
import { readMigrationFiles } from 'drizzle-orm/migrator';
import type pg from 'pg';

export const MIGRATIONS = fileURLToPath(new URL('../../drizzle', import.meta.url));

/**
 * How a database stands to this version's migrations.
 * `foreign`: it holds tables that no migration of ours made, or migrations that this version does not know.
 */
export type SchemaState =
  | { readonly kind: 'empty' | 'current' | 'behind'; readonly pending: number }
  | { readonly kind: 'foreign'; readonly why: string };

export async function schemaState(
  pool: pg.Pool | pg.PoolClient,
  folder = MIGRATIONS,
): Promise<SchemaState> {
  const ours = readMigrationFiles({ migrationsFolder: folder }).map((each) => each.hash);
  const applied = await appliedMigrations(pool);
  if (applied === null || applied.length === 0) {
    return (await hasTables(pool))
      ? { kind: 'foreign', why: 'it holds tables that another program made' }
      : { kind: 'empty', pending: ours.length };
  }
  if (applied.length > ours.length || applied.some((hash, index) => hash !== ours[index])) {
    return { kind: 'foreign', why: 'it was changed by another version of Barmkin' };
  }
  const pending = ours.length - applied.length;
  return { kind: pending === 0 ? 'current' : 'behind', pending };
}

async function appliedMigrations(pool: pg.Pool | pg.PoolClient): Promise<string[] | null> {
  const found = await pool.query<{ table: string | null }>(
    `select to_regclass('drizzle.__drizzle_migrations')::text as table`,
  );
  if (!found.rows[0]?.table) return null;
  const rows = await pool.query<{ hash: string }>(
    'select hash from drizzle.__drizzle_migrations order by created_at, id',
  );
  return rows.rows.map((row) => row.hash);
}

async function hasTables(pool: pg.Pool | pg.PoolClient): Promise<boolean> {
  const rows = await pool.query(
    `select 1 from pg_catalog.pg_tables where schemaname not in ('pg_catalog', 'information_schema', 'drizzle') limit 1`,
  );
  return rows.rows.length > 0;
}
