import { readdirSync, readFileSync } from 'node:fs';

/** Resident memory, in bytes, of the one server process that this process started (Linux). */
export function serverMemory(): number {
  const found = readdirSync('/proc').filter((pid) => /^\d+$/.test(pid) && isOurServer(pid));
  const [pid, ...more] = found;
  if (pid === undefined || more.length > 0)
    throw new Error(`${found.length} servers were started from here, not one`);
  const kb = /^VmRSS:\s+(\d+) kB$/m.exec(readFileSync(`/proc/${pid}/status`, 'utf8'))?.[1];
  return Number(kb) * 1024;
}

function isOurServer(pid: string): boolean {
  try {
    const parent = /^PPid:\s+(\d+)$/m.exec(readFileSync(`/proc/${pid}/status`, 'utf8'))?.[1];
    const command = readFileSync(`/proc/${pid}/cmdline`, 'utf8');
    return Number(parent) === process.pid && command.includes('server/index.ts');
  } catch {
    // It ended while it was looked at.
    return false;
  }
}
