import { randomUUID } from 'node:crypto';
import { eq, sql } from 'drizzle-orm';
import type { Member } from '../../auth/whoAsks.ts';
import type { Tx } from '../../db/client.ts';
import { change, type ChangeKind } from '../../db/schema/change.ts';
import { season } from '../../db/schema/season.ts';
import { tellRevision } from '../../live/note.ts';

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

/** Who did it, and in which season's record it stands. */
interface Where {
  brewery: Pick<Member['brewery'], 'id'>;
  seasonId: string;
  person: Pick<Member['person'], 'id'>;
}

/**
 * Raises the season's revision, and tells all processes of each revision once this is committed. It
 * locks the season, so it comes after the locks of shelves.
 * @param by how many changes are made at once, each with a revision of its own.
 * @returns the last of these revisions.
 */
export async function raiseRevision(tx: Tx, seasonId: string, by = 1): Promise<number> {
  const { rows } = await tx.execute<{ revision: number }>(sql`
    with raised as (
      update ${season} set revision = revision + ${by} where id = ${seasonId} returning revision)
    select raised.revision, ${tellRevision(seasonId, sql`each`)}
    from raised, generate_series(raised.revision - ${by}::int + 1, raised.revision) each`);
  const [raised] = rows;
  if (!raised) throw new Error('The season went away under its own change');
  return raised.revision;
}

/** For what the boards of all seasons show: members, and shelves of which somebody is a guest. */
export async function tellBrewery(tx: Tx, breweryId: string): Promise<void> {
  const seasons = await tx
    .select({ id: season.id })
    .from(season)
    .where(eq(season.breweryId, breweryId))
    .orderBy(season.id);
  for (const { id } of seasons) await raiseRevision(tx, id);
}

export async function writeEntry(tx: Tx, member: Where, at: Date, entry: Entry): Promise<void> {
  await writeEntries(tx, at, [{ member, entry }]);
}

/** In the order in which they are given, in one statement. */
export async function writeEntries(
  tx: Tx,
  at: Date,
  entries: readonly { member: Where; entry: Entry }[],
): Promise<void> {
  const values = entries.map(({ member, entry }) => ({
    id: entry.id ?? randomUUID(),
    brewery_id: member.brewery.id,
    season_id: member.seasonId,
    person_id: member.person.id,
    kind: entry.kind,
    what: entry.what,
    before: entry.before,
    after: entry.after,
    touches: entry.touches,
    of_change: entry.ofChange,
  }));
  // What was not there, or is no longer, is JSON's null: the record has no gaps.
  await tx.execute(sql`
    insert into ${change} (
      id, brewery_id, season_id, person_id, at, kind, what, before, after, touches, of_change)
    select id, brewery_id, season_id, person_id, ${at.toISOString()}::timestamptz, kind, what,
      coalesce(before, 'null'), coalesce(after, 'null'), touches, of_change
    from rows from (jsonb_to_recordset(${JSON.stringify(values)}::jsonb) as (
      id uuid, brewery_id uuid, season_id uuid, person_id uuid, kind text, what text,
      before jsonb, after jsonb, touches uuid[], of_change uuid)) with ordinality
    order by ordinality`);
}
