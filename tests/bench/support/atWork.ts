import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { joinCluster } from '../../../server/local/sharedCluster.mjs';
import { testHome } from '../../../server/local/places.mjs';
import { startTestServer } from '../../../server/local/testServerProcess.mjs';
import { connect, type Db } from '../../../server/db/client.ts';
import { writeBoard } from '../../../e2e/support/board.ts';
import { writeBrewery, type TestBrewery } from '../../../e2e/support/brewery.ts';
import { makeBoard, type BoardSize } from '../../support/boards.ts';
import { planOf } from './planOf.ts';

export interface AtWork {
  url: string;
  databaseUrl: string;
  keys: string;
  /** Of the server's process. */
  pid: number;
  db: Db;
  brewery: TestBrewery;
}

/** A cluster with PostgreSQL's own settings: a write counts when it is on the disk. */
const onDisk = () => joinCluster(`${testHome}-bench`, []);

/**
 * A server process of its own on a database of its own, with a season of this size on its board:
 * all on this machine, as `npm start` has it.
 */
export async function atWork<T>(
  size: BoardSize,
  work: (at: AtWork) => Promise<T>,
  settings: Record<string, string> = {},
): Promise<T> {
  const folder = mkdtempSync(join(tmpdir(), 'barmkin-bench-'));
  const logFile = join(folder, 'server.log');
  const server = await startTestServer({ port: 0, logFile, join: onDisk, settings });
  const { db, pool } = connect(server.databaseUrl, { max: 2 });
  try {
    const brewery = await writeBrewery(db);
    await writeBoard(db, brewery, planOf(makeBoard(size)));
    const { url, databaseUrl, keys, pid } = server;
    return await work({ url, databaseUrl, keys, pid, db, brewery });
  } finally {
    await pool.end();
    await server.close();
    rmSync(folder, { recursive: true, force: true });
  }
}
