import type { Page } from '@playwright/test';
import { readFileSync } from 'node:fs';
import { expectAccessible } from './support/axe.ts';
import { BREWED, fill } from './support/batchPage.ts';
import { dayFromToday } from './support/days.ts';
import { expect, test } from './support/test.ts';

const table = (page: Page) => page.getByRole('region', { name: 'Readings' }).getByRole('table');

test('a fermentation is followed with the mouse, from the board to the signed cake', async ({
  board,
  brewery,
}) => {
  await brewery.write(BREWED);
  await board.goto(`/b/${brewery.slug}`);
  await board.getByRole('button', { name: 'More for Ebb Pale' }).click();
  await board.getByRole('menuitem', { name: 'Readings and cake' }).click();
  await expect(board.getByRole('heading', { level: 1, name: 'Ebb Pale' })).toBeVisible();
  await expect(board.getByText('Nothing is read yet.')).toBeVisible();

  await board.getByRole('button', { name: 'Log a reading' }).click();
  await fill(board, { 'Gravity, as shown': '1,018', 'Sample temperature': '26' });
  await expect(board.getByText(/Corrected: 1\.019/)).toBeVisible();
  await fill(board, { When: `${dayFromToday(-7)}T09:00` });
  await board.getByRole('button', { name: 'Write it down' }).click();
  await expect(table(board)).toContainText('1.019');
  await expect(table(board)).toContainText('1.018 at 26 °C');

  await board.getByRole('button', { name: 'Log a reading' }).click();
  await board.getByText('Temperature', { exact: true }).click();
  await fill(board, { 'Temperature of the beer': '19,4', When: `${dayFromToday(-7)}T09:05` });
  await board.getByRole('button', { name: 'Write it down' }).click();
  await expect(table(board).getByRole('row')).toHaveCount(3);
  await expectAccessible(board);

  const download = board.waitForEvent('download');
  await board.getByRole('button', { name: 'Export' }).click();
  const file = await (await download).path();
  expect(readFileSync(file, 'utf8')).toContain(`${dayFromToday(-7)} 09:05,`);

  await board.getByRole('button', { name: /^Change 19\.4 °C/ }).click();
  await expect(board.getByLabel('Temperature of the beer')).toHaveValue('19,4');
  await fill(board, { 'Temperature of the beer': '26,4' });
  await board.getByRole('button', { name: 'Save', exact: true }).click();
  await expect(board.getByRole('region', { name: 'Too warm for the yeast' })).toBeVisible();

  await judge(board);
  await expect(board.getByText('Signed by')).toBeVisible();
  await expect(board.getByText('gen 1, measured')).toBeVisible();
  await expect(board.getByText('95 % (92–97 %), 400 cells counted')).toBeVisible();
  await expectAccessible(board);
  await expect(board.getByText('Judged the cake of Ebb Pale fit')).toBeVisible();
});

/** 380 living of 400: 95 %, by Wilson 92 to 97 %. */
async function judge(page: Page): Promise<void> {
  const panel = page.getByRole('complementary', { name: 'Racking and cake check' });
  await panel.getByRole('button', { name: 'Save the check' }).click();
  await expect(panel.getByText('Taste the beer first, and say how it was').first()).toBeVisible();
  await panel.getByText('Clean', { exact: true }).click();
  await panel.getByLabel('Volume of the cake').fill('1,1');
  await panel.getByText('Cream').click();
  await panel.getByText('Bread').click();
  await panel.getByLabel('Cells were counted').check();
  await panel.getByLabel('Living cells').fill('380');
  await panel.getByLabel('Dead (stained) cells').fill('20');
  await panel.getByText('Fit', { exact: true }).click();
  await panel.getByRole('button', { name: 'Save the check' }).click();
}

const GRAVITY_BOUNDS = 'Between 0.980 and 1.200';

test('a reading is written down by keyboard alone, and its faults are said at the field', async ({
  board,
  brewery,
}) => {
  const { batches } = await brewery.write(BREWED);
  await board.goto(`/b/${brewery.slug}/batches/${batches['Ebb Pale'] ?? ''}`);
  const log = board.getByRole('button', { name: 'Log a reading' });
  await log.focus();
  await board.keyboard.press('Enter');
  const gravity = board.getByLabel('Gravity, as shown');
  for (const [text, message] of [
    ['', /Write a number/],
    ['200', GRAVITY_BOUNDS],
    ['-5', GRAVITY_BOUNDS],
  ] as const) {
    await gravity.focus();
    await board.keyboard.press('ControlOrMeta+a');
    await board.keyboard.press('Delete');
    if (text) await board.keyboard.type(text);
    await board.keyboard.press('Enter');
    await expect(gravity).toHaveAttribute('aria-invalid', 'true');
    await expect(board.getByRole('dialog').getByText(message).first()).toBeVisible();
    await expect(gravity).toHaveValue(text);
  }
  await gravity.focus();
  await board.keyboard.press('ControlOrMeta+a');
  await board.keyboard.type('1,021');
  await board.keyboard.press('Enter');
  await expect(table(board)).toContainText('1.021');
  await expect(board.getByRole('dialog')).toHaveCount(0);
});

test('what was done is deleted only when asked, and the focus then stays on the page', async ({
  board,
  brewery,
}) => {
  const { batches } = await brewery.write(BREWED);
  await board.goto(`/b/${brewery.slug}/batches/${batches['Ebb Pale'] ?? ''}`);
  const done = board.getByRole('listitem').filter({ hasText: 'Citrus peel' });
  await board.getByRole('button', { name: 'Add something' }).click();
  await fill(board, { 'What and how much': 'Citrus peel', 'Planned for': dayFromToday(3) });
  await board.getByRole('button', { name: 'Write it down' }).click();
  await expect(done).toBeVisible();

  await done.getByRole('button').click();
  await board.getByRole('button', { name: 'Delete', exact: true }).click();
  const asking = board.getByRole('dialog', { name: 'Delete what was done' });
  await asking.getByRole('button', { name: 'Leave it' }).click();
  await expect(asking).toHaveCount(0);
  await board.getByRole('button', { name: 'Delete', exact: true }).click();
  await asking.getByRole('button', { name: 'Delete', exact: true }).click();
  await expect(board.getByRole('dialog')).toHaveCount(0);
  await expect(done).toHaveCount(0);
  await expect(board.locator('#main')).toBeFocused();
});

test('a partner sees a reading as it is written down', async ({ board, partner, brewery }) => {
  const { batches } = await brewery.write(BREWED);
  const at = `/b/${brewery.slug}/batches/${batches['Ebb Pale'] ?? ''}`;
  await board.goto(at);
  await partner.goto(at);
  await expect(partner.getByText('Nothing is read yet.')).toBeVisible();
  await board.getByRole('button', { name: 'Log a reading' }).click();
  await fill(board, { 'Gravity, as shown': '1.030' });
  await board.getByRole('button', { name: 'Write it down' }).click();
  await expect(table(partner)).toContainText('1.030');
});
