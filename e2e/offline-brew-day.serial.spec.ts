import { eq } from 'drizzle-orm';
import { pourEvent, pourReading, pourRun } from '../server/db/schema/pour.ts';
import { nothingWaits, pagesAreKept, waiting } from './support/device.ts';
import { expect, test } from './support/ownServer.ts';
import { cakeThatWaits, PourPage, stageOf } from './support/pour.ts';

// A phone, with everything on it that a phone keeps.
test.use({
  viewport: { width: 390, height: 844 },
  hasTouch: true,
  isMobile: true,
  serviceWorkers: 'allow',
  expectedErrors:
    /ERR_INTERNET_DISCONNECTED|ERR_CONNECTION_(REFUSED|RESET|CLOSED)|ERR_EMPTY_RESPONSE|ERR_SOCKET_NOT_CONNECTED|ERR_INCOMPLETE_CHUNKED_ENCODING/,
});

test('a brew day in a cold garage: the network cut twice, the server killed before the pour, and everything arrives once', async ({
  own,
  board: page,
  brewery,
  context,
  db,
}) => {
  const { second } = await cakeThatWaits(brewery, db);
  const pour = new PourPage(page, (on) => on.tap());

  await test.step('from what is due today, one tap leads to the pour', async () => {
    await page.goto(`/b/${brewery.slug}/today`);
    await expect(page.getByRole('heading', { level: 1, name: 'Today' })).toBeVisible();
    const duty = page.getByRole('listitem').filter({ hasText: 'Brew Ebb Pale' });
    await expect(duty).toContainText('Onto the cake of Creek Blonde.');
    await pagesAreKept(page);
    await duty.getByRole('link', { name: 'Pour check' }).tap();
    await expect(pour.button('Begin the pour')).toBeVisible();
  });

  await test.step('cut once: the whole way to the wort is gone, and waits', async () => {
    await context.setOffline(true);
    await pour.toTheWort();
    await pour.log('24,6');
    await expect(pour.verdict()).toContainText('Hold: 2.6 °C too warm');
    await expect(waiting(page)).toBeVisible();
  });

  await test.step('a phone that was put away opens it again without a connection', async () => {
    await page.reload();
    await pour.step('Wort temperature');
    await expect(pour.verdict()).toContainText('Hold: 2.6 °C too warm');
    await expect(
      page.getByText(/No connection\. You can read what is here, as it was/),
    ).toBeVisible();
    await expect(page.getByText('Without a connection nothing can give leave')).toBeVisible();
  });

  await test.step('back again: it arrives, and a reading inside the window gives leave', async () => {
    await context.setOffline(false);
    await nothingWaits(page);
    await pour.log('21,5');
    await expect(pour.button('Pour now')).toBeVisible();
  });

  await test.step('the server is killed, and the network cut: the leave holds for its time', async () => {
    await own.kill();
    await context.setOffline(true);
    await pour.button('Pour now').tap();
    await pour.record('22,5', '1.051');
    await expect(page.getByText('Ebb Pale is poured')).toBeVisible();
    await expect(page.getByText('Not sent yet. It waits on this device')).toBeVisible();
    await page.getByRole('checkbox', { name: /Lid on/ }).tap();
    // It shows once it is stored: the page is left at once.
    await expect(page.getByRole('checkbox', { name: /Lid on/ })).toBeChecked();
  });

  await test.step('the network is back and the server is not: it goes on waiting', async () => {
    await context.setOffline(false);
    await page.reload();
    await expect(page.getByText('Ebb Pale is poured')).toBeVisible();
    await expect(waiting(page)).toBeVisible();
  });

  await test.step('everything arrives, once and in order', async () => {
    await own.again();
    await nothingWaits(page);
    await expect(page.getByText('Not sent yet.')).toHaveCount(0);
    const runs = await db.select().from(pourRun).where(eq(pourRun.batchId, second));
    expect(runs).toMatchObject([{ state: 'poured', step: 'after', steps: { lidOn: true } }]);
    const readings = await db
      .select()
      .from(pourReading)
      .where(eq(pourReading.runId, runs[0]?.id ?? ''))
      .orderBy(pourReading.deviceAt);
    expect(readings.map(({ temperatureC }) => temperatureC)).toEqual([24.6, 21.5]);
    const pours = await db.select().from(pourEvent).where(eq(pourEvent.batchId, second));
    expect(pours).toMatchObject([{ cleared: true, volumeL: 22.5, og: 1.051 }]);
    expect(pours[0]?.readingId).toBe(readings[1]?.id);
    expect(Number(pours[0]?.arrivedAt)).toBeGreaterThan(Number(pours[0]?.deviceAt));
    expect(await stageOf(db, second)).toMatchObject({ stage: 'fermenting', readVolumeL: 22.5 });
  });
});
