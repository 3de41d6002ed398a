import type { Page } from '@playwright/test';
import { api } from '#shared/api/urls.ts';
import { expectAccessible } from './support/axe.ts';
import { BoardPage } from './support/boardPage.ts';
import { expect, test, type Brewing } from './support/test.ts';

const write = (brewery: Brewing) =>
  brewery.write({
    shelves: [
      {
        name: 'Clean ale',
        batches: [
          { name: 'Creek Blonde', stage: 'racked', brewOn: '2027-03-06', rackedOn: '2027-03-20' },
          { name: 'Ebb Pale', og: 1.052, fg: 1.013, srm: 7, ibu: 38, brewOn: '2027-03-20' },
        ],
      },
    ],
    bench: [{ name: 'Keel', ibu: 24 }],
  });

const menuOf = (page: Page, name: string) => page.getByRole('button', { name: `Season ${name}` });

async function copySeason(page: Page, name: string) {
  await menuOf(page, 'First season').click();
  await page.getByRole('menuitem', { name: 'Copy into a new season' }).click();
  const dialog = page.getByRole('dialog', { name: 'Copy First season' });
  await dialog.getByLabel('Name of the season').fill(name);
  await dialog.getByLabel('First brew day').fill('2027-09-05');
  // A Sunday was asked for; the plan has Saturdays, and both are brew days: it is as it was wished.
  await expect(dialog.getByText('The first brew day is Sun 5 September 2027')).toBeVisible();
  await dialog.getByLabel('Sunday').uncheck({ force: true });
  await expect(
    dialog.getByText(
      '1 shelf and 3 batches. The first brew day is Sat 4 September 2027, 26 weeks later. It keeps to the brew days.',
    ),
  ).toBeVisible();
  await expectAccessible(page);
  await dialog.getByRole('button', { name: 'Copy the season' }).click();
  await expect(dialog).toBeHidden();
}

test('a season is copied, shown beside the current one, and becomes it', async ({
  board,
  brewery,
  context,
}) => {
  await write(brewery);
  await board.goto(`/b/${brewery.slug}/season`);
  await copySeason(board, 'Autumn');
  await expectAccessible(board);
  const list = board.getByRole('list', { name: 'Seasons' });
  await expect(list.getByRole('listitem')).toHaveText([/First season.*Current/, /Autumn/]);

  // Two tabs, two seasons.
  await list.getByRole('link', { name: 'Autumn' }).click();
  await expect(board).toHaveURL(/\/seasons\/[0-9a-f-]{36}$/);
  const address = board.url();
  await expect(board.getByRole('heading', { level: 1 })).toHaveText('Autumn');
  await expect(board.getByText('This is not the current season.')).toBeVisible();
  await expectAccessible(board);
  const other = new BoardPage(await context.newPage());
  await other.open(brewery.slug);
  await expect(other.page.getByRole('heading', { level: 1 })).toHaveText('First season');

  // A move in one is not one in the other, and stays in the address.
  const autumn = new BoardPage(board);
  await autumn.handle('Keel').press('Enter');
  await board.keyboard.press('Home');
  await board.keyboard.press('Enter');
  await expect(autumn.namesOn('Clean ale')).toHaveCount(3);
  await expect(other.namesOn('Clean ale')).toHaveText(['Creek Blonde', 'Ebb Pale']);
  await board.getByRole('link', { name: 'Clean ale', exact: true }).click();
  await expect(board).toHaveURL(/\/seasons\/[^/]+\/chains\//);
  await expect(board.getByText('Autumn').first()).toBeVisible();
  await board.goto(`${address}/record`);
  await expect(board.getByText(/^Moved Keel/).first()).toBeVisible();

  // Who looks at the brewery's own address sees the new current season without a reload.
  await board.goto(`/b/${brewery.slug}/season`);
  await menuOf(board, 'Autumn').click();
  await board.getByRole('menuitem', { name: 'Make it the current season' }).click();
  await expect(board.getByText('Autumn is the current season.')).toBeVisible();
  await expect(other.page.getByRole('heading', { level: 1 })).toHaveText('Autumn');
  await expect(other.namesOn('Clean ale')).toHaveCount(3);
});

test.describe('an archived season', () => {
  test('asks first, is read and not changed, and comes out again', async ({ board, brewery }) => {
    const { batches } = await write(brewery);
    await board.goto(`/b/${brewery.slug}/season`);
    await copySeason(board, 'Autumn');
    await menuOf(board, 'Autumn').click();
    await board.getByRole('menuitem', { name: 'Make it the current season' }).click();
    await expect(board.getByText('Autumn is the current season.')).toBeVisible();
    await menuOf(board, 'First season').click();
    await board.getByRole('menuitem', { name: 'Archive the season' }).click();
    const asked = board.getByRole('dialog', { name: 'Archive First season?' });
    await expectAccessible(board);
    await asked.getByRole('button', { name: 'Archive the season' }).click();
    await expect(asked).toBeHidden();
    const fold = board.getByText('Archive, 1');
    await expect(board.getByRole('list', { name: 'Archived seasons' })).toBeHidden();
    await fold.click();

    await board.getByRole('link', { name: 'First season' }).click();
    await expect(board.getByText(/This season is archived: it is read/)).toBeVisible();
    await expect(board.getByRole('button', { name: 'New batch' })).toHaveCount(0);
    await expect(board.locator('[data-lift-handle]')).toHaveCount(0);
    await expectAccessible(board);
    // The server says so too.
    const place = `${brewery.slug}/seasons/${brewery.seasonId}`;
    const refused = await board.request.patch(api.batch(place, batches.Keel ?? ''), {
      data: { ibu: 30 },
      headers: { 'If-Match': '"1"', 'Sec-Fetch-Site': 'same-origin' },
    });
    expect(refused.status()).toBe(409);
    expect(await refused.json()).toMatchObject({ type: '/problems/season-archived' });

    await board.goto(`/b/${place}/season`);
    await menuOf(board, 'First season').click();
    await board.getByRole('menuitem', { name: 'Take it out of the archive' }).click();
    await expect(board.getByText('First season is out of the archive.')).toBeVisible();
    await board.goto(`/b/${place}`);
    await expect(board.getByRole('button', { name: 'New batch' })).toBeVisible();
  });
});

test('a season is chosen on the board, made new, and deleted while it is empty', async ({
  board,
  brewery,
}) => {
  await write(brewery);
  await board.goto(`/b/${brewery.slug}/season`);
  await board.getByRole('button', { name: 'New season' }).click();
  const dialog = board.getByRole('dialog', { name: 'New season' });
  await dialog.getByLabel('First day').fill('2027-09-01');
  await dialog.getByLabel('Last day').fill('2027-08-01');
  await dialog.getByRole('button', { name: 'Make the season' }).click();
  await expect(dialog.getByText('Write a name').first()).toBeVisible();
  await expect(dialog.getByText('The last day cannot be before the first').first()).toBeVisible();
  await expectAccessible(board);
  await dialog.getByLabel('Name of the season').fill('Harvest');
  await dialog.getByLabel('Last day').fill('2027-10-31');
  await dialog.getByRole('button', { name: 'Make the season' }).click();
  await expect(board.getByText('1 Sep 2027 to 31 Oct 2027 · nothing on it yet')).toBeVisible();

  await board.goto(`/b/${brewery.slug}`);
  await board.getByRole('button', { name: /^Season First season/ }).click();
  await board.getByRole('menuitem', { name: 'Harvest' }).click();
  await expect(board.getByRole('heading', { name: 'The shelf is empty.' })).toBeVisible();
  await expectAccessible(board);

  await board.getByRole('link', { name: 'Season', exact: true }).click();
  await menuOf(board, 'Harvest').click();
  await board.getByRole('menuitem', { name: 'Delete the season' }).click();
  await board
    .getByRole('dialog', { name: 'Delete Harvest?' })
    .getByRole('button', { name: 'Delete the season' })
    .click();
  await expect(board).toHaveURL(new RegExp(`/b/${brewery.slug}/season$`));
  await expect(board.getByRole('list', { name: 'Seasons' }).getByRole('listitem')).toHaveCount(1);
});

test('house rules that were typed and not saved are asked about before they are left', async ({
  board,
  brewery,
}) => {
  await write(brewery);
  await board.goto(`/b/${brewery.slug}/rules`);
  await board.getByLabel('Added bitterness for a Mind, IBU').fill('2');
  await board.getByRole('link', { name: 'Yeasts', exact: true }).click();
  const asked = board.getByRole('alertdialog').or(board.getByRole('dialog'));
  await expect(asked).toBeVisible();
  await asked.getByRole('button', { name: 'Go on writing' }).click();
  await expect(board).toHaveURL(/\/rules$/);
  await expect(board.getByLabel('Added bitterness for a Mind, IBU')).toHaveValue('2');
});
