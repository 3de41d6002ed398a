import { eq } from 'drizzle-orm';
import { cakeCheck } from '../server/db/schema/cake.ts';
import { pourReading, pourRun } from '../server/db/schema/pour.ts';
import { batchNote, reading } from '../server/db/schema/readings.ts';
import { expectAccessible } from './support/axe.ts';
import { keptKeys, nothingWaits, pagesAreKept, waiting } from './support/device.ts';
import { cakeThatWaits, PourPage } from './support/pour.ts';
import { expect, test } from './support/test.ts';

test.use({
  serviceWorkers: 'allow',
  expectedErrors:
    /ERR_INTERNET_DISCONNECTED|status of (409 .*\/pour\/readings|412 .*\/notes\/[^/]+)\)$/,
});

const readingsOf = (db: Parameters<typeof cakeThatWaits>[1], batchId: string) =>
  db
    .select({ c: pourReading.temperatureC })
    .from(pourReading)
    .innerJoin(pourRun, eq(pourRun.id, pourReading.runId))
    .where(eq(pourRun.batchId, batchId));

test('a conflict stops the queue, nothing is dropped without a word, and what was behind it goes on', async ({
  board: page,
  partner,
  brewery,
  context,
  db,
}) => {
  const { second } = await cakeThatWaits(brewery, db);
  const mine = new PourPage(page, (on) => on.click());
  const theirs = new PourPage(partner, (on) => on.click());
  await mine.open(brewery.slug, second);
  await mine.toTheWort();
  await nothingWaits(page);

  await context.setOffline(true);
  await mine.log('30');
  await mine.log('28');
  await expect(waiting(page)).toHaveAccessibleName('2 waiting');

  await theirs.open(brewery.slug, second);
  await theirs.button('Take it over').click();
  await expect(theirs.thermometer()).toBeVisible();

  await context.setOffline(false);
  await expect(waiting(page)).toHaveAccessibleName('1 not taken', { timeout: 30_000 });
  await expect(page.getByText(/^Not taken: Pour of Ebb Pale: wort at 30/)).toBeVisible();
  expect(await readingsOf(db, second), 'nothing was sent past it').toEqual([]);

  await waiting(page).click();
  const box = page.getByRole('dialog', { name: 'Waiting to be sent' });
  await expect(box.getByRole('listitem')).toHaveCount(2);
  await expect(box.getByText('waits behind the one above')).toBeVisible();
  await expectAccessible(page);

  await test.step('it is asked before one is dropped', async () => {
    await box.getByRole('button', { name: 'Discard' }).first().click();
    const asking = page.getByRole('dialog', { name: 'Discard this entry?' });
    await asking.getByRole('button', { name: 'Leave it' }).click();
    await expect(box.getByRole('listitem')).toHaveCount(2);
  });

  await test.step('taken over again, it is tried again and all arrives', async () => {
    await box.getByRole('button', { name: 'Done' }).click();
    await mine.button('Take it over').click();
    await waiting(page).click();
    await box.getByRole('button', { name: 'Try again' }).click();
    await expect(box.getByText('Everything has been sent.')).toBeVisible();
    await nothingWaits(page);
    expect((await readingsOf(db, second)).map(({ c }) => c).toSorted()).toEqual([28, 30]);
  });
});

test('signing out asks where something waits, keeps it, and clears what was read', async ({
  board: page,
  brewery,
  context,
  db,
}) => {
  const { second } = await cakeThatWaits(brewery, db);
  const pour = new PourPage(page, (on) => on.click());
  await pour.open(brewery.slug, second);
  await pour.toTheWort();
  // Only the pour's own address is out of reach, so that there is something left to sign out of.
  await page.route('**/pour/readings', (route) => route.abort('internetdisconnected'));
  await pour.log('30');
  await expect(waiting(page)).toHaveAccessibleName('1 waiting');
  await expect
    .poll(() => keptKeys(page, 'barmkin-kept', 'answers'))
    .toContainEqual(expect.stringContaining('board'));

  const signOut = async () => {
    await page.getByRole('button', { name: 'Account of Orla Finch' }).click();
    await page.getByRole('menuitem', { name: 'Sign out' }).click();
  };
  await signOut();
  const asking = page.getByRole('dialog', { name: 'Sign out before everything is sent?' });
  await expect(asking).toContainText('One entry has not been sent yet.');
  await asking.getByRole('button', { name: 'Stay signed in' }).click();
  await expect(waiting(page)).toBeVisible();

  await page.getByRole('button', { name: 'Account of Orla Finch' }).click();
  await page.getByRole('menuitem', { name: 'Account and units' }).click();
  await page.getByRole('button', { name: 'Close the account' }).click();
  const closing = page.getByRole('dialog', { name: 'Close your account?' });
  await expect(closing).toContainText('One entry has not been sent yet, and is lost with');
  await page.keyboard.press('Escape');
  await expect(closing).toHaveCount(0);

  await signOut();
  await asking.getByRole('button', { name: 'Sign out, send it later' }).click();
  await expect(page).toHaveURL('/');
  await expect.poll(() => keptKeys(page, 'barmkin-kept', 'answers')).toEqual([]);

  await test.step('another person on this device neither sees nor sends it', async () => {
    await page.unroute('**/pour/readings');
    await brewery.signIn(context, 'brewer');
    await page.goto(`/b/${brewery.slug}`);
    await expect(page.getByRole('button', { name: 'Account of Ned Quill' })).toBeVisible();
    await expect(waiting(page)).toHaveCount(0);
    expect(await readingsOf(db, second)).toEqual([]);
    expect(await keptKeys(page, 'barmkin-outbox', 'entries')).toEqual(['entries']);
  });
});

test('once seen, the board and Today open without a connection; a link with a token does not', async ({
  board: page,
  brewery,
  context,
  db,
}) => {
  await cakeThatWaits(brewery, db);
  await page.goto(`/b/${brewery.slug}/today`);
  await expect(page.getByText('Brew Ebb Pale')).toBeVisible();
  await pagesAreKept(page);
  await expect
    .poll(() => keptKeys(page, 'barmkin-kept', 'answers'))
    .toContainEqual(expect.stringContaining('today'));

  await context.setOffline(true);
  await page.goto(`/b/${brewery.slug}`);
  await expect(page.getByRole('button', { name: 'Ebb Pale', exact: true })).toBeVisible();
  await expect(page.getByText(/as it was at \d\d:\d\d/)).toBeVisible();
  await page.getByRole('navigation').getByRole('link', { name: 'Today' }).first().click();
  await expect(page.getByText('Brew Ebb Pale')).toBeVisible();
  await page.goto('/start');
  await expect(page.getByRole('button', { name: 'Ebb Pale', exact: true })).toBeVisible();

  const shared = await page.goto('/shared/some-token').catch((error: Error) => error.message);
  expect(shared).toContain('ERR_INTERNET_DISCONNECTED');
  await context.setOffline(false);
});

test('it can be installed: a manifest with icons, and a worker that is always asked for anew', async ({
  board: page,
}) => {
  await page.goto('/');
  const address = await page.locator('link[rel=manifest]').getAttribute('href');
  const answer = await page.request.get(address ?? '');
  expect(answer.headers()['content-type']).toContain('application/manifest+json');
  const manifest = (await answer.json()) as {
    start_url: string;
    icons: { src: string; sizes: string; purpose: string }[];
  };
  expect(manifest.icons.map(({ purpose }) => purpose)).toContain('maskable');
  for (const { src, sizes } of manifest.icons) {
    const side = await page.evaluate(async (from) => {
      const image = new Image();
      image.src = from;
      await image.decode();
      return image.naturalWidth;
    }, src);
    if (sizes !== 'any') expect(`${side}x${side}`, src).toBe(sizes);
  }
  const worker = await page.request.get('/sw.js');
  expect(worker.headers()['cache-control']).toBe('no-cache');
  expect(await worker.text()).not.toContain('/api/session');
});

test('two versions of a note are shown side by side, and one is chosen', async ({
  board: page,
  brewery,
  context,
  db,
}) => {
  const { first } = await cakeThatWaits(brewery, db);
  const url = `/api/breweries/${brewery.slug}/batches/${first}/notes`;
  const id = crypto.randomUUID();
  const head = { 'Sec-Fetch-Site': 'same-origin' };
  await page.request.post(url, { headers: head, data: { id, text: 'Smells of bread' } });
  await page.goto(`/b/${brewery.slug}/batches/${first}`);
  await expect(page.getByText('Smells of bread')).toBeVisible();
  await pagesAreKept(page);

  await context.setOffline(true);
  await page.getByRole('button', { name: 'Change' }).click();
  const form = page.locator('form').filter({ hasText: 'Save the note' });
  await form.getByLabel('Note').fill('Smells of pears');
  await expect(form.getByText('It is kept on this device')).toBeVisible();
  await page.getByRole('button', { name: 'Save the note' }).click();
  await expect(page.getByRole('listitem').filter({ hasText: 'Smells of pears' })).toBeVisible();
  await expect(waiting(page)).toHaveAccessibleName('1 waiting');
  // Whoever wrote it changes it on another device.
  const theirs = await page.request.put(`${url}/${id}`, {
    headers: { ...head, 'If-Match': '"1"' },
    data: { text: 'Smells of apples' },
  });
  expect(theirs.ok(), await theirs.text()).toBe(true);

  await context.setOffline(false);
  await expect(waiting(page)).toHaveAccessibleName('1 not taken', { timeout: 30_000 });
  await waiting(page).click();
  const box = page.getByRole('dialog', { name: 'Waiting to be sent' });
  const row = box.getByRole('row', { name: /^Text/ });
  await expect(row.getByRole('cell')).toHaveText(['Smells of pears', 'Smells of apples']);
  await expectAccessible(page);
  await box.getByRole('button', { name: 'Mine shall stand' }).click();
  await expect(box.getByText('Everything has been sent.')).toBeVisible();
  const [note] = await db.select().from(batchNote).where(eq(batchNote.id, id));
  expect(note).toMatchObject({ text: 'Smells of pears', version: 3 });
});

test('a second correction without a connection leaves the first in place', async ({
  board: page,
  brewery,
  context,
  db,
}) => {
  const { first } = await cakeThatWaits(brewery, db);
  const url = `/api/breweries/${brewery.slug}/batches/${first}/readings`;
  const made = await page.request.post(url, {
    headers: { 'Sec-Fetch-Site': 'same-origin' },
    data: {
      id: crypto.randomUUID(),
      kind: 'gravity',
      takenAt: new Date().toISOString(),
      shown: 1.02,
      method: 'hydrometer',
      sampleC: null,
      instrumentId: null,
      notes: '',
      typed: {},
    },
  });
  expect(made.ok(), await made.text()).toBe(true);
  await page.goto(`/b/${brewery.slug}/batches/${first}`);
  const readings = page.getByRole('region', { name: 'Readings' });
  const form = page.getByRole('dialog');
  const correct = async (label: string, text: string) => {
    await readings.getByRole('button', { name: /^Change 1\./ }).click();
    await form.getByLabel(label).fill(text);
    await form.getByRole('button', { name: 'Save', exact: true }).click();
    await expect(form).toBeHidden();
  };
  await expect(readings).toContainText('1.020');
  await pagesAreKept(page);

  await context.setOffline(true);
  await correct('Gravity, as shown', '1.012');
  await expect(readings).toContainText('1.012');
  await correct('Note', 'Bready');
  await expect(readings).toContainText('1.012');
  await expect(waiting(page)).toHaveAccessibleName('2 waiting');

  await context.setOffline(false);
  await nothingWaits(page);
  await expect(readings).toContainText('1.012');
  const rows = await db.select().from(reading).where(eq(reading.batchId, first));
  expect(rows).toMatchObject([{ shown: 1.012, notes: 'Bready', version: 3 }]);
});

test('a reading, and the cake as it was judged, are written down without a connection', async ({
  board: page,
  brewery,
  context,
  db,
}) => {
  const { first } = await cakeThatWaits(brewery, db);
  await page.goto(`/b/${brewery.slug}/batches/${first}`);
  await expect(page.getByRole('button', { name: 'Log a reading' })).toBeVisible();
  await pagesAreKept(page);
  await context.setOffline(true);
  await page.getByRole('button', { name: 'Log a reading' }).click();
  const form = page.getByRole('dialog', { name: 'Read Creek Blonde' });
  await form.getByLabel('Gravity, as shown').fill('1.012');
  await form.getByRole('button', { name: 'Write it down' }).click();
  await expect(form).toBeHidden();
  await expect(page.getByRole('region', { name: 'Readings' })).toContainText('1.012');

  const panel = page.getByRole('complementary', { name: 'Racking and cake check' });
  await panel.getByText('Clean', { exact: true }).click();
  await panel.getByText('Fit', { exact: true }).click();
  await panel.getByRole('button', { name: 'Save the check' }).click();
  await expect(waiting(page)).toHaveAccessibleName('2 waiting');
  await page.reload();
  await expect(page.getByRole('region', { name: 'Readings' })).toContainText('1.012');

  await context.setOffline(false);
  await nothingWaits(page);
  const readings = await db.select().from(reading).where(eq(reading.batchId, first));
  expect(readings).toMatchObject([{ shown: 1.012 }]);
  const checks = await db.select().from(cakeCheck).where(eq(cakeCheck.batchId, first));
  expect(checks).toMatchObject([{ judged: 'fit', version: 1 }]);
});
