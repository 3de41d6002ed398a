import type pg from 'pg';
import type { Clock } from './clock.ts';
import type { Config } from './config.ts';
import type { Db } from './db/client.ts';
import type { Live } from './live/live.ts';
import type { Log } from './log.ts';
import type { Pages } from './pages.ts';

/** What the application is given to work with; tests give their own. */
export interface Deps {
  config: Config;
  db: Db;
  pool: pg.Pool;
  clock: Clock;
  log: Log;
  live: Live;
  pages: Pages;
}
