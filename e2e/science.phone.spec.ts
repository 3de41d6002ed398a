import { expectAccessible } from './support/axe.ts';
import { tooWide } from './support/overlaps.ts';
import { expect, test } from './support/test.ts';

test('the science fits a phone', async ({ page }) => {
  await page.goto('/about/science');
  await expect(page.getByRole('heading', { level: 1, name: 'The science' })).toBeVisible();
  expect(await tooWide(page)).toBeLessThanOrEqual(0);
  await expectAccessible(page);
});
