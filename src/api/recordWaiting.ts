import type { z } from 'zod';
import { cakeCheck, cakeCheckWrite, type CakeCheck } from '#shared/api/cakeCheck.ts';
import {
  batchEvent,
  batchNote,
  eventCreate,
  eventWrite,
  noteCreate,
  noteWrite,
  reading,
  readingCreate,
  readingWrite,
  type BatchRecord,
  type Reading,
  type ReadingWrite,
} from '#shared/api/reading.ts';
import { api } from '#shared/api/urls.ts';
import { valueOf } from '#shared/fermentation/correct.ts';
import { isRecord } from '../app/isRecord.ts';
import type { Entry } from '../outbox/entry.ts';
import { pathOf, type Entries } from '../outbox/queue.ts';

interface Where {
  slug: string;
  batchId: string;
  me: { personId: string; name: string };
}

/** Lists of a record whose rows are written, changed and deleted alike. */
type List = 'readings' | 'notes' | 'events';

/** Where an entry of the outbox belongs in a batch's record; null: nowhere in it. */
function placeOf({ url }: Entry, { slug, batchId }: Pick<Where, 'slug' | 'batchId'>) {
  const path = pathOf(url);
  if (path === pathOf(api.cakeCheck(slug, batchId))) return { list: 'check' as const, id: null };
  for (const list of ['readings', 'notes', 'events'] as const) {
    const all = pathOf(api[list](slug, batchId));
    if (path === all) return { list, id: null };
    if (path.startsWith(`${all}/`)) return { list, id: path.slice(all.length + 1) };
  }
  return null;
}

export const ofRecord = (entries: Entries, where: Pick<Where, 'slug' | 'batchId'>): Entries =>
  entries.filter((entry) => placeOf(entry, where) !== null);

/**
 * A batch's record as it will stand once everything that waits has arrived. Versions stay those
 * that the server gave: what is written on top follows on by itself.
 */
export const withRecordWaiting = (
  record: BatchRecord,
  entries: Entries,
  where: Where,
): BatchRecord =>
  ofRecord(entries, where).reduce((standing, entry) => after(standing, entry, where), record);

/**
 * A record that was read before the server took an entry, with the entry in it and what the server
 * made of it: its version, and the figures that are its to work out.
 */
export function withTaken(
  record: BatchRecord,
  entry: Entry,
  answer: unknown,
  where: Where,
): BatchRecord {
  const place = placeOf(entry, where);
  if (!place) return record;
  const laid = after(record, entry, where);
  if (entry.method === 'DELETE' || !isRecord(answer)) return laid;
  if (place.list === 'check') {
    const check = cakeCheck.safeParse(answer).data;
    return check ? newerCheck(record, check) : laid;
  }
  switch (place.list) {
    case 'readings':
      return { ...laid, readings: withAnswer(record.readings, laid.readings, reading, answer) };
    case 'notes':
      return { ...laid, notes: withAnswer(record.notes, laid.notes, batchNote, answer) };
    case 'events':
      return { ...laid, events: withAnswer(record.events, laid.events, batchEvent, answer) };
  }
}

const newerCheck = (record: BatchRecord, check: CakeCheck): BatchRecord =>
  record.check && record.check.version > check.version ? record : { ...record, check };

/** The answer's row in its place; where a newer one was read by now, that one. */
function withAnswer<Row extends { id: string; version: number }>(
  before: readonly Row[],
  laid: Row[],
  contract: z.ZodType<Row>,
  answer: unknown,
): Row[] {
  const row = contract.safeParse(answer).data;
  if (!row) return laid;
  const known = before.find(({ id }) => id === row.id);
  const newest = known && known.version > row.version ? known : row;
  return laid.map((one) => (one.id === row.id ? newest : one));
}

function after(record: BatchRecord, entry: Entry, where: Where): BatchRecord {
  const place = placeOf(entry, where);
  if (!place) return record;
  if (place.list === 'check') return withCheck(record, entry, where);
  if (entry.method === 'DELETE') return without(record, place.list, place.id);
  switch (place.list) {
    case 'readings':
      return { ...record, readings: withReading(record, entry, place.id, where) };
    case 'notes':
      return { ...record, notes: withNote(record, entry, place.id, where) };
    case 'events':
      return { ...record, events: withEvent(record, entry, place.id, where) };
  }
}

const without = (record: BatchRecord, list: List, id: string | null): BatchRecord => ({
  ...record,
  [list]: record[list].filter((row) => row.id !== id),
});

function withReading(
  { readings, instruments }: BatchRecord,
  { body }: Entry,
  id: string | null,
  { me: by }: Where,
): Reading[] {
  const read = (write: ReadingWrite) => ({
    ...write,
    value: valueOf(write, instruments.find((one) => one.id === write.instrumentId) ?? null),
  });
  if (id !== null) {
    const write = readingWrite.parse(body);
    return inTime(readings.map((one) => (one.id === id ? { ...one, ...read(write) } : one)));
  }
  const { id: made, ...write } = readingCreate.parse(body);
  if (readings.some((one) => one.id === made)) return readings;
  return inTime([...readings, { id: made, version: 1, ...read(write), by }]);
}

const inTime = (readings: Reading[]): Reading[] =>
  readings.toSorted((a, b) => Date.parse(a.takenAt) - Date.parse(b.takenAt));

function withNote(
  { notes }: BatchRecord,
  { body, madeAt: at }: Entry,
  id: string | null,
  { me: by }: Where,
): BatchRecord['notes'] {
  if (id !== null) {
    const { text } = noteWrite.parse(body);
    return notes.map((one) => (one.id === id ? { ...one, text, editedAt: at } : one));
  }
  const made = noteCreate.parse(body);
  if (notes.some((one) => one.id === made.id)) return notes;
  return [{ ...made, version: 1, by, at, editedAt: null }, ...notes];
}

function withEvent(
  { events }: BatchRecord,
  { body }: Entry,
  id: string | null,
  { me: by }: Where,
): BatchRecord['events'] {
  if (id !== null) {
    const write = eventWrite.parse(body);
    return events.map((one) => (one.id === id ? { ...one, ...write } : one));
  }
  const made = eventCreate.parse(body);
  return events.some((one) => one.id === made.id)
    ? events
    : [...events, { ...made, version: 1, by }];
}

function withCheck(record: BatchRecord, entry: Entry, { batchId, me }: Where): BatchRecord {
  if (entry.method === 'DELETE') return { ...record, check: null };
  const write = cakeCheckWrite.parse(entry.body);
  const version = record.check?.version ?? 0;
  return { ...record, check: { ...write, batchId, version, signedBy: me, signedAt: entry.madeAt } };
}
