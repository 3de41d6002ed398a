import { ConfigError, parseConfig } from '../config.ts';
import { createLog } from '../log.ts';
import { backupBeforeMigration } from './backupBeforeMigration.ts';
import { connect } from './client.ts';
import { migrateDatabase } from './migrateDatabase.ts';

/** `npm run migrate`: brings the database of a deployment up to this version. */
async function main(): Promise<void> {
  const config = parseConfig(process.env);
  const log = createLog(config.logLevel);
  const { pool } = connect(config.databaseUrl, { max: 1 });
  try {
    const applied = await migrateDatabase(pool, () =>
      backupBeforeMigration(config.databaseUrl, config.photosDir),
    );
    log.info({ applied }, applied === 0 ? 'Nothing to migrate' : 'Migrated');
  } finally {
    await pool.end();
  }
}

try {
  await main();
} catch (error) {
  const sentences = error instanceof ConfigError ? error.sentences : [String(error)];
  for (const sentence of sentences) createLog('info').error(sentence);
  process.exitCode = 1;
}
