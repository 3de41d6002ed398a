import { and, count, eq, exists, gt, inArray, isNotNull, isNull, sql, type SQL } from 'drizzle-orm';
import type { PgColumn } from 'drizzle-orm/pg-core';
import { listed } from '#shared/rules/say.ts';
import type { Tx } from '../../db/client.ts';
import { pourReading, pourRun } from '../../db/schema/pour.ts';
import { batchEvent, batchNote, reading } from '../../db/schema/readings.ts';
import { chainGuest, shareLink } from '../../db/schema/sharing.ts';
import { comment } from '../../db/schema/talk.ts';
import { problem } from '../../problems.ts';
import { one } from './find.ts';
import type { Hand } from './hand.ts';

/**
 * What was read, written or said of a batch or a shelf, or is shared of it, would go with it, and no
 * undo brings it back: an undo knows the rows of a board. So what has any of it is not deleted.
 * @param ids of batches and shelves of the board
 */
export async function demandNothingHangs(
  hand: Hand,
  ids: readonly string[],
  kind: 'in-use' | 'not-undoable' = 'in-use',
): Promise<void> {
  if (ids.length === 0) return;
  const rows = await hangingOn(hand, ids);
  const [first] = rows;
  if (!first) return;
  const { name } = one([...hand.board.chains, ...hand.board.batches], first.id);
  const has = rows.filter(({ id }) => id === first.id).map(({ words }) => words);
  throw problem(kind, { detail: `${name} has ${listed(has)}, which would go with it` });
}

/** By batch or shelf: what there is of each kind, in words. */
async function hangingOn({ tx, now }: Hand, ids: readonly string[]) {
  const rows: { id: string; words: string }[] = [];
  for (const { of: column, kind, which } of kindsOf(tx, now)) {
    const found = await tx
      .select({ id: sql<string>`${column}`, n: count() })
      .from(column.table)
      .where(and(inArray(column, [...ids]), which))
      .groupBy(column);
    const [single, several] = kind;
    rows.push(...found.map(({ id, n }) => ({ id, words: `${n} ${n === 1 ? single : several}` })));
  }
  return rows;
}

interface Kind {
  /** The column that names the batch or the shelf. */
  of: PgColumn;
  kind: readonly [single: string, several: string];
  which?: SQL | undefined;
}

function kindsOf(tx: Tx, now: Date): readonly Kind[] {
  const isBegun = exists(
    tx.select({ id: pourReading.id }).from(pourReading).where(eq(pourReading.runId, pourRun.id)),
  );
  const isSaid = isNull(comment.deletedAt);
  const isGood = and(isNull(shareLink.withdrawnAt), gt(shareLink.expiresAt, now));
  const isGuest = and(isNull(chainGuest.withdrawnAt), isNotNull(chainGuest.joinedAt));
  const isOpen = and(
    isNull(chainGuest.withdrawnAt),
    isNull(chainGuest.joinedAt),
    gt(chainGuest.expiresAt, now),
  );
  return [
    { of: reading.batchId, kind: ['reading', 'readings'] },
    { of: batchNote.batchId, kind: ['note', 'notes'] },
    { of: batchEvent.batchId, kind: ['event', 'events'] },
    { of: pourRun.batchId, kind: ['begun pour', 'begun pours'], which: isBegun },
    {
      of: pourRun.cakeBatchId,
      kind: ['pour begun onto it', 'pours begun onto it'],
      which: isBegun,
    },
    { of: comment.batchId, kind: ['comment', 'comments'], which: isSaid },
    { of: comment.chainId, kind: ['comment', 'comments'], which: isSaid },
    { of: shareLink.chainId, kind: ['link', 'links'], which: isGood },
    { of: chainGuest.chainId, kind: ['guest', 'guests'], which: isGuest },
    { of: chainGuest.chainId, kind: ['open invitation', 'open invitations'], which: isOpen },
  ];
}
