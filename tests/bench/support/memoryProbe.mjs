import { renameSync, writeFileSync } from 'node:fs';
import { setTimeout as pause } from 'node:timers/promises';
import { setFlagsFromString } from 'node:v8';
import { runInNewContext } from 'node:vm';

// Loaded into the server that is measured: told to, it collects what nobody holds any more and
// writes what is left to a file. Without that a figure would mostly be of garbage.
setFlagsFromString('--expose-gc');
/** @type {() => void} */
const collect = runInNewContext('gc');
const file = process.env.MEMORY_FILE;

process.on('SIGUSR2', () => void tell());

async function tell() {
  for (let round = 0; round < 4; round += 1) {
    collect();
    await pause(50);
  }
  if (!file) return;
  // Whole or not at all, for whoever waits for it.
  writeFileSync(`${file}.new`, JSON.stringify(process.memoryUsage()));
  renameSync(`${file}.new`, file);
}
