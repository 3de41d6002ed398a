import { readFileSync, readlinkSync } from 'node:fs';
import { spawnSync } from 'node:child_process';

/** @param {number} pid */
export function isAlive(pid) {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return /** @type {NodeJS.ErrnoException} */ (error).code === 'EPERM';
  }
}

/**
 * When a process began, as text that no later process with the same id repeats; null when there is none.
 * @param {number} pid
 */
export function birthOf(pid) {
  if (!isAlive(pid)) return null;
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    // The second field, the name, may hold spaces and brackets: count from behind its last bracket.
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    const boot = readFileSync('/proc/sys/kernel/random/boot_id', 'utf8').trim();
    return fields[0] === 'Z' ? null : `${boot} ${fields[19]}`;
  } catch {
    const ps = spawnSync('ps', ['-o', 'lstart=', '-p', String(pid)], { encoding: 'utf8' });
    return ps.status === 0 ? ps.stdout.trim() : null;
  }
}

/**
 * Whether a process that was noted is the one that has its id now, and runs.
 * @param {{pid: number, birth: string | null}} known
 */
export const isStill = ({ pid, birth }) => birth !== null && birthOf(pid) === birth;

/**
 * Whether a process works in a folder, as a database server does in its data folder.
 * @param {number} pid
 * @param {string} folder its real path
 */
export function worksIn(pid, folder) {
  if (!isAlive(pid)) return false;
  try {
    return readlinkSync(`/proc/${pid}/cwd`) === folder;
  } catch {
    const ps = spawnSync('ps', ['-o', 'command=', '-p', String(pid)], { encoding: 'utf8' });
    return ps.status === 0 && ps.stdout.includes(folder);
  }
}
