import { expectAccessible } from './support/axe.ts';
import { SAMPLE } from './support/sampleSeason.ts';
import { expect, test } from './support/test.ts';

test('a finding leads to its formula with the figures of its link', async ({ board, brewery }) => {
  const { batches } = await brewery.write(SAMPLE);
  const later = batches['Gull Wheat'] ?? '';
  await board.goto(`/b/${brewery.slug}?link=${later}`);
  const panel = board.getByRole('region', { name: 'Gull Wheat onto Long Night' });
  const kept = await panel.getByLabel('Kept part', { exact: true }).inputValue();
  const row = (name: RegExp) => panel.getByRole('row').filter({ hasText: name });
  const asPoured = async (name: RegExp) =>
    (await row(name).getByRole('cell').last().textContent())?.trim() ?? '';
  const colour = await asPoured(/^Colour/);
  const bitterness = await asPoured(/^Bitterness/);
  const gravity = await asPoured(/^Gravity/);
  const abv = /holds ([\d.]+)\s% ABV/.exec((await panel.textContent()) ?? '')?.[1] ?? 'no ABV';

  await panel.getByRole('link', { name: /^The science of it.*Tired cake/ }).click();
  await expect(board).toHaveURL(new RegExp(`/science\\?link=${later}#alcohol$`));
  await expect(board.getByRole('heading', { name: 'Alcohol', exact: true })).toBeInViewport();
  await expect(board.getByLabel('Worked with the figures of')).toHaveValue(later);
  const figure = (id: string) => board.locator(`[data-figure="${id}"]`);
  await expect(figure('abv')).toHaveText(new RegExp(`^${abv}\\s% ABV$`));
  await expect(figure('kept')).toHaveText(new RegExp(`^${kept}\\smL$`));
  await expect(figure('colour-poured')).toContainText(colour);
  await expect(figure('bitterness-poured')).toContainText(bitterness);
  await expect(figure('gravity-poured')).toContainText(gravity);
  await expect(board.getByRole('math').first()).toHaveAccessibleName(/^P equals/);
  await expectAccessible(board);

  const before = await figure('need').textContent();
  await board
    .getByLabel('Worked with the figures of')
    .selectOption({ label: 'Ebb Pale onto Creek Blonde' });
  await expect(figure('need')).not.toHaveText(before ?? '');
  await expect(board).toHaveURL(new RegExp(`link=${batches['Ebb Pale']}`));
});

test('a rule without a formula has its own entry', async ({ board, brewery }) => {
  const { batches } = await brewery.write(SAMPLE);
  await board.goto(`/b/${brewery.slug}?link=${batches['Lantern Stout']}`);
  await board.getByRole('link', { name: /^The science of it.*Hops in the cake/ }).click();
  await expect(board.getByText('Hops in the cake', { exact: true })).toBeInViewport();
});

test('without a link there are the formulas alone', async ({ board, brewery }) => {
  await board.goto(`/b/${brewery.slug}/science`);
  await expect(board.getByText(/No batch is poured onto another’s cake yet/)).toBeVisible();
  await expect(board.getByRole('heading', { name: 'What a wort needs' })).toBeVisible();
});

test('anybody reads the science with an example', async ({ page }) => {
  await page.goto('/about/checks');
  await page.getByRole('link', { name: /^The science/ }).click();
  await expect(page.getByRole('heading', { level: 1, name: 'The science' })).toBeVisible();
  await expect(page.getByLabel('Worked with the figures of').getByRole('option')).toHaveCount(3);
  await expect(page.locator('[data-figure="abv"]')).toHaveText(/^\d\.\d\s% ABV$/);
  await expect(page.locator('td', { hasText: 'not known' })).toHaveCount(0);
});
