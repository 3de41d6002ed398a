import { and, eq, inArray, sql } from 'drizzle-orm';
import { isDeepStrictEqual } from 'node:util';
import { lapses } from '#shared/chain/lapses.ts';
import { linkChanges } from '#shared/chain/linkChanges.ts';
import type { Tx } from '../../db/client.ts';
import { batch } from '../../db/schema/chain.ts';
import type { BoardNow } from './hand.ts';

/**
 * An acceptance speaks of the link as it was; where that changed it is taken away. So where the
 * house rules changed and the link says something else by them.
 * @param kept batches whose acceptance was just given back, and speaks of the link as it is.
 */
export async function withoutLapsed(
  tx: Tx,
  before: BoardNow,
  after: BoardNow,
  kept: ReadonlySet<string> = new Set(),
): Promise<BoardNow> {
  const lapsed = lapsedBetween(before, after).filter((id) => !kept.has(id));
  if (lapsed.length === 0) return after;
  await tx
    .update(batch)
    .set({ acceptance: null, version: sql`${batch.version} + 1` })
    .where(and(eq(batch.seasonId, after.season.id), inArray(batch.id, lapsed)));
  const batches = after.batches.map((row) =>
    lapsed.includes(row.id)
      ? { ...row, version: row.version + 1, link: { ...row.link, acceptance: null } }
      : row,
  );
  return { ...after, batches };
}

function lapsedBetween(before: BoardNow, after: BoardNow): string[] {
  const byFacts = lapses(before, after);
  const { houseRules } = before;
  if (isDeepStrictEqual(houseRules, after.houseRules)) return byFacts;
  const changed = linkChanges({ ...after, houseRules }, after);
  const lapsed = new Set([...byFacts, ...changed.map(({ batchId }) => batchId)]);
  return after.batches
    .filter(({ id, link }) => link.acceptance !== null && lapsed.has(id))
    .map(({ id }) => id);
}
