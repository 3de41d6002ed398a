import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { createApp } from './app.ts';
import { clockFrom, systemClock } from './clock.ts';
import { parseConfig, type Config } from './config.ts';
import { connect } from './db/client.ts';
import { makeReady } from './db/makeReady.ts';
import { startLive } from './live/live.ts';
import { createLastLog, createLog, type Log } from './log.ts';
import { builtPages, pagesAreBuilt, vitePages, type Pages } from './pages.ts';
import { explain } from './settings/explain.ts';
import { stopCleanly } from './stop.ts';

const root = new URL('..', import.meta.url).pathname;

async function main(): Promise<void> {
  const config = parseConfig(process.env);
  const log = createLog(config.logLevel);
  const clock = config.testNow === null ? systemClock : clockFrom(config.testNow);
  const { db, pool } = openDatabase(config, log);
  await makeReady(config, db, pool, clock);
  const server = createServer();
  const { pages, close } = await pagesFor(config, server);
  const live = startLive({ config, db, clock, log });
  server.on('request', await createApp({ config, db, pool, clock, log, live, pages }));
  // A stream would keep the server from closing.
  stopCleanly(server, log, { before: live.close, after: [close, () => pool.end()] });
  const url = await listen(server, config);
  log.info({ url, mode: config.mode }, 'Listening');
  process.send?.({ type: 'listening', url });
}

function openDatabase(config: Config, log: Log): ReturnType<typeof connect> {
  return connect(config.databaseUrl, {
    onSlow: (query) => log.warn({ query }, 'Slow query'),
    onError: (error) => log.error({ err: error }, 'Database connection lost'),
  });
}

async function pagesFor(
  config: Config,
  server: Server,
): Promise<{ pages: Pages; close: () => Promise<void> }> {
  if (config.mode === 'dev') return vitePages(root, server);
  if (config.mode === 'serve' && !pagesAreBuilt(config.distDir)) {
    throw new Error('The pages are not built: npm run build makes them.');
  }
  return { pages: builtPages(config.distDir), close: async () => {} };
}

function listen(server: Server, config: Config): Promise<string> {
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(config.port, config.host, () => {
      const { port } = server.address() as AddressInfo;
      const host = config.host.includes(':') ? `[${config.host}]` : config.host;
      resolve(config.publicUrl ?? `http://${host}:${port}`);
    });
  });
}

function fail(error: unknown): void {
  const log = createLastLog();
  const sentences = explain(error);
  for (const sentence of sentences) log.error(sentence);
  // Connections that are open by now would keep the process alive.
  const exit = () => process.exit(1);
  if (process.send === undefined) exit();
  else process.send({ type: 'failed', sentences }, exit);
}

try {
  await main();
} catch (error) {
  fail(error);
}
