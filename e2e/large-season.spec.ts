import { BoardPage } from './support/boardPage.ts';
import { carryOver, lift, putDown } from './support/drag.ts';
import { largeSeason } from './support/largeSeason.ts';
import { overlaps, tooWide } from './support/overlaps.ts';
import { expect, test } from './support/test.ts';
import { countVessels, vesselRenders } from './support/vesselRenders.ts';

// A trace of three hundred batches would cost more than the test.
test.use({ trace: 'off' });

test('a large season with the longest names fits every size of page', async ({
  board: page,
  brewery,
}) => {
  test.slow();
  await brewery.write(largeSeason());
  const cards = page.locator('[data-batch]');
  for (const [width, height, shown] of [
    [1440, 900, 300],
    [820, 1180, 300],
    [390, 844, 8],
  ] as const)
    await test.step(`at ${width} by ${height}`, async () => {
      await page.setViewportSize({ width, height });
      await page.goto(`/b/${brewery.slug}`);
      await expect(cards).toHaveCount(shown, { timeout: 30_000 });
      expect(await tooWide(page)).toBeLessThanOrEqual(0);
      expect(await overlaps(page)).toEqual([]);
    });

  await page.getByRole('button', { name: 'Bench, 100' }).click();
  await expect(cards).toHaveCount(100);
  expect(await tooWide(page)).toBeLessThanOrEqual(0);
  expect(await overlaps(page)).toEqual([]);
});

test('a batch is dragged over a large season, and no vessel is drawn anew for it', async ({
  board: page,
  brewery,
}) => {
  test.slow();
  await page.addInitScript(countVessels);
  const { batches } = await brewery.write(largeSeason());
  const board = new BoardPage(page);
  await board.open(brewery.slug, 20_000);
  const names = Object.keys(batches);
  const [carried = '', target = '', other = ''] = [names[200], names[0], names[9]];
  await expect(page.locator('[data-chain] [data-batch] svg[role="img"]')).toHaveCount(200);
  expect(await vesselRenders(page), 'the count sees vessels come about').toBeGreaterThanOrEqual(
    200,
  );

  await lift(page, board.handle(carried));
  await expect(board.words).toContainText('Lifted ');
  await carryOver(page, board.gapAfter(other));
  await expect(board.words).toContainText(`after ${other}`);
  await carryOver(page, board.gapAfter(target));
  await expect(board.words).toContainText(`after ${target}`);
  expect(await vesselRenders(page)).toBe(0);

  const answer = page.waitForResponse((response) => response.url().endsWith('/moves'));
  await putDown(page);
  expect((await answer).status()).toBe(200);
  await expect(board.bench.locator('[data-batch]')).toHaveCount(99);
  await expect(page.locator('[data-chain]').first().locator('[data-batch]')).toHaveCount(9);
});
