import { and, eq, sql } from 'drizzle-orm';
import { isDeepStrictEqual } from 'node:util';
import type { Batch } from '#shared/api/batch.ts';
import type { BoardFacts } from '#shared/chain/board.ts';
import { chain } from '../../db/schema/chain.ts';
import { RowsMoved } from '../../db/inTransaction.ts';
import type { Hand } from '../board/hand.ts';

/** Rows with the versions that storing them gives: a new one where a date or the link changed. */
export function withNewVersions(board: Pick<BoardFacts, 'batches'>, rows: readonly Batch[]) {
  const known = new Map(board.batches.map((row) => [row.id, row]));
  return rows.map((row) => {
    const before = known.get(row.id);
    const changed =
      row.brewOn !== before?.brewOn ||
      (row.link !== before.link && !isDeepStrictEqual(row.link, before.link));
    return changed ? { ...row, version: row.version + 1 } : row;
  });
}

/**
 * Writes the rows of moves in one statement: places, dates and links, with the versions that they
 * carry. Rows of other shelves are not locked; one that was edited meanwhile makes the moves start
 * anew.
 */
export async function storeRows(
  { tx, board }: Pick<Hand, 'tx' | 'board'>,
  rows: readonly Batch[],
): Promise<void> {
  if (rows.length === 0) return;
  const known = new Map(board.batches.map((row) => [row.id, row.version]));
  const values = rows.map((row) => rowValues(row, known.get(row.id)));
  const { rows: stored } = await tx.execute<{ id: string }>(sql`
    update batch set
      chain_id = v.chain_id, place = v.place, brew_on = v.brew_on, taken_on = v.taken_on,
      keep_l = v.keep_l, keep_whole = v.keep_whole, left_above_l = v.left_above_l,
      cake_c = v.cake_c, starter = v.starter, link_typed = v.link_typed,
      acceptance = nullif(v.acceptance, 'null'::jsonb), version = v.version
    from jsonb_to_recordset(${JSON.stringify(values)}::jsonb) as v(
      id uuid, was int, version int, chain_id uuid, place int, brew_on date, taken_on date,
      keep_l float8, keep_whole boolean, left_above_l float8, cake_c float8, starter boolean,
      link_typed jsonb, acceptance jsonb)
    where batch.id = v.id and batch.season_id = ${board.season.id} and batch.version = v.was
    returning batch.id`);
  if (stored.length !== rows.length) throw new RowsMoved();
}

function rowValues(row: Batch, was: number | undefined) {
  const { link } = row;
  return {
    id: row.id,
    was,
    version: row.version,
    chain_id: row.chainId,
    place: row.place,
    brew_on: row.brewOn,
    taken_on: link.takenOn,
    keep_l: link.keepL,
    keep_whole: link.keepWhole,
    left_above_l: link.leftAboveL,
    cake_c: link.cakeC,
    starter: link.starter,
    link_typed: link.typed,
    acceptance: link.acceptance,
  };
}

/** Takes down a shelf that a move had put up. */
export async function dropChain({ tx, board }: Hand, id: string): Promise<void> {
  await tx.delete(chain).where(and(eq(chain.seasonId, board.season.id), eq(chain.id, id)));
}
