import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { waitForLock } from './lock.mjs';
import { root } from './places.mjs';
import { show } from './run.mjs';
import { say, Sentence } from './say.mjs';

const lockfile = join(root, 'package-lock.json');
const installed = join(root, 'node_modules/.package-lock.json');
const stamp = join(root, 'node_modules/.barmkin-stamp');

/** Installs the packages when the lockfile is not the one they were installed from. */
export async function ensurePackages() {
  if (isInstalled()) return;
  const lock = await waitForLock(join(root, '.cache/packages.lock'), 'installing packages', () =>
    say('Waiting for another process to install the packages'),
  );
  try {
    if (isInstalled()) return;
    say('Installing packages (npm ci); the first time takes a minute or two');
    const code = await show('npm', ['ci', '--include=dev', '--loglevel=error'], {
      cwd: root,
      // Under `npm test` the outer npm's settings would be inherited, --omit among them.
      env: Object.fromEntries(
        Object.entries(process.env).filter(
          ([key]) =>
            !/^npm_(config_(omit|production)|package_|lifecycle_)/i.test(key) && key !== 'NODE_ENV',
        ),
      ),
    });
    if (code !== 0)
      throw new Sentence('The packages could not be installed: npm ci says why above.');
    writeFileSync(stamp, lockHash());
  } finally {
    lock.release();
  }
}

const lockHash = () => createHash('sha256').update(readFileSync(lockfile)).digest('hex');

function isInstalled() {
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === lockHash()) return true;
  if (!sameVersions()) return false;
  writeFileSync(stamp, lockHash());
  return true;
}

/** Whether an `npm install` by hand left what the lockfile asks for. */
function sameVersions() {
  if (!existsSync(installed)) return false;
  /** @typedef {Record<string, {version?: string, optional?: boolean}>} Packages */
  /** @type {Packages} */
  const wanted = JSON.parse(readFileSync(lockfile, 'utf8')).packages;
  /** @type {Packages} */
  const have = JSON.parse(readFileSync(installed, 'utf8')).packages;
  return Object.entries(wanted).every(
    ([path, { version, optional }]) =>
      path === '' || optional === true || have[path]?.version === version,
  );
}
