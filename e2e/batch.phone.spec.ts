import { expectAccessible } from './support/axe.ts';
import { BREWED, fill } from './support/batchPage.ts';
import { expect, test } from './support/test.ts';

test('on a phone a reading and a cake check fit under the thumb', async ({ board, brewery }) => {
  const { batches } = await brewery.write(BREWED);
  await board.goto(`/b/${brewery.slug}/batches/${batches['Ebb Pale'] ?? ''}`);
  await expect(board.getByRole('heading', { level: 1, name: 'Ebb Pale' })).toBeVisible();
  await board.getByRole('button', { name: 'Log a reading' }).tap();
  await fill(board, { 'Gravity, as shown': '1,012' });
  await board.getByRole('button', { name: 'Write it down' }).tap();
  await expect(board.getByRole('region', { name: 'Readings' })).toContainText('1.012');
  const wide = await board.evaluate(() => document.documentElement.scrollWidth - innerWidth);
  expect(wide, 'the page does not scroll sideways').toBeLessThanOrEqual(0);
  await expectAccessible(board);

  const panel = board.getByRole('complementary', { name: 'Racking and cake check' });
  await panel.getByText('Off', { exact: true }).tap();
  await panel.getByText('Vinegar', { exact: true }).first().tap();
  await panel.getByText('Vessel', { exact: true }).tap();
  await panel.getByLabel('Vessel with the cake').fill('3,4');
  await panel.getByLabel('Vessel empty').fill('2,1');
  await panel.getByText('Unfit', { exact: true }).tap();
  await panel.getByRole('button', { name: 'Save the check' }).tap();
  await expect(panel.getByText('1.3 kg')).toBeVisible();
  await expect(panel.getByText('off: Vinegar')).toBeVisible();
});
