import type { Locator, Page } from '@playwright/test';
import { expect } from './test.ts';

/** More stops than a page of these tests has. */
const STOPS = 150;

/** Walks with Tab until something has the focus, as somebody without a mouse would. */
export async function tabTo(page: Page, target: Locator): Promise<void> {
  await expect(target).toBeVisible();
  for (let stop = 0; stop < STOPS; stop += 1) {
    if (await target.evaluate((element) => element === document.activeElement)) return;
    await page.keyboard.press('Tab');
  }
  await expect(target, 'reached with Tab').toBeFocused();
}

/** Goes to a field and types into it, in place of what it holds. */
export async function typeInto(page: Page, field: Locator, text: string): Promise<void> {
  await tabTo(page, field);
  await page.keyboard.press('ControlOrMeta+a');
  await page.keyboard.type(text);
}

export async function press(page: Page, button: Locator): Promise<void> {
  await tabTo(page, button);
  await page.keyboard.press('Enter');
}
