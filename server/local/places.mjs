import { createHash } from 'node:crypto';
import { tmpdir, userInfo } from 'node:os';
import { join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

export const root = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '');

/** @param {string} text */
export const shortHash = (text) => createHash('sha256').update(text).digest('hex').slice(0, 10);

/** Where a start on this machine keeps its database, photos, backups and logs. */
export const home = resolve(process.env.BARMKIN_HOME || join(root, '.barmkin'));

/** Where tests keep theirs: never the same folder, so that they run beside the product. */
export const testHome = resolve(
  process.env.BARMKIN_TEST_HOME ||
    (process.env.BARMKIN_HOME
      ? `${home}-test`
      : join(tmpdir(), `barmkin-test-${shortHash(`${root} ${userInfo().uid}`)}`)),
);

export const isRoot = process.getuid?.() === 0;

/** Pages built for tests: not those that a start may be serving. */
export const testDist = join(root, '.cache/test-dist');

/** A port that the same folder always gets, so that every process of a test run agrees on it. */
export const testPort = Number(
  process.env.BARMKIN_TEST_PORT ||
    20_000 + (parseInt(shortHash(testHome).slice(0, 6), 16) % 20_000),
);

/** What the browser tests must know of their server. */
export const testServerFile = join(testHome, 'server.json');
