import { hashToken, newToken } from '../server/auth/tokens.ts';
import { shareLink } from '../server/db/schema/sharing.ts';
import { expectAccessible } from './support/axe.ts';
import { dayFromToday } from './support/days.ts';
import { expect, test } from './support/test.ts';

test('a shared chain runs down a phone’s page', async ({ brewery, db, page }) => {
  const { chains } = await brewery.write({
    shelves: [
      {
        name: 'Harbour ale',
        batches: [
          { name: 'Low Tide', brewOn: '2027-03-06' },
          { name: 'Jetty Pale', og: 1.052, ibu: 38, srm: 7, brewOn: '2027-03-20' },
        ],
      },
    ],
  });
  const token = newToken();
  await db.insert(shareLink).values({
    id: crypto.randomUUID(),
    breweryId: brewery.id,
    chainId: chains['Harbour ale'] ?? '',
    name: 'For a phone',
    tokenHash: hashToken(token),
    createdBy: brewery.members['head-brewer'].id,
    expiresAt: new Date(`${dayFromToday(30)}T00:00:00Z`),
  });
  await page.goto(`/shared/${token}`);
  await expect(page.getByRole('heading', { level: 1, name: 'Harbour ale' })).toBeVisible();
  await page.getByRole('button', { name: 'Jetty Pale onto Low Tide' }).tap();
  await expect(page.getByRole('table')).toBeVisible();
  await expectAccessible(page);
  const wider = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  );
  expect(wider).toBe(0);
});
