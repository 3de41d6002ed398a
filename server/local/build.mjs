import { createHash } from 'node:crypto';
import {
  existsSync,
  readdirSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import { join, relative } from 'node:path';
import { root } from './places.mjs';
import { must } from './run.mjs';
import { say } from './say.mjs';

const INPUTS = ['src', 'shared', 'index.html', 'vite.config.ts', 'package-lock.json'];

/**
 * Builds the pages into a folder, unless they were built there from the very same sources.
 * They are built beside and swapped in, so that a server at work on the folder is never without them.
 * @param {string} dist
 */
export async function ensureBuild(dist) {
  const stamp = join(dist, '.stamp');
  const hash = hashOfInputs();
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === hash) return;
  say('Building the pages');
  const beside = `${dist}.new.${process.pid}`;
  const before = `${dist}.old.${process.pid}`;
  await must(
    'Building the pages',
    process.execPath,
    [join(root, 'node_modules/vite/bin/vite.js'), 'build'],
    {
      cwd: root,
      env: { ...process.env, NODE_ENV: 'production', BARMKIN_DIST: beside },
    },
  );
  writeFileSync(join(beside, '.stamp'), hash);
  if (existsSync(dist)) renameSync(dist, before);
  renameSync(beside, dist);
  rmSync(before, { recursive: true, force: true });
}

function hashOfInputs() {
  const hash = createHash('sha256').update(process.version);
  for (const file of INPUTS.flatMap((each) => filesOf(join(root, each)))) {
    hash.update(relative(root, file)).update('\0').update(readFileSync(file)).update('\0');
  }
  return hash.digest('hex');
}

/**
 * @param {string} path
 * @returns {string[]}
 */
function filesOf(path) {
  if (!existsSync(path)) return [];
  if (!statSync(path).isDirectory()) return [path];
  return readdirSync(path)
    .toSorted()
    .flatMap((name) => filesOf(join(path, name)));
}
