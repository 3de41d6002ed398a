import type { Page } from '@playwright/test';

interface Point {
  x: number;
  y: number;
}

const STEP_MS = 16;
const STOPS = 12;
const FEWEST = 8;

/**
 * One drag as a hand does it: lift the batch, a dozen times from one open gap in sight to the next,
 * stay over the last one.
 */
export async function carry(page: Page, nth: number): Promise<void> {
  const from = await vesselOf(page, nth);
  await page.mouse.move(from.x, from.y);
  await page.mouse.down();
  await glide(page, from, { x: from.x + 60, y: from.y + 20 }, 6);
  await page.waitForSelector('[data-gap-open]');
  await page.waitForTimeout(600);
  let at: Point = { x: from.x + 60, y: from.y + 20 };
  for (const gap of await gapsInSight(page)) {
    await glide(page, at, gap, 10);
    at = gap;
  }
}

/** Puts down what is carried and waits until the server has answered and the board is read anew. */
export async function putDown(page: Page): Promise<void> {
  const answered = page.waitForResponse((response) => response.url().endsWith('/moves'));
  await page.mouse.up();
  await answered;
  await page.waitForTimeout(1000);
}

async function glide(page: Page, from: Point, to: Point, steps: number): Promise<void> {
  for (let step = 1; step <= steps; step += 1) {
    const share = step / steps;
    await page.mouse.move(from.x + (to.x - from.x) * share, from.y + (to.y - from.y) * share);
    await page.waitForTimeout(STEP_MS);
  }
}

/** The middle of a vessel in sight, the nth of those that lie free of the page's edges. */
async function vesselOf(page: Page, nth: number): Promise<Point> {
  const points = await page.locator('[data-chain] [data-batch]').evaluateAll((nodes) =>
    nodes.map((node) => {
      const { x, y } = node.getBoundingClientRect();
      return { x: x + 35, y: y + 90 };
    }),
  );
  const point = points.filter(({ x, y }) => x > 300 && x < 900 && y > 80 && y < 700)[nth];
  if (!point) throw new Error('there is no batch in sight to lift');
  return point;
}

/** A dozen stops over the open gaps that lie free of the page's edges, the first again after the last. */
async function gapsInSight(page: Page): Promise<Point[]> {
  const points = await page.locator('[data-chain] [data-gap-open]').evaluateAll((nodes) =>
    nodes.map((node) => {
      const { x, y, width, height } = node.getBoundingClientRect();
      return { x: x + width / 2, y: y + height / 2 };
    }),
  );
  const free = points.filter(({ x, y }) => x > 200 && x < 1000 && y > 80 && y < 790);
  if (free.length < FEWEST) throw new Error(`only ${free.length} gaps are open in sight`);
  return Array.from({ length: STOPS }, (_, at) => free[at % free.length] ?? { x: 0, y: 0 });
}
