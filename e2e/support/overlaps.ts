import type { Page } from '@playwright/test';

/** What is read or pressed on a batch's card. */
const PARTS = [
  'h2 button',
  'h3 button',
  'h2 + p',
  'h3 + p',
  '[data-lift-handle]',
  'button[aria-label^="Move "]',
  'button[aria-label^="More for"]',
  '[data-verdict]',
].join(', ');

/** Batches whose parts lie over one another or outside their card, in words; at most a dozen. */
export const overlaps = (page: Page): Promise<string[]> =>
  page.evaluate((parts) => {
    const SLACK = 1;
    const told: string[] = [];
    const words = (part: Element) => part.getAttribute('aria-label') ?? part.textContent ?? '';
    for (const card of document.querySelectorAll('[data-batch]')) {
      const frame = card.getBoundingClientRect();
      // Above a card there is room that belongs to its shelf: what is above that is cut off.
      const top = (card.closest('.shelf-run') ?? card).getBoundingClientRect().top;
      const boxes = [...card.querySelectorAll(parts)].map((part) => ({
        part,
        box: part.getBoundingClientRect(),
      }));
      for (const { part, box } of boxes) {
        const isInside =
          box.left >= frame.left - SLACK &&
          box.right <= frame.right + SLACK &&
          box.top >= top - SLACK &&
          box.bottom <= frame.bottom + SLACK;
        if (box.width === 0 || !isInside) told.push(`${words(part)} is not inside its card`);
        for (const other of boxes) {
          const isApart =
            other.box.left >= box.right - SLACK ||
            other.box.right <= box.left + SLACK ||
            other.box.top >= box.bottom - SLACK ||
            other.box.bottom <= box.top + SLACK;
          if (other.part !== part && !isApart)
            told.push(`${words(part)} lies over ${words(other.part)}`);
        }
      }
    }
    return told.slice(0, 12);
  }, PARTS);

/** How far the page is wider than its window, in pixels. */
export const tooWide = (page: Page): Promise<number> =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
