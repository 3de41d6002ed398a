import { and, eq, sql } from 'drizzle-orm';
import type { Batch, Link } from '#shared/api/batch.ts';
import { UNSETTLED_LINK } from '#shared/chain/board.ts';
import type { Tx } from '../../db/client.ts';
import { batch } from '../../db/schema/chain.ts';
import type { BoardNow, Hand } from '../board/hand.ts';

/** Batches that stand on a shelf (null: the bench), in order. */
export const matesOn = (board: BoardNow, chainId: string | null): Batch[] =>
  board.batches
    .filter((each) => each.chainId === chainId && each.stage !== 'scrapped')
    .sort((a, b) => a.place - b.place);

/** The next free place on a shelf or on the bench. */
export const endOf = (board: BoardNow, chainId: string | null): number =>
  (matesOn(board, chainId).at(-1)?.place ?? -1) + 1;

/** The columns of a link's facts. */
export function linkColumns(link: Link) {
  const { typed, ...rest } = link;
  return { ...rest, linkTyped: typed };
}

type Columns = Partial<typeof batch.$inferInsert>;

/** Writes columns of one batch and raises its version. */
export async function writeBatch(tx: Tx, board: BoardNow, id: string, columns: Columns) {
  await tx
    .update(batch)
    .set({ ...columns, version: sql`${batch.version} + 1` })
    .where(and(eq(batch.seasonId, board.season.id), eq(batch.id, id)));
}

/** Writes a place, which is no part of what a batch's version guards. */
export async function writePlace(tx: Tx, board: BoardNow, id: string, place: number) {
  await tx
    .update(batch)
    .set({ place })
    .where(and(eq(batch.seasonId, board.season.id), eq(batch.id, id)));
}

/**
 * Closes the gap that a batch leaves on its shelf. What stood behind it stands on another cake
 * now, so the facts of that link go.
 */
export async function closeUp({ tx, board }: Hand, leaving: Batch): Promise<void> {
  const rest = matesOn(board, leaving.chainId).filter((mate) => mate.id !== leaving.id);
  for (const [place, mate] of rest.entries())
    if (mate.place !== place) await writePlace(tx, board, mate.id, place);
  const next = rest.find((mate) => mate.place > leaving.place);
  if (next && leaving.chainId !== null)
    await writeBatch(tx, board, next.id, linkColumns(UNSETTLED_LINK));
}
