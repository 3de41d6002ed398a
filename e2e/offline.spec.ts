import { BoardPage } from './support/boardPage.ts';
import { expect, test } from './support/test.ts';

const SEASON = {
  shelves: [
    {
      name: 'Clean ale',
      batches: [
        { name: 'Creek Blonde', og: 1.044, fg: 1.011, srm: 4, ibu: 20, brewOn: '2027-03-06' },
        { name: 'Ebb Pale', og: 1.052, fg: 1.013, srm: 7, ibu: 38, brewOn: '2027-03-20' },
      ],
    },
  ],
  bench: [{ name: 'Kelp Rye', og: 1.056, fg: 1.014, srm: 12, ibu: 34 }],
};

// Every request that finds no network is an error to the browser.
test.use({ expectedErrors: /ERR_INTERNET_DISCONNECTED/ });

test('without a connection the board is read, and nothing on it can be changed', async ({
  board: page,
  brewery,
  context,
}) => {
  await brewery.write(SEASON);
  const board = new BoardPage(page);
  await board.open(brewery.slug);
  await board.link('Ebb Pale', 'Creek Blonde').click();
  await page.getByRole('button', { name: 'Close the panel' }).click();

  await context.setOffline(true);
  await expect(page.getByText('No connection. You can read what is here')).toBeVisible();
  await expect(board.namesOn('Clean ale')).toHaveText(['Creek Blonde', 'Ebb Pale']);
  await board.link('Ebb Pale', 'Creek Blonde').click();
  await expect(page.getByRole('region', { name: 'Ebb Pale onto Creek Blonde' })).toContainText(
    'Pour',
  );
  await page.getByRole('button', { name: 'Close the panel' }).click();
  await expect(page.getByRole('button', { name: 'New batch' })).toHaveCount(0);
  await expect(page.getByRole('button', { name: /^Lift / })).toHaveCount(0);

  await context.setOffline(false);
  await expect(page.getByText('No connection.')).toHaveCount(0);
  await page.getByRole('button', { name: 'Move Kelp Rye', exact: true }).click();
  await page.getByRole('button', { name: /^Put here: .*after Ebb Pale$/ }).click();
  await expect(board.namesOn('Clean ale')).toHaveText(['Creek Blonde', 'Ebb Pale', 'Kelp Rye']);
  await expect(board.changes.getByRole('button', { name: 'Undo' })).toBeEnabled();
});

test('a form keeps what was typed while the connection is gone, and saves it after', async ({
  board: page,
  brewery,
  context,
}) => {
  await brewery.write(SEASON);
  await new BoardPage(page).open(brewery.slug);
  await page.getByRole('button', { name: 'Ebb Pale', exact: true }).click();
  const form = page.getByRole('dialog', { name: 'Edit Ebb Pale' });
  const bitterness = form.getByLabel('Bitterness', { exact: true });
  await bitterness.fill('41');
  await context.setOffline(true);
  await expect(form.getByText('What you typed stays here')).toBeVisible();
  const save = form.getByRole('button', { name: 'Save', exact: true });
  await expect(save).toBeDisabled();
  await form.getByLabel('Style').fill('Best pale');
  await expect(bitterness).toHaveValue('41');

  await context.setOffline(false);
  await save.click();
  await expect(form).toBeHidden();
  await page.reload();
  await page.getByRole('button', { name: 'Ebb Pale', exact: true }).click();
  await expect(bitterness).toHaveValue('41');
  await expect(form.getByLabel('Style')).toHaveValue('Best pale');
});

test('a connection that breaks under a save loses nothing', async ({ board: page, brewery }) => {
  await brewery.write(SEASON);
  await new BoardPage(page).open(brewery.slug);
  await page.getByRole('button', { name: 'Ebb Pale', exact: true }).click();
  const form = page.getByRole('dialog', { name: 'Edit Ebb Pale' });
  await form.getByLabel('Bitterness', { exact: true }).fill('42');
  await page.route('**/api/**', (route) => route.abort('internetdisconnected'));
  await form.getByRole('button', { name: 'Save', exact: true }).click();
  await expect(form.getByText('What you typed stays here')).toBeVisible();
  await expect(form.getByLabel('Bitterness', { exact: true })).toHaveValue('42');

  await page.unroute('**/api/**');
  const save = form.getByRole('button', { name: 'Save', exact: true });
  await expect(save).toBeEnabled({ timeout: 15_000 });
  await save.click();
  await expect(form).toBeHidden();
});

test('a page whose parts did not arrive says so, and is loaded as soon as they can be had', async ({
  board: page,
  brewery,
}) => {
  await brewery.write(SEASON);
  const parts = /\/assets\/(Shell|BoardPage)-/;
  await page.route(parts, (route) => route.abort('internetdisconnected'));
  await page.goto(`/b/${brewery.slug}`);
  await expect(page.getByRole('heading', { name: 'This page has not arrived.' })).toBeVisible();
  await page.unroute(parts);
  await expect(page.getByText('Ebb Pale').first()).toBeVisible({ timeout: 15_000 });
});
