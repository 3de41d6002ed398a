import type { Page } from '@playwright/test';
import { BoardPage } from './support/boardPage.ts';
import { carryOver, lift, putDown } from './support/drag.ts';
import { expect, MOVING, test } from './support/test.ts';

test.use(MOVING);

const SEASON = {
  shelves: [
    {
      name: 'Clean ale',
      batches: [
        { name: 'Creek Blonde', og: 1.044, fg: 1.011, srm: 4, ibu: 20, brewOn: '2027-03-06' },
        { name: 'Ebb Pale', og: 1.052, fg: 1.013, srm: 7, ibu: 38, brewOn: '2027-03-20' },
      ],
    },
    {
      name: 'House ale',
      batches: [
        { name: 'Reed Bitter', og: 1.046, fg: 1.012, srm: 10, ibu: 32, brewOn: '2027-03-07' },
      ],
    },
  ],
  bench: [{ name: 'Kelp Rye', og: 1.056, fg: 1.014, srm: 12, ibu: 34 }],
};

// The refusals that this file is about: the browser calls each an error.
test.use({ expectedErrors: /status of (409 .*\/moves\)|412 .*\/batches\/)/ });

test('whoever moves a batch that was moved meanwhile is told where it is now', async ({
  board: page,
  brewery,
  partner,
}) => {
  await brewery.write(SEASON);
  const [mine, theirs] = [new BoardPage(page), new BoardPage(partner)];
  await mine.open(brewery.slug);
  await theirs.open(brewery.slug);

  // In the hand already: nothing slips from under it, so the move is asked for all the same.
  await lift(page, mine.handle('Kelp Rye'));
  await carryOver(page, mine.gapAfter('Reed Bitter'));
  const heard = page.waitForResponse((answer) => answer.url().endsWith('/board'));
  await lift(partner, theirs.handle('Kelp Rye'));
  await carryOver(partner, theirs.gapAfter('Ebb Pale'));
  await putDown(partner);
  await expect(theirs.changes.getByRole('button', { name: 'Undo' })).toBeEnabled();
  await (await heard).finished();
  await expect(mine.namesOn('Clean ale')).toHaveText(['Creek Blonde', 'Ebb Pale']);
  await putDown(page);
  const refusal = page.getByRole('region', { name: 'Not moved' });
  await expect(refusal).toContainText('Clean ale');
  await expect(refusal).toContainText('Nothing of yours was lost');
  await expect(mine.namesOn('Clean ale')).toHaveText(['Creek Blonde', 'Ebb Pale', 'Kelp Rye']);
  await expect(mine.namesOn('House ale')).toHaveText(['Reed Bitter']);
  await expect(mine.bench.locator('[data-batch]')).toHaveCount(0);
});

test('two who move the same batch in the same moment end with one place for it', async ({
  board: page,
  brewery,
  partner,
}) => {
  await brewery.write(SEASON);
  const [mine, theirs] = [new BoardPage(page), new BoardPage(partner)];
  await mine.open(brewery.slug);
  await theirs.open(brewery.slug);
  const place = async (on: Page, after: string) => {
    await on.getByRole('button', { name: 'Move Kelp Rye', exact: true }).click();
    return on.getByRole('dialog').getByRole('button', { name: new RegExp(`after ${after}$`) });
  };
  const [here, there] = [await place(page, 'Reed Bitter'), await place(partner, 'Ebb Pale')];
  const answers = [page, partner].map((on) =>
    on.waitForResponse((answer) => answer.url().endsWith('/moves')),
  );
  await sendTogether([page, partner]);
  await Promise.all([here.click(), there.click()]);
  const statuses = (await Promise.all(answers)).map((answer) => answer.status());
  expect(statuses.toSorted(), 'one moved it, the other was refused').toEqual([200, 409]);

  const [loser, winner] = statuses[0] === 409 ? [mine, theirs] : [theirs, mine];
  const shelf = winner === mine ? 'House ale' : 'Clean ale';
  await expect(loser.page.getByRole('region', { name: 'Not moved' })).toContainText(shelf);
  for (const board of [mine, theirs]) {
    await expect(board.page.locator('[data-batch]')).toHaveCount(4);
    await expect(board.namesOn(shelf).last()).toHaveText('Kelp Rye');
  }
});

test("without a stream a partner's change appears when one comes back to the page", async ({
  board: page,
  brewery,
  partner,
}) => {
  await brewery.write(SEASON);
  // Such as a proxy that lets no stream through.
  await page.context().route(/\/events(\?|$)/, (route) => route.fulfill({ status: 204 }));
  const [mine, theirs] = [new BoardPage(page), new BoardPage(partner)];
  await mine.open(brewery.slug);
  await theirs.open(brewery.slug);
  await partner.getByRole('button', { name: 'Move Kelp Rye', exact: true }).click();
  await partner.getByRole('button', { name: /^Put here: .*after Ebb Pale$/ }).click();
  await expect(theirs.changes.getByRole('button', { name: 'Undo' })).toBeEnabled();
  await expect(mine.bench.locator('[data-batch]')).toHaveCount(1);

  await page.evaluate(() => window.dispatchEvent(new Event('visibilitychange')));
  await expect(mine.namesOn('Clean ale')).toHaveText(['Creek Blonde', 'Ebb Pale', 'Kelp Rye']);
});

test('a form that both edited shows both values and keeps what only one of them touched', async ({
  board: page,
  brewery,
  partner,
}) => {
  const { batches } = await brewery.write(SEASON);
  const address = `/b/${brewery.slug}?batch=${batches['Ebb Pale']}`;
  const form = (on: Page) => on.getByRole('dialog', { name: 'Edit Ebb Pale' });
  const field = (on: Page, label: string) => form(on).getByLabel(label, { exact: true });
  const save = (on: Page) => form(on).getByRole('button', { name: 'Save', exact: true }).click();
  await page.goto(address);
  await partner.goto(address);
  await field(page, 'Bitterness').fill('44');
  await field(page, 'Style').fill('Hazy pale');
  await field(partner, 'Bitterness').fill('40');
  await field(partner, 'Colour').fill('8');

  await save(partner);
  await expect(form(partner)).toBeHidden();
  await save(page);
  // The talk below is a group too, without anything to choose in it.
  const choices = form(page)
    .getByRole('group')
    .filter({ has: page.getByRole('radio') });
  const bitterness = choices.and(page.getByRole('group', { name: 'Bitterness' }));
  await expect(bitterness.getByRole('radio')).toHaveCount(2);
  await expect(bitterness).toContainText('Mine: 44 IBU');
  await expect(bitterness).toContainText('Theirs: 40 IBU');
  await expect(choices).toHaveCount(1);
  await bitterness.getByLabel(/^Theirs/).check();
  await form(page).getByRole('button', { name: 'Save what I chose' }).click();
  await expect(form(page)).toBeHidden();

  await page.goto(address);
  await expect(field(page, 'Bitterness')).toHaveValue('40');
  await expect(field(page, 'Colour')).toHaveValue('8');
  await expect(field(page, 'Style')).toHaveValue('Hazy pale');
});

/** Holds moves back until each page has asked for one, so that none sees the other's beforehand. */
async function sendTogether(pages: readonly Page[]): Promise<void> {
  let asked = 0;
  let sendAll = () => {};
  const all = new Promise<void>((resolve) => (sendAll = resolve));
  for (const on of pages)
    await on.route(/\/moves$/, async (route) => {
      asked += 1;
      if (asked === pages.length) sendAll();
      await all;
      await route.continue();
    });
}
