import { and, eq } from 'drizzle-orm';
import type { Member } from '../../auth/whoAsks.ts';
import type { Db } from '../../db/client.ts';
import { chain } from '../../db/schema/chain.ts';
import { notFound } from '../../problems.ts';

/** The chain must be one of the brewery's; another's does not exist. */
export async function demandChain(db: Db, { brewery }: Member, chainId: string): Promise<void> {
  const found = await db
    .select({ id: chain.id })
    .from(chain)
    .where(and(eq(chain.breweryId, brewery.id), eq(chain.id, chainId)));
  if (found.length === 0) throw notFound();
}
