import { setTimeout as pause } from 'node:timers/promises';
import type { Page } from '@playwright/test';
import { api } from '#shared/api/urls.ts';
import { atWork, type AtWork } from './support/atWork.ts';
import { openBoard, openBrowser } from './support/boardPage.ts';
import { hops, wishOf, type Hop } from './support/hops.ts';
import { latencyRow } from './support/latencyRow.ts';
import type { Part, Row } from './row.ts';

const SIZE = { chains: 12, perChain: 8, bench: 4, seed: 2 };
const WARM = 5;
const MOVES = 40;
const MOST_MS = 250;

/** What one does, seen by another: server, database and both browsers share this machine. */
export const live: Part = {
  name: 'live',
  run: () => atWork(SIZE, async (at) => [await betweenBrowsers(at)]),
};

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
    const what = `a move of one browser, drawn in another; 100 batches, ${MOVES} moves`;
    return latencyRow(what, times, MOST_MS);
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
