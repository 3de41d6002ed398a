import { spawn } from 'node:child_process';
import { Sentence } from './say.mjs';

/**
 * @typedef {import('node:child_process').SpawnOptions} SpawnOptions
 * @typedef {{code: number, stdout: string, stderr: string}} Ran
 */

/**
 * Runs a program to its end and answers what it wrote.
 * @param {string} program
 * @param {readonly string[]} args
 * @param {SpawnOptions & {input?: string}} [options]
 * @returns {Promise<Ran>}
 */
export function run(program, args, { input, ...options } = {}) {
  return new Promise((resolve) => {
    const child = spawn(program, args, { stdio: 'pipe', ...options });
    let stdout = '';
    let stderr = '';
    child.stdout?.on('data', (part) => (stdout += part));
    child.stderr?.on('data', (part) => (stderr += part));
    child.stdin?.on('error', () => {});
    child.stdin?.end(input ?? '');
    child.on('error', (error) => resolve({ code: 127, stdout, stderr: String(error) }));
    /** @type {number | null} */
    let code = null;
    const done = () => resolve({ code: code ?? 1, stdout, stderr });
    child.on('close', done);
    child.on('exit', (exitCode) => {
      code = exitCode;
      // A daemon that it left behind may keep the pipes open for ever.
      setTimeout(done, 2000).unref();
    });
  });
}

/**
 * Like `run`, but a failure ends the script with what was being tried and what was said.
 * @param {string} what
 * @param {string} program
 * @param {readonly string[]} args
 * @param {SpawnOptions & {input?: string}} [options]
 */
export async function must(what, program, args, options) {
  const ran = await run(program, args, options);
  if (ran.code !== 0) {
    const said = (ran.stderr.trim() || ran.stdout.trim()).split('\n').slice(-15).join('\n');
    throw new Sentence(`${what} failed.\n${said}`);
  }
  return ran.stdout;
}

/**
 * Runs a program whose output the reader should see as it comes.
 * @param {string} program
 * @param {readonly string[]} args
 * @param {SpawnOptions} [options]
 * @returns {Promise<number>}
 */
export function show(program, args, options = {}) {
  return new Promise((resolve) => {
    const child = spawn(program, args, { stdio: ['ignore', 'inherit', 'inherit'], ...options });
    child.on('error', () => resolve(127));
    child.on('exit', (code) => resolve(code ?? 1));
  });
}

/** @param {number} ms */
export const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms));
