import { batchCreate } from '#shared/api/batch.ts';
import type { Moved } from '#shared/api/move.ts';
import { yeastCreate } from '#shared/api/yeast.ts';
import { merged } from '../../http/patch.ts';
import { problem } from '../../problems.ts';
import type { EditSide } from '../../record/difference.ts';
import { gistOf, recordEdit } from '../../record/recordEdit.ts';
import { takeSnapshot } from '../../record/snapshot.ts';
import { takeBackRows } from '../../record/takeBackRows.ts';
import { writeRows } from '../../record/writeRows.ts';
import { readBoard } from '../board/changeBoard.ts';
import type { BoardNow, Hand } from '../board/hand.ts';
import { demandNothingHangs } from '../board/hanging.ts';
import { withoutLapsed } from '../board/lapsed.ts';
import { isOfAllSeasons, settleOtherSeasons } from '../board/otherSeasons.ts';
import { raiseRevision } from '../board/record.ts';
import { demandNotInHand } from '../pour/inHand.ts';
import { demandNoPour } from '../pour/onRecord.ts';
import { answerMove } from './answer.ts';
import { demandMayWrite } from './mayWrite.ts';
import { notUndoable, type ChangeRow, type Way } from './notUndoable.ts';

/** Writes the rows of an edit back as they were before it, or again as it left them. */
export async function takeEditBack(hand: Hand, way: Way, row: ChangeRow): Promise<Moved> {
  const { tx, member, board, now } = hand;
  const [before, after] = [row.before as EditSide, row.after as EditSide];
  const [from, to] = way === 'undo' ? [after, before] : [before, after];
  demandMayWrite(member, to);
  const where = { breweryId: member.brewery.id, seasonId: member.seasonId };
  const rows = await takeSnapshot(tx, where);
  const result = takeBackRows(rows, from, to);
  if (!result.ok) throw await notUndoable(hand, row, result);
  await demandNoPour(tx, plannedAnew(to), 'not-undoable');
  await demandNothingHangs(hand, gone(to), 'not-undoable');
  await writeRows(tx, rows, result.next);
  const revision = await raiseRevision(tx, member.seasonId);
  const left = await withAcceptances(hand, to, await readBoard(tx, member, now));
  demandNotInHand(hand, left);
  demandSound(left, row.touches);
  const what = `${way === 'undo' ? 'Undone' : 'Redone'}: ${row.what}`;
  const done = { board: left, rows: await takeSnapshot(tx, where) };
  const said = { kind: way, what, touches: [], ofChange: row.id };
  await recordEdit({ tx, member, now }, said, { board, rows }, done);
  if (isOfAllSeasons(rows, done.rows)) await settleOtherSeasons(hand, left, what);
  return answerMove(hand, { changeId: row.id, what, revision, ...rowsBetween(board, left) });
}

/** Batches that would be pencilled again, or gone. */
const plannedAnew = ({ rows }: EditSide): string[] =>
  Object.entries(rows.batch ?? {}).flatMap(([id, row]) =>
    row === null || row.stage === 'pencilled' ? [id] : [],
  );

/** Batches and shelves that would be gone. */
const gone = ({ rows }: EditSide): string[] =>
  Object.entries({ ...rows.batch, ...rows.chain }).flatMap(([id, row]) =>
    row === null ? [id] : [],
  );

/** An acceptance that comes back must speak of the same link still; one that is changed by this lapses. */
function withAcceptances({ tx, board }: Hand, to: EditSide, left: BoardNow): Promise<BoardNow> {
  const gists = Object.entries(to.accepted ?? {});
  const kept = gists.filter(([id, gist]) => gistOf(left, id) === gist).map(([id]) => id);
  return withoutLapsed(tx, board, left, new Set(kept));
}

/** Two edits of one row may fit each alone and not without the other: a final gravity above the original. */
function demandSound(board: BoardNow, touches: readonly string[]): void {
  const check = (parse: () => unknown, name: string) => {
    try {
      parse();
    } catch {
      throw problem('not-undoable', { detail: `${name} was changed since, and would not fit` });
    }
  };
  for (const row of board.batches)
    if (touches.includes(row.id))
      check(() => merged(batchCreate, Object.keys(batchCreate.shape), row, {}), row.name);
  for (const row of board.yeasts)
    if (touches.includes(row.id))
      check(() => merged(yeastCreate, Object.keys(yeastCreate.shape), row, {}), row.name);
}

/** Batches and shelves that differ, as the answer of a move tells them; the rest is read anew. */
export function rowsBetween(
  before: BoardNow,
  after: BoardNow,
): Pick<Moved, 'batches' | 'chains' | 'removedChainIds'> {
  const text = (row: object | undefined) => JSON.stringify(row);
  const differing = <T extends { id: string }>(was: readonly T[], is: readonly T[]) => {
    const known = new Map(was.map((row) => [row.id, text(row)]));
    return is.filter((row) => known.get(row.id) !== text(row));
  };
  const left = new Set(after.chains.map(({ id }) => id));
  return {
    batches: differing(before.batches, after.batches),
    chains: differing(before.chains, after.chains),
    removedChainIds: before.chains.filter(({ id }) => !left.has(id)).map(({ id }) => id),
  };
}
