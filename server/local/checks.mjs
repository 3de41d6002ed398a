import { cpSync, mkdirSync, readdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { root } from './places.mjs';
import { failed, passed } from './results.mjs';
import { run } from './run.mjs';
import { say } from './say.mjs';

/** @typedef {import('./results.mjs').Result} Result */

/**
 * @param {string} name
 * @param {string} script in node_modules
 * @param {readonly string[]} args
 * @param {Record<string, string>} [env]
 */
async function check(name, script, args, env = {}) {
  const ran = await run(process.execPath, [join(root, 'node_modules', script), ...args], {
    cwd: root,
    env: { ...process.env, ...env },
  });
  return ran.code === 0
    ? passed(name)
    : failed(name, `${ran.stdout}${ran.stderr}`.trim().slice(-6000));
}

export function typecheck() {
  say('Types');
  return check('Types', 'typescript/bin/tsc', ['-b']);
}

/** @returns {Promise<Result>} */
export async function lint() {
  say('Lint');
  const oxlint = await check('Lint', 'oxlint/bin/oxlint', ['--deny-warnings']);
  if (oxlint.failed > 0) return oxlint;
  const config = ['--config', '.dependency-cruiser.cjs'];
  return check('Lint', 'dependency-cruiser/bin/dependency-cruise.mjs', [
    ...config,
    'src',
    'server',
    'shared',
  ]);
}

/**
 * The migrations make exactly the tables that the code speaks of: generating on a copy adds none.
 * @returns {Promise<Result>}
 */
export async function checkMigrations() {
  const name = 'Migrations';
  say(name);
  const copy = `.cache/drizzle-${process.pid}`;
  const folder = join(root, copy);
  try {
    mkdirSync(folder, { recursive: true });
    cpSync(join(root, 'drizzle'), folder, { recursive: true });
    const before = readdirSync(folder).length;
    const ran = await check(name, 'drizzle-kit/bin.cjs', ['generate'], {
      BARMKIN_DRIZZLE_OUT: `./${copy}`,
    });
    if (ran.failed > 0 || readdirSync(folder).length === before) return ran;
    return failed(
      name,
      'The tables differ from what the migrations make: npx drizzle-kit generate writes the missing one.',
    );
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
