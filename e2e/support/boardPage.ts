import type { Locator, Page } from '@playwright/test';
import { expect } from './test.ts';

/** The board as a brewer speaks of it: shelves, batches, gaps and links by their names. */
export class BoardPage {
  readonly page: Page;
  /** What a gesture says to a screen reader. */
  readonly words: Locator;
  readonly changes: Locator;
  readonly bench: Locator;
  readonly newShelf: Locator;

  constructor(page: Page) {
    this.page = page;
    this.words = page.locator('[data-lift-words]');
    this.changes = page.getByRole('region', { name: 'What the move changed' });
    this.bench = page.getByRole('region', { name: /^On the bench/ });
    this.newShelf = page.locator('[data-gap="new"]');
  }

  /** @param patienceMs more than usual for a board of hundreds */
  async open(slug: string, patienceMs = 7_000): Promise<void> {
    await this.page.goto(`/b/${slug}`);
    await expect(this.page.locator('[data-batch]').first()).toBeVisible({ timeout: patienceMs });
  }

  shelf(name: string): Locator {
    return this.page.getByRole('region', { name, exact: true });
  }

  /** The names on a shelf, first to last. */
  namesOn(shelf: string): Locator {
    return this.shelf(shelf).locator('[data-batch] h3');
  }

  batch(name: string): Locator {
    return this.page.locator(`[data-batch]:has(button[title="${name}"])`);
  }

  handle(name: string): Locator {
    return this.batch(name).locator('[data-lift-handle]');
  }

  gapAfter(name: string): Locator {
    return this.batch(name).locator('[data-gap]');
  }

  firstGap(shelf: string): Locator {
    return this.shelf(shelf).locator('[data-gap$=":first"]');
  }

  /** The verdict between two batches, which opens the link's panel. */
  link(later: string, earlier: string): Locator {
    return this.page.getByRole('button', { name: new RegExp(`^${later} onto ${earlier}:`) });
  }

  sum(words: string | RegExp): Locator {
    return this.page.getByText(words);
  }
}
