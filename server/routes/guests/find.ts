import { eq } from 'drizzle-orm';
import { hashToken } from '../../auth/tokens.ts';
import type { Db, Tx } from '../../db/client.ts';
import { brewery } from '../../db/schema/brewery.ts';
import { chain } from '../../db/schema/chain.ts';
import { person } from '../../db/schema/people.ts';
import { chainGuest } from '../../db/schema/sharing.ts';
import { notFound, problem } from '../../problems.ts';

export interface Invitation {
  row: typeof chainGuest.$inferSelect;
  brewery: { id: string; name: string };
  chain: { name: string; seasonId: string };
  by: string;
}

/** An invitation to a chain that may still be accepted. */
export async function findInvitation(db: Db | Tx, token: string, now: Date): Promise<Invitation> {
  const [found] = await db
    .select({
      row: chainGuest,
      brewery: { id: brewery.id, name: brewery.name },
      chain: { name: chain.name, seasonId: chain.seasonId },
      by: person.name,
    })
    .from(chainGuest)
    .innerJoin(brewery, eq(brewery.id, chainGuest.breweryId))
    .innerJoin(chain, eq(chain.id, chainGuest.chainId))
    .innerJoin(person, eq(person.id, chainGuest.createdBy))
    .where(eq(chainGuest.tokenHash, hashToken(token)));
  if (!found) throw notFound();
  const { joinedAt, withdrawnAt, expiresAt } = found.row;
  if (withdrawnAt !== null) throw problem('link-used', { detail: 'It was withdrawn' });
  if (joinedAt !== null)
    throw problem('link-used', { detail: 'It has been used: ask for a new one' });
  if (expiresAt <= now) throw problem('link-used', { detail: 'It has run out: ask for a new one' });
  return found;
}
