import type { Page } from '@playwright/test';
import { BoardPage } from './boardPage.ts';
import { SAMPLE } from './sampleSeason.ts';
import { expect, type Brewing } from './test.ts';

type Check = (page: Page) => Promise<void>;

/** What nobody has to sign in for. */
const PUBLIC_PAGES = [
  '/',
  '/sign-in',
  '/sign-up',
  '/about/checks',
  '/about/science',
  '/no-such-page',
];

/** The pages of a brewery, beside its board. */
const BREWERY_PAGES = ['yeasts', 'vessels', 'people', 'season', 'account'];

/** A page that is drawn: headed, and with nothing that is still on its way. */
async function goTo(page: Page, address: string): Promise<void> {
  await page.goto(address);
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
  await expect(page.locator('[aria-busy="true"]')).toHaveCount(0);
}

export async function publicPages(page: Page, check: Check): Promise<void> {
  for (const address of PUBLIC_PAGES) {
    await goTo(page, address);
    await check(page);
  }
}

export async function breweryPages(page: Page, brewery: Brewing, check: Check): Promise<void> {
  await goTo(page, `/b/${brewery.slug}`);
  await check(page);
  await brewery.write(SAMPLE);
  for (const name of BREWERY_PAGES) {
    await goTo(page, `/b/${brewery.slug}/${name}`);
    await check(page);
  }
}

/** The board, a batch lifted on it, and all that opens on it. */
export async function boardAndAll(page: Page, brewery: Brewing, check: Check): Promise<void> {
  await brewery.write(SAMPLE);
  const board = new BoardPage(page);
  await board.open(brewery.slug);
  await check(page);
  await lifted(board, check);
  await menus(page, check);
  await panels(board, check);
}

async function lifted(board: BoardPage, check: Check) {
  await board.handle('Ebb Pale').press('Enter');
  await board.page.keyboard.press('ArrowDown');
  await expect(board.words).toContainText(/place \d/);
  await expect(board.gapAfter('Long Night')).toHaveAttribute('data-gap-open', /./);
  await check(board.page);
  await board.page.keyboard.press('Escape');
}

async function menus(page: Page, check: Check) {
  await page.getByRole('button', { name: 'More for Ebb Pale' }).click();
  await expect(page.getByRole('menu')).toBeVisible();
  await check(page);
  await page.getByRole('menuitem', { name: 'Delete' }).click();
  await expect(page.getByRole('dialog').or(page.getByRole('alertdialog'))).toBeVisible();
  await check(page);
  await page.keyboard.press('Escape');
  await page.getByRole('button', { name: 'Move Ebb Pale', exact: true }).click();
  await expect(page.getByRole('dialog', { name: 'Where Ebb Pale can go' })).toBeVisible();
  await check(page);
  await page.keyboard.press('Escape');
}

async function panels(board: BoardPage, check: Check) {
  const { page } = board;
  await board.link('Gull Wheat', 'Long Night').click();
  await expect(page.getByRole('region', { name: 'Gull Wheat onto Long Night' })).toBeVisible();
  await check(page);
  await page.keyboard.press('Escape');

  await page.getByRole('button', { name: 'Ebb Pale', exact: true }).click();
  const form = page.getByRole('dialog', { name: 'Edit Ebb Pale' });
  await form.getByLabel('Original gravity', { exact: true }).fill('9');
  for (const fold of await form.locator('summary').all()) await fold.click();
  await form.getByRole('button', { name: 'Save', exact: true }).click();
  await expect(form.locator('[aria-invalid="true"]').first()).toBeVisible();
  await check(page);
}
