import type { Page } from '@playwright/test';
import { expect } from './test.ts';

/** Waits until the pages are on the device, as they are a moment after the first visit. */
export async function pagesAreKept(page: Page): Promise<void> {
  await page.evaluate(async () => {
    const { active } = await navigator.serviceWorker.ready;
    if (!active) throw new Error('The service worker is not at work');
    if (active.state !== 'activated')
      await new Promise((done) => active.addEventListener('statechange', done, { once: true }));
  });
}

/** Keys of what a store of this device holds. */
export const keptKeys = (page: Page, database: string, store: string): Promise<string[]> =>
  page.evaluate(
    ([name, of]) =>
      new Promise<string[]>((resolve, reject) => {
        const opening = indexedDB.open(name);
        opening.onerror = () => reject(opening.error);
        opening.onsuccess = () => {
          const db = opening.result;
          if (!db.objectStoreNames.contains(of)) return resolve([]);
          const asked = db.transaction(of).objectStore(of).getAllKeys();
          asked.onsuccess = () => {
            db.close();
            resolve(asked.result.map(String));
          };
        };
      }),
    [database, store] as const,
  );

/** The mark at the top of the page that tells how much waits. */
export const waiting = (page: Page) =>
  page.getByRole('banner').getByRole('button', { name: /^\d+ (waiting|not taken)$/ });

/** How many entries are on the device, told of or not. */
const entriesOf = (page: Page): Promise<number> =>
  page.evaluate(
    () =>
      new Promise<number>((resolve, reject) => {
        const opening = indexedDB.open('barmkin-outbox');
        opening.onerror = () => reject(opening.error);
        opening.onsuccess = () => {
          const db = opening.result;
          if (!db.objectStoreNames.contains('entries')) return resolve(0);
          const asked = db.transaction('entries').objectStore('entries').get('entries');
          asked.onsuccess = () => {
            db.close();
            resolve(Array.isArray(asked.result) ? asked.result.length : 0);
          };
        };
      }),
  );

export const nothingWaits = (page: Page) =>
  expect.poll(() => entriesOf(page), { message: 'everything is sent', timeout: 30_000 }).toBe(0);
