import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate } from 'drizzle-orm/node-postgres/migrator';
import type pg from 'pg';
import { MIGRATIONS, schemaState } from './schemaState.ts';

/** Any number that no other program is likely to lock; the same in every version. */
const LOCK = 4_600_260_001;

export class ForeignSchemaError extends Error {
  constructor(why: string) {
    super(`This database is not one that this version of Barmkin may use: ${why}.`);
    this.name = 'ForeignSchemaError';
  }
}

/**
 * Brings a database up to this version, forward only, one process at a time.
 * @param backup runs before an existing database is changed; when it fails, nothing is changed.
 * @returns how many migrations were applied.
 * @throws ForeignSchemaError
 */
export async function migrateDatabase(
  pool: pg.Pool,
  backup: () => Promise<void>,
  folder = MIGRATIONS,
): Promise<number> {
  const client = await pool.connect();
  try {
    await client.query('set statement_timeout = 0');
    await client.query('select pg_advisory_lock($1)', [LOCK]);
    const state = await schemaState(client, folder);
    if (state.kind === 'foreign') throw new ForeignSchemaError(state.why);
    if (state.kind === 'behind') await backup();
    if (state.pending > 0) await migrate(drizzle(client), { migrationsFolder: folder });
    return state.pending;
  } finally {
    // The connection is closed, not given back: its lock and its time limit end with it.
    client.release(true);
  }
}
