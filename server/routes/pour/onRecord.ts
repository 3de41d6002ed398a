import { eq, inArray, or } from 'drizzle-orm';
import type { Tx } from '../../db/client.ts';
import { batch } from '../../db/schema/chain.ts';
import { pourEvent } from '../../db/schema/pour.ts';
import { problem } from '../../problems.ts';

/** A pour that happened stays on the record: neither its batch nor its cake's is planned anew, or goes. */
export async function demandNoPour(
  tx: Tx,
  batchIds: readonly string[],
  kind: 'in-use' | 'not-undoable' = 'in-use',
): Promise<void> {
  if (batchIds.length === 0) return;
  const ids = [...batchIds];
  const [poured] = await tx
    .select({ name: batch.name })
    .from(pourEvent)
    .innerJoin(batch, eq(batch.id, pourEvent.batchId))
    .where(or(inArray(pourEvent.batchId, ids), inArray(pourEvent.cakeBatchId, ids)))
    .limit(1);
  if (poured)
    throw problem(kind, {
      detail: `The pour of ${poured.name} is on the record and stays there: correct what was read, or scrap the batch`,
    });
}
