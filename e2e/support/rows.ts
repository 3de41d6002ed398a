import { asc, eq } from 'drizzle-orm';
import type { Db } from '../../server/db/client.ts';
import { batch } from '../../server/db/schema/chain.ts';

/** Where every batch of a brewery stands, as the database has it. */
export async function batchRows(db: Db, breweryId: string) {
  return db
    .select({ id: batch.id, chainId: batch.chainId, place: batch.place })
    .from(batch)
    .where(eq(batch.breweryId, breweryId))
    .orderBy(asc(batch.chainId), asc(batch.place));
}

/** The places of each shelf and of the bench, in order. */
export function placesOf(rows: Awaited<ReturnType<typeof batchRows>>): (number | null)[][] {
  const places = new Map<string, (number | null)[]>();
  for (const { chainId, place } of rows)
    places.set(chainId ?? 'bench', [...(places.get(chainId ?? 'bench') ?? []), place]);
  return [...places.values()];
}
