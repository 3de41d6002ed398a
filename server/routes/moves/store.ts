import { and, eq, sql } from 'drizzle-orm';
import { isDeepStrictEqual } from 'node:util';
import type { Batch } from '#shared/api/batch.ts';
import { chain } from '../../db/schema/chain.ts';
import { RowsMoved } from '../../db/inTransaction.ts';
import type { Hand } from '../board/changeBoard.ts';

/**
 * Writes the rows of a move in one statement: places, and where a date or the link changed also
 * those, raising the version. Rows of other shelves are not locked; one that was edited meanwhile
 * makes the move start anew.
 */
export async function storeRows({ tx, board }: Hand, rows: readonly Batch[]): Promise<Batch[]> {
  if (rows.length === 0) return [];
  const known = new Map(board.batches.map((row) => [row.id, row]));
  const values = rows.map((row) => rowValues(row, known.get(row.id)));
  const { rows: stored } = await tx.execute<{ id: string; version: number }>(sql`
    update batch set
      chain_id = v.chain_id, place = v.place, brew_on = v.brew_on, taken_on = v.taken_on,
      keep_l = v.keep_l, keep_whole = v.keep_whole, left_above_l = v.left_above_l,
      cake_c = v.cake_c, starter = v.starter, link_typed = v.link_typed,
      acceptance = nullif(v.acceptance, 'null'::jsonb), version = batch.version + v.raise
    from jsonb_to_recordset(${JSON.stringify(values)}::jsonb) as v(
      id uuid, version int, raise int, chain_id uuid, place int, brew_on date, taken_on date,
      keep_l float8, keep_whole boolean, left_above_l float8, cake_c float8, starter boolean,
      link_typed jsonb, acceptance jsonb)
    where batch.id = v.id and batch.season_id = ${board.season.id} and batch.version = v.version
    returning batch.id, batch.version`);
  if (stored.length !== rows.length) throw new RowsMoved();
  const versions = new Map(stored.map(({ id, version }) => [id, version]));
  return rows.map((row) => ({ ...row, version: versions.get(row.id) ?? row.version }));
}

function rowValues(row: Batch, before: Batch | undefined) {
  const { link } = row;
  const changed = row.brewOn !== before?.brewOn || !isDeepStrictEqual(link, before.link);
  return {
    id: row.id,
    version: row.version,
    raise: changed ? 1 : 0,
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
