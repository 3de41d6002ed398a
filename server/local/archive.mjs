import { createHash } from 'node:crypto';
import {
  chmodSync,
  cpSync,
  existsSync,
  mkdirSync,
  mkdtempSync,
  readFileSync,
  readdirSync,
  renameSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { root } from './places.mjs';
import { must } from './run.mjs';
import { Sentence } from './say.mjs';

/**
 * A backup is one tar file: what it is, the database as pg_dump's own format, and the photos.
 * @typedef {{format: 'barmkin-backup-1', madeAt: string, migrations: string[]}} Manifest
 * @typedef {{bin: string, env: NodeJS.ProcessEnv, database: string}} Database
 */

const MANIFEST = 'barmkin-backup.json';
const DUMP = 'database.dump';
const PHOTOS = 'photos';

/**
 * @param {Database} database
 * @param {string} photosDir
 * @param {string} file
 */
export async function writeBackup(database, photosDir, file) {
  await inFolder(async (folder) => {
    const dump = join(folder, DUMP);
    await must(
      'The backup',
      join(database.bin, 'pg_dump'),
      ['-Fc', '--no-owner', '--no-acl', '-f', dump, '-d', database.database],
      {
        env: database.env,
      },
    );
    /** @type {Manifest} */
    const manifest = {
      format: 'barmkin-backup-1',
      madeAt: new Date().toISOString(),
      migrations: await migrationsOf(database),
    };
    writeFileSync(join(folder, MANIFEST), `${JSON.stringify(manifest, null, 2)}\n`);
    mkdirSync(join(folder, PHOTOS));
    if (existsSync(photosDir)) cpSync(photosDir, join(folder, PHOTOS), { recursive: true });
    mkdirSync(dirname(file), { recursive: true });
    const beside = `${file}.part`;
    await must('The backup', 'tar', ['-cf', beside, '-C', folder, MANIFEST, DUMP, PHOTOS], {
      env: { ...process.env, LC_ALL: 'C' },
    });
    // It holds addresses and hashes of passwords: for its owner's eyes.
    chmodSync(beside, 0o600);
    renameSync(beside, file);
  });
}

/**
 * Puts a backup in place of what is there: the database in one transaction, then the photos.
 * @param {Database} database
 * @param {string} photosDir
 * @param {string} file
 * @returns {Promise<Manifest>}
 */
export async function readBackup(database, photosDir, file) {
  return inFolder(async (folder) => {
    const manifest = await unpack(file, folder);
    refuseNewer(manifest);
    await restoreDatabase(database, folder);
    restorePhotos(join(folder, PHOTOS), photosDir);
    return manifest;
  });
}

/**
 * @template T
 * @param {(folder: string) => Promise<T>} work
 */
async function inFolder(work) {
  const folder = mkdtempSync(join(tmpdir(), 'barmkin-backup-'));
  try {
    return await work(folder);
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/**
 * @param {string} file
 * @param {string} folder
 * @returns {Promise<Manifest>}
 */
async function unpack(file, folder) {
  const not = new Sentence(`${file} is not a backup of Barmkin.`);
  const listed = await must(`Reading ${file}`, 'tar', ['-tf', file]).catch(() => {
    throw not;
  });
  const names = listed.split('\n').filter((name) => name !== '');
  const strange = names.some(
    (name) =>
      !(name === MANIFEST || name === DUMP || name.startsWith(`${PHOTOS}/`)) || name.includes('..'),
  );
  if (strange || !names.includes(MANIFEST) || !names.includes(DUMP)) throw not;
  await must(`Reading ${file}`, 'tar', ['-xf', file, '-C', folder, '--no-same-owner']);
  const manifest = JSON.parse(readFileSync(join(folder, MANIFEST), 'utf8'));
  if (manifest.format !== 'barmkin-backup-1') throw not;
  return manifest;
}

/** @param {Manifest} manifest */
function refuseNewer(manifest) {
  const known = knownMigrations();
  if (manifest.migrations.every((hash, index) => hash === known[index])) return;
  throw new Sentence(
    'This backup was made by a newer version of Barmkin: bring the program up to date first.',
  );
}

function knownMigrations() {
  const folder = join(root, 'drizzle');
  /** @type {{entries: {tag: string}[]}} */
  const journal = JSON.parse(readFileSync(join(folder, 'meta/_journal.json'), 'utf8'));
  return journal.entries.map(({ tag }) =>
    createHash('sha256')
      .update(readFileSync(join(folder, `${tag}.sql`)))
      .digest('hex'),
  );
}

/** @param {Database} database */
async function migrationsOf(database) {
  const table = 'drizzle.__drizzle_migrations';
  const there = await query(database, `select to_regclass('${table}') is not null`);
  if (there !== 't') return [];
  const hashes = await query(database, `select hash from ${table} order by created_at, id`);
  return hashes === '' ? [] : hashes.split('\n');
}

/**
 * @param {Database} database
 * @param {string} sql
 */
async function query({ bin, env, database }, sql) {
  const out = await must(
    'Reading the database',
    join(bin, 'psql'),
    ['-X', '-tA', '-d', database, '-c', sql],
    { env },
  );
  return out.trim();
}

/** Empties the schema that the product uses, without touching the schema itself, which may belong to another role. */
const EMPTY = `
set client_min_messages = warning;
drop schema if exists drizzle cascade;
do $$
declare each record;
begin
  for each in select format('%I.%I', n.nspname, c.relname) as name,
      case c.relkind when 'v' then 'view' when 'm' then 'materialized view' when 'S' then 'sequence' else 'table' end as kind
    from pg_class c join pg_namespace n on n.oid = c.relnamespace
    where n.nspname = 'public' and c.relkind in ('r', 'p', 'v', 'm', 'S')
      and not exists (select 1 from pg_depend d where d.objid = c.oid and d.deptype in ('e', 'i', 'a'))
  loop execute format('drop %s if exists %s cascade', each.kind, each.name); end loop;
  for each in select p.oid::regprocedure::text as name from pg_proc p join pg_namespace n on n.oid = p.pronamespace
    where n.nspname = 'public' and not exists (select 1 from pg_depend d where d.objid = p.oid and d.deptype = 'e')
  loop execute format('drop routine if exists %s cascade', each.name); end loop;
  for each in select format('%I.%I', n.nspname, t.typname) as name from pg_type t join pg_namespace n on n.oid = t.typnamespace
    where n.nspname = 'public' and t.typtype in ('e', 'd')
      and not exists (select 1 from pg_depend d where d.objid = t.oid and d.deptype = 'e')
  loop execute format('drop type if exists %s cascade', each.name); end loop;
end $$;
`;

/**
 * @param {Database} database
 * @param {string} folder
 */
async function restoreDatabase({ bin, env, database }, folder) {
  const sql = join(folder, 'restore.sql');
  const toSql = ['-f', sql, '--no-owner', '--no-acl', join(folder, DUMP)];
  await must('Restoring', join(bin, 'pg_restore'), toSql, { env });
  const before = join(folder, 'empty.sql');
  writeFileSync(before, EMPTY);
  const options = ['-X', '-q', '-v', 'ON_ERROR_STOP=1', '--single-transaction', '-d', database];
  await must(
    'Restoring (nothing was changed)',
    join(bin, 'psql'),
    [...options, '-f', before, '-f', sql],
    { env },
  );
}

/**
 * @param {string} from
 * @param {string} to
 */
function restorePhotos(from, to) {
  const before = `${to}.old.${process.pid}`;
  const beside = `${to}.new.${process.pid}`;
  mkdirSync(dirname(to), { recursive: true });
  if (readdirSync(from).length > 0 || existsSync(to)) {
    cpSync(from, beside, { recursive: true });
    if (existsSync(to)) renameSync(to, before);
    renameSync(beside, to);
    rmSync(before, { recursive: true, force: true });
  }
}
