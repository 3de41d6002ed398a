import { z } from 'zod';
import {
  pourFound,
  pourObjection,
  pourStep,
  type PourClearance,
  type PourPerson,
  type PourRecord,
  type PourRun,
  type WortReading,
} from '#shared/api/pour.ts';
import { VERDICTS } from '#shared/rules/vocabulary.ts';
import type { ClearanceRow, EventRow, ReadingRow, RunRows } from './rows.ts';
import { happenedAt } from './times.ts';

/** What a pour was judged as, at its own time. */
export const judgement = z.strictObject({
  verdict: z.enum(VERDICTS),
  findings: z.array(pourObjection),
  readingC: z.number().nullable(),
});
export type Judgement = z.infer<typeof judgement>;

type NameOf = (personId: string) => string;

/** The one place where the rows of a run become its contract. */
export function presentRun({ run, readings, clearances, pour }: RunRows, nameOf: NameOf): PourRun {
  return {
    id: run.id,
    batchId: run.batchId,
    cakeBatchId: run.cakeBatchId,
    heldBy: who(run.openedBy, nameOf),
    openedAt: run.openedAt.toISOString(),
    closedAt: run.closedAt?.toISOString() ?? null,
    state: run.state,
    step: pourStep.parse(run.step),
    found: pourFound.parse(run.steps),
    readings: readings
      .map((row) => presentReading(row, nameOf))
      .sort((a, b) => Date.parse(a.at) - Date.parse(b.at)),
    clearances: clearances.map((row) => presentClearance(row, nameOf)),
    pour: pour && presentPour(pour, nameOf),
  };
}

const who = (personId: string, nameOf: NameOf): PourPerson => ({
  personId,
  name: nameOf(personId),
});

const timed = (row: ReadingRow | EventRow, nameOf: NameOf) => ({
  at: happenedAt(row).toISOString(),
  deviceAt: row.deviceAt.toISOString(),
  clockOffsetMs: row.clockOffsetMs,
  arrivedAt: row.arrivedAt.toISOString(),
  by: who(row.personId, nameOf),
});

const presentReading = (row: ReadingRow, nameOf: NameOf): WortReading => ({
  id: row.id,
  c: row.temperatureC,
  typed: row.typed,
  ...timed(row, nameOf),
  withdrawn: row.withdrawnAt !== null,
});

const presentClearance = (row: ClearanceRow, nameOf: NameOf): PourClearance => ({
  id: row.id,
  kind: row.kind,
  readingId: row.readingId,
  askedBy: who(row.askedBy, nameOf),
  askedAt: row.askedAt.toISOString(),
  findings: z.array(pourObjection).parse(row.findings),
  answer: row.answer,
  answeredBy: row.answeredBy === null ? null : who(row.answeredBy, nameOf),
  answeredAt: row.answeredAt?.toISOString() ?? null,
  reason: row.reason,
  expiresAt: row.expiresAt?.toISOString() ?? null,
});

function presentPour(row: EventRow, nameOf: NameOf): PourRecord {
  return {
    id: row.id,
    ...timed(row, nameOf),
    volumeL: row.volumeL,
    og: row.og,
    ...judgement.parse(row.judged),
    cleared: row.cleared,
    signedBy: row.signedBy === null ? null : who(row.signedBy, nameOf),
    signedAt: row.signedAt?.toISOString() ?? null,
    reason: row.reason,
  };
}
