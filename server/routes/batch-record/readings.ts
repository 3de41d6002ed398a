import { and, eq, sql } from 'drizzle-orm';
import type { Reading, ReadingCreate, ReadingWrite } from '#shared/api/reading.ts';
import { sampleFault, valueOf, WHY_NOT_REFRACTED } from '#shared/fermentation/correct.ts';
import { tellReading } from '#shared/record/readings.ts';
import type { Member } from '../../auth/whoAsks.ts';
import { instrument, reading } from '../../db/schema/readings.ts';
import { demandMade, isRepeated } from '../../http/create.ts';
import { demandVersion } from '../../http/etag.ts';
import { invalidField, notFound } from '../../problems.ts';
import { dayIn } from '../../today.ts';
import { readBoard } from '../board/changeBoard.ts';
import { withoutLapsed } from '../board/lapsed.ts';
import { readingOf } from './find.ts';
import { renewFollowed } from './followed.ts';
import { presentReading } from './present.ts';
import { onBatch, type LineNamed, type Scene, type Writing } from './scene.ts';

export const addReading = (
  scene: Scene,
  member: Member,
  batchId: string | undefined,
  body: ReadingCreate,
): Promise<Reading> =>
  onBatch(scene, member, batchId, async (writing) => {
    const { tx, batch, now } = writing;
    const known = await found(writing, body.id);
    if (isRepeated(known, { ...body, takenAt: iso(body.takenAt) }))
      return { result: known, said: null };
    const columns = await columnsOf(writing, body);
    const row = {
      ...columns,
      id: body.id,
      breweryId: member.brewery.id,
      batchId: batch.id,
      personId: member.person.id,
      createdAt: now,
    };
    const lapsed = await follow(writing, async () => {
      const insert = tx.insert(reading).values(row);
      const made = await insert.onConflictDoNothing({ target: reading.id }).returning();
      demandMade(made);
    });
    return said(writing, null, await one(writing, body.id), lapsed);
  });

export const editReading = (
  scene: Scene,
  member: Member,
  { batchId, id, version }: LineNamed,
  body: ReadingWrite,
): Promise<Reading> =>
  onBatch(scene, member, batchId, async (writing) => {
    const { tx, now } = writing;
    const before = await one(writing, id);
    demandVersion(version, before.version, before);
    const columns = await columnsOf(writing, body, before);
    const lapsed = await follow(writing, () =>
      tx
        .update(reading)
        .set({ ...columns, editedAt: now, version: sql`${reading.version} + 1` })
        .where(eq(reading.id, id)),
    );
    return said(writing, before, await one(writing, id), lapsed);
  });

export const removeReading = (
  scene: Scene,
  member: Member,
  { batchId, id, version }: LineNamed,
): Promise<null> =>
  onBatch(scene, member, batchId, async (writing) => {
    const { tx, batch } = writing;
    const before = await one(writing, id);
    demandVersion(version, before.version, before);
    const touches = await follow(writing, () => tx.delete(reading).where(eq(reading.id, id)));
    const what = tellReading(member.brewery.units, batch.name, before, null);
    return { result: null, said: { what, before, after: null, touches } };
  });

const iso = (at: string) => new Date(at).toISOString();

async function found({ tx, batch }: Writing, id: string): Promise<Reading | undefined> {
  const row = await readingOf(tx, batch.id, id);
  return row && presentReading(row.row, row.author);
}

async function one(writing: Writing, id: string): Promise<Reading> {
  const row = await found(writing, id);
  if (!row) throw notFound();
  return row;
}

function said(
  { member, batch }: Writing,
  before: Reading | null,
  after: Reading,
  touches: readonly string[],
) {
  const what = tellReading(member.brewery.units, batch.name, before, after);
  return { result: after, said: { what, before, after, touches } };
}

/**
 * Writes a reading, with what the batch's readings come to. The next link rests on that: an
 * acceptance of it as it was lapses.
 * @returns the batches whose acceptance lapsed.
 */
async function follow({ tx, member, batch, now }: Writing, write: () => Promise<unknown>) {
  const where = { ...member, seasonId: batch.seasonId };
  const before = await readBoard(tx, where, now);
  await write();
  await renewFollowed(tx, batch.id);
  const after = await readBoard(tx, where, now);
  const left = await withoutLapsed(tx, before, after);
  return left.batches.flatMap(({ id }, at) => (left.batches[at] === after.batches[at] ? [] : [id]));
}

/**
 * The row's columns, the corrected value worked out here: nobody's word is taken for it. A reading
 * that says the same keeps its value: an instrument's correction counts for what is read with it
 * from then on.
 */
async function columnsOf(writing: Writing, body: ReadingWrite, before: Reading | null = null) {
  demandTime(writing, body);
  const fault = sampleFault(body.sampleC);
  if (fault) throw invalidField('/sampleC', fault);
  const used = await instrumentOf(writing, body);
  const { kind, method, shown, sampleC, instrumentId, notes, typed } = body;
  const value = before && saysTheSame(before, body) ? before.value : corrected(body, used);
  const takenAt = new Date(body.takenAt);
  return { kind, method, shown, sampleC, instrumentId, notes, typed, value, takenAt };
}

const saysTheSame = (a: ReadingWrite, b: ReadingWrite): boolean =>
  a.kind === b.kind &&
  a.method === b.method &&
  a.shown === b.shown &&
  a.sampleC === b.sampleC &&
  a.instrumentId === b.instrumentId;

function corrected(body: ReadingWrite, used: typeof instrument.$inferSelect | null): number {
  try {
    return valueOf(body, used);
  } catch (error) {
    if (error instanceof RangeError) throw invalidField('/shown', error.message);
    throw error;
  }
}

const AHEAD_MS = 5 * 60_000;

/** Nothing is read in the future, and no refractometer once the beer ferments. */
function demandTime({ now, batch, member }: Writing, { takenAt, method }: ReadingWrite): void {
  const at = new Date(takenAt);
  if (at.getTime() > now.getTime() + AHEAD_MS)
    throw invalidField('/takenAt', 'This is still to come: write when it was read');
  const isBrewed = batch.stage !== 'pencilled';
  const day = dayIn(member.brewery.timeZone, at);
  if (method === 'refractometer' && isBrewed && batch.brewOn !== null && day > batch.brewOn)
    throw invalidField('/method', WHY_NOT_REFRACTED);
}

/** Each kind of reading has its own instruments. */
export const instrumentFor = ({ kind, method }: Pick<ReadingWrite, 'kind' | 'method'>) =>
  kind === 'gravity' ? method : kind === 'ph' ? 'ph-meter' : 'thermometer';

async function instrumentOf({ tx, member }: Writing, body: ReadingWrite) {
  if (body.instrumentId === null) return null;
  const [row] = await tx
    .select()
    .from(instrument)
    .where(and(eq(instrument.breweryId, member.brewery.id), eq(instrument.id, body.instrumentId)));
  if (!row) throw invalidField('/instrumentId', 'Choose one of this brewery’s instruments');
  if (row.kind !== instrumentFor(body))
    throw invalidField('/instrumentId', `${row.name} does not read that`);
  return row;
}
