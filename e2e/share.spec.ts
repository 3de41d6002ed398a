import type { Page } from '@playwright/test';
import { api } from '#shared/api/urls.ts';
import { addDays, formatDay } from '#shared/units/day.ts';
import { expectAccessible } from './support/axe.ts';
import { writeBrewery } from './support/brewery.ts';
import { expect, test, type Brewing } from './support/test.ts';

const PLAN = {
  shelves: [
    {
      name: 'Harbour ale',
      batches: [
        { name: 'Low Tide', brewOn: '2027-03-06', allergens: ['gluten' as const] },
        {
          name: 'Jetty Pale',
          og: 1.052,
          ibu: 38,
          srm: 7,
          brewOn: '2027-03-20',
          allergens: ['gluten' as const, 'milk' as const],
        },
        { name: 'Spring Tide', og: 1.036, brewOn: '2027-04-03' },
      ],
    },
    { name: 'Kveik shelf', batches: [{ name: 'Nobody’s business' }] },
  ],
};

/** Makes a link on the board as the head brewer does, and reads its address. */
async function makeLink(page: Page, brewery: Brewing, name = 'For the festival'): Promise<string> {
  await page.goto(`/b/${brewery.slug}`);
  await page.getByRole('button', { name: 'Shelf Harbour ale' }).click();
  await page.getByRole('menuitem', { name: 'Share' }).click();
  const dialog = page.getByRole('dialog', { name: 'Share Harbour ale' });
  await dialog.getByRole('button', { name: 'Make a link' }).click();
  await dialog.getByLabel('Whom or what it is for').fill(name);
  await expectAccessible(page);
  await dialog.getByRole('button', { name: 'Make the link' }).click();
  const address = await dialog.getByLabel(`Link: ${name}`).inputValue();
  await dialog.getByRole('button', { name: 'Done' }).click();
  return address;
}

test('a link shows one chain to somebody without an account', async ({
  board,
  brewery,
  another,
}) => {
  await brewery.write(PLAN);
  const address = await makeLink(board, brewery);
  const page = await another(null);
  await page.goto(address);
  await expect(page.getByRole('heading', { level: 1, name: 'Harbour ale' })).toBeVisible();
  const batches = page.getByRole('list', { name: 'Batches' });
  await expect(batches.getByRole('heading')).toHaveText(['Low Tide', 'Jetty Pale', 'Spring Tide']);
  await expect(page.getByLabel('What the chain carries')).toContainText('Gluten, milk.');
  await expect(page.getByText('Nobody’s business')).toHaveCount(0);
  await expect(page.locator('meta[name=robots]')).toHaveAttribute('content', 'noindex');
  const held = page.getByRole('button', { name: 'Spring Tide onto Jetty Pale' });
  await held.click();
  await expect(page.getByRole('heading', { name: 'Hold: Undeclared allergen' })).toBeVisible();
  await expect(page.getByText(/no dilution removes an allergen/)).toBeVisible();
  await expectAccessible(page);
  expect(await page.context().cookies()).toEqual([]);
});

test.describe(() => {
  test.use({ expectedErrors: /status of 410 .*\/api\/shared\// });

  test('a link that was withdrawn says so, and the list says how often it was opened', async ({
    board,
    brewery,
    another,
  }) => {
    await brewery.write(PLAN);
    const address = await makeLink(board, brewery);
    const page = await another(null);
    await page.goto(address);
    await expect(page.getByRole('heading', { level: 1, name: 'Harbour ale' })).toBeVisible();
    const links = board.getByRole('list', { name: 'Links' });
    await board.reload();
    await board.getByRole('button', { name: 'Shelf Harbour ale' }).click();
    await board.getByRole('menuitem', { name: 'Share' }).click();
    await expect(links).toContainText('opened 1 time');
    await links.getByRole('button', { name: 'Withdraw For the festival' }).click();
    await board.getByRole('button', { name: 'Withdraw the link' }).click();
    await expect(links).toContainText('withdrawn');
    await page.reload();
    await expect(page.getByRole('heading', { name: 'This link is no longer good' })).toBeVisible();
    await expectAccessible(page);
  });
});

test('somebody of another brewery copies a chain onto their own board', async ({
  board,
  brewery,
  another,
  db,
}) => {
  await brewery.write(PLAN);
  const address = await makeLink(board, brewery);
  const own = await writeBrewery(db, 'Estuary Ales');
  const page = await another(own.members.brewer);
  await page.goto(address);
  await page.getByRole('button', { name: 'Copy into my brewery' }).click();
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Copy it' }).click();
  await expect(page).toHaveURL(new RegExp(`/b/${own.slug}$`));
  const shelf = page.getByRole('list', { name: 'Batches on Harbour ale' });
  await expect(shelf.getByRole('heading')).toHaveText(['Low Tide', 'Jetty Pale', 'Spring Tide']);
});

test('a guest brewer moves and edits on their own board what belongs to another brewery', async ({
  board,
  brewery,
  another,
  db,
}) => {
  await brewery.write(PLAN);
  await board.goto(`/b/${brewery.slug}`);
  await board.getByRole('button', { name: 'Shelf Harbour ale' }).click();
  await board.getByRole('menuitem', { name: 'Share' }).click();
  await board.getByRole('button', { name: 'Invite a guest' }).click();
  const invitation = await board.getByLabel('Invitation for a guest brewer').inputValue();
  const own = await writeBrewery(db, 'Estuary Ales');
  const page = await another(own.members['head-brewer']);
  await page.goto(invitation);
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Put it on my board' }).click();
  const shelf = page.getByRole('region', { name: /^Harbour ale from Reedbed Brewing/ });
  await expect(shelf).toContainText('as brewer');
  await expect(page.getByText('Nobody’s business')).toHaveCount(0);
  await expectAccessible(page);

  await shelf.getByRole('button', { name: 'Move Low Tide' }).click();
  const places = page.getByRole('dialog', { name: /Low Tide/ });
  await expect(places.getByText('New shelf')).toHaveCount(0);
  await expect(places.getByText(/bench/i)).toHaveCount(0);
  await places
    .getByRole('button', { name: /Jetty Pale/ })
    .first()
    .click();
  const names = () =>
    shelf.getByRole('list', { name: 'Batches on Harbour ale' }).getByRole('heading');
  await expect(names()).toHaveText(['Jetty Pale', 'Low Tide', 'Spring Tide']);

  await shelf.getByRole('button', { name: 'Low Tide', exact: true }).click();
  await page.getByLabel('Bitterness').fill('27');
  await page.getByRole('button', { name: 'Save' }).click();
  await expect(shelf).toContainText('27 IBU');

  await board.reload();
  const theirs = board.getByRole('list', { name: 'Batches on Harbour ale' });
  await expect(theirs.getByRole('heading')).toHaveText(['Jetty Pale', 'Low Tide', 'Spring Tide']);
  await expect(theirs).toContainText('27 IBU');

  await board.getByRole('button', { name: 'Shelf Harbour ale' }).click();
  await board.getByRole('menuitem', { name: 'Share' }).click();
  await board.getByRole('button', { name: /^Withdraw: Orla Finch/ }).click();
  await board.getByRole('button', { name: 'End the access' }).click();
  await expect(board.getByRole('list', { name: 'Guests' })).toContainText('ended');
  await expect(shelf).toHaveCount(0);
});

test('a link is given another name and another end, and its address stays', async ({
  board,
  brewery,
}) => {
  await brewery.write(PLAN);
  const address = await makeLink(board, brewery);
  const dialog = board.getByRole('dialog', { name: 'Share Harbour ale' });
  await dialog.getByRole('button', { name: 'Edit For the festival' }).click();
  const form = board.getByRole('dialog', { name: 'Edit the link For the festival' });
  await form.getByLabel('Whom or what it is for').fill('For the guild');
  const end = await form.getByLabel('Works until').inputValue();
  await form.getByLabel('Works until').fill('');
  await form.getByRole('button', { name: 'Save' }).click();
  await expect(form.locator('[aria-invalid="true"]')).toHaveCount(1);
  await expectAccessible(board);
  await form.getByLabel('Works until').fill(addDays(end, 30));
  await form.getByLabel('Show what the yeast costs').check();
  await form.getByRole('button', { name: 'Save' }).click();
  await expect(
    dialog.getByText(new RegExp(`works until ${formatDay(addDays(end, 30))}.* with prices`)),
  ).toBeVisible();
  await expect(dialog.getByText('For the guild')).toBeVisible();
  await board.goto(address);
  await expect(board.getByRole('heading', { level: 1 })).toContainText('Harbour ale');
});

test('a guest hears of a change at once, finds the chain from any page, and leaves it', async ({
  board,
  brewery,
  another,
  db,
  server,
}) => {
  const { chains } = await brewery.write(PLAN);
  await board.goto(`/b/${brewery.slug}`);
  const origin = { Origin: server.url };
  const made = await board.request.post(api.guests(brewery.slug, chains['Harbour ale'] ?? ''), {
    headers: origin,
    data: { id: crypto.randomUUID(), role: 'taster' },
  });
  const { token } = (await made.json()) as { token: string };
  const own = await writeBrewery(db, 'Estuary Ales');
  const page = await another(own.members['head-brewer']);
  await page.context().request.post(api.guestInvitation(token), {
    headers: origin,
    data: { brewerySlug: own.slug },
  });
  await page.goto(`/b/${own.slug}/people`);
  await page.getByRole('button', { name: /^Brewery: Estuary Ales/ }).click();
  await page.getByRole('menuitem', { name: /^Harbour ale from Reedbed/ }).click();
  const shelf = page.getByRole('region', { name: /^Harbour ale from Reedbed Brewing/ });
  await expect(shelf).toBeFocused();
  await expect(page.getByRole('banner').getByText('Live', { exact: true })).toBeVisible();

  await board.getByRole('button', { name: 'Low Tide', exact: true }).click();
  await board.getByLabel('Bitterness').fill('29');
  await board.getByRole('button', { name: 'Save' }).click();
  await expect(board.getByRole('list', { name: 'Batches on Harbour ale' })).toContainText('29 IBU');
  await expect(shelf).toContainText('29 IBU', { timeout: 1_500 });

  await shelf.getByRole('button', { name: 'Leave Harbour ale' }).click();
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Leave the chain' }).click();
  await expect(shelf).toHaveCount(0);
});
