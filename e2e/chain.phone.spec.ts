import { expectAccessible } from './support/axe.ts';
import { expect, test } from './support/test.ts';

test('on a phone the figures come first, and talk is at the foot', async ({ board, brewery }) => {
  await brewery.write({
    shelves: [
      {
        name: 'Clean ale',
        batches: [
          { name: 'Creek Blonde', brewOn: '2027-03-06' },
          { name: 'Ebb Pale', og: 1.052, fg: 1.013, srm: 7, ibu: 38, brewOn: '2027-03-20' },
        ],
      },
    ],
  });
  await board.goto(`/b/${brewery.slug}`);
  await board.getByRole('link', { name: 'Clean ale', exact: true }).tap();
  const figures = board.getByRole('heading', { name: 'In figures' });
  await expect(figures).toBeVisible();
  const [table, gravity] = await Promise.all([
    figures.boundingBox(),
    board.getByRole('heading', { name: 'Gravity', exact: true }).boundingBox(),
  ]);
  expect(table?.y).toBeLessThan(gravity?.y ?? 0);
  const wide = await board.evaluate(() => document.documentElement.scrollWidth - innerWidth);
  expect(wide, 'the page itself does not scroll sideways').toBeLessThanOrEqual(0);
  await expectAccessible(board);

  await board.getByLabel('Write to the chain').fill('From the garage');
  await board.getByRole('button', { name: 'Send' }).tap();
  await expect(board.getByRole('list', { name: 'Talk' })).toContainText('From the garage');
});
