import { randomUUID } from 'node:crypto';
import { eq, sql } from 'drizzle-orm';
import type { Member } from '../../auth/whoAsks.ts';
import type { Tx } from '../../db/client.ts';
import { tell } from '../../live/note.ts';
import { change, type ChangeKind } from '../../db/schema/change.ts';
import { season } from '../../db/schema/season.ts';

/** A line of the change record, in the product's words, with what was before and what is now. */
export interface Entry {
  /** Made by the client where a repeated request must be recognised. */
  id?: string;
  kind: ChangeKind;
  what: string;
  before: unknown;
  after: unknown;
  touches: readonly string[];
  ofChange?: string;
}

/**
 * Raises the season's revision, and tells all processes once this is committed. It locks the
 * season, so it comes after the locks of shelves.
 */
export async function raiseRevision(tx: Tx, seasonId: string): Promise<number> {
  const [raised] = await tx
    .update(season)
    .set({ revision: sql`${season.revision} + 1` })
    .where(eq(season.id, seasonId))
    .returning({ revision: season.revision });
  if (!raised) throw new Error('The season went away under its own change');
  await tell(tx, { kind: 'season', seasonId, revision: raised.revision });
  return raised.revision;
}

export async function writeEntry(tx: Tx, member: Member, at: Date, entry: Entry): Promise<string> {
  const { id = randomUUID(), touches, before, after, ...rest } = entry;
  await tx.insert(change).values({
    id,
    ...rest,
    before: stored(before),
    after: stored(after),
    touches: [...touches],
    breweryId: member.brewery.id,
    seasonId: member.seasonId,
    personId: member.person.id,
    at,
  });
  return id;
}

/** What was not there, or is no longer: JSON's null, since the record has no gaps. */
const stored = (side: unknown) => side ?? sql`'null'::jsonb`;
