import { chownSync, existsSync, mkdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { isRoot, shortHash } from './places.mjs';
import { run } from './run.mjs';
import { say, Sentence } from './say.mjs';

/**
 * Where a cluster stands and as whom its programs run. PostgreSQL refuses to run as root.
 * @typedef {{dir: string, data: string, as: {uid?: number, gid?: number}}} Place
 */

/**
 * @param {string} home
 * @returns {Promise<Place>}
 */
export async function clusterPlace(home) {
  mkdirSync(home, { recursive: true });
  const inside = join(home, 'postgres');
  const outside = `/var/lib/barmkin-${shortHash(home)}`;
  if (!isRoot) return ownPlace(inside, outside);
  for (const dir of [inside, outside]) {
    // Data that an ordinary user made here is served on as that user.
    if (existsSync(join(dir, 'data'))) return asOwner(dir);
  }
  const as = await postgresUser();
  if (await canReach(home, as)) return made(inside, as);
  say(`The database user cannot reach ${home}, so the database is kept in ${outside}`);
  return made(outside, as);
}

/**
 * @param {string} inside
 * @param {string} outside
 * @returns {Place}
 */
function ownPlace(inside, outside) {
  const foreign = [inside, outside].find(
    (dir) => existsSync(dir) && statSync(dir).uid !== process.getuid?.(),
  );
  if (foreign !== undefined) {
    throw new Sentence(
      `${foreign} belongs to another user: start as that user or as root, or set BARMKIN_HOME to a folder of your own.`,
    );
  }
  return made(inside, {});
}

/**
 * @param {string} dir
 * @param {Place['as']} as
 * @returns {Place}
 */
function made(dir, as) {
  mkdirSync(dir, { recursive: true, mode: 0o700 });
  if (as.uid !== undefined && as.gid !== undefined) chownSync(dir, as.uid, as.gid);
  return { dir, data: join(dir, 'data'), as };
}

/**
 * @param {string} dir
 * @returns {Place}
 */
function asOwner(dir) {
  const data = join(dir, 'data');
  const { uid, gid } = statSync(data);
  return { dir, data, as: { uid, gid } };
}

async function postgresUser() {
  const uid = await run('id', ['-u', 'postgres']);
  const gid = await run('id', ['-g', 'postgres']);
  if (uid.code !== 0 || gid.code !== 0) {
    throw new Sentence(
      'PostgreSQL does not run as root, and there is no user named postgres: useradd -r postgres makes one, or start as an ordinary user.',
    );
  }
  return { uid: Number(uid.stdout), gid: Number(gid.stdout) };
}

/**
 * @param {string} folder
 * @param {{uid: number, gid: number}} as
 */
async function canReach(folder, as) {
  return (await run('test', ['-x', folder], { ...as, cwd: '/' })).code === 0;
}

/** @param {Place} place */
export function majorOf(place) {
  const file = join(place.data, 'PG_VERSION');
  return existsSync(file) ? Number(readFileSync(file, 'utf8').trim()) : null;
}
