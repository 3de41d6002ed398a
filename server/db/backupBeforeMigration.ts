import { execFile } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { promisify } from 'node:util';

const run = promisify(execFile);
const script = fileURLToPath(new URL('../local/backup.mjs', import.meta.url));

/** The database and the photos as they are before a migration, in the backups folder. */
export async function backupBeforeMigration(databaseUrl: string, photosDir: string): Promise<void> {
  await run(process.execPath, [script, '--before-migration'], {
    env: { ...process.env, DATABASE_URL: databaseUrl, PHOTOS_DIR: photosDir },
  });
}
