import { and, asc, desc, eq, inArray } from 'drizzle-orm';
import type { PourRun } from '#shared/api/pour.ts';
import type { Db, Tx } from '../../db/client.ts';
import { person } from '../../db/schema/people.ts';
import { pourClearance, pourEvent, pourReading, pourRun } from '../../db/schema/pour.ts';
import { problem } from '../../problems.ts';
import { FORMER } from '../account/redact.ts';
import { presentRun } from './present.ts';
import type { RunRow, RunRows } from './rows.ts';

/** The newest run of a batch: the open one, else the last that was closed. Null: none. */
export async function newestRun(db: Db | Tx, batchId: string): Promise<RunRows | null> {
  const [run] = await db
    .select()
    .from(pourRun)
    .where(eq(pourRun.batchId, batchId))
    .orderBy(desc(eq(pourRun.state, 'open')), desc(pourRun.openedAt))
    .limit(1);
  return run ? withAll(db, run) : null;
}

/** One run of a batch; what is another batch's is not there. */
export async function runOf(tx: Tx, batchId: string, runId: string): Promise<RunRows> {
  const [run] = await tx
    .select()
    .from(pourRun)
    .where(and(eq(pourRun.batchId, batchId), eq(pourRun.id, runId)));
  if (!run)
    throw problem('pour-over', { detail: 'This pour is not there any more: open it again' });
  return withAll(tx, run);
}

async function withAll(db: Db | Tx, run: RunRow): Promise<RunRows> {
  const readings = await db
    .select()
    .from(pourReading)
    .where(eq(pourReading.runId, run.id))
    .orderBy(asc(pourReading.deviceAt), asc(pourReading.id));
  const clearances = await db
    .select()
    .from(pourClearance)
    .where(eq(pourClearance.runId, run.id))
    .orderBy(asc(pourClearance.askedAt), asc(pourClearance.id));
  const [pour] = await db.select().from(pourEvent).where(eq(pourEvent.runId, run.id));
  return { run, readings, clearances, pour: pour ?? null };
}

export async function presented(db: Db | Tx, rows: RunRows): Promise<PourRun> {
  const ids = new Set<string>([rows.run.openedBy]);
  for (const { personId } of rows.readings) ids.add(personId);
  for (const { askedBy, answeredBy } of rows.clearances)
    for (const id of [askedBy, answeredBy]) if (id) ids.add(id);
  if (rows.pour) for (const id of [rows.pour.personId, rows.pour.signedBy]) if (id) ids.add(id);
  const people = await db
    .select({ id: person.id, name: person.name })
    .from(person)
    .where(inArray(person.id, [...ids]));
  const names = new Map(people.map(({ id, name }) => [id, name]));
  return presentRun(rows, (id) => names.get(id) ?? FORMER);
}
