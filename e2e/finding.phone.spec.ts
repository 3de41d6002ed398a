import { expectAccessible } from './support/axe.ts';
import { BoardPage } from './support/boardPage.ts';
import { findByTyping } from './support/finding.ts';
import { SAMPLE } from './support/sampleSeason.ts';
import { expect, test } from './support/test.ts';

test('on a phone a batch is found on whichever shelf, and the board is filtered', async ({
  board,
  brewery,
}) => {
  await brewery.write(SAMPLE);
  await new BoardPage(board).open(brewery.slug);
  await board.getByRole('button', { name: 'Find' }).tap();
  await findByTyping(board, 'Lantern');
  await expect(board.getByRole('button', { name: 'Lantern Stout', exact: true })).toBeFocused();
  await expect(board.getByRole('list', { name: 'Batches on House ale' })).toBeVisible();

  await board.getByRole('button', { name: 'Find' }).tap();
  await board.getByRole('dialog', { name: 'Find' }).getByRole('combobox').fill('kelp');
  await board.getByRole('option', { name: /Kelp Rye/ }).tap();
  await expect(board.getByRole('heading', { name: 'On the bench' })).toBeVisible();

  await board.getByRole('button', { name: 'Filter' }).tap();
  const filter = board.getByRole('region', { name: 'Filter' });
  await filter.getByLabel('Yeast').selectOption({ label: 'Yeast of House ale' });
  await expect(filter.getByRole('status')).toContainText('3 of 9 batches, on 1 of 2 shelves');
  await expectAccessible(board);
  await filter.getByRole('button', { name: 'Show all again' }).tap();
  await expect(filter.getByRole('status')).toHaveText('All 9 batches are shown.');
});
