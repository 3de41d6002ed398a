import type { BatchRecord } from '#shared/api/reading.ts';
import type { Member } from '../../auth/whoAsks.ts';
import type { Db } from '../../db/client.ts';
import { checkOf, eventsOf, notesOf, readingsOf } from './find.ts';
import { pouredAtOf } from './followed.ts';
import { instrumentsOf } from './instruments.ts';
import { presentCheck, presentEvent, presentNote, presentReading } from './present.ts';
import { findBatch } from './scene.ts';

/** All that was written down of one batch. */
export async function readBatchRecord(
  db: Db,
  member: Member,
  id: string | undefined,
): Promise<BatchRecord> {
  const { id: batchId } = await findBatch(db, member, id);
  const [readings, notes, events, instruments, check, pouredAt] = await Promise.all([
    readingsOf(db, batchId),
    notesOf(db, batchId),
    eventsOf(db, batchId),
    instrumentsOf(db, member.brewery.id),
    checkOf(db, batchId),
    pouredAtOf(db, batchId),
  ]);
  return {
    batchId,
    readings: readings.map(({ row, author }) => presentReading(row, author)),
    notes: notes.map(({ row, author }) => presentNote(row, author)),
    events: events.map(({ row, author }) => presentEvent(row, author)),
    instruments,
    check: check ? presentCheck(check.row, check.author) : null,
    pouredAt,
  };
}
