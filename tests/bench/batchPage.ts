import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import type { Browser } from '@playwright/test';
import { renewFollowed } from '../../server/routes/batch-record/followed.ts';
import { batch, chain } from '../../server/db/schema/chain.ts';
import { reading } from '../../server/db/schema/readings.ts';
import { sessionCookies } from '../../e2e/support/server.ts';
import { atWork, type AtWork } from './support/atWork.ts';
import { openBrowser } from './support/boardPage.ts';
import type { Part, Row } from './row.ts';

const SIZE = { chains: 1, perChain: 4, bench: 0, seed: 4 };
const READINGS = 5000;
const MOST_MS = 300;
const OPENINGS = 5;
const MINUTES_APART = 5;
/** For what comes behind the readings, such as the history; the live stream never ends. */
const SETTLE_MS = 2500;

/** A batch whose fermentation a probe wrote down, opened in a fresh browser profile. */
export const batchPage: Part = {
  name: 'batch-page',
  run: () =>
    atWork(SIZE, async (at) => {
      const batchId = await followedBatch(at);
      const browser = await openBrowser();
      try {
        const took: number[] = [];
        for (let nth = 0; nth < OPENINGS; nth += 1)
          took.push(await scripting(browser, at, batchId));
        return [row(took)];
      } finally {
        await browser.close();
      }
    }),
};

function row(took: readonly number[]): Row {
  const worst = Math.max(...took);
  return {
    what: `a batch with ${READINGS} readings opened: scripting, worst of ${OPENINGS}`,
    reach: `≤ ${MOST_MS} ms`,
    measured: `${worst.toFixed(0)} ms`,
    holds: worst <= MOST_MS,
  };
}

/** A gravity and a temperature in turn, over some two weeks. */
async function followedBatch({ db, brewery }: AtWork): Promise<string> {
  const [found] = await db
    .select({ id: batch.id })
    .from(batch)
    .innerJoin(chain, eq(chain.id, batch.chainId))
    .where(eq(batch.seasonId, brewery.seasonId))
    .orderBy(batch.place)
    .limit(1);
  if (!found) throw new Error('the season has no batch');
  const start = Date.now() - READINGS * MINUTES_APART * 60_000;
  const own = { breweryId: brewery.id, batchId: found.id };
  const personId = brewery.members['head-brewer'].id;
  const rows = Array.from({ length: READINGS }, (_, nth) => ({
    ...own,
    personId,
    id: randomUUID(),
    takenAt: new Date(start + nth * MINUTES_APART * 60_000),
    ...(nth % 2 === 0 ? gravity(nth / READINGS) : warmth(nth)),
  }));
  for (let from = 0; from < READINGS; from += 1000)
    await db.insert(reading).values(rows.slice(from, from + 1000));
  await db.transaction((tx) => renewFollowed(tx, found.id));
  return found.id;
}

function gravity(done: number) {
  const value = 1.011 + 0.04 / (1 + Math.exp((done * 14 - 2.4) / 0.85));
  return { kind: 'gravity' as const, method: 'hydrometer' as const, shown: value, value };
}

function warmth(nth: number) {
  const value = 19 + Math.sin(nth / 40);
  return { kind: 'temperature' as const, shown: value, value };
}

/**
 * Milliseconds of JavaScript from a blank page to the last readings on it: the main thread's own time,
 * without what it waited for the server, which works on the same cores. Nothing asks the page
 * meanwhile, since that would count as well.
 */
async function scripting(browser: Browser, at: AtWork, batchId: string): Promise<number> {
  const context = await browser.newContext({ serviceWorkers: 'block' });
  await context.addCookies(sessionCookies(at, at.brewery.members['head-brewer'].token));
  const page = await context.newPage();
  const session = await context.newCDPSession(page);
  await session.send('Performance.enable', { timeDomain: 'threadTicks' });
  const read = page.waitForResponse((answer) =>
    answer.url().endsWith(`/batches/${batchId}/record`),
  );
  await page.goto(`${at.url}/b/${at.brewery.slug}/batches/${batchId}`);
  await (await read).finished();
  await page.waitForTimeout(SETTLE_MS);
  const { metrics } = await session.send('Performance.getMetrics');
  await page.getByText(`${READINGS} in all`).waitFor({ timeout: 1_000 });
  await context.close();
  const script = metrics.find(({ name }) => name === 'ScriptDuration');
  if (!script || script.value === 0) throw new Error('the browser measured no scripting');
  return script.value * 1000;
}
