import { and, eq, isNull } from 'drizzle-orm';
import { z } from 'zod';
import { pourObjection } from '#shared/api/pour.ts';
import type { TodayFacts } from '#shared/api/today.ts';
import type { Db } from '../../db/client.ts';
import { surplus } from '../../db/schema/cake.ts';
import { batch } from '../../db/schema/chain.ts';
import { person } from '../../db/schema/people.ts';
import { pourClearance, pourEvent, pourRun } from '../../db/schema/pour.ts';
import { batchEvent } from '../../db/schema/readings.ts';

interface Where {
  breweryId: string;
  seasonId: string;
}

/** What waits in a season and does not stand on its board. */
export async function readToday(db: Db, where: Where): Promise<Omit<TodayFacts, 'now'>> {
  const [overrides, runs, unsigned, events, jars] = await Promise.all([
    askedOverrides(db, where),
    openRuns(db, where),
    unsignedPours(db, where),
    eventsOfFermenting(db, where),
    jarsToBe(db, where),
  ]);
  return { overrides, runs, unsigned, events, jars };
}

const inSeason = ({ breweryId, seasonId }: Where) =>
  and(eq(pourRun.breweryId, breweryId), eq(pourRun.seasonId, seasonId));

const ofSeason = ({ breweryId, seasonId }: Where) =>
  and(eq(batch.breweryId, breweryId), eq(batch.seasonId, seasonId));

async function askedOverrides(db: Db, where: Where) {
  const rows = await db
    .select({ clearance: pourClearance, batchId: pourRun.batchId, name: person.name })
    .from(pourClearance)
    .innerJoin(pourRun, eq(pourRun.id, pourClearance.runId))
    .innerJoin(person, eq(person.id, pourClearance.askedBy))
    .where(
      and(
        inSeason(where),
        eq(pourRun.state, 'open'),
        eq(pourClearance.kind, 'override'),
        isNull(pourClearance.answer),
      ),
    )
    .orderBy(pourClearance.askedAt);
  return rows.map(({ clearance, batchId, name: askedBy }) => ({
    id: clearance.id,
    batchId,
    askedBy,
    askedAt: clearance.askedAt.toISOString(),
    holds: holdIn(clearance.findings),
  }));
}

/** The title of what holds; empty where it is not told. */
const holdIn = (findings: unknown): string =>
  z
    .array(pourObjection)
    .parse(findings)
    .find(({ verdict }) => verdict === 'hold')?.title ?? '';

async function openRuns(db: Db, where: Where) {
  const rows = await db
    .select({ batchId: pourRun.batchId, heldBy: person.name, openedAt: pourRun.openedAt })
    .from(pourRun)
    .innerJoin(person, eq(person.id, pourRun.openedBy))
    .where(and(inSeason(where), eq(pourRun.state, 'open')))
    .orderBy(pourRun.openedAt);
  return rows.map((row) => ({ ...row, openedAt: row.openedAt.toISOString() }));
}

async function unsignedPours(db: Db, where: Where) {
  const rows = await db
    .select({ batchId: pourEvent.batchId, arrivedAt: pourEvent.arrivedAt })
    .from(pourEvent)
    .innerJoin(pourRun, eq(pourRun.id, pourEvent.runId))
    .where(and(inSeason(where), eq(pourEvent.cleared, false), isNull(pourEvent.signedAt)))
    .orderBy(pourEvent.arrivedAt);
  return rows.map(({ batchId, arrivedAt }) => ({ batchId, at: arrivedAt.toISOString() }));
}

async function eventsOfFermenting(db: Db, where: Where) {
  const { id, batchId, kind, plannedOn, doneAt, text } = batchEvent;
  const rows = await db
    .select({ id, batchId, kind, plannedOn, doneAt, text })
    .from(batchEvent)
    .innerJoin(batch, eq(batch.id, batchEvent.batchId))
    .where(and(ofSeason(where), eq(batch.stage, 'fermenting')))
    .orderBy(batchEvent.createdAt);
  return rows.map(({ doneAt: done, ...row }) => ({ ...row, isDone: done !== null }));
}

const jarsToBe = (db: Db, where: Where) =>
  db
    .select({
      id: surplus.id,
      batchId: surplus.cakeBatchId,
      day: surplus.day,
      volumeL: surplus.volumeL,
      generation: surplus.generation,
    })
    .from(surplus)
    .innerJoin(batch, eq(batch.id, surplus.cakeBatchId))
    .where(and(ofSeason(where), eq(surplus.what, 'jar')))
    .orderBy(surplus.day, surplus.id);
