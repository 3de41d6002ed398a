import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, afterEach, beforeEach, describe, expect, test } from 'vitest';
import { connect } from '../../../server/db/client.ts';
import { ForeignSchemaError, migrateDatabase } from '../../../server/db/migrateDatabase.ts';
import { schemaState } from '../../../server/db/schemaState.ts';
import { testDatabase, type TestDatabase } from '../../support/database.ts';

const noBackup = async () => {
  throw new Error('nothing was there to back up');
};

test('an empty database is migrated once by three processes that start together, without a backup', async () => {
  const database = await testDatabase({ migrated: false });
  const others = [connect(database.url, { max: 1 }), connect(database.url, { max: 1 })];
  try {
    expect(await schemaState(database.pool)).toMatchObject({ kind: 'empty' });
    const applied = await Promise.all(
      [database, ...others].map(({ pool }) => migrateDatabase(pool, noBackup)),
    );
    const [none, again, all] = applied.toSorted((a, b) => a - b);
    expect([none, again]).toEqual([0, 0]);
    expect(all).toBeGreaterThan(0);
    expect(await schemaState(database.pool)).toEqual({ kind: 'current', pending: 0 });
  } finally {
    await Promise.all(others.map(({ pool }) => pool.end()));
    await database.close();
  }
});

describe('an existing database', () => {
  const folder = mkdtempSync(join(tmpdir(), 'barmkin-migrations-'));
  let database: TestDatabase;

  /** A folder of migrations as the generator writes it. */
  function write(...statements: string[]): void {
    mkdirSync(join(folder, 'meta'), { recursive: true });
    const entries = statements.map((sql, idx) => {
      writeFileSync(join(folder, `000${idx}_step.sql`), sql);
      return { idx, version: '7', when: 1000 + idx, tag: `000${idx}_step`, breakpoints: true };
    });
    writeFileSync(join(folder, 'meta/_journal.json'), JSON.stringify({ entries }));
  }

  const columns = async () => {
    const rows = await database.pool.query<{ column_name: string }>(
      `select column_name from information_schema.columns where table_name = 'shelf' order by ordinal_position`,
    );
    return rows.rows.map((row) => row.column_name);
  };

  const FIRST = 'create table shelf (id integer)';
  const SECOND = 'alter table shelf add column name text';

  beforeEach(async () => {
    database = await testDatabase({ migrated: false });
    write(FIRST);
    await migrateDatabase(database.pool, noBackup, folder);
  });
  afterEach(() => database.close());
  afterAll(() => rmSync(folder, { recursive: true, force: true }));

  test('is backed up before it is changed', async () => {
    write(FIRST, SECOND);
    const seen: string[][] = [];
    const applied = await migrateDatabase(
      database.pool,
      async () => void seen.push(await columns()),
      folder,
    );
    expect(applied).toBe(1);
    expect(seen).toEqual([['id']]);
    expect(await columns()).toEqual(['id', 'name']);
  });

  test('is not touched when the backup fails', async () => {
    write(FIRST, SECOND);
    await expect(migrateDatabase(database.pool, noBackup, folder)).rejects.toThrow(
      'nothing was there',
    );
    expect(await columns()).toEqual(['id']);
    expect(await schemaState(database.pool, folder)).toEqual({ kind: 'behind', pending: 1 });
  });

  test('keeps nothing of migrations of which a later one fails', async () => {
    write(FIRST, SECOND, 'alter table no_such_table add column x text');
    await expect(migrateDatabase(database.pool, async () => {}, folder)).rejects.toThrow();
    expect(await columns()).toEqual(['id']);
  });

  test('whose migration was rewritten afterwards is refused', async () => {
    write('create table shelf (id bigint)', SECOND);
    await expect(migrateDatabase(database.pool, noBackup, folder)).rejects.toThrow(
      ForeignSchemaError,
    );
  });
});

describe('a database that is not ours', () => {
  test('is refused and left alone', async () => {
    const database = await testDatabase({ migrated: false });
    try {
      await database.pool.query('create table their_things (id integer)');
      await expect(migrateDatabase(database.pool, noBackup)).rejects.toThrow(ForeignSchemaError);
      expect(await schemaState(database.pool)).toMatchObject({ kind: 'foreign' });
    } finally {
      await database.close();
    }
  });

  test('of a newer version is refused', async () => {
    const database = await testDatabase();
    try {
      await database.pool.query(
        `insert into drizzle.__drizzle_migrations (hash, created_at) values ('of a later version', 9999999999999)`,
      );
      await expect(migrateDatabase(database.pool, noBackup)).rejects.toThrow(/another version/);
    } finally {
      await database.close();
    }
  });
});

test('days come back as the text that they are', async () => {
  const database = await testDatabase();
  try {
    const rows = await database.pool.query(`select date '2027-03-28' as day`);
    expect(rows.rows).toEqual([{ day: '2027-03-28' }]);
  } finally {
    await database.close();
  }
});
