import { mkdirSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { removeCluster, startCluster } from './cluster.mjs';
import { readHolder, waitForLock } from './lock.mjs';
import { birthOf } from './processes.mjs';

/** Nothing in a test's database is worth a wait for the disk. */
const FAST = ['fsync=off', 'synchronous_commit=off', 'full_page_writes=off', 'max_connections=200'];

/**
 * A cluster that several test runs may use at one time: the first starts it, the last stops it.
 * @param {string} home
 * @param {readonly string[]} [settings]
 */
export async function joinCluster(home, settings = FAST) {
  const users = join(home, 'users');
  const mine = join(users, `${process.pid}-${Date.now()}`);
  const cluster = await alone(home, async () => {
    mkdirSync(users, { recursive: true });
    writeFileSync(mine, JSON.stringify({ pid: process.pid, birth: birthOf(process.pid) }));
    try {
      return await startCluster(home, { settings, quiet: true });
    } catch {
      // Without fsync a crash of the machine may have left it unreadable.
      await removeCluster(home);
      return startCluster(home, { settings, quiet: true });
    }
  });
  const leave = () =>
    alone(home, async () => {
      rmSync(mine, { force: true });
      if (!anyAtWork(users)) await cluster.stop();
    });
  return { cluster, leave };
}

/** @param {string} users */
function anyAtWork(users) {
  return readdirSync(users).some((name) => {
    const user = readHolder(join(users, name));
    const atWork = user !== null && user.birth !== null && birthOf(user.pid) === user.birth;
    if (!atWork) rmSync(join(users, name), { force: true });
    return atWork;
  });
}

/**
 * @template T
 * @param {string} home
 * @param {() => Promise<T>} work
 */
async function alone(home, work) {
  const lock = await waitForLock(join(home, 'lock'), 'a test run', () => {});
  try {
    return await work();
  } finally {
    lock.release();
  }
}
