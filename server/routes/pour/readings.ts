import { randomUUID } from 'node:crypto';
import { and, eq } from 'drizzle-orm';
import type { WortReadingRequest } from '#shared/api/pour.ts';
import { objectionsOf } from '#shared/pour/standing.ts';
import { rulesOf } from '#shared/chain/boardLink.ts';
import { pourClearance, pourReading } from '../../db/schema/pour.ts';
import { demandMade } from '../../http/create.ts';
import { invalidField, notFound } from '../../problems.ts';
import { countedUntil, standingAt, type RunCommand, type Scene } from './scene.ts';
import { asTold, happenedAt } from './times.ts';

const MINUTE = 60_000;
const SILENT = { what: '', touches: [] } as const;

/** A temperature of the wort. Where it lets the wort be poured it gives leave at once, for its time. */
export const addReading =
  (body: WortReadingRequest): RunCommand =>
  async (scene) => {
    const { tx, member, now } = scene.hand;
    if (scene.readings.some(({ id }) => id === body.id)) return null;
    const made = await tx
      .insert(pourReading)
      .values({
        id: body.id,
        runId: scene.run.id,
        temperatureC: body.c,
        typed: body.typed,
        ...asTold(body, now),
        personId: member.person.id,
      })
      .onConflictDoNothing({ target: pourReading.id })
      .returning();
    demandMade(made);
    await clearBy({ ...scene, readings: [...scene.readings, ...made] });
    return { ...SILENT };
  };

/** Leave to pour from the newest reading, where nothing holds. It lasts as long as a reading is fresh. */
async function clearBy(scene: Scene): Promise<void> {
  const { tx, board, member, now } = scene.hand;
  const newest = countedUntil(scene.readings, now).at(-1);
  if (!newest) return;
  const standing = standingAt(scene, now);
  if (!standing.clear) return;
  const minutes = rulesOf(board).readingMinutes;
  await tx.insert(pourClearance).values({
    id: randomUUID(),
    runId: scene.run.id,
    kind: 'reading',
    readingId: newest.id,
    askedBy: member.person.id,
    askedAt: now,
    findings: objectionsOf(standing),
    answer: 'granted',
    answeredAt: now,
    expiresAt: new Date(happenedAt(newest).getTime() + minutes * MINUTE),
  });
}

/** A mistake in writing it down: it is kept, and counts for nothing. */
export const withdrawReading =
  (readingId: string): RunCommand =>
  async ({ hand, run, readings }) => {
    const row = readings.find(({ id }) => id === readingId);
    if (!row) throw notFound();
    if (row.withdrawnAt !== null) return null;
    if (run.state !== 'open') throw invalidField('/readingId', 'The pour is over');
    await hand.tx
      .update(pourReading)
      .set({ withdrawnAt: hand.now })
      .where(and(eq(pourReading.runId, run.id), eq(pourReading.id, readingId)));
    return { ...SILENT };
  };
