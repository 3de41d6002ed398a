import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/**
 * The keys that sign a local start's cookies: made once, so that people stay signed in over a restart.
 * @param {string} home
 */
export function sessionKeys(home) {
  const file = join(home, 'session-keys');
  if (!existsSync(file)) {
    const keys = [randomBytes(32), randomBytes(32)].map((key) => key.toString('hex'));
    writeFileSync(file, keys.join(','), { mode: 0o600 });
  }
  return readFileSync(file, 'utf8').trim();
}
