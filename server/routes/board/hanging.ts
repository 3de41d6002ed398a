import { and, count, exists, gt, inArray, isNotNull, isNull, eq, sql, type SQL } from 'drizzle-orm';
import { unionAll, type PgColumn } from 'drizzle-orm/pg-core';
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
  const hanging = await hangingOn(hand, ids);
  const [first] = hanging;
  if (!first) return;
  const { name } = one([...hand.board.chains, ...hand.board.batches], first.id);
  const has = hanging.filter(({ id }) => id === first.id).map(({ n, what }) => counted(n, what));
  throw problem(kind, { detail: `${name} has ${listed(has)}, which would go with it` });
}

const counted = (n: number, what: string) => `${n} ${what}${n === 1 ? '' : 's'}`;

function hangingOn({ tx, now }: Hand, ids: readonly string[]) {
  const of = counting(tx, ids);
  const isSaid = isNull(comment.deletedAt);
  const isBegun = exists(
    tx.select({ id: pourReading.id }).from(pourReading).where(eq(pourReading.runId, pourRun.id)),
  );
  const isOpen = and(isNull(chainGuest.withdrawnAt), isNull(chainGuest.joinedAt));
  return unionAll(
    of('reading', reading.batchId),
    of('note', batchNote.batchId),
    of('event', batchEvent.batchId),
    of('begun pour', pourRun.batchId, isBegun),
    of('begun pour', pourRun.cakeBatchId, isBegun),
    of('comment', comment.batchId, isSaid),
    of('comment', comment.chainId, isSaid),
    of('link', shareLink.chainId, and(isNull(shareLink.withdrawnAt), gt(shareLink.expiresAt, now))),
    of(
      'guest',
      chainGuest.chainId,
      and(isNull(chainGuest.withdrawnAt), isNotNull(chainGuest.joinedAt)),
    ),
    of('open invitation', chainGuest.chainId, and(isOpen, gt(chainGuest.expiresAt, now))),
  );
}

/** How many rows of a table refer to each of these. */
const counting =
  (tx: Tx, ids: readonly string[]) => (what: string, column: PgColumn, which?: SQL) =>
    tx
      .select({ id: sql<string>`${column}`, what: sql<string>`${what}::text`, n: count() })
      .from(column.table)
      .where(and(inArray(column, [...ids]), which))
      .groupBy(column);
