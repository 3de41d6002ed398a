import { expectAccessible } from './support/axe.ts';
import { dayFromToday } from './support/days.ts';
import { cakeThatWaits } from './support/pour.ts';
import { expect, test } from './support/test.ts';

test('what is due stands first, each one tap from doing it', async ({
  board: page,
  brewery,
  db,
}) => {
  const { first, second } = await cakeThatWaits(brewery, db);
  await page.goto(`/b/${brewery.slug}/today`);
  const due = page.getByRole('region', { name: 'Due today' });
  await expect(due.getByRole('heading', { level: 3 })).toHaveText([
    'Check the cake of Creek Blonde',
    'Brew Ebb Pale',
  ]);
  const brew = due.getByRole('listitem').filter({ hasText: 'Brew Ebb Pale' });
  await expect(brew.locator('[data-verdict]')).toBeVisible();
  await expect(due.getByRole('link', { name: 'Check the cake' })).toHaveAttribute(
    'href',
    new RegExp(`/batches/${first}$`),
  );
  await expectAccessible(page);
  const wide = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth);
  expect(wide, 'the page does not scroll sideways').toBeLessThanOrEqual(0);
  await brew.getByRole('link', { name: 'Pour check' }).tap();
  await expect(page).toHaveURL(new RegExp(`/pour/${second}$`));
});

test('the bar at the thumb begins with Today, and has at most five cells', async ({
  board: page,
  brewery,
}) => {
  await page.goto(`/b/${brewery.slug}/today`);
  const bar = page.getByRole('navigation', { name: 'Pages' }).last();
  await expect(bar.getByRole('link').first()).toHaveText('Today');
  expect(
    await bar.locator(':scope > a, :scope > button, :scope > div').count(),
  ).toBeLessThanOrEqual(5);
  await bar.getByRole('link', { name: 'Board' }).tap();
  await expect(page).toHaveURL(`/b/${brewery.slug}`);
});

test('the installed app begins with Today on a phone', async ({ board: page, brewery }) => {
  await page.goto('/start');
  await expect(page).toHaveURL(`/b/${brewery.slug}/today`);
});

test('an empty week says what comes next, and when', async ({ board: page, brewery }) => {
  await page.goto(`/b/${brewery.slug}/today`);
  await expect(page.getByRole('heading', { name: 'Nothing is due' })).toBeVisible();
  await brewery.write({
    shelves: [{ name: 'Clean ale', batches: [{ name: 'Creek Blonde', brewOn: dayFromToday(30) }] }],
  });
  await page.reload();
  await expect(page.getByText(/^Next: Brew Creek Blonde, \w{3} \d+ \w+\.$/)).toBeVisible();
});

test.describe('leave to pour', () => {
  test('that is asked for shows on the head brewer’s Today at once', async ({
    board: head,
    partner,
    brewery,
    db,
  }) => {
    const { second } = await cakeThatWaits(brewery, db);
    await head.goto(`/b/${brewery.slug}/today`);
    await expect(head.getByText('Brew Ebb Pale')).toBeVisible();
    const api = `/api/breweries/${brewery.slug}/batches/${second}/pour`;
    const send = async (path: string, data: object) => {
      const headers = { 'Sec-Fetch-Site': 'same-origin' };
      const answer = await partner.request.post(`${api}${path}`, { headers, data });
      expect(answer.ok(), await answer.text()).toBe(true);
    };
    const [runId, id] = [crypto.randomUUID(), crypto.randomUUID()];
    await send('', { id: runId });
    const time = { deviceAt: new Date().toISOString(), clockOffsetMs: 0 };
    await send('/readings', { runId, id: crypto.randomUUID(), c: 25, typed: {}, ...time });
    await send('/overrides', { runId, id, reason: null });
    const asked = head
      .getByRole('listitem')
      .filter({ hasText: 'Leave to pour Ebb Pale is asked for' });
    await expect(asked).toContainText('Ned Quill asks: ');
    await asked.getByRole('link', { name: 'Answer' }).tap();
    await expect(head.getByText('Ned Quill asks to pour all the same')).toBeVisible();
  });
});
