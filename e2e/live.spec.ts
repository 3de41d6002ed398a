import type { Page } from '@playwright/test';
import { eq } from 'drizzle-orm';
import { api } from '#shared/api/urls.ts';
import { session } from '../server/db/schema/people.ts';
import { expectAccessible } from './support/axe.ts';
import { expect, test, type Brewing } from './support/test.ts';

/** What another does is to be seen within this time. */
const SOON = { timeout: 1_000 };

const SEASON = {
  shelves: [
    {
      name: 'Clean ale',
      batches: [
        { name: 'Creek Blonde', brewOn: '2027-03-06' },
        { name: 'Ebb Pale', og: 1.052, fg: 1.013, srm: 7, ibu: 38, brewOn: '2027-03-20' },
      ],
    },
    { name: 'Lantern row', batches: [{ name: 'Lamp Amber', srm: 12, brewOn: '2027-03-08' }] },
  ],
  bench: [{ name: 'Lantern Stout', og: 1.054, fg: 1.014, srm: 33, ibu: 32 }],
} as const;

async function openBoard(page: Page, brewery: Brewing): Promise<void> {
  await page.goto(`/b/${brewery.slug}`);
  await expect(page.getByRole('banner').getByText('Live', { exact: true })).toBeVisible();
}

/** Asks the server as this page would. */
async function ask(page: Page, method: string, url: string, body?: unknown, version?: number) {
  const status = await page.evaluate(
    async ({ method, url, body, version }) => {
      const headers: Record<string, string> = { 'Content-Type': 'application/json' };
      if (version !== undefined) headers['If-Match'] = `"${version}"`;
      const init = { method, headers, ...(body !== undefined && { body: JSON.stringify(body) }) };
      return (await fetch(url, init)).status;
    },
    { method, url, body, version },
  );
  expect(status, `${method} ${url}`).toBeLessThan(300);
}

const moveOf = (batchId: string, from: string | null, toChainId: string, after: string | null) => ({
  id: crypto.randomUUID(),
  batchId,
  toChainId,
  afterBatchId: after,
  expectedChainId: from,
  dates: 'keep',
});

test('a move of one appears to the other within a second, and says who is here', async ({
  board,
  brewery,
  partner,
}) => {
  const { batches, chains } = await brewery.write(SEASON);
  await openBoard(board, brewery);
  await openBoard(partner, brewery);
  await expect(board.getByRole('img', { name: 'Ned Quill, brewer, here now' })).toBeVisible();
  await expect(
    partner.getByRole('img', { name: 'Orla Finch, head brewer, here now' }),
  ).toBeVisible();
  await expect(board.getByRole('img', { name: 'Ivy Marsh, taster', exact: true })).toBeVisible();

  const stout = batches['Lantern Stout'] ?? '';
  const target = chains['Clean ale'] ?? '';
  await ask(
    partner,
    'POST',
    api.moves(brewery.slug),
    moveOf(stout, null, target, batches['Ebb Pale'] ?? ''),
  );
  await expect(standing(board, target, 'Lantern Stout')).toBeVisible(SOON);
  await expectAccessible(board);

  await partner.close();
  await expect(board.getByRole('img', { name: 'Ned Quill, brewer', exact: true })).toBeVisible();
});

test.describe(() => {
  test.use({ expectedErrors: /status of 412 .*\/batches\/[^/]+\)$/ });

  test('an open form keeps what is written in it and the focus, and says quietly who changed what', async ({
    board,
    brewery,
    partner,
  }) => {
    const { batches } = await brewery.write(SEASON);
    const pale = batches['Ebb Pale'] ?? '';
    await openBoard(partner, brewery);
    await board.goto(`/b/${brewery.slug}?batch=${pale}`);
    const form = board.getByRole('dialog', { name: 'Edit Ebb Pale' });
    const bitterness = form.getByLabel(/^Bitterness/);
    await bitterness.fill('41');

    await ask(partner, 'PATCH', api.batch(brewery.slug, pale), { ibu: 44, fg: 1.012 }, 1);
    const notice = form.getByRole('status');
    await expect(notice).toContainText('Ned Quill changed this while you were writing', SOON);
    await expect(notice).toContainText('Bitterness');
    await expect(bitterness).toBeFocused();
    await expect(bitterness).toHaveValue('41');
    await expectAccessible(board);

    await form.getByRole('button', { name: 'Save' }).click();
    await expect(form.getByText(/Choose which shall stand/)).toBeVisible();
    await form.getByRole('radio', { name: /^Theirs/ }).check();
    await form.getByRole('button', { name: 'Save what I chose' }).click();
    await expect(form).toBeHidden();
  });
});

test('a drag is not disturbed: what others do appears when it ends', async ({
  board,
  brewery,
  partner,
}) => {
  const { batches, chains } = await brewery.write(SEASON);
  await openBoard(board, brewery);
  await openBoard(partner, brewery);
  await lift(board, 'Lantern Stout');
  const ale = chains['Clean ale'] ?? '';
  const amber = batches['Lamp Amber'] ?? '';
  const read = board.waitForResponse((answer) => answer.url().endsWith('/board'));
  await ask(
    partner,
    'POST',
    api.moves(brewery.slug),
    moveOf(amber, chains['Lantern row'] ?? '', ale, batches['Ebb Pale'] ?? ''),
  );
  // Heard of and read, and not shown.
  await (await read).finished();
  await expectInHand(board, 'Lantern Stout');
  await expect(standing(board, ale, 'Lamp Amber')).toHaveCount(0);
  await board.keyboard.press('Escape');
  await board.mouse.up();
  await expect(standing(board, ale, 'Lamp Amber')).toBeVisible(SOON);
});

test('a drag ends with a word where the batch in the hand is gone', async ({
  board,
  brewery,
  partner,
}) => {
  const { batches } = await brewery.write(SEASON);
  await openBoard(board, brewery);
  await openBoard(partner, brewery);
  await lift(board, 'Lantern Stout');
  const stout = batches['Lantern Stout'] ?? '';
  await ask(partner, 'DELETE', api.batch(brewery.slug, stout), undefined, 1);
  await expect(board.locator('[data-lift-words]')).toContainText(
    'Lantern Stout is no longer on this board',
    SOON,
  );
  await expect(inHand(board)).toHaveCount(0);
  await expect(board.locator('[data-lifting]')).toHaveCount(0);
  await board.mouse.up();
});

test('two tabs share one stream, and both are told', async ({ board, brewery, partner }) => {
  const { batches } = await brewery.write(SEASON);
  const streams: string[] = [];
  board.context().on('request', (request) => {
    if (request.url().includes('/events')) streams.push(request.url());
  });
  await openBoard(board, brewery);
  const second = await board.context().newPage();
  await openBoard(second, brewery);
  await openBoard(partner, brewery);
  const blonde = batches['Creek Blonde'] ?? '';
  await ask(partner, 'PATCH', api.batch(brewery.slug, blonde), { name: 'Creek Kölsch' }, 1);
  for (const page of [board, second])
    await expect(page.getByText('Creek Kölsch').first()).toBeVisible(SOON);
  expect(streams).toHaveLength(1);

  // The tab that had the stream goes; the other takes it over and misses nothing.
  await board.close();
  await ask(partner, 'PATCH', api.batch(brewery.slug, blonde), { name: 'Creek Golden' }, 2);
  await expect(second.getByText('Creek Golden').first()).toBeVisible({ timeout: 3_000 });
  expect(streams).toHaveLength(2);
});

test.describe(() => {
  test.use({ expectedErrors: /ERR_INTERNET_DISCONNECTED|ERR_NETWORK_CHANGED|ERR_FAILED/ });

  test('a lost network is told, and what was missed is there when it is back', async ({
    board,
    brewery,
    partner,
  }) => {
    const { batches } = await brewery.write(SEASON);
    await openBoard(board, brewery);
    await openBoard(partner, brewery);
    await board.context().setOffline(true);
    await expect(board.getByText(/No connection/).first()).toBeVisible();
    const blonde = batches['Creek Blonde'] ?? '';
    await ask(partner, 'PATCH', api.batch(brewery.slug, blonde), { name: 'Creek Golden' }, 1);
    await board.context().setOffline(false);
    await expect(board.getByText('Creek Golden').first()).toBeVisible({ timeout: 3_000 });
    await expect(board.getByRole('banner').getByText('Live', { exact: true })).toBeVisible();
  });
});

test('a page whose sign-in is ended elsewhere asks to sign in', async ({ board, brewery, db }) => {
  await brewery.write(SEASON);
  const member = brewery.members['head-brewer'];
  await openBoard(board, brewery);
  await db.delete(session).where(eq(session.personId, member.id));
  await expect(board).toHaveURL(/\/sign-in\?next=/, { timeout: 20_000 });
});

/** A batch on a shelf. */
const standing = (page: Page, chainId: string, name: string) =>
  page.locator(`[data-chain="${chainId}"]`).getByRole('button', { name, exact: true });

/** Takes a batch by the pointer and carries it a little. */
async function lift(page: Page, name: string): Promise<void> {
  const handle = page.getByRole('button', { name: `Lift ${name}` });
  const box = await handle.boundingBox();
  if (!box) throw new Error(`${name} has no handle in sight`);
  const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
  await page.mouse.move(x, y);
  await page.mouse.down();
  await page.mouse.move(x + 30, y - 30, { steps: 10 });
  await expectInHand(page, name);
}

const inHand = (page: Page) => page.locator('.lifted-card');

/** The batch is carried, and each shelf holds its places open. */
async function expectInHand(page: Page, name: string): Promise<void> {
  await expect(inHand(page)).toContainText(name);
  for (const shelf of ['Clean ale', 'Lantern row'])
    await expect(
      page.getByRole('region', { name: shelf, exact: true }).locator('[data-gap-open]').first(),
    ).toBeVisible();
}
