import { expect, test } from './support/ownServer.ts';
import { cakeThatWaits, PourPage, stageOf } from './support/pour.ts';

// With each step of the clock the server is gone for a moment.
test.use({
  expectedErrors:
    /ERR_CONNECTION_(REFUSED|RESET|CLOSED)|ERR_EMPTY_RESPONSE|ERR_SOCKET_NOT_CONNECTED|ERR_INCOMPLETE_CHUNKED_ENCODING/,
});

/** London goes over to summer time in the night of 29 March 2026, at 01:00 UTC. */
const BEGIN = new Date('2026-03-28T23:50:00Z');
const MINUTE_MS = 60_000;

/**
 * Wort that cools towards 20 °C by Newton's law, from 30 °C at the beginning to 22 °C after 126
 * minutes: 20 + 10 × exp(−ln 5 × t / 126).
 */
const wortAfter = (minutes: number) =>
  (20 + 10 * Math.exp((-Math.log(5) * minutes) / 126)).toFixed(1);

test('a pour over midnight and over the change to summer time', async ({
  own,
  board: page,
  brewery,
  context,
  db,
}) => {
  const { second } = await cakeThatWaits(brewery, db, { on: BEGIN });
  const pour = new PourPage(page, (on) => on.click());

  /** Server and device, so many minutes after the beginning. */
  const at = async (minutes: number) => {
    await own.kill();
    const then = BEGIN.getTime() + minutes * MINUTE_MS;
    await own.again({ TEST_NOW: new Date(then).toISOString() });
    await context.clock.fastForward(Math.max(0, then - (await page.evaluate(() => Date.now()))));
  };
  let readings = 0;
  const readNow = async (minutes: number) => {
    await pour.log(wortAfter(minutes));
    await expect(page.getByText(`All readings (${(readings += 1)})`)).toBeVisible();
  };
  const readAt = async (minutes: number) => {
    await at(minutes);
    await readNow(minutes);
  };

  await own.kill();
  await own.again({ TEST_NOW: BEGIN.toISOString() });
  await context.clock.install({ time: BEGIN });

  await test.step('it is due on the evening before', async () => {
    await page.goto(`/b/${brewery.slug}/today`);
    await expect(page.getByText('Sat 28 March', { exact: true })).toBeVisible();
    const due = page.getByRole('region', { name: 'Due today' });
    await expect(due).toContainText('Brew Ebb Pale');
    await pour.open(brewery.slug, second);
    await pour.toTheWort();
  });

  await test.step('minutes are minutes, whatever the clock on the wall says', async () => {
    await readNow(0);
    for (const minutes of [20, 40, 70, 90]) await readAt(minutes);
    await expect(pour.verdict()).toContainText('Mind: 1.2 °C too warm');
    // 01:56 UTC by Newton's law; on the wall it is an hour later by then.
    await expect(pour.verdict()).toContainText(
      /In the window at about (02:[45]\d|03:0\d), in [34]\d minutes/,
    );
    await page.getByText('All readings (5)').click();
    await expect(page.getByRole('listitem').filter({ hasText: 'Take back' })).toContainText([
      /02:20 · 23\.2/,
      /02:00 · 24\.1/,
      /00:30 · 26 °C/,
      /00:10 · 27\.7/,
      /23:50 · 30 °C/,
    ]);
  });

  await test.step('leave holds for its time, and the beer is brewed on the day of its pour', async () => {
    await at(128);
    await pour.log('21.9');
    await expect(pour.verdict()).toContainText('Pour: inside the window');
    await expect(page.getByText(/Leave holds until 03:(0|1)\d/)).toBeVisible();
    await pour.button('Pour now').click();
    await pour.record('22', '1.052');
    await pour.step('Air, lid and blow-off');
    await expect
      .poll(() => stageOf(db, second))
      .toMatchObject({ stage: 'fermenting', brewOn: '2026-03-29' });
    await page.goto(`/b/${brewery.slug}/today`);
    await expect(page.getByText('Sun 29 March', { exact: true })).toBeVisible();
    await expect(page.getByText('Brew Ebb Pale')).toHaveCount(0);
  });
});
