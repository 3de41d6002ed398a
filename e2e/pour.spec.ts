import type { Locator } from '@playwright/test';
import { cakeThatWaits, PourPage, stageOf } from './support/pour.ts';
import { expect, test } from './support/test.ts';

/** The keyboard alone: to the control by Tab, then the key that works it. */
async function byKey(on: Locator): Promise<void> {
  const page = on.page();
  await expect(on).toBeEnabled();
  for (let tabs = 0; tabs < 80; tabs += 1) {
    if (await on.evaluate((node) => node === document.activeElement)) {
      const isTick = (await on.getAttribute('type')) === 'checkbox';
      await page.keyboard.press(isTick ? 'Space' : 'Enter');
      return;
    }
    await page.keyboard.press('Tab');
  }
  throw new Error('The keyboard does not come to it');
}

test('a whole run by keyboard', async ({ board, brewery, db }) => {
  const { second } = await cakeThatWaits(brewery, db);
  const pour = new PourPage(board, byKey);
  await pour.open(brewery.slug, second);
  await pour.toTheWort();
  await pour.log('21.5');
  await expect(pour.verdict()).toContainText('Pour: inside the window');
  await byKey(pour.button('Pour now'));
  await pour.record('', '');
  await pour.step('Air, lid and blow-off');
  await expect.poll(() => stageOf(db, second)).toMatchObject({ stage: 'fermenting', readOg: null });
});

test.describe('two people', () => {
  test.use({ expectedErrors: /status of 409 .*\/pour/ });

  test('one holds the run, asks for leave, and the head brewer gives it from another screen', async ({
    board: head,
    partner,
    brewery,
    db,
  }) => {
    const { second } = await cakeThatWaits(brewery, db);
    const theirs = new PourPage(partner, (on) => on.click());
    const mine = new PourPage(head, (on) => on.click());
    await theirs.open(brewery.slug, second);
    await mine.open(brewery.slug, second);
    await theirs.toTheWort();
    await expect(head.getByText('Ned Quill has this pour in hand.')).toBeVisible();
    await expect(mine.thermometer()).toHaveCount(0);

    await theirs.log('24.6');
    await expect(mine.verdict()).toContainText('Hold: 2.6 °C too warm');
    await theirs.button('Ask the head brewer').click();
    await expect(partner.getByText('The head brewer is asked.')).toBeVisible();

    await expect(head.getByText('Ned Quill asks to pour all the same')).toBeVisible();
    await mine.button('Let it be poured').click();
    await expect(head.getByText('Write why, in a few words')).toBeVisible();
    await head.getByLabel('Your reason').fill('It cools in the vessel');
    await mine.button('Let it be poured').click();

    await expect(partner.getByText('Orla Finch lets it: It cools in the vessel.')).toBeVisible();
    await theirs.button('Pour now').click();
    await theirs.record('22', '1.052');
    await theirs.step('Air, lid and blow-off');
    await mine.step('Air, lid and blow-off');
    await expect(head.getByText('Ebb Pale is poured')).toBeVisible();
  });

  test('a pour without leave is recorded, and red until the head brewer signs', async ({
    board: head,
    partner,
    brewery,
    db,
  }) => {
    const { second } = await cakeThatWaits(brewery, db);
    const theirs = new PourPage(partner, (on) => on.click());
    await theirs.open(brewery.slug, second);
    await theirs.toTheWort();
    await theirs.log('40');
    await expect(theirs.verdict()).toContainText('Hold: kills the yeast');
    await expect(partner.getByText('Nobody overrides that.')).toBeVisible();
    await expect(theirs.button('Ask the head brewer')).toHaveCount(0);
    await theirs.button('It is poured already').click();
    await theirs.record('22', '1.052');
    await expect(partner.getByText('Ebb Pale was poured without leave')).toBeVisible();
    await expect(partner.getByText('It stays red until a head brewer signs')).toBeVisible();

    const mine = new PourPage(head, (on) => on.click());
    await mine.open(brewery.slug, second);
    await head.getByLabel('Your reason').fill('The thermometer was broken');
    await mine.button('Sign it').click();
    await expect(partner.getByText('The thermometer was broken')).toBeVisible();
  });
});

test('an unfit cake: fresh yeast in two taps, and the chain comes along', async ({
  board,
  brewery,
  db,
}) => {
  const { second, third } = await cakeThatWaits(brewery, db);
  const pour = new PourPage(board, (on) => on.click());
  await pour.open(brewery.slug, second);
  await board.getByText('Not onto this cake: other ways').click();
  await board.getByRole('button', { name: /^A fresh pack/ }).click();
  await pour.button('Do it so').click();
  await expect(board.getByRole('heading', { level: 1 })).toHaveText('Ebb Pale onto fresh yeast');
  await expect(pour.button('Do it so')).toHaveCount(0);
  // The moves are shown before they have arrived.
  await expect
    .poll(async () => {
      const [b, c] = [await stageOf(db, second), await stageOf(db, third)];
      return [b?.place, c?.place, c?.chainId === b?.chainId];
    })
    .toEqual([0, 1, true]);
});
