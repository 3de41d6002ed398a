import { sql, type SQL } from 'drizzle-orm';
import type { Db, Tx } from '../db/client.ts';

/** The one channel of the database on which all processes tell each other what changed. */
export const CHANNEL = 'barmkin';

/** A note names what to look at, never what is in it: PostgreSQL lets every session listen. */
export type Note =
  | { kind: 'season'; seasonId: string; revision: number }
  /** Somebody came to a season's board, or left it. */
  | { kind: 'here'; seasonId: string }
  /** A sign-in or a membership of this person may have ended. */
  | { kind: 'person'; personId: string };

function write(note: Exclude<Note, { kind: 'season' }>): string {
  switch (note.kind) {
    case 'here':
      return `here ${note.seasonId}`;
    case 'person':
      return `person ${note.personId}`;
  }
}

/** Null for what another version may have said. */
export function readNote(payload: string): Note | null {
  const [kind, id, revision] = payload.split(' ');
  if (!id) return null;
  switch (kind) {
    case 'season':
      return { kind, seasonId: id, revision: Number(revision) };
    case 'here':
      return { kind, seasonId: id };
    case 'person':
      return { kind, personId: id };
    default:
      return null;
  }
}

/** Told when the transaction is committed, and not at all if it is not. */
export async function tell(db: Db | Tx, note: Exclude<Note, { kind: 'season' }>): Promise<void> {
  await db.execute(sql`select pg_notify(${CHANNEL}, ${write(note)})`);
}

/** Tells of a season's revision, as a column of the statement that raises it. */
export const tellRevision = (seasonId: string, revision: SQL): SQL =>
  sql`pg_notify(${CHANNEL}, format('season %s %s', ${seasonId}::text, ${revision}))`;
