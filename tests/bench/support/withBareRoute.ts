import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { fileURLToPath } from 'node:url';

/** Runs a bare Express route on a database, in a process of its own, for as long as the work takes. */
export async function withBareRoute<T>(
  databaseUrl: string,
  work: (url: string) => Promise<T>,
): Promise<T> {
  const script = fileURLToPath(new URL('./bareRoute.ts', import.meta.url));
  const child = spawn(process.execPath, ['--import', 'tsx', script], {
    env: { ...process.env, DATABASE_URL: databaseUrl },
    stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
  });
  const ended = once(child, 'exit');
  try {
    const [{ port }] = (await once(child, 'message')) as [{ port: number }];
    return await work(`http://127.0.0.1:${port}/`);
  } finally {
    child.disconnect();
    await ended;
  }
}
