import { randomUUID } from 'node:crypto';
import { api } from '#shared/api/urls.ts';
import { expectAccessible } from './support/axe.ts';
import { expect, test, type Brewing } from './support/test.ts';

const PHONE = { width: 390, height: 844 };

/** A dark beer under a pale one, which the colour rule holds or minds, and a beer too strong. */
const season = (brewery: Brewing) =>
  brewery.write({
    shelves: [
      {
        name: 'Clean ale',
        batches: [
          { name: 'Creek Blonde', brewOn: '2027-03-06' },
          { name: 'Ebb Pale', og: 1.052, fg: 1.013, srm: 7, ibu: 38, brewOn: '2027-03-20' },
          { name: 'Lantern Stout', og: 1.054, fg: 1.014, srm: 33, ibu: 40, brewOn: '2027-04-03' },
          { name: 'Mist Blonde', brewOn: '2027-04-17' },
        ],
      },
    ],
    bench: [{ name: 'Keel', ibu: 24 }],
  });

test('a head brewer changes a limit, sees first what it would change, and takes it back', async ({
  board,
  brewery,
}) => {
  await season(brewery);
  await board.goto(`/b/${brewery.slug}/season`);
  await board.getByRole('link', { name: 'House rules' }).click();
  await expect(board.getByRole('heading', { name: 'House rules', level: 1 })).toBeVisible();
  await expect(board.getByText('Nothing on this board changes.')).toBeVisible();

  // Any bitterness that is added is one too much.
  const alone = board.getByLabel('Added bitterness for a Hold at any gap, IBU');
  await alone.fill('0,01');
  await expect(board.getByText('At least 1 IBU, where the Mind begins')).toBeVisible();
  await expect(board.getByText(/Mend the fields .* to see what would change/)).toBeVisible();
  await board.getByLabel('Added bitterness for a Mind, IBU').fill('0');
  const preview = board.getByRole('listitem').filter({ hasText: 'Cake under Mist Blonde' });
  await expect(preview).toContainText('Hold');
  await expectAccessible(board);

  await board.getByRole('button', { name: 'Save', exact: true }).click();
  await expect(board.getByText('House rules saved.')).toBeVisible();
  await expect(board.getByText('Nothing on this board changes.')).toBeVisible();
  await expect(board.getByText(/^Changed the house rules: /)).toBeVisible();

  await board.reload();
  await expect(alone).toHaveValue('0');
  await board.getByRole('button', { name: 'All back to the defaults' }).click();
  await expect(alone).toHaveValue('5');
  await board.getByRole('button', { name: 'Save', exact: true }).click();
  await expect(board.getByText('Put the house rules back to the defaults')).toBeVisible();

  await board.goto(`/b/${brewery.slug}`);
  await board
    .getByRole('button', { name: 'Undo: Put the house rules back to the defaults' })
    .click();
  await expect(
    board.getByRole('button', { name: 'Redo: Put the house rules back to the defaults' }),
  ).toBeVisible();
});

test('a hold is softened, but never one that can hurt', async ({ board, brewery }) => {
  await season(brewery);
  await board.goto(`/b/${brewery.slug}/rules`);
  await expect(board.getByText(/Its hold is never softened/)).toHaveCount(2);
  await expect(board.getByLabel('Show its hold as a Mind (Allergens)')).toHaveCount(0);
  await board.getByLabel('Show its hold as a Mind (Tired cake)').check();
  await board.getByRole('button', { name: 'Save', exact: true }).click();
  await expect(board.getByText('House rules saved.')).toBeVisible();
  await board.getByRole('button', { name: 'Tired cake: back to the default' }).click();
  await expect(board.getByLabel('Show its hold as a Mind (Tired cake)')).not.toBeChecked();
});

test.describe(() => {
  test.use({ expectedErrors: /status of 412 .*\/house-rules\)$/ });

  test('rules that somebody else saved meanwhile are shown, and nothing typed is lost', async ({
    board,
    brewery,
    another,
  }) => {
    await season(brewery);
    const rules = `/b/${brewery.slug}/rules`;
    const second = await another(brewery.members['head-brewer']);
    await board.goto(rules);
    await second.goto(rules);
    const darker = 'Colour gap that counts, SRM';
    await board.getByLabel(darker).fill('6');
    await second.getByLabel(darker).fill('4');
    await second.getByRole('button', { name: 'Save', exact: true }).click();
    await expect(second.getByText('House rules saved.')).toBeVisible();
    await board.getByRole('button', { name: 'Save', exact: true }).click();
    await expect(board.getByText(/Somebody saved other house rules/)).toBeVisible();
    await expect(board.getByLabel(darker)).toHaveValue('6');
    await board.getByRole('button', { name: 'Save mine over theirs' }).click();
    await expect(
      board.getByText('Set the colour gap that counts of the house rules from 4 to 6 SRM'),
    ).toBeVisible();
  });
});

test('units are the reader’s own, and a taster reads the rules without fields', async ({
  brewery,
  context,
  page,
}) => {
  await season(brewery);
  await brewery.signIn(context, 'taster');
  await page.goto(`/b/${brewery.slug}/rules`);
  await expect(page.getByText('1.065', { exact: true })).toBeVisible();
  await expect(page.getByRole('textbox')).toHaveCount(0);
  await expectAccessible(page);
  await page.goto(`/b/${brewery.slug}/account`);
  await page.getByRole('radio', { name: '°P' }).check();
  await page.goto(`/b/${brewery.slug}/rules`);
  // 1.065 is 15.9 °P by the extract table.
  await expect(page.getByText('15.9 °P', { exact: true })).toBeVisible();
});

test('the record tells an edit and a move with what the link said, and leads to where it stands', async ({
  board,
  brewery,
}) => {
  const { batches, chains } = await season(brewery);
  const edited = await board.request.patch(api.batch(brewery.slug, batches['Keel'] ?? ''), {
    headers: { 'Sec-Fetch-Site': 'same-origin', 'If-Match': '"1"' },
    data: { ibu: 28 },
  });
  expect(edited.status()).toBe(200);
  await board.goto(`/b/${brewery.slug}`);
  await expect(
    board.getByRole('button', { name: 'Undo: Set the bitterness of Keel from 24 to 28 IBU' }),
  ).toBeVisible();

  await board.goto(`/b/${brewery.slug}/record`);
  const edit = board.getByRole('listitem').filter({ hasText: 'Set the bitterness of Keel' });
  await expect(edit).toContainText('Orla Finch');
  await expect(edit).toContainText('Set the bitterness of Keel from 24 to 28 IBU');
  await expectAccessible(board);
  await expect(edit.getByRole('link', { name: 'Open Keel' })).toHaveAttribute(
    'href',
    `/b/${brewery.slug}?batch=${batches['Keel'] ?? ''}`,
  );

  await board.goto(`/b/${brewery.slug}`);
  await board.getByRole('button', { name: /^Undo: Set the bitterness/ }).click();
  await expect(board.getByRole('button', { name: /^Redo: Set the bitterness/ })).toBeVisible();
  await board.goto(`/b/${brewery.slug}/record`);
  await expect(edit.filter({ hasText: 'undone since' })).toHaveCount(1);

  const wish = {
    id: randomUUID(),
    batchId: batches['Keel'],
    toChainId: chains['Clean ale'],
    afterBatchId: batches['Lantern Stout'],
    expectedChainId: null,
    dates: 'pull',
  };
  const moved = await board.request.post(api.moves(brewery.slug), {
    headers: { 'Sec-Fetch-Site': 'same-origin' },
    data: wish,
  });
  expect(moved.status()).toBe(200);
  const move = board.getByRole('listitem').filter({ hasText: 'Moved Keel after Lantern Stout' });
  await expect(move).toContainText('The cake under Keel then said');
  await move.getByRole('link', { name: 'Open the link' }).click();
  await expect(board).toHaveURL(new RegExp(`link=${batches['Keel'] ?? ''}`));
  await board.goBack();

  await board.getByLabel('Batch').selectOption({ label: 'Ebb Pale' });
  await expect(board.getByText('Nothing on the record is like that.')).toBeVisible();
  await board.getByRole('button', { name: 'Show all' }).click();
  await expect(edit.first()).toBeVisible();
});

test('both pages fit a phone', async ({ board, brewery }) => {
  await season(brewery);
  await board.setViewportSize(PHONE);
  for (const page of ['rules', 'record']) {
    await board.goto(`/b/${brewery.slug}`);
    await board.getByRole('button', { name: 'More', exact: true }).click();
    await board
      .getByRole('menuitem', { name: page === 'rules' ? 'House rules' : 'Record' })
      .click();
    await expect(board).toHaveURL(new RegExp(`/${page}$`));
    await expect(board.getByRole('heading', { level: 1 })).toBeVisible();
    if (page === 'rules') {
      await board.getByLabel('Colour gap that counts, SRM').fill('6');
      await expect(board.getByRole('button', { name: 'Save', exact: true })).toBeInViewport();
    }
    const wider = await board.evaluate(
      () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
    );
    expect(wider).toBe(0);
    await expectAccessible(board);
  }
});
