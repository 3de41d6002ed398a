import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { testHome } from '../../../server/local/places.mjs';
import { joinCluster } from '../../../server/local/sharedCluster.mjs';
import { startTestServer } from '../../../server/local/testServerProcess.mjs';
import { test as base } from '../test.ts';

interface OwnDatabase {
  own: Awaited<ReturnType<typeof startTestServer>> & {
    /** Ends the database as a power cut would, and starts it again after a while. */
    crashDatabase(awayMs: number): Promise<void>;
  };
}

/**
 * No wait for the disk, which does not fail here; but what was answered is in the log of the
 * database before, so that it outlives the database's processes.
 */
const SETTINGS = ['fsync=off', 'full_page_writes=off', 'max_connections=60'];

/** A server and a cluster that nobody else uses, so that the database may be killed under it. */
export const test = base.extend<object, OwnDatabase>({
  own: [
    async ({}, use) => {
      const folder = mkdtempSync(join(tmpdir(), 'barmkin-team-'));
      const { cluster, leave } = await joinCluster(`${testHome}-team`, SETTINGS);
      const server = await startTestServer({
        port: 0,
        logFile: join(folder, 'server.log'),
        settings: { HEARTBEAT_SECONDS: '3' },
        join: async () => ({ cluster, leave: async () => {} }),
      });
      const crashDatabase = async (awayMs: number) => {
        await cluster.crash();
        await pause(awayMs);
        await cluster.again();
      };
      await use({ ...server, crashDatabase });
      await server.close();
      await leave();
      rmSync(folder, { recursive: true, force: true });
    },
    { scope: 'worker' },
  ],
  server: [async ({ own }, use) => use(own), { scope: 'worker' }],
  baseURL: async ({ server }, use) => use(server.url),
});
