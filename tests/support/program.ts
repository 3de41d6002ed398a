import { spawn } from 'node:child_process';
import { resolve } from 'node:path';

export interface Ended {
  readonly code: number | null;
  readonly stdout: string;
  readonly stderr: string;
}

interface Program {
  /** Answers once a line that was written matches. */
  seen(text: RegExp): Promise<void>;
  stop(signal: NodeJS.Signals): void;
  readonly ended: Promise<Ended>;
}

/** Runs one of the product's own scripts as a user would, with nothing of this process's settings. */
export function runProgram(
  args: readonly string[],
  env: Readonly<Record<string, string>>,
): Program {
  const { PATH = '', LANG = 'C.UTF-8' } = process.env;
  const child = spawn(process.execPath, args, {
    cwd: resolve(import.meta.dirname, '../..'),
    env: { PATH, LANG, ...env },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let stdout = '';
  let stderr = '';
  child.stdout.on('data', (part) => (stdout += String(part)));
  child.stderr.on('data', (part) => (stderr += String(part)));
  const ended = new Promise<Ended>((done) =>
    child.on('close', (code) => done({ code, stdout, stderr })),
  );
  const seen = (text: RegExp) =>
    new Promise<void>((found, lost) => {
      const look = () => text.test(stdout) && found();
      child.stdout.on('data', look);
      look();
      void ended.then(() =>
        lost(new Error(`It ended without saying ${text}:\n${stdout}${stderr}`)),
      );
    });
  return { seen, ended, stop: (signal) => void child.kill(signal) };
}
