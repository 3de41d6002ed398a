import type pg from 'pg';
import type { Clock } from '../clock.ts';
import type { Config } from '../config.ts';
import { isLoopback } from '../settings/weakSettings.ts';
import { backupBeforeMigration } from './backupBeforeMigration.ts';
import type { Db } from './client.ts';
import { hasDemoAccounts } from './demoAccounts.ts';
import { ForeignSchemaError, migrateDatabase } from './migrateDatabase.ts';
import { schemaState } from './schemaState.ts';
import { seedDemo } from './seed.ts';

/**
 * The database as this version needs it. On one machine it is migrated and given its demo;
 * a deployment is migrated only when told, so there anything but a current schema is refused.
 */
export async function makeReady(
  config: Config,
  db: Db,
  pool: pg.Pool,
  clock: Clock,
): Promise<void> {
  if (config.mode === 'serve') await refuseOtherSchema(pool);
  else
    await migrateDatabase(pool, () => backupBeforeMigration(config.databaseUrl, config.photosDir));
  if (config.demo) await seedDemo(db, clock);
  if (facesNetwork(config) && (await hasDemoAccounts(pool))) {
    throw new Error(
      'This database holds the demo accounts, whose password is public: only a start bound to 127.0.0.1 may use it.',
    );
  }
}

function facesNetwork(config: Config): boolean {
  if (config.mode === 'serve' || !isLoopback(config.host)) return true;
  return config.publicUrl !== null && !isLoopback(new URL(config.publicUrl).hostname);
}

async function refuseOtherSchema(pool: pg.Pool): Promise<void> {
  const state = await schemaState(pool);
  switch (state.kind) {
    case 'current':
      return;
    case 'foreign':
      throw new ForeignSchemaError(state.why);
    case 'empty':
    case 'behind':
      throw new Error('The database is not at this version yet: npm run migrate brings it there.');
  }
}
