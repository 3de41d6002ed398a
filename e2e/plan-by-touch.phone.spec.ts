import { BoardPage } from './support/boardPage.ts';
import { expect, MOVING, test } from './support/test.ts';
import { Finger } from './support/touch.ts';

test.use(MOVING);

const SEASON = {
  shelves: [
    {
      name: 'Clean ale',
      batches: [
        { name: 'Creek Blonde', og: 1.044, fg: 1.011, srm: 4, ibu: 20, brewOn: '2027-03-06' },
        { name: 'Long Night', og: 1.095, fg: 1.024, srm: 42, ibu: 60, brewOn: '2027-03-20' },
        { name: 'Ebb Pale', og: 1.052, fg: 1.013, srm: 7, ibu: 38, brewOn: '2027-04-03' },
        { name: 'Kelp Rye', og: 1.056, fg: 1.014, srm: 12, ibu: 40, brewOn: '2027-04-17' },
        { name: 'Jetty Amber', og: 1.058, fg: 1.014, srm: 15, ibu: 40, brewOn: '2027-05-01' },
      ],
    },
  ],
};

test('a shelf is put in order with the move buttons', async ({ board: page, brewery }) => {
  await brewery.write(SEASON);
  const board = new BoardPage(page);
  await board.open(brewery.slug);
  const names = page.locator('[data-batch] h2');
  await expect(board.link('Ebb Pale', 'Long Night')).toContainText('Hold');

  await page.getByRole('button', { name: 'Move Long Night later', exact: true }).tap();
  await expect(names).toHaveText([
    'Creek Blonde',
    'Ebb Pale',
    'Long Night',
    'Kelp Rye',
    'Jetty Amber',
  ]);
  await expect(board.link('Ebb Pale', 'Creek Blonde')).toContainText('Pour');
  await expect(board.link('Kelp Rye', 'Long Night')).toContainText('Hold');
  await expect(
    page.getByRole('button', { name: /^Move Creek Blonde earlier: not possible/ }),
  ).toHaveAttribute('aria-disabled', 'true');
  await page.getByRole('button', { name: 'Undo', exact: true }).tap();
  await expect(names.nth(1)).toHaveText('Long Night');
});

test('a batch goes from the bench to its best place by the Move menu', async ({
  board: page,
  brewery,
}) => {
  await brewery.write({
    shelves: [
      {
        name: 'Clean ale',
        batches: [
          { name: 'Creek Blonde', brewOn: '2027-03-06' },
          { name: 'Jetty Amber', og: 1.052, fg: 1.013, srm: 15, ibu: 34, brewOn: '2027-03-20' },
        ],
      },
    ],
    bench: [{ name: 'Samphire Brown', og: 1.056, fg: 1.014, srm: 22, ibu: 30 }],
  });
  const board = new BoardPage(page);
  await board.open(brewery.slug);
  await page.getByRole('button', { name: 'Bench, 1' }).tap();
  await page.getByRole('button', { name: 'Move Samphire Brown', exact: true }).tap();
  const places = page.getByRole('dialog', { name: 'Where Samphire Brown can go' });
  await expect(places.getByText('Best gap')).toBeVisible();
  await places.getByRole('button', { name: /after Jetty Amber$/ }).tap();
  await expect(places).toBeHidden();
  await page.getByRole('button', { name: 'Clean ale' }).tap();
  await expect(board.link('Samphire Brown', 'Jetty Amber')).toContainText('Pour');
});

test('a finger on the handle drags and mends a Hold; anywhere else it scrolls', async ({
  board: page,
  brewery,
}) => {
  await brewery.write(SEASON);
  const board = new BoardPage(page);
  await board.open(brewery.slug);
  const finger = await Finger.on(page);
  const scrolled = () => page.evaluate(() => window.scrollY);

  await test.step('on a name it scrolls and lifts nothing', async () => {
    await finger.down(board.batch('Ebb Pale').getByRole('heading'));
    await finger.moveBy(0, -160);
    await finger.up();
    await expect.poll(scrolled).toBeGreaterThan(60);
    await expect(board.words).toHaveText('');
    await expect(page.locator('[data-in-hand]')).toHaveCount(0);
  });

  await test.step('by the handle it carries', async () => {
    const handle = board.handle('Long Night');
    await finger.down(handle);
    const before = await scrolled();
    await finger.moveBy(-10, 14);
    await expect(board.words).toContainText('Lifted Long Night, on Clean ale, place 2 of 5.');
    await finger.moveBy(-60, 60);
    await expect(board.gapAfter('Ebb Pale')).toHaveAttribute('data-gap-open', /./);
    expect(await scrolled(), 'the page stays under a carried batch').toBe(before);
    await finger.moveOver(board.gapAfter('Ebb Pale'));
    await expect(board.words).toContainText(/Clean ale, place 3 of 5, after Ebb Pale. Hold/);
    await finger.moveOver(board.gapAfter('Creek Blonde'));
    await finger.up();
  });
  await expect(board.words).toContainText('Long Night put back on Clean ale, place 2 of 5.');

  await test.step('to the end of the shelf, which the page scrolls to', async () => {
    await finger.down(board.handle('Long Night'));
    await finger.moveBy(-10, 14);
    const foot = page.viewportSize()?.height ?? 0;
    const from = await board.handle('Long Night').boundingBox();
    await finger.moveBy(-120, foot - 60 - (from?.y ?? 0));
    await expect(board.gapAfter('Jetty Amber')).toBeInViewport({ ratio: 1 });
    await finger.restOver(board.gapAfter('Jetty Amber'));
    await expect(board.words).toContainText('place 5 of 5, after Jetty Amber. Pour');
    await finger.up();
  });
  await expect(board.words).toContainText('Long Night put down on Clean ale, place 5 of 5.');
  await expect(board.link('Ebb Pale', 'Creek Blonde')).toContainText('Pour');
  await expect(board.link('Long Night', 'Jetty Amber')).toContainText('Pour');
});
