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
