import { and, eq } from 'drizzle-orm';
import type { Member } from '../../auth/whoAsks.ts';
import type { Clock } from '../../clock.ts';
import type { Db, Tx } from '../../db/client.ts';
import { inTransaction } from '../../db/inTransaction.ts';
import { batch } from '../../db/schema/chain.ts';
import { season } from '../../db/schema/season.ts';
import { notFound, problem } from '../../problems.ts';
import { demandOpen } from '../board/changeBoard.ts';
import { lockBoard } from '../board/locks.ts';
import { raiseRevision, writeEntry } from '../board/record.ts';

export interface Scene {
  db: Db;
  clock: Clock;
}

/** A line of a batch's record, in the version that was seen. */
export interface LineNamed {
  batchId: string | undefined;
  id: string;
  version: number;
}

/** The batch whose record is written, in whatever season of this brewery. */
export async function findBatch(db: Db | Tx, { brewery }: Member, id: string | undefined) {
  const [row] = await db
    .select({
      id: batch.id,
      name: batch.name,
      seasonId: batch.seasonId,
      chainId: batch.chainId,
      stage: batch.stage,
      brewOn: batch.brewOn,
      archivedAt: season.archivedAt,
    })
    .from(batch)
    .innerJoin(season, eq(season.id, batch.seasonId))
    .where(and(eq(batch.breweryId, brewery.id), eq(batch.id, id ?? '')));
  if (!row) throw notFound();
  return row;
}
export type WrittenBatch = Awaited<ReturnType<typeof findBatch>>;

/** What a command has in hand: the batch, under the locks of its shelf and its season. */
export interface Writing {
  tx: Tx;
  member: Member;
  batch: WrittenBatch;
  now: Date;
}

/** What was written, and the line of the change record that says so; null: it stood already. */
export interface Written<T> {
  result: T;
  said: {
    what: string;
    before: unknown;
    after: unknown;
    /** Rows that it changed beside the batch. */
    touches?: readonly string[];
  } | null;
}

/**
 * Writes something into a batch's record: all or nothing, with a line in the change record, and
 * everybody on the season's board told. The locks are those of an edit of the board.
 */
export function onBatch<T>(
  { db, clock }: Scene,
  member: Member,
  batchId: string | undefined,
  write: (writing: Writing) => Promise<Written<T>>,
): Promise<T> {
  return inTransaction(db, async (tx) => {
    const known = await findBatch(tx, member, batchId);
    await lockBoard(tx, known.seasonId, known.chainId === null ? [] : [known.chainId]);
    const row = await findBatch(tx, member, batchId);
    demandOpen({ season: { isArchived: row.archivedAt !== null } });
    if (row.stage === 'scrapped')
      throw problem('in-use', { detail: `${row.name} was scrapped: its record is closed` });
    const now = clock.now();
    const { result, said } = await write({ tx, member, batch: row, now });
    if (!said) return result;
    await raiseRevision(tx, row.seasonId);
    const shelf = row.chainId === null ? [] : [row.chainId];
    const touches = [row.id, ...shelf, ...(said.touches ?? [])];
    const where = { ...member, seasonId: row.seasonId };
    await writeEntry(tx, where, now, { kind: 'edit', ...said, touches });
    return result;
  });
}
