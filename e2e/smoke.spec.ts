import { expectAccessible } from './support/axe.ts';
import { expect, test } from './support/test.ts';

test('somebody who signs up stands before an empty board, and finds it again after signing in', async ({
  page,
}) => {
  const email = `orla-${Date.now()}@reedbed.example`;
  await page.goto('/sign-up');
  await page.getByLabel('Your name').fill('Orla Finch');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password', { exact: true }).fill('reeds in the wind');
  await page.getByRole('button', { name: 'Start' }).click();
  await expect(page).toHaveURL(/\/b\/[a-z0-9-]+$/);
  const address = page.url();

  // What the page asks for on its own has been answered by then.
  await expect(page.getByText('Live', { exact: true })).toBeVisible();
  await page.context().clearCookies();
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password', { exact: true }).fill('reeds in the wind');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page).toHaveURL(address);
  await expectAccessible(page);
});

test('a head brewer sees the shelves of the season, with a verdict on the link', async ({
  board,
  brewery,
}) => {
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
    bench: [{ name: 'Lantern Stout', og: 1.054, fg: 1.014, srm: 33, ibu: 32 }],
  });
  await board.goto(`/b/${brewery.slug}`);
  for (const name of ['Creek Blonde', 'Ebb Pale', 'Lantern Stout']) {
    await expect(board.getByText(name).first()).toBeVisible();
  }
  await expect(board.getByText('Pour', { exact: true }).first()).toBeVisible();
  await expectAccessible(board);
});

test('a page tries nothing that its content policy forbids', async ({ page }) => {
  const forbidden: string[] = [];
  await page.exposeFunction('tellForbidden', (what: string) => forbidden.push(what));
  await page.addInitScript(`document.addEventListener('securitypolicyviolation',
    ({ effectiveDirective, blockedURI }) => tellForbidden(effectiveDirective + ' ' + blockedURI))`);
  await page.goto('/sign-in');
  await expect(page.getByLabel('E-mail')).toBeVisible();
  expect(forbidden).toEqual([]);
});
