import { existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { aptInstall } from './apt.mjs';
import { Sentence } from './say.mjs';

const NAMES = ['chromium', 'chromium-browser'];

/**
 * The browser of the browser tests, installed where it is missing.
 * @returns {Promise<string>}
 */
export async function findChromium() {
  const found = chromiumHere();
  if (found !== null) return found;
  await aptInstall('Chromium', ['chromium']);
  const installed = chromiumHere();
  if (installed === null)
    throw new Sentence('Chromium was installed but is not found: set CHROMIUM to its path.');
  return installed;
}

function chromiumHere() {
  const wished = process.env.CHROMIUM;
  if (wished) return wished;
  const folders = ['/usr/bin', ...(process.env.PATH ?? '').split(delimiter)];
  const paths = folders.flatMap((folder) => NAMES.map((name) => join(folder, name)));
  return paths.find((path) => existsSync(path)) ?? null;
}
