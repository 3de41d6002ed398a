import type { Page } from '@playwright/test';
import { expectAccessible } from './support/axe.ts';
import { writeBrewery } from './support/brewery.ts';
import { press, tabTo } from './support/keys.ts';
import { expect, test } from './support/test.ts';

const card = (page: Page, name: string) =>
  page.getByRole('list', { name: 'People' }).getByRole('listitem').filter({ hasText: name });

test('a role is changed with the mouse, and the other’s page follows', async ({
  board: page,
  brewery,
  partner,
}) => {
  await partner.goto(`/b/${brewery.slug}`);
  await expect(partner.getByRole('button', { name: 'New batch' }).first()).toBeVisible();
  await page.goto(`/b/${brewery.slug}/people`);
  await page.getByRole('button', { name: 'More for Ned Quill' }).click();
  await page.getByRole('menuitem', { name: 'Change the role' }).click();
  const dialog = page.getByRole('dialog', { name: 'Role of Ned Quill' });
  await expectAccessible(page);
  await dialog.getByRole('radio', { name: /^Taster/ }).check();
  await dialog.getByRole('button', { name: 'Change the role' }).click();
  await expect(card(page, 'Ned Quill')).toContainText('Taster.');
  await expect(partner.getByRole('button', { name: 'New batch' })).toHaveCount(0);
  await page.goto(`/b/${brewery.slug}/record`);
  await expect(page.getByRole('main')).toContainText('Made Ned Quill a taster');
});

test.describe('the last head brewer', () => {
  // What is refused is an error to the browser, as is a last look at a board that is theirs no longer.
  test.use({
    expectedErrors: /status of (409 .*\/membership|404 .*\/api\/breweries\/[^/]+\/board)\)$/,
  });

  test('is told what to do, hands over by keyboard and leaves', async ({
    board: page,
    brewery,
    partner,
  }) => {
    await page.goto(`/b/${brewery.slug}/people`);
    await press(page, page.getByRole('button', { name: 'More for you' }));
    await page.keyboard.press('End');
    await page.keyboard.press('Enter');
    const leaving = page.getByRole('dialog', { name: /^Leave Reedbed Brewing/ });
    await press(page, leaving.getByRole('button', { name: 'Leave the brewery' }));
    await expect(leaving).toContainText('Make somebody else head brewer first');
    await page.keyboard.press('Escape');

    await press(page, page.getByRole('button', { name: 'More for Ned Quill' }));
    await page.keyboard.press('ArrowDown');
    await page.keyboard.press('Enter');
    const handing = page.getByRole('dialog', { name: 'Hand over to Ned Quill' });
    await tabTo(page, handing.getByRole('radio', { name: 'I stay head brewer as well.' }));
    await page.keyboard.press('ArrowDown');
    await press(page, handing.getByRole('button', { name: 'Hand over' }));
    await expect(card(page, 'Ned Quill')).toContainText('Head brewer.');
    await expect(card(page, 'Orla Finch')).toContainText('Brewer.');
    await expect(page.getByRole('button', { name: 'More for Ned Quill' })).toHaveCount(0);

    await press(page, page.getByRole('button', { name: 'More for you' }));
    await page.keyboard.press('Enter');
    await press(page, leaving.getByRole('button', { name: 'Leave the brewery' }));
    await expect(page.getByRole('heading', { name: 'Your breweries' })).toBeVisible();
    await expect(page.getByRole('link', { name: /Reedbed/ })).toHaveCount(0);
    await partner.goto(`/b/${brewery.slug}/people`);
    await expect(card(partner, 'Orla Finch')).toHaveCount(0);
  });
});

test.describe('whoever is removed', () => {
  // Their page asks once more for the board, and finds that it is gone.
  test.use({ expectedErrors: /status of 404 .*\/api\/breweries\/[^/]+\/board\)$/ });

  test('is asked for first, and told at once', async ({ board: page, brewery, partner }) => {
    await partner.goto(`/b/${brewery.slug}`);
    await expect(partner.getByRole('banner').getByText('Live', { exact: true })).toBeVisible();
    await page.goto(`/b/${brewery.slug}/people`);
    await page.getByRole('button', { name: 'More for Ned Quill' }).click();
    await page.getByRole('menuitem', { name: 'Remove from the brewery' }).click();
    const asking = page.getByRole('dialog', { name: 'Remove Ned Quill?' });
    await expectAccessible(page);
    await asking.getByRole('button', { name: 'Remove Ned Quill' }).click();
    await expect(card(page, 'Ned Quill')).toHaveCount(0);
    await expect(
      partner.getByRole('heading', { name: 'You no longer belong to this brewery.' }),
    ).toBeVisible({ timeout: 3_000 });
    await partner.getByRole('link', { name: 'Your breweries' }).click();
    await expect(partner.getByRole('main')).toContainText('You belong to none at the moment');
    await expectAccessible(partner);
  });
});

test('another brewery is made and switched to; the device keeps the last one', async ({
  board: page,
  brewery,
}) => {
  await page.goto(`/b/${brewery.slug}`);
  await page.getByRole('button', { name: /^Brewery: Reedbed/ }).click();
  await expectAccessible(page);
  await page.getByRole('menuitem', { name: /make another/ }).click();
  await page.getByRole('button', { name: 'Make another brewery' }).click();
  await page.getByRole('button', { name: 'Make the brewery' }).click();
  await expect(page.getByText('Write a name').first()).toBeVisible();
  await page.getByLabel('Name of the brewery').fill('Far Shore');
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Make the brewery' }).click();
  await expect(page.getByRole('button', { name: 'Brewery: Far Shore' })).toBeVisible();
  await page.goto('/');
  await page.getByRole('main').getByRole('link', { name: 'To the board' }).click();
  await expect(page.getByRole('heading', { name: 'The shelf is empty.' })).toBeVisible();
  await page.getByRole('button', { name: 'Brewery: Far Shore' }).press('Enter');
  await expect(page.getByRole('menuitem', { name: /^Reedbed/ })).toBeFocused();
  await page.keyboard.press('Home');
  await page.keyboard.press('Enter');
  await expect(page).toHaveURL(new RegExp(`/b/${brewery.slug}$`));
});

test('a join link takes in who is signed in, and says when they are in already', async ({
  board: page,
  brewery,
  another,
  db,
}) => {
  await page.goto(`/b/${brewery.slug}/people`);
  await page.getByRole('button', { name: 'Make a join link' }).click();
  const link = await page.getByLabel('Link for one brewer').inputValue();
  await page.goto(link);
  await expect(
    page.getByRole('heading', { name: /^You are in Reedbed .* already$/ }),
  ).toBeVisible();

  const other = await writeBrewery(db, 'Far Shore');
  const guest = await another(other.members['head-brewer']);
  await guest.goto(link);
  await guest.getByRole('button', { name: 'Join the brewery' }).click();
  await expect(guest).toHaveURL(new RegExp(`/b/${brewery.slug}$`));
  await guest.getByRole('button', { name: /^Brewery: Reedbed/ }).click();
  await expect(guest.getByRole('menuitem', { name: /^Far Shore/ })).toBeVisible();
});
