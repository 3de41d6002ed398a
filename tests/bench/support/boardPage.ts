import { existsSync } from 'node:fs';
import { chromium, type Browser, type Page } from '@playwright/test';
import { CHROMIUM_ARGS } from '../../../e2e/support/chromium.ts';
import { sessionCookies } from '../../../e2e/support/server.ts';
import type { AtWork } from './atWork.ts';

export function openBrowser(): Promise<Browser> {
  const path = process.env.CHROMIUM ?? '/usr/bin/chromium';
  return chromium.launch({
    args: CHROMIUM_ARGS,
    ...(existsSync(path) ? { executablePath: path } : {}),
  });
}

/** The board as a head brewer sees it, in a fresh browser profile, after a moment's look at it. */
export async function openBoard(browser: Browser, at: AtWork, before?: () => void): Promise<Page> {
  const context = await browser.newContext({
    viewport: { width: 1440, height: 900 },
    // It loads every other page behind the one that is measured.
    serviceWorkers: 'block',
  });
  await context.addCookies(sessionCookies(at, at.brewery.members['head-brewer'].token));
  const page = await context.newPage();
  // A function that is sent as text was compiled with calls of this helper.
  await page.addInitScript('globalThis.__name = (each) => each');
  if (before) await page.addInitScript(before);
  await page.goto(`${at.url}/b/${at.brewery.slug}`);
  await page.locator('[data-batch]').first().waitFor();
  await page.waitForTimeout(LOOK_MS);
  return page;
}

const LOOK_MS = 2500;
