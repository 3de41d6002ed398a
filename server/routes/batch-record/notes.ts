import { eq, sql } from 'drizzle-orm';
import type { BatchNote, NoteCreate } from '#shared/api/reading.ts';
import type { Member } from '../../auth/whoAsks.ts';
import { batchNote } from '../../db/schema/readings.ts';
import { demandMade, isRepeated } from '../../http/create.ts';
import { demandVersion } from '../../http/etag.ts';
import { notFound, problem } from '../../problems.ts';
import { canRemoveComments } from '../../policies.ts';
import { noteOf } from './find.ts';
import { presentNote } from './present.ts';
import { onBatch, type LineNamed, type Scene, type Writing } from './scene.ts';

export const addNote = (
  scene: Scene,
  member: Member,
  batchId: string | undefined,
  body: NoteCreate,
): Promise<BatchNote> =>
  onBatch(scene, member, batchId, async (writing) => {
    const { tx, batch, now } = writing;
    const known = await noteOf(tx, batch.id, body.id);
    const row = known && presentNote(known.row, known.author);
    if (isRepeated(row, body)) return { result: row, said: null };
    const made = await tx
      .insert(batchNote)
      .values({
        ...body,
        breweryId: member.brewery.id,
        batchId: batch.id,
        personId: member.person.id,
        createdAt: now,
      })
      .onConflictDoNothing({ target: batchNote.id })
      .returning({ id: batchNote.id });
    demandMade(made);
    const after = await one(writing, body.id);
    const what = `Wrote a note on ${batch.name}`;
    return { result: after, said: { what, before: null, after: after.text } };
  });

export const editNote = (
  scene: Scene,
  member: Member,
  { batchId, id, version }: LineNamed,
  { text }: { text: string },
): Promise<BatchNote> =>
  onBatch(scene, member, batchId, async (writing) => {
    const before = await one(writing, id);
    demandOwn(member, before, false);
    demandVersion(version, before.version, before);
    await writing.tx
      .update(batchNote)
      .set({ text, editedAt: writing.now, version: sql`${batchNote.version} + 1` })
      .where(eq(batchNote.id, id));
    const result = await one(writing, id);
    const what = `Changed a note on ${writing.batch.name}`;
    return { result, said: { what, before: before.text, after: text } };
  });

export const removeNote = (
  scene: Scene,
  member: Member,
  { batchId, id, version }: LineNamed,
): Promise<null> =>
  onBatch(scene, member, batchId, async (writing) => {
    const before = await one(writing, id);
    demandOwn(member, before, canRemoveComments(member));
    demandVersion(version, before.version, before);
    await writing.tx.delete(batchNote).where(eq(batchNote.id, id));
    const what = `Deleted a note on ${writing.batch.name}`;
    return { result: null, said: { what, before: before.text, after: null } };
  });

function demandOwn({ person }: Member, { by }: BatchNote, mayAny: boolean): void {
  if (by.personId !== person.id && !mayAny)
    throw problem('not-allowed', { detail: 'Somebody else wrote it' });
}

async function one({ tx, batch }: Writing, id: string): Promise<BatchNote> {
  const found = await noteOf(tx, batch.id, id);
  if (!found) throw notFound();
  return presentNote(found.row, found.author);
}
