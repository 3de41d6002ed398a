import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { ensureBuild } from './build.mjs';
import { checkMigrations, lint, typecheck } from './checks.mjs';
import { findChromium } from './chromium.mjs';
import { waitForLock } from './lock.mjs';
import { ensurePackages } from './packages.mjs';
import { home, root, testDist, testHome } from './places.mjs';
import { findPostgres } from './postgresPrograms.mjs';
import { failed, passed, playwrightResult, vitestResult } from './results.mjs';
import { show } from './run.mjs';
import { readArguments, say, Sentence } from './say.mjs';

/**
 * `npm test`: every check there is, to the end even where one fails. The last line counts them all.
 * @param {readonly string[]} args
 */
export async function testAll(args) {
  readArguments(args, [], 0);
  if (testHome === home)
    throw new Sentence('BARMKIN_TEST_HOME must be another folder than BARMKIN_HOME.');
  const started = Date.now();
  const lock = await waitForLock(join(testHome, 'run.lock'), 'npm test', ({ pid }) =>
    say(`Waiting for another npm test (process ${pid}) to end`),
  );
  try {
    await ensurePackages();
    await findPostgres(null, testHome);
    const chromium = await findChromium();
    return report(await allResults(chromium), started);
  } finally {
    lock.release();
  }
}

/**
 * @param {string} chromium
 * @returns {Promise<import('./results.mjs').Result[]>}
 */
async function allResults(chromium) {
  const checks = await Promise.all([
    typecheck(),
    lint().then(async (each) => [each, await checkMigrations()]),
  ]);
  const vitest = await runVitest();
  const build = await attempt('Build', () => ensureBuild(testDist));
  // Without pages there is nothing for a browser to see.
  const browser =
    build.failed > 0
      ? failed('Browser tests', 'the pages could not be built')
      : await runPlaywright(chromium);
  return [...checks.flat(), vitest, build, browser];
}

/**
 * @param {string} name
 * @param {() => Promise<unknown>} work
 */
async function attempt(name, work) {
  try {
    await work();
    return passed(name);
  } catch (error) {
    return failed(name, error instanceof Error ? error.message : String(error));
  }
}

const reports = join(testHome, 'reports');

async function runVitest() {
  say('Tests of the engine and the API');
  mkdirSync(reports, { recursive: true });
  const file = join(reports, `vitest-${process.pid}.json`);
  const args = ['run', '--reporter=dot', '--reporter=json', `--outputFile.json=${file}`];
  const code = await show(
    process.execPath,
    [join(root, 'node_modules/vitest/vitest.mjs'), ...args],
    { cwd: root },
  );
  return vitestResult(file, code);
}

/** @param {string} chromium */
async function runPlaywright(chromium) {
  say('Tests in the browser');
  const file = join(reports, `playwright-${process.pid}.json`);
  const args = ['test', '--reporter=dot,json'];
  const code = await show(
    process.execPath,
    [join(root, 'node_modules/@playwright/test/cli.js'), ...args],
    {
      cwd: root,
      env: { ...process.env, CHROMIUM: chromium, PLAYWRIGHT_JSON_OUTPUT_NAME: file },
    },
  );
  return playwrightResult(file, code);
}

/**
 * @param {readonly import('./results.mjs').Result[]} results
 * @param {number} started
 */
function report(results, started) {
  const slowest = results
    .flatMap((each) => each.times)
    .toSorted((a, b) => b.ms - a.ms)
    .slice(0, 10);
  say('\nThe ten slowest tests:');
  for (const { name, ms } of slowest) say(`${(ms / 1000).toFixed(1).padStart(6)} s  ${name}`);
  say('');
  for (const each of results) {
    const skipped = each.skipped > 0 ? `, ${each.skipped} skipped` : '';
    say(`${each.name}: ${each.passed} passed, ${each.failed} failed${skipped}`);
    if (each.why !== null) say(each.why.replace(/^/gm, '  '));
  }
  const sum = (/** @type {'passed' | 'failed'} */ key) =>
    results.reduce((total, each) => total + each[key], 0);
  say(`Took ${Math.round((Date.now() - started) / 1000)} s`);
  say(`${sum('passed')} passed, ${sum('failed')} failed`);
  return sum('failed') > 0 ? 1 : 0;
}
