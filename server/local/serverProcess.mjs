import { spawn } from 'node:child_process';
import { openSync, readFileSync, renameSync, statSync, closeSync } from 'node:fs';
import { join } from 'node:path';
import { root } from './places.mjs';
import { isStill } from './processes.mjs';
import { pause } from './run.mjs';
import { Sentence } from './say.mjs';

/** @typedef {{url: string, ended: Promise<number>, stop: () => Promise<void>, pid: number}} ServerProcess */

const PATIENCE_MS = 12_000;
const ORPHAN_PATIENCE_MS = 5_000;
const LONG_LOG = 10 * 1024 * 1024;

/**
 * Starts the server as a process of its own and waits until it listens. Its log goes to a file.
 * It ends by itself when this process does, however that comes about.
 * @param {Record<string, string | undefined>} settings
 * @param {string} logFile
 * @param {(pid: number) => void} [onBegun] told of the process before it is known to listen
 * @returns {Promise<ServerProcess>}
 */
export async function startServer(settings, logFile, onBegun = () => {}) {
  rotate(logFile);
  const log = openSync(logFile, 'a', 0o600);
  const child = spawn(process.execPath, ['--import', 'tsx', join(root, 'server/index.ts')], {
    cwd: root,
    env: { ...process.env, ...settings },
    stdio: ['ignore', log, log, 'ipc'],
    // A group of its own: Ctrl-C reaches the launcher alone, which then stops things in order.
    detached: true,
  });
  closeSync(log);
  if (child.pid !== undefined) onBegun(child.pid);
  /** @type {Promise<number>} */
  const ended = new Promise((resolve) => child.on('exit', (code) => resolve(code ?? 1)));
  /** @type {string} */
  const url = await new Promise((resolve, reject) => {
    child.on(
      'message',
      (/** @type {{type: string, url: string, sentences: string[]}} */ message) => {
        if (message.type === 'listening') resolve(message.url);
        if (message.type === 'failed') reject(new Sentence(message.sentences.join('\n')));
      },
    );
    void ended.then(() =>
      reject(new Sentence(`The server ended. Its log:\n${lastLines(logFile)}`)),
    );
  });
  const stop = async () => {
    child.kill('SIGTERM');
    const lastResort = setTimeout(() => child.kill('SIGKILL'), PATIENCE_MS);
    await ended;
    clearTimeout(lastResort);
  };
  return { url, ended, stop, pid: child.pid ?? 0 };
}

/**
 * The server of a launcher that was killed ends by itself, and has its port until then. One that is
 * stuck is ended: it can answer nobody any more.
 * @param {{pid: number, birth: string | null} | undefined} server as the launcher noted it
 */
export async function awaitOrphan(server) {
  if (server === undefined) return;
  for (const started = Date.now(); isStill(server); await pause(100))
    if (Date.now() - started > ORPHAN_PATIENCE_MS) process.kill(server.pid, 'SIGKILL');
}

/** @param {string} file */
export function lastLines(file) {
  try {
    return readFileSync(file, 'utf8').trim().split('\n').slice(-12).join('\n');
  } catch {
    return '(nothing)';
  }
}

/** @param {string} file */
function rotate(file) {
  try {
    if (statSync(file).size > LONG_LOG) renameSync(file, `${file}.1`);
  } catch {
    // There is none yet.
  }
}
