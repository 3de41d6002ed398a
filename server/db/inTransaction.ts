import pg from 'pg';
import type { Db, Tx } from './client.ts';

/** Two changes that met: a deadlock, or two rows that wanted one place or one name. */
const MET = new Set(['40001', '40P01']);
const PLACES = new Set(['batch_place', 'chain_position', 'change_pkey']);
const TRIES = 6;

/** Thrown by a command that finds its rows changed under it: it is run again. */
export class RowsMoved extends Error {}

/** Of a write that names the version it was made from: somebody else may have been first. */
export function demandWritten(rows: readonly unknown[]): void {
  if (rows.length === 0) throw new RowsMoved();
}

function met(error: unknown): boolean {
  if (error instanceof RowsMoved) return true;
  const cause = error instanceof Error && error.cause instanceof Error ? error.cause : error;
  if (!(cause instanceof pg.DatabaseError)) return false;
  return (
    MET.has(cause.code ?? '') || (cause.code === '23505' && PLACES.has(cause.constraint ?? ''))
  );
}

/** A command's transaction. Where it met another it is run again from the start, on what is there now. */
export async function inTransaction<T>(db: Db, command: (tx: Tx) => Promise<T>): Promise<T> {
  for (let left = TRIES - 1; ; left -= 1) {
    try {
      return await db.transaction(command);
    } catch (error) {
      if (left === 0 || !met(error)) throw error;
    }
  }
}
