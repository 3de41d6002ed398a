import { join } from 'node:path';
import { startCluster } from './cluster.mjs';
import { tryLock } from './lock.mjs';
import { home } from './places.mjs';
import { findPostgres } from './postgresPrograms.mjs';
import { Sentence } from './say.mjs';

/**
 * Gives work the database it is meant for: the one that DATABASE_URL names, else the local one,
 * which is started for it where it does not run, and stopped again.
 * @param {string} what the work, in words
 * @param {(database: import('./archive.mjs').Database, photosDir: string) => Promise<void>} work
 */
export async function withDatabase(what, work) {
  const url = process.env.DATABASE_URL;
  const photosDir = process.env.PHOTOS_DIR || join(home, 'photos');
  if (url) {
    const { bin } = await findPostgres(null, '');
    return work({ bin, ...connection(url) }, photosDir);
  }
  // Whoever has the lock has the database too; without it, the database is ours to start and stop.
  const lock = tryLock(join(home, 'lock'), what);
  if ('pid' in lock && lock.url === undefined) {
    throw new Sentence(
      `${lock.what} is just at work on the database (process ${lock.pid}): try again in a moment.`,
    );
  }
  const cluster = await startCluster(home, { quiet: true });
  try {
    await work({ bin: cluster.bin, env: cluster.env, database: 'barmkin' }, photosDir);
  } finally {
    if (!('pid' in lock)) {
      await cluster.stop();
      lock.release();
    }
  }
}

/**
 * The password goes by the environment: an argument would show it to every user of the machine.
 * @param {string} url
 */
function connection(url) {
  const parts = new URL(url);
  const password = decodeURIComponent(parts.password);
  parts.password = '';
  return {
    env: { ...process.env, PGPASSWORD: password || process.env.PGPASSWORD },
    database: parts.href,
  };
}
