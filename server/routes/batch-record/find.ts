import { and, asc, desc, eq, type SQL } from 'drizzle-orm';
import type { Db, Tx } from '../../db/client.ts';
import { cakeCheck } from '../../db/schema/cake.ts';
import { person } from '../../db/schema/people.ts';
import { batchEvent, batchNote, reading } from '../../db/schema/readings.ts';

/** Whoever closed the account has another name in its row. */
const author = person.name;

const readings = (db: Db | Tx, where: SQL | undefined) =>
  db
    .select({ row: reading, author })
    .from(reading)
    .innerJoin(person, eq(person.id, reading.personId))
    .where(where)
    .orderBy(asc(reading.takenAt), asc(reading.id));
const notes = (db: Db | Tx, where: SQL | undefined) =>
  db
    .select({ row: batchNote, author })
    .from(batchNote)
    .innerJoin(person, eq(person.id, batchNote.personId))
    .where(where)
    .orderBy(desc(batchNote.createdAt), desc(batchNote.id));
const events = (db: Db | Tx, where: SQL | undefined) =>
  db
    .select({ row: batchEvent, author })
    .from(batchEvent)
    .innerJoin(person, eq(person.id, batchEvent.personId))
    .where(where)
    .orderBy(asc(batchEvent.plannedOn), asc(batchEvent.doneAt), asc(batchEvent.id));

/** Rows of a batch, each with who wrote it. */
export const readingsOf = (db: Db | Tx, batchId: string) =>
  readings(db, eq(reading.batchId, batchId));
export const notesOf = (db: Db | Tx, batchId: string) => notes(db, eq(batchNote.batchId, batchId));
export const eventsOf = (db: Db | Tx, batchId: string) =>
  events(db, eq(batchEvent.batchId, batchId));

/** One of them; undefined where the batch has none of that id. */
export const readingOf = async (tx: Tx, batchId: string, id: string) =>
  (await readings(tx, and(eq(reading.batchId, batchId), eq(reading.id, id))))[0];
export const noteOf = async (tx: Tx, batchId: string, id: string) =>
  (await notes(tx, and(eq(batchNote.batchId, batchId), eq(batchNote.id, id))))[0];
export const eventOf = async (tx: Tx, batchId: string, id: string) =>
  (await events(tx, and(eq(batchEvent.batchId, batchId), eq(batchEvent.id, id))))[0];

export async function checkOf(db: Db | Tx, batchId: string) {
  const [found] = await db
    .select({ row: cakeCheck, author })
    .from(cakeCheck)
    .innerJoin(person, eq(person.id, cakeCheck.signedBy))
    .where(eq(cakeCheck.batchId, batchId));
  return found;
}
