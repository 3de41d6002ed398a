import { eq, sql } from 'drizzle-orm';
import type { BatchEvent, EventCreate, EventWrite } from '#shared/api/reading.ts';
import { tellEvent } from '#shared/record/readings.ts';
import type { Member } from '../../auth/whoAsks.ts';
import { batchEvent } from '../../db/schema/readings.ts';
import { demandMade, isRepeated } from '../../http/create.ts';
import { demandVersion } from '../../http/etag.ts';
import { notFound } from '../../problems.ts';
import { eventOf } from './find.ts';
import { presentEvent } from './present.ts';
import { onBatch, type LineNamed, type Scene, type Writing } from './scene.ts';

const doneAt = (body: EventWrite) => (body.doneAt === null ? null : new Date(body.doneAt));

export const addEvent = (
  scene: Scene,
  member: Member,
  batchId: string | undefined,
  body: EventCreate,
): Promise<BatchEvent> =>
  onBatch(scene, member, batchId, async (writing) => {
    const { tx, batch, now } = writing;
    const known = await eventOf(tx, batch.id, body.id);
    const row = known && presentEvent(known.row, known.author);
    const done = doneAt(body);
    if (isRepeated(row, { ...body, doneAt: done?.toISOString() ?? null }))
      return { result: row, said: null };
    const made = await tx
      .insert(batchEvent)
      .values({
        ...body,
        doneAt: done,
        doneBy: done && member.person.id,
        breweryId: member.brewery.id,
        batchId: batch.id,
        personId: member.person.id,
        createdAt: now,
      })
      .onConflictDoNothing({ target: batchEvent.id })
      .returning({ id: batchEvent.id });
    demandMade(made);
    return said(writing, null, await one(writing, body.id));
  });

export const editEvent = (
  scene: Scene,
  member: Member,
  { batchId, id, version }: LineNamed,
  body: EventWrite,
): Promise<BatchEvent> =>
  onBatch(scene, member, batchId, async (writing) => {
    const before = await one(writing, id);
    demandVersion(version, before.version, before);
    const done = doneAt(body);
    await writing.tx
      .update(batchEvent)
      .set({
        ...body,
        doneAt: done,
        // Whoever did it stays who did it, whoever mends its words.
        doneBy: done && sql`coalesce(${batchEvent.doneBy}, ${member.person.id})`,
        editedAt: writing.now,
        version: sql`${batchEvent.version} + 1`,
      })
      .where(eq(batchEvent.id, id));
    return said(writing, before, await one(writing, id));
  });

export const removeEvent = (
  scene: Scene,
  member: Member,
  { batchId, id, version }: LineNamed,
): Promise<null> =>
  onBatch(scene, member, batchId, async (writing) => {
    const before = await one(writing, id);
    demandVersion(version, before.version, before);
    await writing.tx.delete(batchEvent).where(eq(batchEvent.id, id));
    const what = tellEvent(writing.batch.name, before, null);
    return { result: null, said: { what, before, after: null } };
  });

async function one({ tx, batch }: Writing, id: string): Promise<BatchEvent> {
  const found = await eventOf(tx, batch.id, id);
  if (!found) throw notFound();
  return presentEvent(found.row, found.author);
}

function said({ batch }: Writing, before: BatchEvent | null, after: BatchEvent) {
  return { result: after, said: { what: tellEvent(batch.name, before, after), before, after } };
}
