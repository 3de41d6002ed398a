import { api } from '#shared/api/urls.ts';
import { writeBrewery } from './support/brewery.ts';
import { BoardPage } from './support/boardPage.ts';
import { expect, test } from './support/test.ts';

const SEASON = {
  shelves: [
    {
      name: 'Clean ale',
      batches: [
        { name: 'Creek Blonde', og: 1.044, fg: 1.011, srm: 4, ibu: 20, brewOn: '2027-03-06' },
        { name: 'Long Night', og: 1.095, fg: 1.024, srm: 42, ibu: 60, brewOn: '2027-03-20' },
        { name: 'Ebb Pale', og: 1.052, fg: 1.013, srm: 7, ibu: 38, brewOn: '2027-04-03' },
      ],
    },
  ],
  bench: [{ name: 'Kelp Rye', og: 1.056, fg: 1.014, srm: 12, ibu: 34 }],
};

// A link that was used is refused, and the browser calls the refusal an error.
test.describe('a join link', () => {
  test.use({ expectedErrors: /status of (410|409|404) .*\/join\// });

  test('lets one person in, in the role that it was made for', async ({
    board: page,
    brewery,
    another,
  }) => {
    await brewery.write(SEASON);
    await page.goto(`/b/${brewery.slug}/people`);
    await page.getByRole('radio', { name: /^Taster/ }).check();
    await page.getByRole('button', { name: 'Make a join link' }).click();
    const link = await page.getByLabel('Link for one taster').inputValue();

    const guest = await another(null);
    await guest.goto(link);
    await expect(guest.getByRole('heading', { name: /^Join Reedbed Brewing/ })).toBeVisible();
    await expect(guest.getByText('Orla Finch asks you in as taster')).toBeVisible();
    await guest.getByLabel('Your name').fill('Una Sallow');
    await guest.getByLabel('E-mail').fill(`una-${Date.now()}@reedbed.example`);
    await guest.getByLabel('Password', { exact: true }).fill('sallow by the water');
    await guest.getByRole('button', { name: 'Join the brewery' }).click();
    await expect(new BoardPage(guest).namesOn('Clean ale')).toHaveCount(3);
    await expect(guest.getByRole('button', { name: 'New batch' })).toHaveCount(0);

    await page.context().clearCookies();
    await page.goto(link);
    await expect(page.getByRole('heading', { name: 'This link is no longer good' })).toBeVisible();
  });
});

test('a brewer plans; yeasts, season and people are left to the head brewer', async ({
  brewery,
  partner: page,
}) => {
  await brewery.write(SEASON);
  const board = new BoardPage(page);
  await board.open(brewery.slug);
  await page.getByRole('button', { name: 'Move Kelp Rye', exact: true }).click();
  await page.getByRole('button', { name: /^Put here: .*after Creek Blonde$/ }).click();
  await expect(board.namesOn('Clean ale').nth(1)).toHaveText('Kelp Rye');

  await board.link('Ebb Pale', 'Long Night').click();
  const panel = page.getByRole('region', { name: 'Ebb Pale onto Long Night' });
  await expect(panel).toContainText('Hold');
  await expect(panel.getByRole('button', { name: /[Aa]ccept/ })).toHaveCount(0);

  for (const [where, button] of [
    ['yeasts', /yeast/i],
    ['vessels', /vessel/i],
    ['people', /join link/i],
    ['season', /save/i],
  ] as const) {
    await page.goto(`/b/${brewery.slug}/${where}`);
    await expect(page.getByRole('main').getByRole('heading').first()).toBeVisible();
    await expect(page.getByText(/the head brewer (changes|asks)/i).first()).toBeVisible();
    await expect(page.getByRole('main').getByRole('button', { name: button })).toHaveCount(0);
  }
});

test('a taster sees the board and changes nothing', async ({ brewery, context, page, baseURL }) => {
  const { batches } = await brewery.write(SEASON);
  await brewery.signIn(context, 'taster');
  const board = new BoardPage(page);
  await board.open(brewery.slug);
  await expect(board.link('Ebb Pale', 'Long Night')).toContainText('Hold');
  for (const name of ['New batch', 'New shelf', /^Lift /, /^Move /, /^More for /, /^Undo/])
    await expect(page.getByRole('button', { name })).toHaveCount(0);

  await page.getByRole('button', { name: 'Ebb Pale', exact: true }).click();
  const facts = page.getByRole('dialog', { name: 'Ebb Pale' });
  await expect(facts).toContainText('1.052');
  await expect(facts.getByRole('textbox')).toHaveCount(0);
  await page.keyboard.press('Escape');

  await board.link('Ebb Pale', 'Long Night').click();
  const panel = page.getByRole('region', { name: 'Ebb Pale onto Long Night' });
  await expect(panel).toContainText('Tired cake');
  await expect(panel.getByRole('textbox').and(page.locator(':enabled'))).toHaveCount(0);

  const id = batches['Ebb Pale'] ?? '';
  const refused = await page.request.patch(api.batch(brewery.slug, id), {
    headers: { 'If-Match': '"1"', Origin: baseURL ?? '' },
    data: { name: 'Mine now' },
  });
  expect(refused.status()).toBe(403);
});

test.describe("somebody else's brewery", () => {
  test('is not there', async ({ board: page, brewery, db }) => {
    await brewery.write(SEASON);
    const other = await writeBrewery(db, 'Far Shore');
    await page.goto(`/b/${other.slug}`);
    await expect(page.getByRole('heading', { name: 'Nothing stands here.' })).toBeVisible();
    expect((await page.request.get(api.board(other.slug))).status()).toBe(404);
    await page.getByRole('main').getByRole('link', { name: 'To the board' }).click();
    await expect(page).toHaveURL(new RegExp(`/b/${brewery.slug}$`));
  });
});
