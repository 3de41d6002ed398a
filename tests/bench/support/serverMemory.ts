import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { fileURLToPath } from 'node:url';

export interface MemoryProbe {
  /** What the server must be started with. */
  settings: Record<string, string>;
  /** What the server holds once it has collected its garbage. */
  look(pid: number): Promise<NodeJS.MemoryUsage>;
  close(): void;
}

/** Looks into the memory of a server process. */
export function openMemoryProbe(): MemoryProbe {
  const folder = mkdtempSync(join(tmpdir(), 'barmkin-memory-'));
  const file = join(folder, 'memory.json');
  const script = fileURLToPath(new URL('./memoryProbe.mjs', import.meta.url));
  return {
    settings: { NODE_OPTIONS: `--import ${script}`, MEMORY_FILE: file },
    async look(pid) {
      rmSync(file, { force: true });
      process.kill(pid, 'SIGUSR2');
      while (!existsSync(file)) await pause(50);
      return JSON.parse(readFileSync(file, 'utf8')) as NodeJS.MemoryUsage;
    },
    close: () => rmSync(folder, { recursive: true, force: true }),
  };
}
