import type { Page } from '@playwright/test';
import { BoardPage } from './support/boardPage.ts';
import { SAMPLE } from './support/sampleSeason.ts';
import { expect, test } from './support/test.ts';

const ground = (page: Page) =>
  page.evaluate(() => getComputedStyle(document.documentElement).backgroundColor);

/** Lightness of an rgb() colour, 0 to 255. */
const lightness = (colour: string) => {
  const [red = 0, green = 0, blue = 0] = (colour.match(/\d+/g) ?? []).map(Number);
  return (red + green + blue) / 3;
};

test('a chosen theme stands from the first paint on', async ({ board: page, brewery }) => {
  await page.emulateMedia({ colorScheme: 'light' });
  await brewery.write(SAMPLE);
  await page.goto(`/b/${brewery.slug}/account`);
  const saved = page.waitForResponse((answer) => answer.url().endsWith('/api/account'));
  await page.getByRole('radio', { name: 'Dark' }).click();
  expect((await saved).status()).toBe(200);
  await expect.poll(async () => lightness(await ground(page))).toBeLessThan(80);

  // Each ground that the page has from its first frame on: none of them is light.
  await page.addInitScript(() => {
    const seen = new Set<string>();
    Object.assign(window, { seenGrounds: seen });
    const look = () => {
      if (document.body) seen.add(getComputedStyle(document.documentElement).backgroundColor);
      requestAnimationFrame(look);
    };
    requestAnimationFrame(look);
  });
  await page.goto(`/b/${brewery.slug}`);
  await expect(page.locator('[data-batch]').first()).toBeVisible();
  const seen = await page.evaluate(() => {
    const grounds: unknown = Reflect.get(window, 'seenGrounds');
    return grounds instanceof Set ? [...grounds].map(String) : [];
  });
  expect(seen.length).toBeGreaterThan(0);
  for (const colour of seen) expect(lightness(colour), colour).toBeLessThan(80);
});

test('on paper the board is its shelves: no buttons, no panel, nothing cut off', async ({
  board: page,
  brewery,
}) => {
  await brewery.write(SAMPLE);
  const board = new BoardPage(page);
  await board.open(brewery.slug);
  await page.emulateMedia({ media: 'print' });
  await expect(board.batch('Creek Blonde')).toBeVisible();
  await expect(board.link('Gull Wheat', 'Long Night')).toBeVisible();
  await expect(page.getByRole('complementary')).toBeHidden();
  // No bar of the product: the season's name is the first word on the paper.
  await expect(page.getByRole('banner')).toBeHidden();
  await expect(page.getByRole('navigation')).toHaveCount(0);
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
  for (const name of ['New batch', 'New shelf', 'Lift Ebb Pale', 'More for Ebb Pale'])
    await expect(page.getByRole('button', { name, exact: true })).toHaveCount(0);
  for (const shelf of ['Clean ale', 'House ale']) {
    const run = board.shelf(shelf).locator('.shelf-run');
    const cutOff = await run.evaluate((node) =>
      getComputedStyle(node).overflowX === 'visible' ? 0 : node.scrollWidth - node.clientWidth,
    );
    expect(cutOff, `of ${shelf}, in pixels`).toBeLessThanOrEqual(0);
  }
  const paper = await page.pdf({ format: 'A4', landscape: true });
  const pages = paper.toString('latin1').match(/\/Type\s*\/Page\b/g) ?? [];
  expect(pages.length).toBeGreaterThan(0);
  expect(pages.length, 'pages for two shelves and a bench').toBeLessThanOrEqual(2);
});
