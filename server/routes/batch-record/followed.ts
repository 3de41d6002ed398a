import { asc, desc, eq } from 'drizzle-orm';
import { digestOf } from '#shared/fermentation/digest.ts';
import type { Db, Tx } from '../../db/client.ts';
import { batch } from '../../db/schema/chain.ts';
import { pourEvent } from '../../db/schema/pour.ts';
import { reading } from '../../db/schema/readings.ts';
import { happenedAt } from '../pour/times.ts';

/** When the wort of a batch met its yeast, where a pour was recorded. */
export async function pouredAtOf(db: Db | Tx, batchId: string): Promise<string | null> {
  const [pour] = await db
    .select()
    .from(pourEvent)
    .where(eq(pourEvent.batchId, batchId))
    .orderBy(desc(pourEvent.deviceAt))
    .limit(1);
  return pour ? happenedAt(pour).toISOString() : null;
}

/** Renews what a batch's readings come to, after one of them or the pour was written. */
export async function renewFollowed(tx: Tx, batchId: string): Promise<void> {
  const rows = await tx
    .select({ kind: reading.kind, at: reading.takenAt, value: reading.value })
    .from(reading)
    .where(eq(reading.batchId, batchId))
    .orderBy(asc(reading.takenAt), asc(reading.id));
  const readings = rows.map(({ at, ...rest }) => ({ ...rest, at: at.toISOString() }));
  const followed = digestOf(readings, await pouredAtOf(tx, batchId));
  await tx.update(batch).set({ followed }).where(eq(batch.id, batchId));
}
