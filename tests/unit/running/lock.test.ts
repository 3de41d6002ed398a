import { spawn } from 'node:child_process';
import { mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { readHolder, takeLock, tryLock } from '../../../server/local/lock.mjs';
import { birthOf } from '../../../server/local/processes.mjs';

let folder = '';
let path = '';
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'barmkin-lock-'));
  path = join(folder, 'lock');
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

function hold(pid: number, birth: string | null): void {
  writeFileSync(
    path,
    JSON.stringify({ pid, birth, what: 'npm start', url: 'http://127.0.0.1:4600' }),
  );
}

test('a free lock is taken, says who has it, and is given back', async () => {
  const lock = await takeLock(path, 'a test', () => 'taken');
  lock.note({ url: 'http://127.0.0.1:1' });
  expect(readHolder(path)).toMatchObject({
    pid: process.pid,
    what: 'a test',
    url: 'http://127.0.0.1:1',
  });
  lock.release();
  expect(readdirSync(folder)).toEqual([]);
});

test('a lock that was given back keeps no hold of the process', async () => {
  const before = process.listenerCount('exit');
  const lock = await takeLock(path, 'a test', () => 'taken');
  expect(process.listenerCount('exit')).toBe(before + 1);
  lock.release();
  expect(process.listenerCount('exit')).toBe(before);
});

test('a lock of a process at work is refused with what it said', async () => {
  const child = spawn(process.execPath, ['-e', 'setTimeout(() => {}, 60_000)']);
  try {
    const pid = child.pid ?? 0;
    hold(pid, birthOf(pid));
    await expect(
      takeLock(path, 'a test', (holder) => `it runs at ${holder.url}`, 50),
    ).rejects.toThrow('it runs at http://127.0.0.1:4600');
  } finally {
    child.kill('SIGKILL');
  }
});

test('a lock of a process that was killed is taken over', async () => {
  const child = spawn(process.execPath, ['-e', 'setTimeout(() => {}, 60_000)']);
  const pid = child.pid ?? 0;
  hold(pid, birthOf(pid));
  child.kill('SIGKILL');
  await new Promise((ended) => child.on('exit', ended));
  const lock = tryLock(path, 'a test');
  expect(lock).not.toHaveProperty('pid');
  expect(lock, 'and says whose it was').toMatchObject({ before: { pid, what: 'npm start' } });
});

test('a process id that was given to another process keeps nobody out', () => {
  hold(process.ppid, 'some other boot 12345');
  expect(tryLock(path, 'a test')).not.toHaveProperty('pid');
  expect(readHolder(path)).toMatchObject({ pid: process.pid });
});

test('a lock file that was cut off in writing is taken over', () => {
  writeFileSync(path, '{"pid": 12');
  expect(tryLock(path, 'a test')).not.toHaveProperty('pid');
});

test('two takers at one time: one gets it', async () => {
  hold(process.ppid, 'some other boot 12345');
  const script = `import { tryLock } from ${JSON.stringify(join(process.cwd(), 'server/local/lock.mjs'))};
    const got = tryLock(${JSON.stringify(path)}, 'a test');
    console.log('pid' in got ? 'refused' : 'taken');
    process.stdin.on('data', () => process.exit(0));`;
  const children = Array.from({ length: 4 }, () =>
    spawn(process.execPath, ['--input-type=module', '-e', script]),
  );
  const answers = await Promise.all(
    children.map(
      (child) =>
        new Promise<string>((said) =>
          child.stdout.once('data', (data) => said(String(data).trim())),
        ),
    ),
  );
  for (const child of children) child.stdin.write('end\n');
  await Promise.all(children.map((child) => new Promise((ended) => child.on('exit', ended))));
  expect(answers.toSorted()).toEqual(['refused', 'refused', 'refused', 'taken']);
});
