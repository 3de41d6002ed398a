import { BoardPage } from './support/boardPage.ts';
import { press, tabTo, typeInto } from './support/keys.ts';
import { DOZEN } from './support/season.ts';
import { expect, test } from './support/test.ts';

test('a newcomer signs up, names a yeast, writes beers down and puts them on the shelf by keys alone', async ({
  page,
}) => {
  test.slow();
  const board = new BoardPage(page);
  await page.goto('/sign-up');
  await typeInto(page, page.getByLabel('Your name'), 'Orla Finch');
  await typeInto(page, page.getByLabel('E-mail'), `orla-${Date.now()}@reedbed.example`);
  await typeInto(page, page.getByLabel('Password', { exact: true }), 'reeds in the wind');
  await page.keyboard.press('Enter');
  await typeInto(page, page.getByLabel('Strain'), 'Harbour ale');
  await page.keyboard.press('Enter');
  await expect(board.shelf('Harbour ale')).toBeVisible();

  const form = page.getByRole('dialog', { name: 'New batch' });
  const newBatch = page.getByRole('button', { name: 'New batch' });
  for (const beer of DOZEN.slice(0, 3)) {
    await press(page, newBatch);
    const field = (label: string) => form.getByLabel(label, { exact: true });
    await typeInto(page, field('Name'), beer.name);
    if (beer.volume) await typeInto(page, field('Volume'), beer.volume);
    await typeInto(page, field('Bitterness'), beer.ibu);
    await typeInto(page, field('Original gravity'), beer.og);
    await typeInto(page, field('Colour'), beer.srm);
    await page.keyboard.press('Enter');
    await expect(form).toBeHidden();
    await expect(newBatch, 'the focus is back where the form was opened').toBeFocused();
  }

  await tabTo(page, board.handle('Creek Blonde'));
  await page.keyboard.press('Space');
  await expect(board.words).toContainText('Lifted Creek Blonde, on the bench. Best gap:');
  await page.keyboard.press('Home');
  await expect(board.words).toContainText('Best gap. Harbour ale, place 1 of 1. Pour');
  await page.keyboard.press('Enter');
  await expect(board.words).toContainText('Creek Blonde put down on Harbour ale, place 1 of 1.');
  await expect(board.namesOn('Harbour ale')).toHaveText(['Creek Blonde']);
  await expect(board.handle('Creek Blonde')).toBeFocused();

  await tabTo(page, board.handle('Ebb Pale'));
  await page.keyboard.press('Enter');
  await page.keyboard.press('ArrowUp');
  await expect(board.words).toContainText('place 2 of 2, after Creek Blonde. Pour');
  await page.keyboard.press('Space');
  await expect(board.namesOn('Harbour ale')).toHaveText(['Creek Blonde', 'Ebb Pale']);
  await expect(board.handle('Ebb Pale')).toBeFocused();
});

const SHELVES = {
  shelves: [
    {
      name: 'Clean ale',
      batches: [
        { name: 'Creek Blonde', og: 1.044, fg: 1.011, srm: 4, ibu: 20, brewOn: '2027-03-06' },
        { name: 'Long Night', og: 1.095, fg: 1.024, srm: 42, ibu: 60, brewOn: '2027-03-20' },
        { name: 'Ebb Pale', og: 1.052, fg: 1.013, srm: 7, ibu: 38, brewOn: '2027-04-03' },
      ],
    },
    {
      name: 'House ale',
      batches: [
        { name: 'Reed Bitter', og: 1.046, fg: 1.012, srm: 10, ibu: 32, brewOn: '2027-03-07' },
        { name: 'Lantern Stout', og: 1.06, fg: 1.015, srm: 35, ibu: 42, brewOn: '2027-03-21' },
      ],
    },
  ],
  bench: [{ name: 'Kelp Rye', og: 1.056, fg: 1.014, srm: 12, ibu: 34 }],
};

test('keys mend a Hold, from shelf to shelf, and take it back and do it again', async ({
  board: page,
  brewery,
}) => {
  await brewery.write(SHELVES);
  const board = new BoardPage(page);
  await board.open(brewery.slug);
  await expect(page.getByText('one link on hold')).toBeVisible();

  await test.step('a batch that is lifted and put back stays where it was', async () => {
    await tabTo(page, board.handle('Long Night'));
    await page.keyboard.press('Space');
    await expect(board.words).toContainText('Lifted Long Night, on Clean ale, place 2 of 3.');
    await page.keyboard.press('ArrowRight');
    await expect(board.words).toContainText('Clean ale, place 3 of 3, after Ebb Pale.');
    await page.keyboard.press('Escape');
    await expect(board.words).toHaveText('Long Night put back on Clean ale, place 2 of 3.');
    await expect(board.handle('Long Night')).toBeFocused();
    await expect(board.namesOn('Clean ale')).toHaveText(['Creek Blonde', 'Long Night', 'Ebb Pale']);
  });

  await test.step('arrows walk over the end of a shelf to the next one', async () => {
    await page.keyboard.press('Space');
    await page.keyboard.press('ArrowRight');
    await page.keyboard.press('ArrowRight');
    await expect(board.words).toContainText('House ale, place 1 of 3. Hold');
    await page.keyboard.press('ArrowRight');
    await expect(board.words).toContainText('House ale, place 2 of 3, after Reed Bitter. Hold');
    await page.keyboard.press('ArrowRight');
    await expect(board.words).toContainText('House ale, place 3 of 3, after Lantern Stout. Pour');
    await expect(board.gapAfter('Lantern Stout')).toBeInViewport();
    await page.keyboard.press('Enter');
    await expect(board.words).toContainText('Long Night put down on House ale, place 3 of 3. Pour');
    await expect(board.handle('Long Night')).toBeFocused();
  });
  await expect(board.namesOn('Clean ale')).toHaveText(['Creek Blonde', 'Ebb Pale']);
  await expect(board.link('Ebb Pale', 'Creek Blonde')).toContainText('Pour');
  await expect(board.link('Long Night', 'Lantern Stout')).toContainText('Pour');
  await expect(page.getByText('no link on hold')).toBeVisible();

  await test.step('undo and redo', async () => {
    await page.keyboard.press('Control+z');
    await expect(board.words).toContainText('Undone: ');
    await expect(board.namesOn('Clean ale')).toHaveText(['Creek Blonde', 'Long Night', 'Ebb Pale']);
    await expect(board.handle('Long Night')).toBeFocused();
    await page.keyboard.press('Control+Shift+z');
    await expect(board.words).toContainText('Done again: ');
    await expect(board.namesOn('House ale')).toHaveText([
      'Reed Bitter',
      'Lantern Stout',
      'Long Night',
    ]);
  });
});

test('the list of places and the panel of a link are reached and left by keys', async ({
  board: page,
  brewery,
}) => {
  await brewery.write(SHELVES);
  const board = new BoardPage(page);
  await board.open(brewery.slug);

  const menu = page.getByRole('button', { name: 'Move Kelp Rye', exact: true });
  await press(page, menu);
  const places = page.getByRole('dialog', { name: 'Where Kelp Rye can go' });
  await expect(places).toBeVisible();
  await page.keyboard.press('Escape');
  await expect(places).toBeHidden();
  await expect(menu).toBeFocused();

  const link = board.link('Ebb Pale', 'Long Night');
  await press(page, link);
  const panel = page.getByRole('region', { name: 'Ebb Pale onto Long Night' });
  await expect(panel).toBeFocused();
  await page.keyboard.press('Escape');
  await expect(panel).toBeHidden();
  await expect(link).toBeFocused();

  await press(page, menu);
  await press(page, places.getByRole('button', { name: /^Put here: / }).first());
  await expect(places).toBeHidden();
  await expect(board.handle('Kelp Rye')).toBeFocused();
  await expect(board.bench.locator('[data-batch]')).toHaveCount(0);
});
