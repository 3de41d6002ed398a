import type { Page } from '@playwright/test';
import { BoardPage } from './support/boardPage.ts';
import { carryOver, lift, putDown } from './support/drag.ts';
import { expect, MOVING, test } from './support/test.ts';

test.use(MOVING);

const SEASON = {
  shelves: [
    {
      name: 'Clean ale',
      batches: [
        { name: 'Creek Blonde', og: 1.044, fg: 1.011, srm: 4, ibu: 20, brewOn: '2027-03-06' },
        { name: 'Ebb Pale', og: 1.052, fg: 1.013, srm: 7, ibu: 38, brewOn: '2027-03-20' },
      ],
    },
  ],
  bench: [{ name: 'Kelp Rye', og: 1.056, fg: 1.014, srm: 12, ibu: 34 }],
};

/** Remembers where each card that glides was when it set out, and that it did. */
function watchGlides(): void {
  const seen: string[] = [];
  Object.assign(window, { seenGlides: seen });
  new MutationObserver((changes) => {
    for (const node of changes.flatMap(({ addedNodes }) => [...addedNodes]))
      if (node instanceof HTMLElement && 'glides' in node.dataset) seen.push(node.innerText);
  }).observe(document, { childList: true, subtree: true });
}

const glides = (page: Page): Promise<string[]> =>
  page.evaluate(() => {
    const seen: unknown = Reflect.get(window, 'seenGlides');
    return Array.isArray(seen) ? seen.map(String) : [];
  });

async function dropOnShelf(page: Page, board: BoardPage): Promise<void> {
  await lift(page, board.handle('Kelp Rye'));
  await carryOver(page, board.gapAfter('Ebb Pale'));
  await putDown(page);
  await expect(board.namesOn('Clean ale')).toHaveText(['Creek Blonde', 'Ebb Pale', 'Kelp Rye']);
}

test('a dropped batch glides to its place, and nothing of the lift is left', async ({
  board: page,
  brewery,
}) => {
  await page.addInitScript(watchGlides);
  await brewery.write(SEASON);
  const board = new BoardPage(page);
  await board.open(brewery.slug);
  await dropOnShelf(page, board);
  await expect(page.locator('[data-glides]')).toHaveCount(0);
  await expect(page.locator('[data-gap-open], [data-lifting], .lifted-card')).toHaveCount(0);
  expect((await glides(page)).join()).toContain('Kelp Rye');
});

test('who asked for less motion sees it there at once', async ({ board: page, brewery }) => {
  await page.emulateMedia({ reducedMotion: 'reduce' });
  await page.addInitScript(watchGlides);
  await brewery.write(SEASON);
  const board = new BoardPage(page);
  await board.open(brewery.slug);
  await dropOnShelf(page, board);
  await expect(page.locator('[data-gap-open]')).toHaveCount(0);
  expect(await glides(page)).toEqual([]);
});

test('a batch carried by the pointer is put back by Escape, and its click presses nothing', async ({
  board: page,
  brewery,
}) => {
  await brewery.write(SEASON);
  const board = new BoardPage(page);
  await board.open(brewery.slug);
  await lift(page, board.handle('Kelp Rye'));
  await carryOver(page, board.gapAfter('Ebb Pale'));
  await expect(board.words).toContainText('after Ebb Pale');
  await page.keyboard.press('Escape');
  await expect(board.words).toContainText('Kelp Rye put back on the bench');
  await page.mouse.up();
  await expect(page.locator('[data-gap-open]')).toHaveCount(0);
  await expect(page.getByRole('dialog')).toHaveCount(0);
  await expect(board.namesOn('Clean ale')).toHaveText(['Creek Blonde', 'Ebb Pale']);
});

test('with the last scrapped batch put back the focus follows it to the bench', async ({
  board: page,
  brewery,
}) => {
  await brewery.write(SEASON);
  const board = new BoardPage(page);
  await board.open(brewery.slug);
  await page.getByRole('button', { name: 'More for Kelp Rye' }).click();
  await page.getByRole('menuitem', { name: 'Scrap' }).click();
  await page.getByRole('button', { name: 'Scrap it' }).click();
  await page.getByRole('button', { name: '1 scrapped' }).click();
  await page.getByRole('button', { name: 'Put Kelp Rye back on the bench' }).click();
  await expect(page.getByRole('dialog')).toHaveCount(0);
  await expect(board.handle('Kelp Rye')).toBeFocused();
});
