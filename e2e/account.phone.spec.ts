import { eq } from 'drizzle-orm';
import { hashPassword } from '../server/auth/passwords.ts';
import { person } from '../server/db/schema/people.ts';
import { expectAccessible } from './support/axe.ts';
import { expect, test } from './support/test.ts';

test('on a phone: a brewery more, the password, and handing over', async ({
  board: page,
  brewery,
  db,
}) => {
  const { id } = brewery.members['head-brewer'];
  const passwordHash = await hashPassword('reeds in the wind');
  await db.update(person).set({ passwordHash }).where(eq(person.id, id));

  await page.goto(`/b/${brewery.slug}`);
  await page.getByRole('button', { name: 'More', exact: true }).tap();
  await page.getByRole('menuitem', { name: 'Breweries' }).tap();
  await expect(page.getByRole('heading', { name: 'Your breweries' })).toBeVisible();
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Make another brewery' }).tap();
  await page.getByLabel('Name of the brewery').fill('Far Shore');
  await page.getByRole('button', { name: 'Make the brewery' }).tap();
  await expect(page).toHaveURL(/\/b\/far-shore/);

  await page.goto(`/b/${brewery.slug}/account`);
  await page.getByLabel('Password now').fill('reeds in the wind');
  await page.getByLabel('New password').fill('sallow by the water');
  await page.getByRole('button', { name: 'Change the password' }).tap();
  await expect(page.getByText('Password changed.')).toBeVisible();
  await expectAccessible(page);

  await page.goto(`/b/${brewery.slug}/people`);
  await page.getByRole('button', { name: 'More for Ned Quill' }).tap();
  await page.getByRole('menuitem', { name: 'Hand over' }).tap();
  const dialog = page.getByRole('dialog', { name: 'Hand over to Ned Quill' });
  await dialog.getByRole('radio', { name: 'I step down to taster.' }).tap();
  await expectAccessible(page);
  await dialog.getByRole('button', { name: 'Hand over' }).tap();
  await expect(page.getByRole('listitem').filter({ hasText: 'Orla Finch' })).toContainText(
    'Taster.',
  );
});
