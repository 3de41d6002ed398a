import { and, eq, ne } from 'drizzle-orm';
import { isDeepStrictEqual } from 'node:util';
import type { Member } from '../../auth/whoAsks.ts';
import type { Db } from '../../db/client.ts';
import { season } from '../../db/schema/season.ts';
import type { BoardNow } from './hand.ts';
import { raiseRevision } from './record.ts';

/** Yeasts, vessels and house rules are the brewery's: the boards of all its seasons show them. */
export const isOfAllSeasons = (before: BoardNow, after: BoardNow): boolean =>
  (['yeasts', 'vessels', 'houseRules'] as const).some(
    (key) => !isDeepStrictEqual(before[key], after[key]),
  );

/**
 * Lets whoever has another season's board open read it anew. After the change and not within it:
 * two of them would wait for each other's seasons.
 */
export async function tellOtherSeasons(db: Db, { brewery, seasonId }: Member): Promise<void> {
  const others = await db
    .select({ id: season.id })
    .from(season)
    .where(and(eq(season.breweryId, brewery.id), ne(season.id, seasonId)));
  for (const { id } of others) await db.transaction((tx) => raiseRevision(tx, id));
}
