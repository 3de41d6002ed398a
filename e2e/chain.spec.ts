import type { Page } from '@playwright/test';
import { expectAccessible } from './support/axe.ts';
import { expect, test } from './support/test.ts';

const SHELF = {
  shelves: [
    {
      name: 'Clean ale',
      batches: [
        {
          name: 'Creek Blonde',
          brewOn: '2027-03-06',
          stage: 'racked' as const,
          readOg: 1.045,
          readFg: 1.01,
          rackedOn: '2027-03-20',
        },
        { name: 'Ebb Pale', og: 1.078, fg: 1.015, srm: 7, ibu: 38, brewOn: '2027-03-20' },
        { name: 'Withy Bitter', og: 1.038, fg: 1.01, srm: 10, ibu: 30, brewOn: '2027-04-03' },
      ],
    },
  ],
  bench: [{ name: 'Lantern Stout', og: 1.046, fg: 1.012, srm: 33, ibu: 32 }],
};

const open = async (page: Page, slug: string) => {
  await page.goto(`/b/${slug}`);
  await page.getByRole('link', { name: 'Clean ale', exact: true }).click();
  await expect(page.getByRole('heading', { level: 1, name: 'Clean ale' })).toBeVisible();
};

test('a chain opened from its name tells its course in figures', async ({ board, brewery }) => {
  await brewery.write(SHELF);
  await open(board, brewery.slug);
  const figures = board.getByRole('region', { name: 'Figures' });
  const row = (name: string) =>
    figures.getByRole('row').filter({ has: board.getByRole('rowheader', { name }) });
  await expect(row('Creek Blonde')).toContainText('1.045');
  await expect(row('Creek Blonde')).not.toContainText('planned');
  await expect(row('Ebb Pale')).toContainText('1.078, planned');
  await expect(row('Withy Bitter')).toContainText('Hold');
  await expect(row('Ebb Pale')).toContainText(/[\d.]+ × \([\d.]+ × to [\d.]+ ×\)/);
  // Wider than its place, it fades where it goes on, and no longer at its end.
  const table = board.getByRole('region', { name: 'In figures' });
  await expect(table).toHaveCSS('mask-image', /^linear-gradient/);
  await table.evaluate((region) => region.scrollTo({ left: region.scrollWidth }));
  await expect(table).toHaveCSS('mask-image', 'none');
  await expectAccessible(board);

  await board.getByRole('button', { name: 'Withy Bitter onto Ebb Pale' }).click();
  const panel = board.getByRole('region', { name: 'Withy Bitter onto Ebb Pale' });
  await expect(panel).toContainText('Tired cake');
  await board.keyboard.press('Escape');
  await expect(board.getByRole('heading', { name: 'Who shares this chain' })).toBeVisible();
});

test('what is said of a link keeps what the link said, and is marked unread for others', async ({
  board,
  brewery,
  another,
}) => {
  await brewery.write(SHELF);
  await open(board, brewery.slug);
  await board.getByRole('button', { name: 'Withy Bitter onto Ebb Pale' }).click();
  await board.getByText('Talk', { exact: true }).click();
  await board.getByLabel('Say something about this link').fill('Count the cells before we decide.');
  await board.getByRole('button', { name: 'Send' }).click();
  await expect(board.getByText('Talk (1)')).toBeVisible();
  await board.keyboard.press('Escape');
  const said = board.getByRole('list', { name: 'Talk' });
  await expect(said).toContainText('said of');
  await expect(said).toContainText(/Hold \d/);

  const taster = await another(brewery.members.taster);
  await taster.goto(`/b/${brewery.slug}`);
  const unread = taster.getByRole('link', { name: '1 new comment on Clean ale' });
  await expect(unread).toBeVisible();
  await expectAccessible(taster);
  await unread.click();
  const talk = taster.getByRole('list', { name: 'Talk' });
  await expect(talk).toContainText('Count the cells before we decide.');
  await expect(talk).toContainText('new');
  await taster.getByLabel('Write to the chain').fill('I taste nothing odd.');
  await taster.getByRole('button', { name: 'Send' }).click();
  await expect(talk.getByRole('listitem')).toHaveCount(2);
  await taster.getByRole('link', { name: 'Board', exact: true }).first().click();
  await expect(taster.getByRole('link', { name: 'Clean ale', exact: true })).toBeVisible();
  await expect(taster.getByText(/\d new$/)).toHaveCount(0);
});

test('a removed comment can be put back, and an empty one is not sent', async ({
  board,
  brewery,
}) => {
  await brewery.write(SHELF);
  await open(board, brewery.slug);
  await board.getByRole('button', { name: 'Send' }).click();
  await expect(board.getByText('Write something first')).toBeVisible();
  await board.getByLabel('Write to the chain').fill('Buttery');
  await board.getByRole('button', { name: 'Send' }).click();
  const said = board.getByRole('list', { name: 'Talk' }).getByRole('listitem');
  await expect(said).toContainText('Buttery');
  await said.getByRole('button', { name: 'Change' }).click();
  await said.getByLabel('What you said').fill('Butter, faint');
  await said.getByRole('button', { name: 'Save' }).click();
  await expect(said).toContainText('edited');
  await said.getByRole('button', { name: 'Remove' }).click();
  await expect(said).toContainText('removed');
  await board.getByRole('button', { name: 'Undo' }).click();
  await expect(said).toContainText('Butter, faint');
});

test('a cake goes under two worts, each with its part, and both shelves say so', async ({
  board,
  brewery,
}) => {
  await brewery.write(SHELF);
  await board.goto(`/b/${brewery.slug}`);
  await board.getByRole('button', { name: 'More for Creek Blonde' }).click();
  await board.getByRole('menuitem', { name: 'Pour part of this cake onto another wort' }).click();
  await board.getByLabel('Name of the shelf').fill('Second shelf');
  await board.getByRole('button', { name: 'Divide the cake' }).click();
  const panel = board.getByRole('region', { name: 'Lantern Stout onto Creek Blonde' });
  await expect(panel).toContainText('goes under Ebb Pale');
  await panel.getByLabel('Kept part', { exact: true }).fill('50 L');
  await panel.getByLabel('Kept part', { exact: true }).press('Enter');
  await expect(panel.getByText(/Keep at most .* Ebb Pale shares it/)).toBeVisible();
  await panel.getByLabel('Kept part', { exact: true }).fill('300 mL');
  await panel.getByLabel('Kept part', { exact: true }).press('Enter');
  await expect(panel).toContainText('kept 300 mL');
  await board.keyboard.press('Escape');

  await board.getByRole('link', { name: 'Second shelf', exact: true }).click();
  await expect(board.getByText(/Creek Blonde’s cake, 300 mL of/)).toBeVisible();
  await expectAccessible(board);
  await board.getByRole('link', { name: 'Creek Blonde' }).click();
  await expect(board.getByRole('heading', { level: 1, name: 'Clean ale' })).toBeVisible();
  await expect(board.getByText(/cake also starts/)).toContainText('300 mL of');

  await board.goto(`/b/${brewery.slug}/yeasts`);
  await board.getByRole('link', { name: 'Family of Yeast of Clean ale' }).click();
  const list = board.getByRole('main').getByRole('list').first();
  await expect(list).toContainText('Lantern Stout');
  await expect(list).toContainText('generation 2');
  await expectAccessible(board);
});
