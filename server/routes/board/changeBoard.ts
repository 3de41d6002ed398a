import { and, eq, inArray, sql } from 'drizzle-orm';
import type { Member } from '../../auth/whoAsks.ts';
import type { Tx } from '../../db/client.ts';
import { inTransaction } from '../../db/inTransaction.ts';
import { batch } from '../../db/schema/chain.ts';
import type { Deps } from '../../deps.ts';
import { lapses } from '#shared/chain/lapses.ts';
import { notFound, problem } from '../../problems.ts';
import { recordEdit, type Said } from '../../record/recordEdit.ts';
import { takeSnapshot } from '../../record/snapshot.ts';
import { dayIn } from '../../today.ts';
import type { BoardNow, Hand } from './hand.ts';
import { loadBoardRows } from './load.ts';
import { lockSeason, lockShelves } from './locks.ts';
import { isOfAllSeasons, tellOtherSeasons } from './otherSeasons.ts';
import { raiseRevision } from './record.ts';

/** Null: there was nothing to change. */
export type Command = (hand: Hand) => Promise<Said | null>;

/**
 * Runs an edit of anything on a season's board: under the locks, with the acceptances that it made
 * lapse, the revision raised and the change recorded, all or nothing.
 * @param shelves ids of the chains whose order the edit touches.
 * @param may whether it may be of a season that is put away.
 * @returns the board as the edit left it.
 */
export async function changeBoard(
  deps: Pick<Deps, 'db' | 'clock'>,
  member: Member,
  shelves: readonly string[] | 'all',
  command: Command,
  may: 'open' | 'archived-too' = 'open',
): Promise<BoardNow> {
  const { before, after } = await inTransaction(deps.db, async (tx) => {
    await lockShelves(tx, member.seasonId, shelves);
    await lockSeason(tx, member.seasonId);
    const now = deps.clock.now();
    const board = await readBoard(tx, member, now);
    if (may === 'open') demandOpen(board);
    return { before: board, after: await carryOut({ tx, member, board, now }, command) };
  });
  if (isOfAllSeasons(before, after)) await tellOtherSeasons(deps.db, member);
  return after;
}

async function carryOut(hand: Hand, command: Command): Promise<BoardNow> {
  const { tx, member, board, now } = hand;
  const where = { breweryId: member.brewery.id, seasonId: member.seasonId };
  const rows = await takeSnapshot(tx, where);
  const said = await command(hand);
  if (!said) return board;
  await raiseRevision(tx, member.seasonId);
  const after = await withoutLapsed(tx, board, await readBoard(tx, member, now));
  await recordEdit(
    { tx, member, now },
    { kind: 'edit', ...said },
    { board, rows },
    { board: after, rows: await takeSnapshot(tx, where) },
  );
  return after;
}

export async function readBoard(tx: Tx, member: Member, now: Date): Promise<BoardNow> {
  const rows = await loadBoardRows(tx, member.brewery.id, member.seasonId);
  if (!rows) throw notFound();
  return { ...rows, today: dayIn(member.brewery.timeZone, now) };
}

/** Said under the locks, so that nobody archives the season in between. */
export function demandOpen({ season }: { season: { isArchived: boolean } }): void {
  if (season.isArchived)
    throw problem('season-archived', {
      detail: 'Take it out of the archive to change something on it',
    });
}

/**
 * An acceptance speaks of the link as it was; where that changed it is taken away.
 * @param kept batches whose acceptance was just given back, and speaks of the link as it is.
 */
export async function withoutLapsed(
  tx: Tx,
  before: BoardNow,
  after: BoardNow,
  kept: ReadonlySet<string> = new Set(),
): Promise<BoardNow> {
  const lapsed = lapses(before, after).filter((id) => !kept.has(id));
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
