import type { Member } from '../../auth/whoAsks.ts';
import type { Tx } from '../../db/client.ts';
import { inTransaction } from '../../db/inTransaction.ts';
import type { Deps } from '../../deps.ts';
import { notFound, problem } from '../../problems.ts';
import { recordEdit, type Said } from '../../record/recordEdit.ts';
import { takeSnapshot } from '../../record/snapshot.ts';
import { dayIn } from '../../today.ts';
import { demandNotInHand } from '../pour/inHand.ts';
import type { BoardNow, Hand } from './hand.ts';
import { withoutLapsed } from './lapsed.ts';
import { loadBoardRows, loadScene, type SceneRows } from './load.ts';
import { lockFor, type Reach } from './locks.ts';
import { isOfAllSeasons, settleOtherSeasons } from './otherSeasons.ts';
import { raiseRevision } from './record.ts';

/** Null: there was nothing to change. */
export type Command = (hand: Hand) => Promise<Said | null>;

type Scene = Pick<Deps, 'db' | 'clock'>;

/**
 * Runs an edit of anything on a season's board: under the locks, with the acceptances that it made
 * lapse, the revision raised and the change recorded, all or nothing.
 * @param shelves ids of the chains whose order the edit touches.
 * @param may whether it may be of a season that is put away.
 * @returns the board as the edit left it.
 */
export function changeBoard(
  deps: Scene,
  member: Member,
  shelves: readonly string[] | 'all',
  command: Command,
  may: 'open' | 'archived-too' = 'open',
): Promise<BoardNow> {
  return change(deps, member, { shelves, may, reach: 'season' }, command);
}

/**
 * Runs an edit of what the boards of all seasons show: yeasts, vessels, house rules and the brewery
 * itself. All seasons are locked, so that two who edit from different ones see each other.
 */
export function changeShared(
  deps: Scene,
  member: Member,
  command: Command,
  shelves: readonly string[] | 'all' = [],
): Promise<BoardNow> {
  return change(deps, member, { shelves, may: 'open', reach: 'all-seasons' }, command);
}

interface Scope {
  shelves: readonly string[] | 'all';
  may: 'open' | 'archived-too';
  reach: Reach;
}

function change(
  { db, clock }: Scene,
  member: Member,
  { shelves, may, reach }: Scope,
  command: Command,
): Promise<BoardNow> {
  const where = { breweryId: member.brewery.id, seasonId: member.seasonId };
  return inTransaction(db, async (tx) => {
    await lockFor(tx, where, shelves, reach);
    const now = clock.now();
    const { board, inHand } = await readScene(tx, member, now);
    if (may === 'open') demandOpen(board);
    return carryOut({ tx, member, board, inHand, now }, command);
  });
}

async function carryOut(hand: Hand, command: Command): Promise<BoardNow> {
  const { tx, member, board, now } = hand;
  const where = { breweryId: member.brewery.id, seasonId: member.seasonId };
  const rows = await takeSnapshot(tx, where);
  const said = await command(hand);
  if (!said) return board;
  await raiseRevision(tx, member.seasonId);
  const after = await withoutLapsed(tx, board, await readBoard(tx, member, now));
  demandNotInHand(hand, after);
  const left = { board: after, rows: await takeSnapshot(tx, where) };
  await recordEdit({ tx, member, now }, { kind: 'edit', ...said }, { board, rows }, left);
  if (isOfAllSeasons(rows, left.rows)) await settleOtherSeasons(hand, after, said.what);
  return after;
}

export async function readBoard(tx: Tx, member: Member, now: Date): Promise<BoardNow> {
  const rows = await loadBoardRows(tx, member.brewery.id, member.seasonId);
  if (!rows) throw notFound();
  return { ...rows, today: dayIn(member.brewery.timeZone, now) };
}

/** The board under the locks, with what else a command asks beforehand. */
export async function readScene(
  tx: Tx,
  { brewery, seasonId }: Pick<Member, 'brewery' | 'seasonId'>,
  now: Date,
  changeIds: readonly string[] = [],
): Promise<Pick<Hand, 'board' | 'inHand'> & Pick<SceneRows, 'made'>> {
  const scene = await loadScene(tx, brewery.id, seasonId, changeIds);
  if (!scene) throw notFound();
  return { ...scene, board: { ...scene.board, today: dayIn(brewery.timeZone, now) } };
}

/** Said under the locks, so that nobody archives the season in between. */
export function demandOpen({ season }: { season: { isArchived: boolean } }): void {
  if (season.isArchived)
    throw problem('season-archived', {
      detail: 'Take it out of the archive to change something on it',
    });
}
