import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { startTestServer } from '../../server/local/testServerProcess.mjs';
import { test as base, expect } from './test.ts';

type OwnServer = Awaited<ReturnType<typeof startTestServer>>;

interface Own {
  /** A server that this test may kill and start again. */
  own: OwnServer;
}

/** For `*.serial.spec.ts`: the brewery, the database and the page are those of a server of one's own. */
export const test = base.extend<object, Own>({
  own: [
    async ({}, use) => {
      const folder = mkdtempSync(join(tmpdir(), 'barmkin-own-'));
      const own = await startTestServer({ port: 0, logFile: join(folder, 'server.log') });
      await use(own);
      await own.close();
      rmSync(folder, { recursive: true, force: true });
    },
    { scope: 'worker' },
  ],
  server: [async ({ own }, use) => use(own), { scope: 'worker' }],
  baseURL: async ({ server }, use) => use(server.url),
});

export { expect };
