import { and, eq } from 'drizzle-orm';
import { randomUUID } from 'node:crypto';
import { valueOf } from '#shared/fermentation/correct.ts';
import { renewFollowed } from '../routes/batch-record/followed.ts';
import type { Tx } from './client.ts';
import { DEMO_READINGS, type DemoReadings } from './demo/readings.ts';
import { batch } from './schema/chain.ts';
import { batchEvent, batchNote, reading } from './schema/readings.ts';

interface Place {
  tx: Tx;
  breweryId: string;
  seasonId: string;
}

const HOUR_MS = 3_600_000;

/** The fermentations of the demo, as somebody with a hydrometer and a thermometer wrote them down. */
export async function addDemoReadings(
  { tx, breweryId, seasonId }: Place,
  people: ReadonlyMap<string, string>,
): Promise<void> {
  for (const each of DEMO_READINGS) {
    const [found] = await tx
      .select({ id: batch.id, brewOn: batch.brewOn })
      .from(batch)
      .where(and(eq(batch.seasonId, seasonId), eq(batch.name, each.batch)));
    if (!found?.brewOn) throw new Error(`The demo has not brewed ${each.batch}`);
    const noon = Date.parse(`${found.brewOn}T12:00:00Z`);
    const at = (day: number) => new Date(noon + Math.round(day * 24) * HOUR_MS);
    const own = { breweryId, batchId: found.id, personId: people.get(each.by) ?? '' };
    await tx.insert(reading).values(readingsOf(each).map((row) => ({ ...own, ...timed(row, at) })));
    for (const { day, ...rest } of each.events)
      await tx.insert(batchEvent).values({ ...own, ...rest, id: randomUUID(), doneAt: at(day) });
    for (const { day, text } of each.notes)
      await tx.insert(batchNote).values({ ...own, text, id: randomUUID(), createdAt: at(day) });
    await renewFollowed(tx, found.id);
  }
}

function readingsOf({ gravity, temperature }: DemoReadings) {
  return [
    ...gravity.map(([day, shown, sampleC = null]) => ({
      day,
      kind: 'gravity' as const,
      method: 'hydrometer' as const,
      shown,
      sampleC,
    })),
    ...temperature.map(([day, shown]) => ({
      day,
      kind: 'temperature' as const,
      method: null,
      shown,
      sampleC: null,
    })),
  ];
}

const timed = (
  { day, ...row }: ReturnType<typeof readingsOf>[number],
  at: (day: number) => Date,
) => ({
  ...row,
  id: randomUUID(),
  value: valueOf(row, null),
  takenAt: at(day),
  createdAt: at(day),
});
