import { test as base, expect, type BrowserContext, type Page } from '@playwright/test';
import type { Role } from '#shared/api/people.ts';
import { connect, type Db } from '../../server/db/client.ts';
import { leaveBrewery, writeBrewery, type TestBrewery } from './brewery.ts';
import { writeBoard, type BoardPlan, type WrittenBoard } from './board.ts';
import { sessionCookies, sharedServer, type RunningServer } from './server.ts';

export interface Brewing extends TestBrewery {
  /** Puts shelves and batches on the board. */
  write(plan: BoardPlan): Promise<WrittenBoard>;
  /** Signs a browser in as the member of a role. */
  signIn(context: BrowserContext, role: Role): Promise<void>;
}

export interface Fixtures {
  /** Console errors that this test expects; anything else on the console fails it. */
  expectedErrors: RegExp | null;
  brewery: Brewing;
  /** The page, signed in as the brewery's head brewer. */
  board: Page;
  /** One more browser, watched like the first, in which a member is signed in; null: nobody. */
  another: (member: { token: string } | null) => Promise<Page>;
  /** A second browser, in which the brewer is signed in. */
  partner: Page;
  watch: void;
}

export interface WorkerFixtures {
  server: RunningServer;
  db: Db;
}

/** Every test gets a brewery of its own, so that none depends on another or on their order. */
export const test = base.extend<Fixtures, WorkerFixtures>({
  server: [async ({}, use) => use(sharedServer()), { scope: 'worker' }],
  db: [
    async ({ server }, use) => {
      const { db, pool } = connect(server.databaseUrl, { max: 2 });
      await use(db);
      await pool.end();
    },
    { scope: 'worker' },
  ],
  expectedErrors: [null, { option: true }],
  watch: [
    async ({ context, expectedErrors }, use) => {
      const errors = watchErrors(context);
      await use();
      expect(others(errors, expectedErrors), 'errors on the console').toEqual([]);
    },
    { auto: true },
  ],
  brewery: async ({ db, server }, use) => {
    const made = await writeBrewery(db);
    await use({
      ...made,
      write: (plan) => writeBoard(db, made, plan),
      signIn: (context, role) =>
        context.addCookies(sessionCookies(server, made.members[role].token)),
    });
    await leaveBrewery(db, made);
  },
  board: async ({ brewery, context, page }, use) => {
    await brewery.signIn(context, 'head-brewer');
    await use(page);
  },
  another: async ({ browser, server, expectedErrors, contextOptions, baseURL }, use) => {
    const opened: { context: BrowserContext; errors: string[] }[] = [];
    await use(async (member) => {
      const context = await browser.newContext({ ...contextOptions, baseURL: baseURL ?? '' });
      opened.push({ context, errors: watchErrors(context) });
      if (member) await context.addCookies(sessionCookies(server, member.token));
      return context.newPage();
    });
    for (const { context, errors } of opened) {
      await context.close();
      expect(others(errors, expectedErrors), 'errors on the console of another').toEqual([]);
    }
  },
  partner: async ({ brewery, another }, use) => use(await another(brewery.members.brewer)),
});

/** For tests of what moves: `test.use(MOVING)`. */
export const MOVING = { contextOptions: { reducedMotion: 'no-preference' } } as const;

const others = (errors: readonly string[], expected: RegExp | null) =>
  errors.filter((text) => !expected?.test(text));

/** Whoever is not signed in asks who is, and is told nobody: the browser calls every 401 an error. */
const NOBODY_SIGNED_IN = /status of 401 .*\/api\/session\)$/;

/** What any page of a browser writes to the console as an error, or throws. */
export function watchErrors(context: BrowserContext): string[] {
  const errors: string[] = [];
  context.on('console', (message) => {
    const text = `${message.text()} (${message.location().url})`;
    if (message.type() === 'error' && !NOBODY_SIGNED_IN.test(text)) errors.push(text);
  });
  context.on('weberror', (error) => errors.push(String(error.error())));
  return errors;
}

export { expect };
