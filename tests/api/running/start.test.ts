import { chmodSync, existsSync, mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:http';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { freePort, removeCluster } from '../../../server/local/cluster.mjs';
import { readHolder } from '../../../server/local/lock.mjs';
import { isStill } from '../../../server/local/processes.mjs';
import { runProgram } from '../../support/program.ts';

let home = '';
let port = 0;
beforeEach(async () => {
  home = mkdtempSync(join(tmpdir(), 'barmkin-start-'));
  // The database user may pass through.
  chmodSync(home, 0o711);
  port = await freePort();
});
afterEach(async () => {
  await removeCluster(home);
  rmSync(home, { recursive: true, force: true });
});

const start = () =>
  runProgram(['server/local/start.mjs', '--dev'], { BARMKIN_HOME: home, PORT: String(port) });

const UP = /Barmkin is at http:\/\/127\.0\.0\.1:\d+/;
const isUp = () =>
  fetch(`http://127.0.0.1:${port}/api/health`).then(
    ({ status }) => status === 200,
    () => false,
  );

test('a start says where it is and how to sign in; a second one where the first runs; a signal ends all', async () => {
  const first = start();
  await first.seen(UP);
  expect(await isUp()).toBe(true);

  const second = await start().ended;
  expect(second.code).toBe(1);
  expect(second.stderr).toContain(`Barmkin already runs here: http://127.0.0.1:${port}`);

  first.stop('SIGINT');
  const { code, stdout, stderr } = await first.ended;
  expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
  for (const email of ['mo', 'tamsin', 'ruth'])
    expect(stdout).toContain(`${email}@saltmarsh.example`);
  expect(stdout).toContain('slack-water-26');
  expect(await isUp()).toBe(false);
  expect(existsSync(join(home, 'lock'))).toBe(false);
  expect(existsSync(join(home, 'postgres/data/postmaster.pid'))).toBe(false);
}, 120_000);

test('a start after a killed one takes over the database that outlived it', async () => {
  const first = start();
  await first.seen(UP);
  first.stop('SIGKILL');
  await first.ended;
  expect(readHolder(join(home, 'lock'))).not.toBeNull();

  const second = start();
  await second.seen(UP);
  second.stop('SIGTERM');
  const { code, stdout } = await second.ended;
  expect(code).toBe(0);
  expect(stdout).toContain('still running');
}, 120_000);

test('a start after a killed one ends the server that hangs and has the port', async () => {
  const first = start();
  await first.seen(UP);
  const server = readHolder(join(home, 'lock'))?.server;
  if (!server) throw new Error('the lock does not say which process the server is');
  process.kill(server.pid, 'SIGSTOP');
  first.stop('SIGKILL');
  await first.ended;
  expect(isStill(server)).toBe(true);

  const second = start();
  await second.seen(UP);
  expect(isStill(server)).toBe(false);
  expect(await isUp()).toBe(true);
  second.stop('SIGTERM');
  expect((await second.ended).code).toBe(0);
}, 120_000);

test('a port that another program has is named before the long steps', async () => {
  const other = createServer();
  await new Promise<void>((listening) => other.listen(port, '127.0.0.1', listening));
  try {
    const { code, stdout, stderr } = await start().ended;
    expect(code).toBe(1);
    expect(stderr).toContain(`Port ${port} is taken`);
    expect(stdout).not.toContain('database');
  } finally {
    other.close();
  }
});
