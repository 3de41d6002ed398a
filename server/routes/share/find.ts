import { eq } from 'drizzle-orm';
import { hashToken } from '../../auth/tokens.ts';
import type { Db, Tx } from '../../db/client.ts';
import { brewery } from '../../db/schema/brewery.ts';
import { chain } from '../../db/schema/chain.ts';
import { shareLink } from '../../db/schema/sharing.ts';
import { notFound, problem } from '../../problems.ts';

export interface FoundLink {
  link: typeof shareLink.$inferSelect;
  brewery: typeof brewery.$inferSelect;
  /** The season on whose board the chain stands. */
  seasonId: string;
}

/** A link that may be looked at. */
export async function findShareLink(db: Db | Tx, token: string, now: Date): Promise<FoundLink> {
  const [found] = await db
    .select({ link: shareLink, brewery, seasonId: chain.seasonId })
    .from(shareLink)
    .innerJoin(brewery, eq(brewery.id, shareLink.breweryId))
    .innerJoin(chain, eq(chain.id, shareLink.chainId))
    .where(eq(shareLink.tokenHash, hashToken(token)));
  if (!found) throw notFound();
  if (found.link.withdrawnAt !== null)
    throw problem('link-used', { detail: 'It was withdrawn: ask whoever gave it to you' });
  if (found.link.expiresAt <= now)
    throw problem('link-used', { detail: 'It has run out: ask whoever gave it to you' });
  return found;
}
