import { readFileSync } from 'node:fs';
import { relative } from 'node:path';
import { root } from './places.mjs';

/**
 * What the runners write, as far as it is read here.
 * @typedef {{status: string, duration?: number | null, fullName: string}} Assertion
 * @typedef {{title: string, file: string, tests: {projectName: string, results: {duration: number}[]}[]}} Spec
 * @typedef {{title: string, specs?: Spec[], suites?: Suite[]}} Suite
 */

/**
 * What one runner counted.
 * @typedef {{
 *   name: string, passed: number, failed: number, skipped: number,
 *   times: {name: string, ms: number}[], why: string | null,
 * }} Result
 */

/**
 * @param {string} name
 * @returns {Result}
 */
export const passed = (name) => ({ name, passed: 1, failed: 0, skipped: 0, times: [], why: null });

/**
 * @param {string} name
 * @param {string} why
 * @returns {Result}
 */
export const failed = (name, why) => ({ name, passed: 0, failed: 1, skipped: 0, times: [], why });

/**
 * @param {string} file
 * @param {number} code the runner's exit code: a failure that no test shows is counted too
 * @returns {Result}
 */
export function vitestResult(file, code) {
  const name = 'Engine and API tests';
  /**
   * @type {{numPassedTests: number, numFailedTests: number, numPendingTests: number, numTodoTests: number,
   *   testResults: {name: string, status: string, message: string, assertionResults: Assertion[]}[]} | null}
   */
  const report = readReport(file);
  if (report === null) return failed(name, 'the runner left no report');
  const unloaded = report.testResults.filter(
    (each) =>
      each.status === 'failed' && each.assertionResults.every(({ status }) => status !== 'failed'),
  );
  const times = report.testResults.flatMap((each) =>
    each.assertionResults.map(({ fullName, duration }) => ({
      name: `${relative(root, each.name)} › ${fullName}`,
      ms: duration ?? 0,
    })),
  );
  return counted(name, code, {
    passed: report.numPassedTests,
    failed: report.numFailedTests + unloaded.length,
    skipped: report.numPendingTests + report.numTodoTests,
    times,
    why: unloaded.map((each) => `${relative(root, each.name)}: ${each.message}`).join('\n') || null,
  });
}

/**
 * @param {string} file
 * @param {number} code
 * @returns {Result}
 */
export function playwrightResult(file, code) {
  const name = 'Browser tests';
  /**
   * @type {{suites: Suite[], errors: {message?: string}[],
   *   stats: {expected: number, unexpected: number, flaky: number, skipped: number}} | null}
   */
  const report = readReport(file);
  if (report === null) return failed(name, 'the runner left no report');
  const { expected, unexpected, flaky, skipped } = report.stats;
  const times = report.suites.flatMap(specsOf).flatMap((spec) =>
    spec.tests.map(({ projectName, results }) => ({
      name: `e2e/${spec.file} (${projectName}) › ${spec.title}`,
      ms: results.reduce((sum, { duration }) => sum + duration, 0),
    })),
  );
  return counted(name, code, {
    passed: expected,
    failed: unexpected + flaky + report.errors.length,
    skipped,
    times,
    why: report.errors.map(({ message }) => message ?? '').join('\n') || null,
  });
}

/**
 * @param {Suite} suite
 * @returns {Spec[]}
 */
function specsOf(suite) {
  return [...(suite.specs ?? []), ...(suite.suites ?? []).flatMap(specsOf)];
}

/**
 * @param {string} name
 * @param {number} code
 * @param {Omit<Result, 'name'>} result
 * @returns {Result}
 */
function counted(name, code, result) {
  if (result.passed + result.failed === 0) return failed(name, 'no test ran');
  if (code !== 0 && result.failed === 0) {
    return { name, ...result, failed: 1, why: 'the runner failed outside of any test: see above' };
  }
  return { name, ...result };
}

/** @param {string} file */
function readReport(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return null;
  }
}
