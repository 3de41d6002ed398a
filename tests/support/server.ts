import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { createApp } from '../../server/app.ts';
import { systemClock, type Clock } from '../../server/clock.ts';
import { parseConfig } from '../../server/config.ts';
import { startLive } from '../../server/live/live.ts';
import { createLog } from '../../server/log.ts';
import type { Pages } from '../../server/pages.ts';
import type { LimitChanges } from '../../server/settings/limits.ts';
import { testDatabase, type TestDatabase } from './database.ts';

export interface TestServer extends TestDatabase {
  readonly databaseUrl: string;
}

interface Options {
  readonly clock?: Clock;
  readonly limits?: LimitChanges;
  readonly pages?: Pages;
  /** A database to share; otherwise the server has one of its own, dropped on close. */
  readonly database?: TestDatabase;
  /** Settings of the environment, over those of a test. */
  readonly settings?: Readonly<Record<string, string>>;
}

/** The cookies of one test server are good at another. */
export const TEST_KEYS = 'a-key-for-tests-only-1,a-key-for-tests-only-2';

const noPages: Pages = (_req, _res, next) => next();

/** The whole application over HTTP on a port of its own, with a real database. */
export async function startTestServer(options: Options = {}): Promise<TestServer> {
  const database = options.database ?? (await testDatabase());
  const config = parseConfig({
    BARMKIN_MODE: 'test',
    DATABASE_URL: database.url,
    SESSION_KEYS: TEST_KEYS,
    LIMITS: JSON.stringify(options.limits ?? {}),
    PORT: '0',
    ...options.settings,
  });
  const server = createServer();
  const { db, pool } = database;
  const clock = options.clock ?? systemClock;
  const log = createLog(process.env.LOG_LEVEL ?? 'error');
  const live = startLive({ config, db, clock, log });
  const app = await createApp({
    config,
    db,
    pool,
    clock,
    log,
    live,
    pages: options.pages ?? noPages,
  });
  server.on('request', app);
  await new Promise<void>((listening) => server.listen(0, '127.0.0.1', listening));
  const { port } = server.address() as AddressInfo;
  const close = async () => {
    await live.close();
    server.closeAllConnections();
    await new Promise<void>((closed) => server.close(() => closed()));
    if (options.database === undefined) await database.close();
  };
  return { ...database, databaseUrl: database.url, url: `http://127.0.0.1:${port}`, close };
}
