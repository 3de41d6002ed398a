import { eq } from 'drizzle-orm';
import type { CakeState } from '#shared/api/batch.ts';
import { cake, cakeCheck } from '../../db/schema/cake.ts';
import type { Hand } from '../board/hand.ts';

/** A cake is there from the brew day on; what was measured of it stays with it. */
export async function setCake({ tx }: Hand, batchId: string, state: CakeState): Promise<void> {
  await tx
    .insert(cake)
    .values({ batchId, state })
    .onConflictDoUpdate({ target: cake.batchId, set: { state } });
}

/** With how it was judged: it was never there. */
export async function dropCake({ tx }: Hand, batchId: string): Promise<void> {
  await tx.delete(cakeCheck).where(eq(cakeCheck.batchId, batchId));
  await tx.delete(cake).where(eq(cake.batchId, batchId));
}
