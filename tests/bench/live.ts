import { randomUUID } from 'node:crypto';
import { setTimeout as pause } from 'node:timers/promises';
import type { Page } from '@playwright/test';
import { eq } from 'drizzle-orm';
import { moved } from '#shared/api/move.ts';
import { api } from '#shared/api/urls.ts';
import { batch } from '../../server/db/schema/chain.ts';
import { atWork, type AtWork } from './support/atWork.ts';
import { openBoard, openBrowser } from './support/boardPage.ts';
import { cookieOf } from './support/cookie.ts';
import { openListener, type Listener } from './support/listeners.ts';
import { signInBrewers } from './support/movers.ts';
import { percentile } from './support/percentile.ts';
import { serverMemory } from './support/serverMemory.ts';
import type { Part, Row } from './row.ts';

const SIZE = { chains: 12, perChain: 8, bench: 4, seed: 2 };
const STREAMS = 200;
const WARM = 5;
const MOVES = 40;
const MOST_MS = 250;
const MOST_KB = 100;

/** What one does, seen by others: server, database, browsers and listeners share this machine. */
export const live: Part = {
  name: 'live',
  run: () => atWork(SIZE, async (at) => [await betweenBrowsers(at), ...(await manyStreams(at))]),
};

interface Hop {
  batchId: string;
  from: string;
  to: string;
}

/** A batch that goes back and forth between two shelves. */
async function hops({ db, brewery }: AtWork): Promise<(turn: number) => Hop> {
  const rows = await db
    .select({ id: batch.id, chainId: batch.chainId })
    .from(batch)
    .where(eq(batch.seasonId, brewery.seasonId))
    .orderBy(batch.chainId, batch.place);
  const [first] = rows;
  const other = rows.find(({ chainId }) => chainId !== null && chainId !== first?.chainId);
  const [one, two] = [first?.chainId, other?.chainId];
  if (!first || !one || !two) throw new Error('the board has no two shelves');
  return (turn) =>
    turn % 2 === 0
      ? { batchId: first.id, from: one, to: two }
      : { batchId: first.id, from: two, to: one };
}

const wishOf = ({ batchId, from, to }: Hop) => ({
  id: randomUUID(),
  batchId,
  toChainId: to,
  afterBatchId: null,
  expectedChainId: from,
  dates: 'keep' as const,
});

/** From the moment when one browser sends a move to the frame in which another has drawn it. */
async function betweenBrowsers(at: AtWork): Promise<Row> {
  const browser = await openBrowser();
  try {
    const [mover, watcher] = [await openBoard(browser, at), await openBoard(browser, at)];
    const hop = await hops(at);
    const times: number[] = [];
    for (let turn = 0; turn < WARM + MOVES; turn += 1) {
      const next = hop(turn);
      const seen = watchFor(watcher, next);
      const sent = await send(mover, api.moves(at.brewery.slug), next);
      if (turn >= WARM) times.push((await seen) - sent);
      else await seen;
      await pause(150);
    }
    return latencyRow(
      `a move of one browser, drawn in another; 100 batches, ${MOVES} moves`,
      times,
    );
  } finally {
    await browser.close();
  }
}

/** Both pages tell the time by the clock of this one machine. */
function watchFor(page: Page, { batchId, to }: Hop): Promise<number> {
  return page.evaluate(
    (place) =>
      new Promise<number>((resolve) => {
        const look = () => {
          if (document.querySelector(place)) requestAnimationFrame(() => resolve(Date.now()));
          else requestAnimationFrame(look);
        };
        look();
      }),
    `[data-chain="${to}"] [data-batch="${batchId}"]`,
  );
}

async function send(page: Page, url: string, hop: Hop): Promise<number> {
  const { sent, status } = await page.evaluate(
    async ({ address, wish }) => {
      const start = Date.now();
      const answer = await fetch(address, {
        method: 'POST',
        headers: { 'Content-Type': 'application/json' },
        body: JSON.stringify(wish),
      });
      return { sent: start, status: answer.status };
    },
    { address: url, wish: wishOf(hop) },
  );
  if (status !== 200) throw new Error(`a move was answered ${status}`);
  return sent;
}

/** Two hundred people with the board open, and one who moves. */
async function manyStreams(at: AtWork): Promise<Row[]> {
  const cookies = await signInBrewers(at, STREAMS);
  const hop = await hops(at);
  const head = cookieOf(at, at.brewery.members['head-brewer'].token);
  for (let turn = 0; turn < 10; turn += 1) await move(at, head, hop(turn));
  const before = serverMemory();
  const listeners: Listener[] = [];
  for (const cookie of cookies) listeners.push(await openListener(at, cookie));
  // Until everybody was told who is here, which is the most that a stream has to carry.
  await pause(3_000);
  const eachKb = (serverMemory() - before) / STREAMS / 1000;
  const times: number[] = [];
  for (let turn = 0; turn < MOVES; turn += 1) {
    const start = performance.now();
    const revision = await move(at, head, hop(turn));
    await pause(MOST_MS * 2);
    for (const { heard } of listeners) times.push((heard.get(revision) ?? Infinity) - start);
  }
  for (const { close } of listeners) close();
  return [
    {
      what: `${STREAMS} open streams on one process: what the process grew by, for each`,
      reach: `≤ ${MOST_KB} kB`,
      measured: `${eachKb.toFixed(0)} kB`,
      holds: eachKb <= MOST_KB,
    },
    latencyRow(`a move, from its sending until each of ${STREAMS} streams heard of it`, times),
  ];
}

async function move(at: AtWork, cookie: string, hop: Hop): Promise<number> {
  const answer = await fetch(at.url + api.moves(at.brewery.slug), {
    method: 'POST',
    headers: { cookie, origin: at.url, 'content-type': 'application/json' },
    body: JSON.stringify(wishOf(hop)),
  });
  if (answer.status !== 200) throw new Error(`a move was answered ${answer.status}`);
  return moved.parse(await answer.json()).revision;
}

function latencyRow(what: string, times: readonly number[]): Row {
  const p95 = percentile(times, 0.95);
  return {
    what,
    reach: `p95 ≤ ${MOST_MS} ms`,
    measured: `p95 ${p95.toFixed(0)} ms`,
    holds: p95 <= MOST_MS,
  };
}
