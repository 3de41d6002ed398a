import type { Browser } from '@playwright/test';
import { atWork, type AtWork } from './support/atWork.ts';
import { openBoard, openBrowser } from './support/boardPage.ts';
import { carry, putDown } from './support/carry.ts';
import { percentile } from './support/percentile.ts';
import { CATEGORIES, readTrace, type Timeline } from './support/trace.ts';
import { countVessels, vesselRenders } from '../../e2e/support/vesselRenders.ts';
import type { Part, Row } from './row.ts';

const SIZE = { chains: 25, perChain: 8, bench: 0, seed: 3 };
const PAGES = 2;
const DRAGS = 2;
const WHAT = 'dragging over 200 batches on 25 shelves, from lift to the saved drop';

/** A batch carried over a large season's board in a browser: the built pages and a real server. */
export const drag: Part = {
  name: 'drag',
  run: () =>
    atWork(SIZE, async (at) => {
      const browser = await openBrowser();
      try {
        const traces: Timeline[] = [];
        for (let page = 0; page < PAGES; page += 1)
          traces.push(...(await tracedDrags(browser, at)));
        return [...timeRows(traces), vesselRow(await countedDrag(browser, at))];
      } finally {
        await browser.close();
      }
    }),
};

/** Drags on a freshly opened page, the first one before anything is warm. */
async function tracedDrags(browser: Browser, at: AtWork): Promise<Timeline[]> {
  const page = await openBoard(browser, at);
  const traces: Timeline[] = [];
  for (let nth = 0; nth < DRAGS; nth += 1) {
    await browser.startTracing(page, { categories: CATEGORIES });
    await carry(page, nth * 3);
    await putDown(page);
    const trace = (await browser.stopTracing()).toString();
    traces.push(readTrace(trace));
  }
  await page.context().close();
  return traces;
}

/** Renders of vessels while one batch is carried, on a page of its own, since counting takes time. */
async function countedDrag(browser: Browser, at: AtWork): Promise<number> {
  const page = await openBoard(browser, at, countVessels);
  const atFirst = await vesselRenders(page);
  if (atFirst < 200) throw new Error(`the count saw ${atFirst} of 200 vessels come about`);
  await carry(page, 0);
  const carried = await vesselRenders(page);
  await putDown(page);
  await page.context().close();
  return carried;
}

function timeRows(traces: readonly Timeline[]): Row[] {
  const frame = percentile(
    traces.flatMap(({ frames }) => frames),
    0.95,
  );
  const task = Math.max(...traces.flatMap(({ tasks }) => tasks));
  return [
    {
      what: `${WHAT}: scripting and layout a frame`,
      reach: 'p95 ≤ 8 ms',
      measured: `p95 ${frame.toFixed(1)} ms`,
      holds: frame <= 8,
    },
    {
      what: `${WHAT}: longest task`,
      reach: '≤ 50 ms',
      measured: `${task.toFixed(0)} ms`,
      holds: task <= 50,
    },
  ];
}

const vesselRow = (renders: number): Row => ({
  what: `${WHAT}: renders of the vessels on the shelves while carried`,
  reach: '0',
  measured: String(renders),
  holds: renders === 0,
});
