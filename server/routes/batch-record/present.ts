import type { CakeCheck } from '#shared/api/cakeCheck.ts';
import type { BatchEvent, BatchNote, Instrument, Reading } from '#shared/api/reading.ts';
import type { cakeCheck } from '../../db/schema/cake.ts';
import type { batchEvent, batchNote, instrument, reading } from '../../db/schema/readings.ts';

const text = (at: Date | null): string | null => at?.toISOString() ?? null;

export const presentReading = (row: typeof reading.$inferSelect, author: string): Reading => ({
  id: row.id,
  version: row.version,
  kind: row.kind,
  takenAt: row.takenAt.toISOString(),
  shown: row.shown,
  value: row.value,
  method: row.method,
  sampleC: row.sampleC,
  instrumentId: row.instrumentId,
  notes: row.notes,
  typed: row.typed,
  by: { personId: row.personId, name: author },
});

export const presentNote = (row: typeof batchNote.$inferSelect, author: string): BatchNote => ({
  id: row.id,
  version: row.version,
  text: row.text,
  by: { personId: row.personId, name: author },
  at: row.createdAt.toISOString(),
  editedAt: text(row.editedAt),
});

export const presentEvent = (row: typeof batchEvent.$inferSelect, author: string): BatchEvent => ({
  id: row.id,
  version: row.version,
  kind: row.kind,
  plannedOn: row.plannedOn,
  doneAt: text(row.doneAt),
  text: row.text,
  by: { personId: row.personId, name: author },
});

export const presentInstrument = (row: typeof instrument.$inferSelect): Instrument => ({
  id: row.id,
  version: row.version,
  name: row.name,
  kind: row.kind,
  correction: row.correction,
  calibratedC: row.calibratedC,
  notes: row.notes,
  typed: row.typed,
  retired: row.retiredAt !== null,
});

export const presentCheck = (row: typeof cakeCheck.$inferSelect, author: string): CakeCheck => ({
  batchId: row.batchId,
  version: row.version,
  tasted: row.tasted,
  faults: row.faults,
  volumeL: row.volumeL,
  massKg: row.massKg,
  fullKg: row.fullKg,
  tareKg: row.tareKg,
  layers: row.layers,
  colour: row.colour,
  smells: row.smells,
  count: row.count,
  judged: row.judged,
  notes: row.notes,
  typed: row.typed,
  signedBy: { personId: row.signedBy, name: author },
  signedAt: row.signedAt.toISOString(),
});
