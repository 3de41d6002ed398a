import { batch } from '../server/db/schema/chain.ts';
import { season } from '../server/db/schema/season.ts';
import { eq, sql } from 'drizzle-orm';
import { expect, test } from './support/ownServer.ts';

test.describe(() => {
  test.use({
    expectedErrors: /ERR_CONNECTION_REFUSED|ERR_INCOMPLETE_CHUNKED_ENCODING|ERR_CONNECTION_RESET/,
  });

  test('a board whose server is killed says so, comes back by itself, and shows what it missed', async ({
    board,
    brewery,
    own,
    db,
  }) => {
    const { batches } = await brewery.write({
      shelves: [{ name: 'Clean ale', batches: [{ name: 'Creek Blonde', brewOn: '2027-03-06' }] }],
    });
    await board.goto(`/b/${brewery.slug}`);
    const bar = board.getByRole('banner');
    await expect(bar.getByText('Live', { exact: true })).toBeVisible();
    await own.kill();
    await expect(bar.getByText('Reconnecting', { exact: true })).toBeVisible();
    await expect(board.getByText(/Changes of others do not arrive/)).toHaveCount(1);
    // Somebody at another process goes on meanwhile.
    await db
      .update(batch)
      .set({ name: 'Creek Golden' })
      .where(eq(batch.id, batches['Creek Blonde'] ?? ''));
    await db
      .update(season)
      .set({ revision: sql`${season.revision} + 1` })
      .where(eq(season.id, brewery.seasonId));
    await own.again();
    await expect(board.getByText('Creek Golden').first()).toBeVisible({ timeout: 20_000 });
    await expect(bar.getByText('Live', { exact: true })).toBeVisible();
  });
});
