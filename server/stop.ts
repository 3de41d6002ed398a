import type { Server } from 'node:http';
import type { Log } from './log.ts';

const PATIENCE_MS = 10_000;

/**
 * Stops cleanly, once, on SIGTERM, SIGINT, or when the launcher that started this process is gone:
 * the port is given up at once, what stays open by itself is ended, requests under way are answered,
 * then everything is closed in the order given.
 */
export function stopCleanly(
  server: Server,
  log: Log,
  { before, after }: { before: () => Promise<void>; after: readonly (() => Promise<void>)[] },
): void {
  let stopping = false;
  const stop = async (why: string) => {
    if (stopping) return;
    stopping = true;
    log.info({ why }, 'Stopping');
    const closed = new Promise<void>((done) => {
      server.close(() => done());
    });
    const lastResort = setTimeout(() => server.closeAllConnections(), PATIENCE_MS);
    await before();
    server.closeIdleConnections();
    await closed;
    clearTimeout(lastResort);
    for (const each of after) await each();
    log.info('Stopped');
    process.exit(0);
  };
  const stopOrFail = (why: string) =>
    void stop(why).catch((error: unknown) => {
      log.error({ err: error }, 'Stopping failed');
      process.exit(1);
    });
  process.on('SIGTERM', () => stopOrFail('SIGTERM'));
  process.on('SIGINT', () => stopOrFail('SIGINT'));
  process.on('disconnect', () => stopOrFail('the launcher ended'));
  // It was gone before anybody listened. Without a launcher this is undefined.
  if (process.connected === false) stopOrFail('the launcher ended');
}
