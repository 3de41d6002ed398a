import { and, eq, isNotNull, isNull, sql } from 'drizzle-orm';
import type { Tx } from '../../db/client.ts';
import { brewery } from '../../db/schema/brewery.ts';
import { chainGuest } from '../../db/schema/sharing.ts';
import { tell } from '../../live/note.ts';
import { tellBrewery } from '../board/record.ts';

/** What the brewery does not take along by itself, or is held by what goes later: in this order. */
const FIRST = ['change', 'jar', 'season', 'yeast_line'];

/**
 * Deletes a brewery and all that belongs to it, the record too: that is kept for those who work
 * together, and nobody is left. The record's own guard lets it pass for this brewery and
 * transaction alone.
 */
export async function endBrewery(tx: Tx, breweryId: string): Promise<void> {
  const guests = await tx
    .select({ personId: chainGuest.personId, board: chainGuest.guestBreweryId })
    .from(chainGuest)
    .where(
      and(
        eq(chainGuest.breweryId, breweryId),
        isNotNull(chainGuest.joinedAt),
        isNull(chainGuest.withdrawnAt),
      ),
    );
  await tx.execute(sql`select set_config('barmkin.ending_brewery', ${breweryId}, true)`);
  for (const table of FIRST)
    await tx.execute(
      sql`delete from ${sql.identifier(table)} where brewery_id = ${breweryId}::uuid`,
    );
  await tx.delete(brewery).where(eq(brewery.id, breweryId));
  const boards = new Set(guests.flatMap(({ board }) => board ?? []));
  for (const board of [...boards].toSorted()) await tellBrewery(tx, board);
  for (const { personId } of guests) if (personId) await tell(tx, { kind: 'person', personId });
}
