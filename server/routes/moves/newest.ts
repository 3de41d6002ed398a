import { sql } from 'drizzle-orm';
import type { Db, Tx } from '../../db/client.ts';

interface ChangeRef {
  id: string;
  what: string;
}

/** How far back one may undo, in own changes. */
const REACH = 200;

/**
 * The newest of somebody's own moves and edits that stands (to be undone), and the one that was undone last
 * (to be redone). A new change of one's own ends the redoing. What happened stays: a pour is neither.
 */
export async function newestOwn(
  db: Db | Tx,
  seasonId: string,
  personId: string,
): Promise<{ undo: ChangeRef | null; redo: ChangeRef | null }> {
  const { rows } = await db.execute<{ undo: ChangeRef | null; redo: ChangeRef | null }>(sql`
    with own as (
      select c.id, c.what, c.seq, last.kind as last_kind, last.seq as last_seq
      from change c
      left join lateral (
        select u.kind, u.seq from change u where u.of_change = c.id order by u.seq desc limit 1
      ) last on true
      where c.season_id = ${seasonId} and c.person_id = ${personId}
        and (c.kind = 'move' or (c.kind = 'edit' and c.after ? 'rows' and not c.after ? 'stays'))
      order by c.seq desc limit ${REACH}
    ), newest as (
      select max(seq) as seq from change
      where season_id = ${seasonId} and person_id = ${personId} 
        and (kind = 'move' or (kind = 'edit' and after ? 'rows'))
    )
    select
      (select json_build_object('id', id, 'what', what) from own
       where last_kind is null or last_kind = 'redo' order by seq desc limit 1) as undo,
      (select json_build_object('id', id, 'what', what) from own, newest
       where last_kind = 'undo' and last_seq > newest.seq order by last_seq desc limit 1) as redo`);
  return rows[0] ?? { undo: null, redo: null };
}
