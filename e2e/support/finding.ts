import { expect, type Page } from '@playwright/test';
import type { BoardPlan } from './board.ts';

/** So many shelves that nobody scrolls through them gladly. */
export const HUNDRED_SHELVES: BoardPlan = {
  shelves: Array.from({ length: 100 }, (_, at) => ({
    name: `Shelf ${at + 1}`,
    kind: at % 2 === 0 ? ('ale' as const) : ('lager' as const),
    batches: [
      { name: `First of ${at + 1}`, brewOn: '2027-03-06', stage: 'racked' as const },
      { name: `Second of ${at + 1}`, brewOn: '2027-03-20' },
    ],
  })),
  bench: [{ name: 'Stray' }],
};

/** Opens the finder, types, and goes to the first that is found. */
export async function findByTyping(page: Page, text: string): Promise<void> {
  const dialog = page.getByRole('dialog', { name: 'Find' });
  await dialog.getByRole('combobox', { name: 'Name' }).fill(text);
  await expect(dialog.getByRole('option').first()).toBeVisible();
  await page.keyboard.press('Enter');
  await expect(dialog).toBeHidden();
}
