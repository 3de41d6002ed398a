import './checkNode.mjs';

// The server that the browser tests work on: a database of its own, built pages, no demo. Stopped by SIGTERM.
const { rmSync, writeFileSync } = await import('node:fs');
const { join } = await import('node:path');
const { ensureBuild } = await import('./build.mjs');
const { testDist, testHome, testPort, testServerFile } = await import('./places.mjs');
const { runMain } = await import('./say.mjs');
const { startTestServer } = await import('./testServerProcess.mjs');

await runMain(async () => {
  /** @type {Promise<void>} */
  const asked = new Promise((resolve) => {
    for (const signal of /** @type {const} */ (['SIGTERM', 'SIGINT', 'SIGHUP'])) {
      process.on(signal, () => resolve());
    }
  });
  await ensureBuild(testDist);
  const server = await startTestServer({ port: testPort, logFile: join(testHome, 'server.log') });
  const { url, databaseUrl, keys } = server;
  writeFileSync(testServerFile, JSON.stringify({ url, databaseUrl, keys }), { mode: 0o600 });
  await Promise.race([asked, server.ended]);
  rmSync(testServerFile, { force: true });
  await server.close();
});
