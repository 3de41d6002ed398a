import { expectAccessible } from './support/axe.ts';
import { tooWide } from './support/overlaps.ts';
import { SAMPLE } from './support/sampleSeason.ts';
import { expect, test } from './support/test.ts';

test('the pages for the printer are read on a phone too', async ({ board, brewery }) => {
  const { batches, chains } = await brewery.write(SAMPLE);
  await board.goto(`/b/${brewery.slug}`);
  await board.getByRole('link', { name: 'Print the season' }).tap();
  for (const address of [
    'season',
    `chains/${chains['Clean ale']}`,
    `brew-sheets/${batches['Ebb Pale']}`,
  ]) {
    await board.goto(`/b/${brewery.slug}/print/${address}`);
    await expect(board.getByRole('article').getByRole('heading', { level: 1 })).toBeVisible();
    expect(await tooWide(board)).toBeLessThanOrEqual(0);
    await expectAccessible(board);
  }
});
