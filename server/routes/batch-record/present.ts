import type { CakeCheck } from '#shared/api/cakeCheck.ts';
import type { BatchEvent, BatchNote, Instrument, Reading } from '#shared/api/reading.ts';
import type { cakeCheck } from '../../db/schema/cake.ts';
import type { batchEvent, batchNote, instrument, reading } from '../../db/schema/readings.ts';

/** Whoever closed the account is not named any more. */
const FORMER = 'A former brewer';

export interface Author {
  name: string;
  closedAt: Date | null;
}

const by = (personId: string, { name, closedAt }: Author) => ({
  personId,
  name: closedAt === null ? name : FORMER,
});

const text = (at: Date | null): string | null => at?.toISOString() ?? null;

export const presentReading = (row: typeof reading.$inferSelect, author: Author): Reading => ({
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
  by: by(row.personId, author),
});

export const presentNote = (row: typeof batchNote.$inferSelect, author: Author): BatchNote => ({
  id: row.id,
  version: row.version,
  text: row.text,
  by: by(row.personId, author),
  at: row.createdAt.toISOString(),
  editedAt: text(row.editedAt),
});

export const presentEvent = (row: typeof batchEvent.$inferSelect, author: Author): BatchEvent => ({
  id: row.id,
  version: row.version,
  kind: row.kind,
  plannedOn: row.plannedOn,
  doneAt: text(row.doneAt),
  text: row.text,
  by: by(row.personId, author),
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

export const presentCheck = (row: typeof cakeCheck.$inferSelect, author: Author): CakeCheck => ({
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
  signedBy: by(row.signedBy, author),
  signedAt: row.signedAt.toISOString(),
});
