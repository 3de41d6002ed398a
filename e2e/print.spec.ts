import type { Page } from '@playwright/test';
import { api } from '#shared/api/urls.ts';
import { expectAccessible } from './support/axe.ts';
import { largeSeason } from './support/largeSeason.ts';
import { dense, readPdf } from './support/pdf.ts';
import { demoSeason } from './support/demoSeason.ts';
import { SAMPLE } from './support/sampleSeason.ts';
import { expect, test } from './support/test.ts';

/** Sheets in mm. A page for the printer names its own size, which the browser then takes. */
const SHEETS = { a4: [210, 297], letter: [215.9, 279.4] } as const;
const PAPERS = ['a4', 'letter'] as const;
type Paper = (typeof PAPERS)[number];

async function printed(page: Page, address: string) {
  await page.goto(address);
  await expect(page.getByRole('article').getByRole('heading', { level: 1 })).toBeVisible();
  await page.evaluate(() => document.fonts.ready);
  return readPdf(await page.pdf({ preferCSSPageSize: true }));
}

function expectSheets({ size, pages }: Awaited<ReturnType<typeof readPdf>>, paper: Paper) {
  const [width, height] = SHEETS[paper];
  expect(Math.abs(size[0] - width)).toBeLessThan(0.5);
  expect(Math.abs(size[1] - height)).toBeLessThan(0.5);
  for (const [at, words] of pages.entries()) {
    expect(words).toContain(`page${at + 1}of${pages.length}`);
    expect(words).toMatch(/ReedbedBrewing[0-9a-f]{6}·/);
    expect(words).toMatch(/Printed\w{3}\d{1,2}[A-Z][a-z]+\d{4}/);
  }
}

for (const paper of PAPERS) {
  test(`a season on ${paper} is told without colour, on one sheet`, async ({ board, brewery }) => {
    const plan = demoSeason();
    await brewery.write(plan);
    const pdf = await printed(board, `/b/${brewery.slug}/print/season?paper=${paper}`);
    expectSheets(pdf, paper);
    expect(pdf.pages).toHaveLength(1);
    const all = pdf.pages.join('');
    for (const { name, batches } of plan.shelves ?? [])
      for (const words of [name, ...batches.map((one) => one.name)])
        expect(all).toContain(dense(words));
    for (const { name } of plan.bench ?? []) expect(all).toContain(dense(name));
    expect(all).toMatch(/Hold\d:[a-z]/);
    expect(all).toMatch(/Mind\d:[a-z]/);
    expect(all).toContain('Allergens:Gluten.');
    for (const control of ['Skiptothepage', 'Letter', 'Newbatch'])
      expect(all, 'controls').not.toContain(control);
  });

  test(`a brew sheet on ${paper} is one sheet`, async ({ board, brewery }) => {
    const { batches } = await brewery.write(SAMPLE);
    const later = batches['Gull Wheat'] ?? '';
    await board.goto(`/b/${brewery.slug}?link=${later}`);
    const panel = board.getByRole('region', { name: 'Gull Wheat onto Long Night' });
    const kept = await panel.getByLabel('Kept part', { exact: true }).inputValue();
    const because = await panel.getByText(/^Long Night was brewed at/).textContent();
    await panel.getByRole('link', { name: 'Brew sheet' }).click();
    await expect(board).toHaveURL(new RegExp(`/print/brew-sheets/${later}$`));
    const pdf = await printed(board, `${new URL(board.url()).pathname}?paper=${paper}`);
    expectSheets(pdf, paper);
    expect(pdf.pages).toHaveLength(1);
    const [sheet = ''] = pdf.pages;
    expect(kept).not.toBe('');
    for (const words of [
      'Gull Wheat onto Long Night',
      `${kept} mL or `,
      'nine times in ten it is',
      'rule of thumb by weight',
      '18–22 °C',
      'Usual for ale yeast (common practice)',
      'Long Night is finished',
      'Tasted',
      'Cleaned and sanitised',
      'Wort temperature',
      'Aerated',
      'blow-off fitted',
      because ?? 'no finding',
      'Do:',
      'Allergens: Gluten.',
      'Live cultures and enzymes beside the yeast: None declared.',
      "The makers' instructions and local codes go first",
    ])
      expect(sheet).toContain(dense(words));
  });
}

test('a hold that was accepted stands on the sheet with its reason', async ({ board, brewery }) => {
  const { batches } = await brewery.write(SAMPLE);
  const later = batches['Gull Wheat'] ?? '';
  await board.goto(`/b/${brewery.slug}?link=${later}`);
  const panel = board.getByRole('region', { name: 'Gull Wheat onto Long Night' });
  await panel.getByRole('button', { name: /^Accept/ }).click();
  await board.getByLabel(/[Rr]eason|[Ww]hy/).fill('A test brew for the drain');
  await board
    .getByRole('button', { name: /^Accept/ })
    .last()
    .click();
  await expect(panel.getByText('accepted', { exact: true })).toBeVisible();
  const pdf = await printed(board, `/b/${brewery.slug}/print/brew-sheets/${later}`);
  expect(pdf.pages).toHaveLength(1);
  expect(pdf.pages[0]).toContain(dense('Accepted by Orla Finch: A test brew for the drain'));
});

test('a chain is printed with plots, figures and findings, its talk only if wanted', async ({
  board,
  brewery,
}) => {
  const { chains } = await brewery.write(SAMPLE);
  const id = chains['Clean ale'] ?? '';
  await board.goto(`/b/${brewery.slug}/chains/${id}`);
  await board.getByLabel('Write to the chain').fill('Smells of pear drops');
  await board.getByRole('button', { name: 'Send' }).click();
  await expect(board.getByRole('list', { name: 'Talk' })).toContainText('pear drops');
  await board.getByRole('main').getByRole('link', { name: 'Print' }).click();
  await expect(board.getByRole('radio', { name: 'A4' })).toBeChecked();
  await expectAccessible(board);
  const pdf = await printed(board, `/b/${brewery.slug}/print/chains/${id}?paper=a4`);
  expectSheets(pdf, 'a4');
  // The shelf and the plots fill the first sheet, figures and findings the second.
  expect(pdf.pages).toHaveLength(2);
  const all = pdf.pages.join('');
  for (const words of ['Along the chain', 'Original gravity', 'Gull Wheat onto Long Night', 'Do:'])
    expect(all).toContain(dense(words));
  expect(all).not.toContain('peardrops');

  await board.getByRole('checkbox', { name: 'With the talk' }).check();
  await expect(board.getByRole('list', { name: 'Talk' })).toContainText('pear drops');
  const withTalk = await readPdf(await board.pdf({ preferCSSPageSize: true }));
  expect(withTalk.pages.join('')).toContain('OrlaFinch');
  expect(withTalk.pages.join('')).toContain('Smellsofpeardrops');
});

test('whoever measures in gallons and °F reads them on Letter', async ({ board, brewery }) => {
  const { batches } = await brewery.write(SAMPLE);
  await board.goto(`/b/${brewery.slug}/account`);
  for (const name of ['US gallons, ounces', '°P', 'EBC', '°F']) {
    const saved = board.waitForResponse(
      (answer) => answer.url().endsWith(api.account) && answer.request().method() === 'PATCH',
    );
    await board.getByRole('radio', { name, exact: true }).click();
    expect((await saved).status()).toBe(200);
  }
  const pdf = await printed(board, `/b/${brewery.slug}/print/brew-sheets/${batches['Ebb Pale']}`);
  expectSheets(pdf, 'letter');
  const [sheet = ''] = pdf.pages;
  expect(sheet).toContain('64.4–71.6°F');
  for (const unit of ['gal', '°P', 'EBC', 'lb']) expect(sheet).toContain(unit);
  for (const unit of ['°C', 'SRM']) expect(sheet).not.toContain(unit);
});

test('a link that is gone says so', async ({ board, brewery }) => {
  await brewery.write(SAMPLE);
  await board.goto(`/b/${brewery.slug}/print/brew-sheets/00000000-0000-4000-8000-000000000000`);
  await expect(
    board.getByRole('heading', { name: 'There is no such link any more' }),
  ).toBeVisible();
});

const PX_PER_MM = 96 / 25.4;
/** What 12 and 16 mm of margin leave of the height of A4, and 13 mm each of its width, px. */
const ROOM = { width: (210 - 26) * PX_PER_MM, height: (297 - 28) * PX_PER_MM };

test('200 batches with the longest names: no shelf is split, nothing is cut off', async ({
  board,
  brewery,
}) => {
  test.slow();
  const plan = largeSeason();
  await brewery.write(plan);
  await board.setViewportSize({ width: Math.floor(ROOM.width), height: 1000 });
  const pdf = await printed(board, `/b/${brewery.slug}/print/season?paper=a4`);
  expectSheets(pdf, 'a4');

  await board.emulateMedia({ media: 'print' });
  const { cutOff, tallest, bench } = await board.getByRole('article').evaluate((paper) => {
    const parts = [...paper.querySelectorAll<HTMLElement>('h1, h2, h3, p, li, b')];
    const shelves = [...paper.querySelectorAll('[data-chain]')];
    return {
      cutOff: parts
        .filter((part) => part.scrollWidth > part.clientWidth + 1 && part.clientWidth > 0)
        .map((part) => part.textContent),
      tallest: Math.max(...shelves.map((shelf) => shelf.getBoundingClientRect().height)),
      bench: paper.querySelector('section:last-child')?.getBoundingClientRect().height ?? 0,
    };
  });
  expect(cutOff).toEqual([]);
  expect(tallest, 'a shelf fits on a sheet').toBeLessThan(ROOM.height);
  expect(bench).toBeGreaterThan(0);

  // With 20 px between them so many shelves stand on a sheet; the heading takes one more sheet at
  // most, and the bench its own height with one sheet that it shares.
  const shelves = plan.shelves ?? [];
  const onSheet = Math.floor(ROOM.height / (tallest + 20));
  const most = 1 + Math.ceil(shelves.length / onSheet) + 1 + Math.ceil(bench / ROOM.height);
  expect(pdf.pages.length).toBeLessThanOrEqual(most);
  for (const { name, batches } of shelves) {
    const sheet = pdf.pages.find((words) => words.includes(dense(name))) ?? '';
    for (const batch of batches) expect(sheet, name).toContain(dense(batch.name));
  }
  const all = pdf.pages.join('');
  for (const { name } of plan.bench ?? []) expect(all).toContain(dense(name));
});

test('200 batches with names of a usual length take sixteen sheets at most', async ({
  board,
  brewery,
}) => {
  test.slow();
  const { shelves = [], bench = [] } = largeSeason();
  const short = <T extends { name: string }>(one: T, at: number) => ({
    ...one,
    name: `${one.name.slice(0, 5)} ${at}`,
    style: 'Pale ale',
  });
  await brewery.write({
    shelves: shelves.map((shelf, at) => ({
      name: `Shelf ${at}`,
      batches: shelf.batches.map((batch, place) => short(batch, at * 8 + place)),
    })),
    bench: bench.map((batch, at) => short(batch, 200 + at)),
  });
  const pdf = await printed(board, `/b/${brewery.slug}/print/season?paper=a4`);
  // Two rows of four, with three lines of reasons under each, and a heading are at most half a sheet:
  // 25 shelves take thirteen. A hundred on the bench, two lines each in two columns, take two; the
  // heading and what collides, one.
  expect(pdf.pages.length).toBeLessThanOrEqual(16);
  expect(pdf.pages.join('')).toContain('Shelf24');
});
