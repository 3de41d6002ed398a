import type { Locator, Page } from '@playwright/test';
import { expect } from './test.ts';

/** Further than the pointer must go before a press becomes a lift. */
const FIRST_STEP = 12;

/** The middle of what is to be seen of an element. */
export async function middle(of: Locator): Promise<{ x: number; y: number }> {
  await of.scrollIntoViewIfNeeded();
  const box = await of.boundingBox();
  expect(box, 'a place on the page').not.toBeNull();
  const { x = 0, y = 0, width = 0, height = 0 } = box ?? {};
  return { x: x + width / 2, y: y + height / 2 };
}

/** Takes a batch by its handle with the mouse, once the board around it has come to rest. */
export async function lift(page: Page, handle: Locator): Promise<void> {
  await handle.hover();
  const { x, y } = await middle(handle);
  await page.mouse.move(x, y);
  await page.mouse.down();
  await page.mouse.move(x + FIRST_STEP, y - FIRST_STEP, { steps: 3 });
}

/** Carries a lifted batch over a gap; the button stays down, so that the verdict can be read. */
export async function carryOver(page: Page, gap: Locator): Promise<void> {
  await expect(gap).toHaveAttribute('data-gap-open', /./);
  await expect(gap).toBeVisible();
  const { x, y } = await middle(gap);
  await page.mouse.move(x, y, { steps: 15 });
}

export const putDown = (page: Page): Promise<void> => page.mouse.up();
