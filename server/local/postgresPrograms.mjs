import { existsSync, readdirSync } from 'node:fs';
import { delimiter, dirname, join } from 'node:path';
import { aptInstallPostgres } from './apt.mjs';
import { run } from './run.mjs';
import { Sentence } from './say.mjs';

const DEBIAN = '/usr/lib/postgresql';
const NEEDED = ['initdb', 'pg_ctl', 'postgres', 'psql', 'pg_dump', 'pg_restore'];
const OLDEST = 14;

/** @typedef {{bin: string, major: number}} Programs */

/**
 * PostgreSQL's programs, installed where they are missing.
 * @param {number | null} major the version of the data that they shall work on; null: the newest
 * @param {string} dataDir named when only another version is here
 * @returns {Promise<Programs>}
 */
export async function findPostgres(major, dataDir) {
  let here = await programsHere();
  if (here.length === 0) {
    await aptInstallPostgres();
    here = await programsHere();
  }
  const newest = here[0];
  if (newest === undefined)
    throw new Sentence('PostgreSQL was installed but its programs are not found.');
  if (major === null) return atLeastOldest(newest);
  const fitting = here.find((each) => each.major === major);
  if (fitting === undefined) throw new Sentence(otherMajor(major, newest.major, dataDir));
  return fitting;
}

/** @returns {Promise<Programs[]>} newest first */
async function programsHere() {
  const debian = existsSync(DEBIAN)
    ? readdirSync(DEBIAN)
        .map((name) => ({ bin: join(DEBIAN, name, 'bin'), major: Number(name) }))
        .filter(({ bin, major }) => Number.isInteger(major) && isComplete(bin))
        .toSorted((a, b) => b.major - a.major)
    : [];
  const onPath = (process.env.PATH ?? '').split(delimiter).find((dir) => dir && isComplete(dir));
  if (onPath === undefined || debian.some(({ bin }) => bin === onPath)) return debian;
  const version = await run(join(onPath, 'postgres'), ['--version']);
  const major = Number(/(\d+)/.exec(version.stdout)?.[1]);
  return [...debian, { bin: dirname(join(onPath, 'postgres')), major }];
}

/** @param {string} bin */
const isComplete = (bin) => NEEDED.every((name) => existsSync(join(bin, name)));

/** @param {Programs} found */
function atLeastOldest(found) {
  if (found.major >= OLDEST) return found;
  throw new Sentence(
    `Barmkin needs PostgreSQL ${OLDEST} or newer; this machine has ${found.major}.`,
  );
}

/**
 * @param {number} wanted
 * @param {number} here
 * @param {string} dataDir
 */
const otherMajor = (wanted, here, dataDir) =>
  `The database in ${dataDir} was made by PostgreSQL ${wanted}, and this machine has ${here}.\n` +
  `Either install PostgreSQL ${wanted} again (postgresql-${wanted}), or move over by a backup: on a machine with ` +
  `PostgreSQL ${wanted} run npm run backup FILE, then here npm start -- --reset, and npm run restore FILE.`;
