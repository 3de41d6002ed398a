import { randomUUID } from 'node:crypto';
import {
  existsSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { connect } from '../../../server/db/client.ts';
import { migrateDatabase } from '../../../server/db/migrateDatabase.ts';
import { makeBrewery, makePerson } from '../../../server/routes/account/commands.ts';
import { removeCluster, startCluster } from '../../../server/local/cluster.mjs';
import { testDatabase, type TestDatabase } from '../../support/database.ts';
import { runProgram } from '../../support/program.ts';

let folder = '';
let database: TestDatabase;
beforeEach(async () => {
  folder = mkdtempSync(join(tmpdir(), 'barmkin-backup-test-'));
  database = await testDatabase();
});
afterEach(async () => {
  await database.close();
  rmSync(folder, { recursive: true, force: true });
});

const photos = () => join(folder, 'photos');
const file = () => join(folder, 'out/season.tar');

function run(script: 'backup' | 'restore', ...args: string[]) {
  const env = {
    DATABASE_URL: database.url,
    PHOTOS_DIR: photos(),
    BARMKIN_HOME: join(folder, 'home'),
  };
  return runProgram([`server/local/${script}.mjs`, ...args], env).ended;
}

async function fill(): Promise<void> {
  await database.db.transaction(async (tx) => {
    const email = `${randomUUID()}@reedbed.example`;
    const head = await makePerson(tx, { name: 'Zoë “Quill” 🍺', email, passwordHash: 'none' });
    await makeBrewery(tx, head, { breweryName: 'Reedbed \\N \t’n’ Co' });
  });
  mkdirSync(join(photos(), 'a'), { recursive: true });
  writeFileSync(join(photos(), 'a/cake one.jpg'), Buffer.from([0xff, 0xd8, 0, 1, 2]));
}

/** Every row of every table, and where every sequence stands. */
async function everything(): Promise<Record<string, unknown>> {
  const tables = await database.pool.query<{ name: string }>(
    `select format('%I.%I', schemaname, tablename) as name from pg_tables
     where schemaname in ('public', 'drizzle') order by 1`,
  );
  const all: Record<string, unknown> = {};
  for (const { name } of tables.rows) {
    const rows = await database.pool.query(
      `select to_jsonb(t)::text as row from ${name} t order by 1`,
    );
    all[name] = rows.rows;
  }
  const rest = await database.pool.query(
    `select (select jsonb_agg(format('%s %s', sequencename, last_value) order by sequencename) from pg_sequences) as sequences,
      (select jsonb_agg(conname order by conname) from pg_constraint where connamespace = 'public'::regnamespace) as constraints,
      (select jsonb_agg(tgname order by tgname) from pg_trigger where not tgisinternal) as triggers,
      (select jsonb_agg(indexname order by indexname) from pg_indexes where schemaname = 'public') as indexes`,
  );
  return { ...all, rest: rest.rows };
}

test('a backup brings back rows, photos and all that keeps them in order, more than once', async () => {
  await fill();
  const before = await everything();
  expect(await run('backup', file())).toMatchObject({ code: 0 });

  for (const round of [1, 2]) {
    await fill();
    await database.pool.query(`create table left_over_${round} (id integer); delete from session`);
    rmSync(join(photos(), 'a'), { recursive: true });
    writeFileSync(join(photos(), 'later.jpg'), 'later');
    expect(await run('restore', file(), '--yes')).toMatchObject({ code: 0 });
    expect(await everything()).toEqual(before);
    expect(readdirSync(photos())).toEqual(['a']);
    expect([...readFileSync(join(photos(), 'a/cake one.jpg'))]).toEqual([0xff, 0xd8, 0, 1, 2]);
  }
});

test('nobody to ask: nothing is overwritten without --yes', async () => {
  await fill();
  await run('backup', file());
  await fill();
  const before = await everything();
  const ended = await run('restore', file());
  expect(ended.code).toBe(1);
  expect(ended.stderr).toContain('--yes');
  expect(await everything()).toEqual(before);
});

test('a backup never overwrites a file', async () => {
  mkdirSync(join(folder, 'out'));
  writeFileSync(file(), 'precious');
  expect(await run('backup', file())).toMatchObject({ code: 1 });
  expect(readFileSync(file(), 'utf8')).toBe('precious');
});

test('a file that is no backup, or is cut off, is refused and nothing changes', async () => {
  await fill();
  const before = await everything();
  const text = join(folder, 'letter.txt');
  writeFileSync(text, 'Dear brewer');
  const refused = await run('restore', text, '--yes');
  expect(refused.stderr).toContain('is not a backup of Barmkin');
  await run('backup', file());
  const whole = readFileSync(file());
  const cut = join(folder, 'cut.tar');
  writeFileSync(cut, whole.subarray(0, Math.floor(whole.length / 2)));
  expect((await run('restore', cut, '--yes')).code).toBe(1);
  expect(await everything()).toEqual(before);
});

test('a backup of a newer version is refused', async () => {
  await database.pool.query(
    `insert into drizzle.__drizzle_migrations (hash, created_at) values ('of a later version', 9999999999999)`,
  );
  await run('backup', file());
  const refused = await run('restore', file(), '--yes');
  expect(refused.code).toBe(1);
  expect(refused.stderr).toContain('newer version');
});

test('the local database is backed up and restored while it is stopped, and is stopped again', async () => {
  const home = join(folder, 'home');
  const inHome = (script: string, ...args: string[]) =>
    runProgram([`server/local/${script}.mjs`, ...args], { BARMKIN_HOME: home }).ended;
  const first = await startCluster(home, { quiet: true });
  const { pool } = connect(first.url(), { max: 1 });
  await migrateDatabase(pool, async () => {});
  await pool.query(`insert into brewery (id, slug, name, time_zone, currency, units)
    values (gen_random_uuid(), 'reedbed', 'Reedbed', 'Europe/London', 'GBP', '{}')`);
  await pool.end();
  await first.stop();

  expect(await inHome('backup')).toMatchObject({ code: 0 });
  const made = readdirSync(join(home, 'backups'));
  expect(made).toHaveLength(1);
  expect(await inHome('restore', join(home, 'backups', made[0] ?? ''), '--yes')).toMatchObject({
    code: 0,
  });
  expect(existsSync(join(home, 'lock'))).toBe(false);

  const again = await startCluster(home, { quiet: true });
  try {
    expect(again.adopted).toBe(false);
    const after = connect(again.url(), { max: 1 });
    const rows = await after.pool.query('select slug from brewery');
    expect(rows.rows).toEqual([{ slug: 'reedbed' }]);
    await after.pool.end();
  } finally {
    await again.stop();
    await removeCluster(home);
  }
});
