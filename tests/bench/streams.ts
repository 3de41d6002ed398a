import { setTimeout as pause } from 'node:timers/promises';
import { atWork, type AtWork } from './support/atWork.ts';
import { cookieOf } from './support/cookie.ts';
import { hopOver, hops } from './support/hops.ts';
import { latencyRow } from './support/latencyRow.ts';
import { openListener, type Listener } from './support/listeners.ts';
import { signInBrewers } from './support/movers.ts';
import { openMemoryProbe, type MemoryProbe } from './support/serverMemory.ts';
import type { Part, Row } from './row.ts';

const SIZE = { chains: 12, perChain: 8, bench: 4, seed: 2 };
/** Open before anything is measured, so that what the first streams load is not taken for theirs. */
const BEFORE = 10;
const STREAMS = 200;
const MOVES = 40;
const MOST_MS = 250;
const MOST_KB = 100;

/** Two hundred people with the board open, and one who moves. */
export const streams: Part = {
  name: 'streams',
  async run() {
    const probe = openMemoryProbe();
    try {
      return await atWork(SIZE, (at) => manyStreams(at, probe), probe.settings);
    } finally {
      probe.close();
    }
  },
};

async function manyStreams(at: AtWork, probe: MemoryProbe): Promise<Row[]> {
  const cookies = await signInBrewers(at, BEFORE + STREAMS);
  const hop = await hops(at);
  const head = cookieOf(at, at.brewery.members['head-brewer'].token);
  for (let turn = 0; turn < 10; turn += 1) await hopOver(at, head, hop(turn));
  const listeners: Listener[] = [];
  const come = async (guests: readonly string[]) => {
    for (const cookie of guests) listeners.push(await openListener(at, cookie));
    // Until everybody was told who is here, which is the most that a stream has to carry.
    await pause(3_000);
  };
  await come(cookies.slice(0, BEFORE));
  const before = await probe.look(at.pid);
  await come(cookies.slice(BEFORE));
  const after = await probe.look(at.pid);
  const times: number[] = [];
  for (let turn = 0; turn < MOVES; turn += 1) {
    const start = performance.now();
    const revision = await hopOver(at, head, hop(turn));
    await pause(MOST_MS * 2);
    for (const { heard } of listeners) times.push((heard.get(revision) ?? Infinity) - start);
  }
  for (const { close } of listeners) close();
  const what = `a move, from its sending until each of ${listeners.length} streams heard of it`;
  return [memoryRow(before, after), latencyRow(what, times, MOST_MS)];
}

function memoryRow(before: NodeJS.MemoryUsage, after: NodeJS.MemoryUsage): Row {
  const each = (of: 'rss' | 'heapUsed') => (after[of] - before[of]) / STREAMS / 1000;
  return {
    what: `${STREAMS} open streams on one process: what it holds more, for each`,
    reach: `≤ ${MOST_KB} kB`,
    measured: `${each('rss').toFixed(0)} kB resident, ${each('heapUsed').toFixed(0)} kB in the heap`,
    holds: each('rss') <= MOST_KB && each('heapUsed') <= MOST_KB,
  };
}
