import { sql } from 'drizzle-orm';
import type { Db } from '../db/client.ts';
import { CHANNEL } from './note.ts';
import type { Watcher } from './stream.ts';

/**
 * Who is here, by rows that every process can read. Times are the database's own, so that the
 * clocks of the processes need not agree.
 */

/** A row that was not renewed for so many heartbeats belonged to a process that was killed. */
const FORGOTTEN_BEATS = 3;

const rowsOf = (watchers: readonly Watcher[]) =>
  JSON.stringify(
    watchers.map(({ streamId, seasonId, personId }) => ({
      stream_id: streamId,
      season_id: seasonId,
      person_id: personId,
    })),
  );

/** Writes the rows of these watchers, new or renewed. Where one is new, its season is told. */
export async function arrive(db: Db, watchers: readonly Watcher[]): Promise<void> {
  if (watchers.length === 0) return;
  // Joined, so that one whose season or person was deleted meanwhile does not cost the others theirs.
  await db.execute(sql`
    with written as (
      insert into presence (stream_id, season_id, person_id, seen_at)
      select v.stream_id, v.season_id, v.person_id, now()
      from jsonb_to_recordset(${rowsOf(watchers)}::jsonb)
        as v(stream_id uuid, season_id uuid, person_id uuid)
      join season on season.id = v.season_id
      join person on person.id = v.person_id
      on conflict (stream_id) do update set seen_at = now()
      returning season_id, xmax = 0 as is_new
    )
    select pg_notify(${CHANNEL}, 'here ' || season_id)
    from (select distinct season_id from written where is_new) as changed`);
}

export async function depart(db: Db, streamIds: readonly string[]): Promise<void> {
  if (streamIds.length === 0) return;
  await db.execute(sql`
    with gone as (
      delete from presence
      where stream_id in (select value::uuid from jsonb_array_elements_text(${JSON.stringify(streamIds)}::jsonb))
      returning season_id
    )
    select pg_notify(${CHANNEL}, 'here ' || season_id)
    from (select distinct season_id from gone) as changed`);
}

/** Ids of the people in each season, in a fixed order. */
export async function hereIn(
  db: Db,
  seasonIds: readonly string[],
  beatMs: number,
): Promise<Map<string, string[]>> {
  const { rows } = await db.execute<{ season_id: string; people: string[] }>(sql`
    select season_id, json_agg(distinct person_id::text) as people from presence
    where season_id in (select value::uuid from jsonb_array_elements_text(${JSON.stringify(seasonIds)}::jsonb))
      and seen_at > ${remembered(beatMs)}
    group by season_id`);
  return new Map(rows.map(({ season_id, people }) => [season_id, people.toSorted()]));
}

/** Takes away what killed processes left behind. */
export async function sweep(db: Db, beatMs: number): Promise<void> {
  await db.execute(sql`delete from presence where seen_at <= ${remembered(beatMs)}`);
}

const remembered = (beatMs: number) =>
  sql`now() - make_interval(secs => ${(beatMs * FORGOTTEN_BEATS) / 1000})`;
