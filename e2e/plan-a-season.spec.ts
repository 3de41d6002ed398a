import { typeBeer } from './support/batchForm.ts';
import { BoardPage } from './support/boardPage.ts';
import { carryOver, lift, putDown } from './support/drag.ts';
import { DOZEN } from './support/season.ts';
import { expect, MOVING, test } from './support/test.ts';

test.use(MOVING);

test('a newcomer signs up, writes a dozen beers down, drags them onto shelves and mends a Hold', async ({
  page,
}) => {
  test.slow();
  const board = new BoardPage(page);
  await page.goto('/');
  await page.getByRole('link', { name: 'Start a brewery' }).first().click();
  await page.getByLabel('Your name').fill('Orla Finch');
  await page.getByLabel('E-mail').fill(`orla-${Date.now()}@reedbed.example`);
  await page.getByLabel('Password', { exact: true }).fill('reeds in the wind');
  await page.getByRole('button', { name: 'Start a brewery' }).click();

  await expect(page.getByRole('heading', { name: 'The shelf is empty.' })).toBeVisible();
  await page.getByLabel('Strain').fill('Harbour ale');
  await page.getByRole('button', { name: 'Put on shelf' }).click();
  await expect(board.shelf('Harbour ale')).toBeVisible();

  for (const beer of DOZEN) {
    await page.getByRole('button', { name: 'New batch' }).click();
    await typeBeer(page, beer);
  }
  await expect(board.bench.locator('[data-batch]')).toHaveCount(12);

  await test.step('each verdict is read before the drop', async () => {
    await lift(page, board.handle('Creek Blonde'));
    await carryOver(page, board.firstGap('Harbour ale'));
    await expect(board.words).toContainText('Harbour ale, place 1 of 1. Pour');
    await putDown(page);
    await expect(board.namesOn('Harbour ale')).toHaveText(['Creek Blonde']);

    await lift(page, board.handle('Ebb Pale'));
    await carryOver(page, board.gapAfter('Creek Blonde'));
    await expect(board.gapAfter('Creek Blonde')).toContainText('Best gap');
    await expect(board.words).toContainText('place 2 of 2, after Creek Blonde. Pour');
    await putDown(page);
    await expect(board.link('Ebb Pale', 'Creek Blonde')).toContainText('Pour');

    await lift(page, board.handle('Long Night'));
    await carryOver(page, board.firstGap('Harbour ale'));
    await expect(board.firstGap('Harbour ale')).toContainText(/Hold \d/);
    await expect(board.words).toContainText(/place 1 of 3. Hold \d/);
    await carryOver(page, board.gapAfter('Creek Blonde'));
    await expect(board.gapAfter('Creek Blonde')).toContainText(/Hold \d/);
    await putDown(page);
    await expect(board.namesOn('Harbour ale')).toHaveText([
      'Creek Blonde',
      'Long Night',
      'Ebb Pale',
    ]);
  });

  await test.step('the move that helps mends the Hold', async () => {
    await expect(board.link('Ebb Pale', 'Long Night')).toContainText('Hold');
    await expect(board.changes).toContainText('Long Night moved');
    await expect(board.changes).toContainText('Tired cake. Long Night was brewed at 1.095');
    await expect(page.getByText('one link on hold')).toBeVisible();
    await page.getByRole('button', { name: 'Move it' }).click();
    await expect(page.getByText('no link on hold')).toBeVisible();
    await expect(board.changes.locator('[data-verdict="hold"]')).toHaveCount(0);
  });

  await test.step('a second shelf is begun by a drop', async () => {
    await lift(page, board.handle('Gull Wheat'));
    await carryOver(page, board.newShelf);
    await expect(board.words).toContainText('A new shelf. Pour');
    await putDown(page);
    await page.getByRole('button', { name: 'Make the shelf' }).click();
    await expect(board.namesOn('Harbour ale 2')).toHaveText(['Gull Wheat']);
    for (const [name, after] of [
      ['Reed Bitter', 'Gull Wheat'],
      ['Kelp Rye', 'Reed Bitter'],
      ['Mudlark Porter', 'Kelp Rye'],
    ] as const) {
      await lift(page, board.handle(name));
      await carryOver(page, board.gapAfter(after));
      await expect(board.gapAfter(after)).toContainText('Pour');
      await putDown(page);
      await expect(board.link(name, after)).toContainText('Pour');
    }
  });

  await page.reload();
  await expect(board.namesOn('Harbour ale 2')).toHaveText([
    'Gull Wheat',
    'Reed Bitter',
    'Kelp Rye',
    'Mudlark Porter',
  ]);
  await expect(board.bench.locator('[data-batch]')).toHaveCount(5);
  await expect(page.getByText('7 batches on 2 cakes')).toBeVisible();
});
