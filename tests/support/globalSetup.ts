import type { TestProject } from 'vitest/node';
import pg from 'pg';
import { connect } from '../../server/db/client.ts';
import { migrateDatabase } from '../../server/db/migrateDatabase.ts';
import { testHome } from '../../server/local/places.mjs';
import { joinCluster } from '../../server/local/sharedCluster.mjs';

declare module 'vitest' {
  interface ProvidedContext {
    /** The cluster's address without a database's name, and the prefix of this run's databases. */
    cluster: { url: string; prefix: string };
  }
}

/** A cluster with a migrated template, from which each test file gets a database of its own. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const { cluster, leave } = await joinCluster(testHome);
  const prefix = `test_${process.pid}_${Date.now().toString(36)}`;
  const admin = new pg.Client({ connectionString: cluster.url('postgres') });
  await admin.connect();
  await admin.query(`create database ${prefix}_template`);
  const { pool } = connect(cluster.url(`${prefix}_template`), { max: 1 });
  await migrateDatabase(pool, async () => {});
  await pool.end();
  project.provide('cluster', { url: cluster.url(''), prefix });
  return async () => {
    const made = await admin.query<{ datname: string }>(
      'select datname from pg_database where starts_with(datname, $1)',
      [prefix],
    );
    for (const { datname } of made.rows) {
      await admin.query(`drop database if exists "${datname}" with (force)`);
    }
    await admin.end();
    await leave();
  };
}
