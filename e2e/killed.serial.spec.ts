import type { MoveRequest } from '#shared/api/move.ts';
import { BoardPage } from './support/boardPage.ts';
import { Mover } from './support/mover.ts';
import { expect, test } from './support/ownServer.ts';
import { batchRows, placesOf } from './support/rows.ts';

const NAMES = Array.from({ length: 24 }, (_, number) => `Beer ${number + 1}`);
const SEASON = {
  shelves: [
    { name: 'Clean ale', batches: NAMES.slice(0, 8).map((name) => ({ name })) },
    { name: 'House ale', batches: NAMES.slice(8, 16).map((name) => ({ name })) },
  ],
  bench: NAMES.slice(16).map((name) => ({ name })),
};

// While the server is away the browser calls every request an error, and the open stream a cut one.
test.use({
  expectedErrors:
    /ERR_CONNECTION_(REFUSED|RESET|CLOSED)|ERR_EMPTY_RESPONSE|ERR_SOCKET_NOT_CONNECTED|ERR_INCOMPLETE_CHUNKED_ENCODING/,
});

for (const killAfter of [5, 11, 17])
  test(`a server killed after ${killAfter} moves loses and doubles no batch`, async ({
    own,
    db,
    brewery,
    request,
  }) => {
    const { chains } = await brewery.write(SEASON);
    const before = await batchRows(db, brewery.id);
    const where = new Map(before.map(({ id, chainId }) => [id, chainId]));
    const mover = new Mover(request, {
      server: own,
      brewery,
      chains: Object.values(chains),
      where,
    });

    const move = async (): Promise<MoveRequest | null> => {
      const wish = mover.nextWish();
      return (await mover.send(wish)) ? null : wish;
    };
    while (mover.answered < killAfter) expect(await move()).toBeNull();
    const killed = own.kill();
    let lost = await move();
    while (lost === null) lost = await move();
    await killed;
    await own.again();

    const rows = await batchRows(db, brewery.id);
    expect(rows.map(({ id }) => id).toSorted(), 'every batch once').toEqual(
      before.map(({ id }) => id).toSorted(),
    );
    for (const places of placesOf(rows))
      expect(places, 'places from 0, without a hole').toEqual(places.map((_, at) => at));
    for (const { id, chainId } of rows)
      if (id !== lost.batchId)
        expect(chainId, 'a move that was answered stands').toBe(where.get(id));

    expect(await mover.send(lost), 'the lost move may be asked for again').toBe(true);
    const after = await batchRows(db, brewery.id);
    expect(after).toHaveLength(NAMES.length);
    for (const { id, chainId } of after) expect(chainId, 'and is done once').toBe(where.get(id));
  });

test('a board that is open while the server is killed says so and goes on after', async ({
  own,
  board: page,
  brewery,
}) => {
  await brewery.write(SEASON);
  const board = new BoardPage(page);
  const putAfter = async (after: string) => {
    await page.getByRole('button', { name: 'Move Beer 17', exact: true }).click();
    await page.getByRole('button', { name: new RegExp(`^Put here: .*after ${after}$`) }).click();
  };
  await board.open(brewery.slug);
  // Killed with the move under way: a page that knew before would not have sent it.
  await page.route(
    '**/moves',
    async (route) => {
      await own.kill();
      await route.continue();
    },
    { times: 1 },
  );
  await putAfter('Beer 8');
  await expect(page.getByText('No connection. You can read what is here')).toBeVisible();
  await expect(board.words).toContainText('Beer 17 is back where it was.');
  await expect(board.bench.locator('[data-batch]')).toHaveCount(8);

  await own.again();
  await expect(page.getByText('No connection.')).toHaveCount(0, { timeout: 20_000 });
  await putAfter('Beer 8');
  await expect(board.namesOn('Clean ale').last()).toHaveText('Beer 17');
  await expect(board.bench.locator('[data-batch]')).toHaveCount(7);
});
