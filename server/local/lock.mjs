import { linkSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { birthOf, isStill } from './processes.mjs';
import { pause } from './run.mjs';
import { Sentence } from './say.mjs';

/**
 * A file that says which process works in a folder. The process's birth stands in it too, so that
 * neither a killed process nor another one that was given its number keeps anybody out.
 * @typedef {{pid: number, birth: string | null}} Known
 * @typedef {Known & {what: string, url?: string, stopping?: boolean, server?: Known}} Holder
 * @typedef {{note: (more: Partial<Holder>) => void, release: () => void, before: Holder | null}} Lock
 *   `before`: who had it and was killed
 */

/**
 * @param {string} path
 * @param {string} what what the holder does, in words
 * @returns {Lock | Holder} the lock, or who has it
 */
export function tryLock(path, what) {
  mkdirSync(dirname(path), { recursive: true });
  /** @type {Holder} */
  const mine = { pid: process.pid, birth: birthOf(process.pid), what };
  const beside = `${path}.${process.pid}`;
  /** @type {Holder | null} */
  let before = null;
  for (;;) {
    writeFileSync(beside, JSON.stringify(mine));
    try {
      // A link appears whole or not at all, and never over another.
      linkSync(beside, path);
      return lockOf(path, mine, before);
    } catch (error) {
      if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'EEXIST') throw error;
    } finally {
      rmSync(beside, { force: true });
    }
    const holder = readHolder(path);
    if (holder !== null && isStill(holder)) return holder;
    dropStale(path, holder);
    before = holder ?? before;
  }
}

/**
 * Takes it at once, or after a holder that is just stopping; refuses when somebody means to keep it.
 * @param {string} path
 * @param {string} what
 * @param {(holder: Holder) => string} refusal
 * @param {number} [graceMs] how long a holder may take to say that it is stopping
 * @returns {Promise<Lock>}
 */
export async function takeLock(path, what, refusal, graceMs = 1500) {
  const started = Date.now();
  for (;;) {
    const got = tryLock(path, what);
    if (!('pid' in got)) return got;
    const patience = got.stopping === true ? 20_000 : graceMs;
    if (Date.now() - started > patience) throw new Sentence(refusal(got));
    await pause(100);
  }
}

/**
 * Waits while another process has it.
 * @param {string} path
 * @param {string} what
 * @param {(holder: Holder) => void} onWait
 * @returns {Promise<Lock>}
 */
export async function waitForLock(path, what, onWait) {
  let told = false;
  for (;;) {
    const got = tryLock(path, what);
    if (!('pid' in got)) return got;
    if (!told) onWait(got);
    told = true;
    await pause(500);
  }
}

/**
 * @param {string} path
 * @returns {Holder | null}
 */
export function readHolder(path) {
  try {
    return JSON.parse(readFileSync(path, 'utf8'));
  } catch {
    return null;
  }
}

/**
 * Removes a lock that nobody holds, unless a third process has just taken it.
 * @param {string} path
 * @param {Holder | null} stale
 */
function dropStale(path, stale) {
  const aside = `${path}.stale.${process.pid}`;
  try {
    renameSync(path, aside);
  } catch {
    return;
  }
  const taken = readHolder(aside);
  if (taken !== null && taken.pid !== stale?.pid && isStill(taken)) {
    try {
      linkSync(aside, path);
    } catch {
      // Somebody else has it by now.
    }
  }
  rmSync(aside, { force: true });
}

/**
 * @param {string} path
 * @param {Holder} mine
 * @param {Holder | null} before
 * @returns {Lock}
 */
function lockOf(path, mine, before) {
  const release = () => {
    process.off('exit', release);
    if (readHolder(path)?.pid === process.pid) rmSync(path, { force: true });
  };
  process.on('exit', release);
  return {
    note(more) {
      const beside = `${path}.${process.pid}`;
      writeFileSync(beside, JSON.stringify(Object.assign(mine, more)));
      renameSync(beside, path);
    },
    release,
    before,
  };
}
