import type { Page } from '@playwright/test';
import { BoardPage } from './support/boardPage.ts';
import { SAMPLE } from './support/sampleSeason.ts';
import { expect, test } from './support/test.ts';

const open = async (page: Page) => {
  await page.getByRole('button', { name: 'Kelp Rye', exact: true }).click();
  const form = page.getByRole('dialog', { name: 'Edit Kelp Rye' });
  return { form, field: (label: string) => form.getByLabel(label, { exact: true }) };
};

test('a figure reads after saving as it was typed, decimal comma and all', async ({
  board: page,
  brewery,
}) => {
  await brewery.write(SAMPLE);
  await new BoardPage(page).open(brewery.slug);
  const typed = {
    Volume: '22,50',
    'Original gravity': '1,0560',
    Colour: '12,0',
    Bitterness: '34.25',
    'Ferments at': '19,5',
  };
  const { form, field } = await open(page);
  for (const [label, text] of Object.entries(typed)) await field(label).fill(text);
  await form.getByRole('button', { name: 'Save', exact: true }).click();
  await expect(form).toBeHidden();

  await page.reload();
  await open(page);
  for (const [label, text] of Object.entries(typed)) await expect(field(label)).toHaveValue(text);
});

test('what cannot be read is said at its field, and what was typed stays', async ({
  board: page,
  brewery,
}) => {
  await brewery.write(SAMPLE);
  await new BoardPage(page).open(brewery.slug);
  const { form, field } = await open(page);
  await field('Volume').fill('two buckets');
  await field('Colour').fill('11');
  await form.getByRole('button', { name: 'Save', exact: true }).click();
  await expect(field('Volume')).toHaveAttribute('aria-invalid', 'true');
  await expect(field('Volume')).toHaveValue('two buckets');
  await expect(field('Colour')).toHaveValue('11');
  await field('Volume').fill('21');
  await form.getByRole('button', { name: 'Save', exact: true }).click();
  await expect(form).toBeHidden();
});

test('other units show the same beer, and back again the figure as it was typed', async ({
  board: page,
  brewery,
}) => {
  await brewery.write(SAMPLE);
  const address = `/b/${brewery.slug}`;
  await page.goto(address);
  const first = await open(page);
  await first.field('Volume').fill('23,0');
  await first.form.getByRole('button', { name: 'Save', exact: true }).click();
  await expect(first.form).toBeHidden();

  const choose = async (...names: string[]) => {
    await page.goto(`${address}/account`);
    for (const name of names) {
      const saved = page.waitForResponse(
        (answer) => answer.url().endsWith('/api/account') && answer.request().method() === 'PATCH',
      );
      const radio = page.getByRole('radio', { name, exact: true });
      await radio.click();
      await expect(radio).toBeChecked();
      expect((await saved).status()).toBe(200);
    }
    await page.goto(address);
  };
  await choose('US gallons, ounces', '°P', 'EBC', '°F');
  const there = await open(page);
  // 23 L ÷ 3.785411784 L/gal; 20 °C × 9/5 + 32; 12 SRM × 1.97.
  await expect(there.field('Volume')).toHaveValue(/^6\.08?$/);
  await expect(there.field('Ferments at')).toHaveValue('68');
  await expect(there.field('Colour')).toHaveValue(/^2[34](\.\d)?$/);
  await page.keyboard.press('Escape');
  await choose('Litres, grams', 'SG', 'SRM', '°C');
  await expect((await open(page)).field('Volume')).toHaveValue('23,0');
});
