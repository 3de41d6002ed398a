import { and, asc, eq, ne, sql } from 'drizzle-orm';
import { isDeepStrictEqual } from 'node:util';
import type { Tx } from '../../db/client.ts';
import { change } from '../../db/schema/change.ts';
import { season } from '../../db/schema/season.ts';
import type { Snapshot } from '../../record/snapshot.ts';
import type { BoardNow, Hand } from './hand.ts';
import { withoutLapsed } from './lapsed.ts';
import { loadBoardRows } from './load.ts';
import type { Reach } from './locks.ts';
import { raiseRevision, writeEntry } from './record.ts';

/** Tables whose rows are the brewery's: the boards of all its seasons show them. */
const SHARED = ['brewery', 'house_rules', 'yeast', 'vessel'] as const;

export const isOfAllSeasons = (before: Snapshot, after: Snapshot): boolean =>
  SHARED.some((name) => !isDeepStrictEqual(before.rows[name], after.rows[name]));

/** How far it reaches to take a change back. Known before the locks, since the record stays as it is. */
export async function reachOf(tx: Tx, changeId: string): Promise<Reach> {
  const tables = sql.raw(SHARED.map((name) => `'${name}'`).join());
  const wide = sql`${change.after} -> 'rows' ?| array[${tables}]`;
  const found = await tx
    .select({ id: change.id })
    .from(change)
    .where(and(eq(change.id, changeId), wide));
  return found.length > 0 ? 'all-seasons' : 'season';
}

/**
 * Lets whoever has another season's board open read it anew, and ends the acceptances there whose
 * link is another one by the change. An archived season stays as it is. It is done within the
 * change, whose locks are those of all seasons.
 * @param after the board of the season from which it was changed, as the change left it.
 */
export async function settleOtherSeasons(hand: Hand, after: BoardNow, what: string): Promise<void> {
  const { tx, member } = hand;
  const others = await tx
    .select({ id: season.id, archivedAt: season.archivedAt })
    .from(season)
    .where(and(eq(season.breweryId, member.brewery.id), ne(season.id, member.seasonId)))
    .orderBy(asc(season.id));
  for (const { id, archivedAt } of others) {
    await raiseRevision(tx, id);
    if (archivedAt === null) await endLapsed(hand, id, after, what);
  }
}

async function endLapsed(
  { tx, member, board, now }: Hand,
  seasonId: string,
  { today }: BoardNow,
  what: string,
): Promise<void> {
  const rows = await loadBoardRows(tx, member.brewery.id, seasonId);
  if (!rows) return;
  const { yeasts, vessels, houseRules } = board;
  const is = { ...rows, today };
  const left = await withoutLapsed(tx, { ...is, yeasts, vessels, houseRules }, is);
  const ended = is.batches.filter((row, at) => row.version !== left.batches[at]?.version);
  if (ended.length === 0) return;
  const names = ended.map(({ name }) => name).join(', ');
  await writeEntry(tx, { ...member, seasonId }, now, {
    kind: 'edit',
    what: `Ended the acceptance under ${names}: ${what}`,
    before: ended.map(({ id, link }) => ({ id, acceptance: link.acceptance })),
    after: null,
    touches: ended.map(({ id }) => id),
  });
}
