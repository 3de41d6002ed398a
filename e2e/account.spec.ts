import type { Page } from '@playwright/test';
import { eq } from 'drizzle-orm';
import { hashPassword } from '../server/auth/passwords.ts';
import type { Db } from '../server/db/client.ts';
import { membership } from '../server/db/schema/brewery.ts';
import { person } from '../server/db/schema/people.ts';
import { expectAccessible } from './support/axe.ts';
import { writeBrewery, type Member } from './support/brewery.ts';
import { press, typeInto } from './support/keys.ts';
import { sessionCookies } from './support/server.ts';
import { expect, test } from './support/test.ts';

const PASSWORD = 'reeds in the wind';
const NEW = 'sallow by the water';

/** The fixtures' people have no password: a session row signs them in. */
async function givePassword(db: Db, { id }: Member): Promise<void> {
  const passwordHash = await hashPassword(PASSWORD);
  await db.update(person).set({ passwordHash }).where(eq(person.id, id));
}

const part = (page: Page, title: string) =>
  page.locator('section').filter({ has: page.getByRole('heading', { name: title, exact: true }) });

// A wrong password and a common one are refused, and the browser calls a refusal an error.
test.describe('name, address and password', () => {
  test.use({ expectedErrors: /status of 422 .*\/api\/account\/(email|password)\)$/ });

  test('are changed by keyboard, each fault told at its field', async ({
    board: page,
    brewery,
    db,
  }) => {
    const me = brewery.members['head-brewer'];
    await givePassword(db, me);
    await page.goto(`/b/${brewery.slug}/account`);
    await expectAccessible(page);

    const address = part(page, 'E-mail address');
    await typeInto(page, address.getByLabel('E-mail'), `new-${me.email}`);
    await typeInto(page, address.getByLabel('Your password'), 'not the password');
    await press(page, address.getByRole('button', { name: 'Change the address' }));
    await expect(address).toContainText('This is not your password');
    await expect(address.getByLabel('E-mail')).toHaveValue(`new-${me.email}`);
    await typeInto(page, address.getByLabel('Your password'), PASSWORD);
    await press(page, address.getByRole('button', { name: 'Change the address' }));
    await expect(page.getByText(`Signed in as new-${me.email}.`)).toBeVisible();

    const secret = part(page, 'Password');
    await typeInto(page, secret.getByLabel('Password now'), PASSWORD);
    await typeInto(page, secret.getByLabel('New password'), 'QwertyUiop');
    await press(page, secret.getByRole('button', { name: 'Change the password' }));
    await expect(secret).toContainText('choose another, such as a short sentence');
    await expectAccessible(page);
    await typeInto(page, secret.getByLabel('New password'), NEW);
    await press(page, secret.getByRole('button', { name: 'Change the password' }));
    await expect(page.getByText('Password changed.')).toBeVisible();
    await expect(secret.getByLabel('New password')).toHaveValue('');
  });
});

test('a sign-in elsewhere is seen and ended, and its page asks to sign in', async ({
  board: page,
  brewery,
  another,
  db,
}) => {
  await givePassword(db, brewery.members['head-brewer']);
  const other = await another(null);
  await other.goto('/sign-in');
  await other.getByLabel('E-mail').fill(brewery.members['head-brewer'].email);
  await other.getByLabel('Password', { exact: true }).fill(PASSWORD);
  await other.getByRole('button', { name: 'Sign in' }).click();
  await expect(other.getByRole('banner').getByText('Live', { exact: true })).toBeVisible();

  await page.goto(`/b/${brewery.slug}/account`);
  const where = part(page, 'Where you are signed in');
  await expect(where.getByRole('listitem')).toHaveCount(2);
  await expect(where).toContainText('This one');
  await where.getByRole('button', { name: /^Sign out: Chrome on Linux/ }).click();
  await expect(where.getByRole('listitem')).toHaveCount(1);
  await expect(other).toHaveURL(/\/sign-in\?next=/, { timeout: 3_000 });
});

test.describe('closing the account', () => {
  test.use({ expectedErrors: /status of 422 .*\/api\/account\/closing\)$/ });

  test('is refused to the only head brewer, and offers to hand over', async ({
    board: page,
    brewery,
  }) => {
    await page.goto(`/b/${brewery.slug}/account`);
    await page.getByRole('button', { name: 'Close the account' }).click();
    const dialog = page.getByRole('dialog', { name: 'Close your account?' });
    await expect(dialog).toContainText('Hand over first');
    await expectAccessible(page);
    await dialog.getByRole('link', { name: /^Hand over Reedbed/ }).click();
    await expect(page).toHaveURL(new RegExp(`/b/${brewery.slug}/people$`));
  });

  test('says what is lost, offers it as a file, and ends with the front page', async ({
    context,
    db,
    page,
    server,
  }) => {
    const lone = await writeBrewery(db, 'Lone Jetty');
    const me = lone.members['head-brewer'];
    await givePassword(db, me);
    const others = [lone.members.brewer.id, lone.members.taster.id];
    for (const id of others) await db.delete(membership).where(eq(membership.personId, id));
    await context.addCookies(sessionCookies(server, me.token));
    await page.goto('/account');
    await page.getByRole('button', { name: 'Close the account' }).click();
    const dialog = page.getByRole('dialog', { name: 'Close your account?' });
    await expect(dialog).toContainText(/Lone Jetty \w+: 1 season and the whole record\./);
    await expectAccessible(page);
    const download = page.waitForEvent('download');
    await dialog.getByRole('link', { name: 'Download it first' }).click();
    expect((await download).suggestedFilename()).toBe('barmkin-data.json');
    await dialog.getByLabel('Your password').fill('not the password');
    await dialog.getByRole('button', { name: 'Close the account' }).click();
    await expect(dialog).toContainText('This is not your password');
    await dialog.getByLabel('Your password').fill(PASSWORD);
    await dialog.getByRole('button', { name: 'Close the account' }).click();
    await expect(page.getByRole('link', { name: 'Sign in' }).first()).toBeVisible();
    await page.goto(`/b/${lone.slug}`);
    await expect(page).toHaveURL(/\/sign-in/);
  });
});
