import { eq } from 'drizzle-orm';
import { surplus } from '../server/db/schema/cake.ts';
import { expectAccessible } from './support/axe.ts';
import { cakeThatWaits, PourPage, stageOf } from './support/pour.ts';
import { expect, test } from './support/test.ts';

test('a whole run by touch, from the racked beer to the closed fermenter', async ({
  board,
  brewery,
  db,
}) => {
  const { first, second } = await cakeThatWaits(brewery, db);
  const pour = new PourPage(board, (on) => on.tap());
  await pour.open(brewery.slug, second);
  await expect(board.getByRole('heading', { level: 1 })).toHaveText(
    'Ebb Pale onto Creek Blonde’s cake',
  );
  await pour.toTheWort();
  await expect(pour.verdict()).toContainText('Hold: no reading yet');
  await expectAccessible(board);

  await test.step('what is no temperature of a wort is told so, and stays in the field', async () => {
    await pour.log('');
    await expect(board.getByText('Write the temperature that the thermometer shows')).toBeVisible();
    await pour.log('200');
    await expect(board.getByText('200 °C would be steam')).toBeVisible();
    await expect(pour.thermometer()).toHaveValue('200');
    await pour.log('-5');
    await expect(board.getByText('−5 °C would be ice')).toBeVisible();
  });

  await test.step('a hold with a forecast, and no pour button', async () => {
    for (const [minutes, c] of [
      [25, 33.1],
      [19, 30.4],
      [13, 28.2],
      [6, 26.1],
    ] as const)
      await pour.readBefore(brewery.slug, second, minutes, c);
    await pour.log('24,6');
    await expect(pour.verdict()).toContainText('Hold: 2.6 °C too warm');
    await expect(pour.verdict()).toContainText(/In the window at about \d\d:\d\d, in \d+ minutes/);
    await expect(board.getByText('Pour is locked until 22 °C')).toBeVisible();
    await expect(pour.button('Pour now')).toHaveCount(0);
    const plot = board.getByRole('img', { name: '5 readings against time, the last 24.6 °C' });
    await expect(plot).toBeVisible();
    await expectAccessible(board);
    const wide = await board.evaluate(() => document.documentElement.scrollWidth - innerWidth);
    expect(wide, 'the page does not scroll sideways').toBeLessThanOrEqual(0);
  });

  await test.step('inside the window there is leave, and the pour goes on the record', async () => {
    await pour.log('21,5');
    await expect(pour.verdict()).toContainText('Pour: inside the window');
    await pour.button('Pour now').tap();
    await pour.record('22,5', '1.051');
    await pour.step('Air, lid and blow-off');
    await expect(board.getByText('Ebb Pale is poured')).toBeVisible();
    for (const tick of await board.getByRole('checkbox').all()) await tick.tap();
    await expect(board.getByRole('checkbox', { name: /Lid on/ })).toBeChecked();
  });

  await test.step('the batch ferments with what was read, and the rest is a jar to be', async () => {
    await expect
      .poll(() => stageOf(db, second))
      .toMatchObject({ stage: 'fermenting', readVolumeL: 22.5, readOg: 1.051 });
    const rest = await db.select().from(surplus).where(eq(surplus.cakeBatchId, first));
    expect(rest).toMatchObject([{ what: 'jar', generation: 1 }]);
  });

  await test.step('dates behind it are asked, not sprung', async () => {
    await expect(board.getByRole('heading', { name: 'Dates behind it' })).toBeVisible();
    expect((await stageOf(db, second))?.stage).toBe('fermenting');
    await pour.button('Keep my dates').tap();
    await expect(board.getByRole('heading', { name: 'Dates behind it' })).toHaveCount(0);
  });
});

test('°F and gallons by the person’s units', async ({ board, brewery, db }) => {
  const { second } = await cakeThatWaits(brewery, db);
  const session = (await (await board.request.get('/api/session')).json()) as { version: number };
  const set = await board.request.patch('/api/account', {
    headers: { 'Sec-Fetch-Site': 'same-origin', 'If-Match': `"${session.version}"` },
    data: { units: { system: 'us', gravity: 'plato', colour: 'srm', temperature: 'f' } },
  });
  expect(set.ok()).toBe(true);
  const pour = new PourPage(board, (on) => on.tap());
  await pour.open(brewery.slug, second);
  await pour.toTheWort();
  await pour.log('76,3');
  await expect(pour.verdict()).toContainText('Hold: 4.7 °F too warm');
  await expect(board.getByText('64.4 and 71.6 °F')).toBeVisible();
  await pour.log('70');
  await pour.button('Pour now').tap();
  await pour.record('6', '12.9');
  await pour.step('Air, lid and blow-off');
  await expect.poll(async () => (await stageOf(db, second))?.readVolumeL).toBeCloseTo(22.71, 2);
  expect((await stageOf(db, second))?.readOg).toBeCloseTo(1.052, 3);
});
