import { expectAccessible } from './support/axe.ts';
import { BoardPage } from './support/boardPage.ts';
import { findByTyping, HUNDRED_SHELVES } from './support/finding.ts';
import { SAMPLE } from './support/sampleSeason.ts';
import { expect, test } from './support/test.ts';

const HUNDRED_MS = 20_000;

test('something is found by its name with the keys alone, on a board of a hundred shelves', async ({
  board,
  brewery,
}) => {
  // A hundred shelves take their time on a machine that does other things too.
  test.slow();
  await brewery.write(HUNDRED_SHELVES);
  await new BoardPage(board).open(brewery.slug, HUNDRED_MS);
  await board.keyboard.press('/');
  const dialog = board.getByRole('dialog', { name: 'Find' });
  await expect(dialog.getByText('301 have it; the first 40 are listed.')).toBeVisible();
  await dialog.getByRole('combobox', { name: 'Name' }).fill('of 77');
  await expect(dialog.getByText('2 names found.')).toBeVisible();
  await expectAccessible(board);
  await board.keyboard.press('ArrowDown');
  await expect(dialog.getByRole('option', { selected: true })).toContainText('Second of 77');
  await board.keyboard.press('Enter');
  const name = board.getByRole('button', { name: 'Second of 77', exact: true });
  await expect(name).toBeFocused();
  await expect(name).toBeInViewport();

  await board.keyboard.press('/');
  await findByTyping(board, 'Shelf 3');
  await expect(board.getByRole('link', { name: 'Shelf 3', exact: true })).toBeFocused();

  // From another page it leads to the board.
  await board.goto(`/b/${brewery.slug}/yeasts`);
  await expect(board.getByRole('heading', { name: 'Yeasts', level: 1 })).toBeVisible();
  await board.keyboard.press('/');
  await findByTyping(board, 'stray');
  await expect(board.getByRole('button', { name: 'Stray', exact: true })).toBeFocused();
});

test('the board is filtered, its address keeps that, and the keys clear it', async ({
  board,
  brewery,
}) => {
  // A hundred shelves take their time on a machine that does other things too.
  test.slow();
  await brewery.write(HUNDRED_SHELVES);
  const page = new BoardPage(board);
  await page.open(brewery.slug, HUNDRED_MS);
  await board.keyboard.press('f');
  const filter = board.getByRole('region', { name: 'Filter' });
  await filter.getByLabel('Yeast').selectOption({ label: 'Yeast of Shelf 50' });
  await filter.getByLabel('Stage').selectOption('Pencilled');
  const told = filter.getByRole('status');
  await expect(told).toHaveText('1 of 201 batches, on 1 of 100 shelves. The rest is pale.');
  await expect(board.locator('[data-chain]').first()).toContainText('Shelf 50');
  await expect(page.batch('Second of 50')).not.toHaveAttribute('data-pale');
  await expect(page.batch('First of 50')).toHaveAttribute('data-pale');

  // It stays through a reload, and while a batch is opened and closed.
  await page.open(`${brewery.slug}${new URL(board.url()).search}`, HUNDRED_MS);
  await expect(told).toContainText('1 of 201');
  await board.getByRole('button', { name: 'Second of 50', exact: true }).click();
  await expect(board.getByRole('dialog', { name: 'Edit Second of 50' })).toBeVisible();
  await board.keyboard.press('Escape');
  await expect(told).toContainText('1 of 201');
  await expect(board).toHaveURL(/stage=pencilled/);

  await page.open(`${brewery.slug}?stage=racked`);
  await expect(told).toContainText('100 of 201 batches, on 100 of 100 shelves');
  await board.keyboard.press('x');
  await expect(filter).toBeHidden();
  await expect(board).not.toHaveURL(/stage/);
  await expect(board.locator('[data-pale]')).toHaveCount(0);
});

test('what the filter passes over takes a batch as ever', async ({ board, brewery }) => {
  await brewery.write(SAMPLE);
  const page = new BoardPage(board);
  await page.open(`${brewery.slug}?verdict=hold`);
  await expect(page.batch('Reed Bitter')).toHaveAttribute('data-pale');
  await expectAccessible(board);
  await page.handle('Kelp Rye').press('Enter');
  await board.keyboard.press('Home');
  await board.keyboard.press('Enter');
  await expect(page.bench.getByRole('button', { name: 'Kelp Rye', exact: true })).toHaveCount(0);
});

test('each key does what the list of keys says, none of them while typing, and all can be off', async ({
  board,
  brewery,
}) => {
  await brewery.write(SAMPLE);
  const page = new BoardPage(board);
  await page.open(brewery.slug);
  await board.keyboard.press('?');
  const keys = board.getByRole('dialog', { name: 'Keys' });
  await expect(keys.getByText('Find a batch or a shelf by its name')).toBeVisible();
  await expectAccessible(board);
  // A key of the page does nothing behind a dialog.
  await board.keyboard.press('n');
  await expect(board.getByRole('dialog')).toHaveCount(1);
  await board.keyboard.press('Escape');
  await expect(keys).toBeHidden();

  await board.keyboard.press('n');
  const form = board.getByRole('dialog', { name: 'New batch' });
  const name = form.getByLabel('Name', { exact: true });
  await name.pressSequentially('bnsfx/?r');
  await expect(name).toHaveValue('bnsfx/?r');
  await expect(board.getByRole('dialog')).toHaveCount(1);
  await board.keyboard.press('Escape');
  await board.getByRole('button', { name: 'Leave without saving' }).click();
  await expect(board.getByRole('dialog')).toHaveCount(0);
  await board.keyboard.press('s');
  await expect(board.getByRole('dialog', { name: 'New shelf' })).toBeVisible();
  await board.keyboard.press('Escape');
  await expect(board.getByRole('dialog')).toHaveCount(0);
  await board.keyboard.press('r');
  await expect(board).toHaveURL(/\/record$/);
  await expect(board.getByRole('heading', { name: 'Record', level: 1 })).toBeVisible();
  await board.keyboard.press('b');
  await expect(board).toHaveURL(new RegExp(`/b/${brewery.slug}$`));

  await board.getByRole('button', { name: /^Account of/ }).click();
  await board.getByRole('menuitem', { name: 'Keys' }).click();
  await keys.getByLabel('Single keys do something, on this device').uncheck();
  await board.keyboard.press('Escape');
  await expect(keys).toBeHidden();
  await board.reload();
  await expect(page.batch('Ebb Pale')).toBeVisible();
  for (const key of ['n', '/', '?', 'f']) await board.keyboard.press(key);
  // What the keys would have opened stands there by the time that a part loaded after them does.
  await board.getByRole('button', { name: /^Account of/ }).click();
  await board.getByRole('menuitem', { name: 'Keys' }).click();
  await expect(keys).toBeVisible();
  await expect(board.getByRole('dialog')).toHaveCount(1);
  await expect(board.getByRole('region', { name: 'Filter' })).toHaveCount(0);
});
