import pg from 'pg';
import { inject } from 'vitest';
import { connect, type Db } from '../../server/db/client.ts';

export interface TestDatabase {
  readonly url: string;
  readonly db: Db;
  readonly pool: pg.Pool;
  readonly close: () => Promise<void>;
}

let count = 0;

/** A database of one's own at this version's schema, without rows; dropped on close. */
export async function testDatabase({ migrated = true } = {}): Promise<TestDatabase> {
  const { url: cluster, prefix } = inject('cluster');
  count += 1;
  const name = `${prefix}_${process.pid}_${count}`;
  await asAdmin(
    cluster,
    `create database ${name} template ${migrated ? `${prefix}_template` : 'template1'}`,
  );
  const { db, pool } = connect(`${cluster}${name}`, { max: 10 });
  const close = async () => {
    await pool.end();
    await asAdmin(cluster, `drop database if exists ${name} with (force)`);
  };
  return { url: `${cluster}${name}`, db, pool, close };
}

async function asAdmin(cluster: string, statement: string): Promise<void> {
  const admin = new pg.Client({ connectionString: `${cluster}postgres` });
  await admin.connect();
  try {
    await admin.query(statement);
  } finally {
    await admin.end();
  }
}
