import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { freePort } from '../../../server/local/cluster.mjs';
import { testDatabase, type TestDatabase } from '../../support/database.ts';
import { runProgram } from '../../support/program.ts';

const SERVE = ['--import', 'tsx', 'server/index.ts'];
const MIGRATE = ['--import', 'tsx', 'server/db/migrate.ts'];
const dist = mkdtempSync(join(tmpdir(), 'barmkin-serve-'));

let current: TestDatabase;
beforeAll(async () => {
  current = await testDatabase();
  mkdirSync(join(dist, 'assets'));
  writeFileSync(join(dist, 'index.html'), '<title>Barmkin</title>');
});
afterAll(async () => {
  await current.close();
  rmSync(dist, { recursive: true, force: true });
});

const settings = (database: TestDatabase, change: Record<string, string> = {}) => ({
  DATABASE_URL: database.url,
  SESSION_KEYS: 'c2f0b1d49a6e8375c2f0b1d49a6e8375ab,7d1e9c3b5a80f2467d1e9c3b5a80f246cd',
  PUBLIC_URL: 'https://brews.example',
  BARMKIN_DIST: dist,
  BARMKIN_HOME: dist,
  ...change,
});

/** The log, each line of which must be JSON. */
const lines = (stdout: string): { msg: string; level: string }[] =>
  stdout
    .trim()
    .split('\n')
    .map((line) => JSON.parse(line));

describe('npm run serve', () => {
  test('serves over HTTP, logs nothing but JSON, and ends cleanly on SIGTERM', async () => {
    const port = await freePort();
    const program = runProgram(SERVE, settings(current, { PORT: String(port) }));
    await program.seen(/Listening/);
    const health = await fetch(`http://127.0.0.1:${port}/api/health`);
    const page = await fetch(`http://127.0.0.1:${port}/`);
    program.stop('SIGTERM');
    const ended = await program.ended;
    expect(health.status).toBe(200);
    expect(await page.text()).toContain('<title>Barmkin');
    expect(ended).toMatchObject({ code: 0, stderr: '' });
    expect(lines(ended.stdout).map(({ msg }) => msg)).toEqual(
      expect.arrayContaining(['Listening', 'Stopping', 'Stopped']),
    );
  });

  test('refuses to start without settings, a sentence for each', async () => {
    const ended = await runProgram(SERVE, {}).ended;
    expect(ended.code).toBe(1);
    expect(lines(ended.stdout).map(({ msg }) => msg)).toEqual([
      expect.stringContaining('DATABASE_URL'),
      expect.stringContaining('SESSION_KEYS'),
    ]);
  });

  test('refuses a database that is not migrated, and does not migrate it', async () => {
    const empty = await testDatabase({ migrated: false });
    try {
      const ended = await runProgram(SERVE, settings(empty)).ended;
      expect(ended.code).toBe(1);
      expect(lines(ended.stdout)[0]?.msg).toContain('npm run migrate');
      const tables = await empty.pool.query(`select 1 from pg_tables where schemaname = 'public'`);
      expect(tables.rows).toEqual([]);

      const migrated = await runProgram(MIGRATE, settings(empty)).ended;
      expect(migrated.code).toBe(0);
      const after = await empty.pool.query(`select 1 from pg_tables where tablename = 'brewery'`);
      expect(after.rows).toHaveLength(1);
    } finally {
      await empty.close();
    }
  });

  test('refuses a database of another program', async () => {
    const other = await testDatabase({ migrated: false });
    try {
      await other.pool.query('create table their_things (id integer)');
      const ended = await runProgram(SERVE, settings(other)).ended;
      expect(ended.code).toBe(1);
      expect(lines(ended.stdout)[0]?.msg).toContain('another program');
    } finally {
      await other.close();
    }
  });

  test('refuses a database that holds the demo accounts', async () => {
    const demo = await testDatabase();
    try {
      await demo.pool.query(`insert into person (id, name, email, password_hash, units)
        values (gen_random_uuid(), 'Mo', 'mo@saltmarsh.example', 'none', '{}')`);
      const ended = await runProgram(SERVE, settings(demo)).ended;
      expect(ended.code).toBe(1);
      expect(lines(ended.stdout)[0]?.msg).toContain('demo accounts');
    } finally {
      await demo.close();
    }
  });

  test('names a port that is taken', async () => {
    const port = await freePort();
    const first = runProgram(SERVE, settings(current, { PORT: String(port) }));
    await first.seen(/Listening/);
    const second = await runProgram(SERVE, settings(current, { PORT: String(port) })).ended;
    first.stop('SIGTERM');
    await first.ended;
    expect(second.code).toBe(1);
    expect(lines(second.stdout)[0]?.msg).toContain('port');
  });
});
