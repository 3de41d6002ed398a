import { z } from 'zod';
import { cakeCheck } from './cakeCheck.ts';
import * as f from './fields.ts';
import { alsoWhenFaulty } from './refining.ts';
import { typed } from './units.ts';

export const READING_KINDS = ['gravity', 'temperature', 'ph'] as const;
export type ReadingKind = (typeof READING_KINDS)[number];
export const METHODS = ['hydrometer', 'refractometer'] as const;

/** What an instrument may show of a beer, by what is read: SG, °Bx, °C or pH. */
export const SHOWN_RANGE = {
  hydrometer: { min: 0.98, max: 1.2, why: 'Between 0.980 and 1.200' },
  refractometer: { min: 0, max: 40, why: 'Between 0 and 40 °Bx' },
  temperature: { min: -5, max: 50, why: 'Between −5 and 50 °C (23 and 122 °F)' },
  ph: { min: 2, max: 8, why: 'Between 2 and 8' },
} as const;

const instant = z.iso.datetime({ error: 'Say when' });

const fields = {
  kind: z.enum(READING_KINDS),
  takenAt: instant,
  /** As the instrument showed it: SG, °Bx of a refractometer, °C or pH. */
  shown: z.number({ error: 'Write a number' }).min(-100).max(1000),
  /** How a gravity was read; else null. */
  method: z.enum(METHODS).nullable(),
  /** Of a hydrometer's sample; null: at the hydrometer's own temperature. */
  sampleC: f.celsius.nullable(),
  instrumentId: f.id.nullable(),
  notes: f.note.max(500, 'Use at most 500 characters'),
  typed,
};

/** Which range a reading must lie in. */
export const rangeOf = ({ kind, method }: Pick<ReadingCreate, 'kind' | 'method'>) =>
  SHOWN_RANGE[kind === 'gravity' ? (method ?? 'hydrometer') : kind];

function fits<T extends z.ZodType>(schema: T): T {
  const is = (value: unknown) => value as ReadingCreate;
  const withMethod = alsoWhenFaulty(
    schema,
    ['method'],
    'Say how the gravity was read',
    (value) => (is(value).kind === 'gravity') === (is(value).method !== null),
  );
  const withSample = alsoWhenFaulty(
    withMethod,
    ['sampleC'],
    'Only a hydrometer’s sample has a temperature of its own',
    (value) => is(value).sampleC === null || is(value).method === 'hydrometer',
  );
  return withSample.superRefine((value, ctx) => {
    const { min, max, why } = rangeOf(is(value));
    const { shown } = is(value);
    if (shown < min || shown > max) ctx.addIssue({ code: 'custom', path: ['shown'], message: why });
  });
}

export const readingCreate = fits(z.strictObject({ id: f.id, ...fields }));
export interface ReadingCreate {
  id: string;
  kind: ReadingKind;
  takenAt: string;
  shown: number;
  method: (typeof METHODS)[number] | null;
  sampleC: number | null;
  instrumentId: string | null;
  notes: string;
  typed: z.infer<typeof typed>;
}
/** All of it again; its id stands in the address. */
export const readingWrite = fits(z.strictObject(fields));
export type ReadingWrite = Omit<ReadingCreate, 'id'>;

const author = z.strictObject({ personId: f.id, name: z.string() });

export const reading = z.strictObject({
  id: f.id,
  version: f.version,
  ...fields,
  /** With the instrument's correction, and a sample's temperature taken out: SG, °C or pH. */
  value: z.number(),
  by: author,
});
export type Reading = z.infer<typeof reading>;

export const INSTRUMENT_KINDS = ['hydrometer', 'refractometer', 'thermometer', 'ph-meter'] as const;
export type InstrumentKind = (typeof INSTRUMENT_KINDS)[number];

const instrumentFields = {
  name: f.name,
  kind: z.enum(INSTRUMENT_KINDS),
  /** Added to what it shows, in its own scale: SG, °Bx, °C or pH. */
  correction: z
    .number({ error: 'Write a number' })
    .min(-20, 'Between −20 and 20')
    .max(20, 'Between −20 and 20'),
  /** Temperature that a hydrometer is made for; else null. */
  calibratedC: f.celsius.nullable(),
  notes: f.note,
  typed,
};
export const instrumentCreate = z.strictObject({ id: f.id, ...instrumentFields });
export type InstrumentCreate = z.infer<typeof instrumentCreate>;
export const instrumentPatch = z
  .strictObject({ ...instrumentFields, retired: z.boolean() })
  .omit({ kind: true })
  .partial();
export type InstrumentPatch = z.infer<typeof instrumentPatch>;
export const instrument = z.strictObject({
  id: f.id,
  version: f.version,
  ...instrumentFields,
  /** No longer used; old readings still name it. */
  retired: z.boolean(),
});
export type Instrument = z.infer<typeof instrument>;

const words = f.note.min(1, 'Write something first');
export const noteCreate = z.strictObject({ id: f.id, text: words });
export type NoteCreate = z.infer<typeof noteCreate>;
export const noteWrite = z.strictObject({ text: words });
export const batchNote = z.strictObject({
  id: f.id,
  version: f.version,
  text: z.string(),
  by: author,
  at: z.iso.datetime(),
  editedAt: z.iso.datetime().nullable(),
});
export type BatchNote = z.infer<typeof batchNote>;

export const EVENT_KINDS = ['dry-hop', 'addition', 'yeast-taken', 'other'] as const;
export type EventKind = (typeof EVENT_KINDS)[number];
const eventFields = {
  kind: z.enum(EVENT_KINDS),
  plannedOn: f.day.nullable(),
  /** Null: not done yet. */
  doneAt: instant.nullable(),
  text: f.note.max(200, 'Use at most 200 characters'),
};
const hasDay = <T extends z.ZodType>(schema: T): T =>
  alsoWhenFaulty(schema, ['plannedOn'], 'Say when it is planned, or when it was done', (value) => {
    const { plannedOn, doneAt } = value as { plannedOn?: unknown; doneAt?: unknown };
    return plannedOn !== null || doneAt !== null;
  });
export const eventCreate = hasDay(z.strictObject({ id: f.id, ...eventFields }));
export type EventCreate = z.infer<typeof eventCreate>;
export const eventWrite = hasDay(z.strictObject(eventFields));
export type EventWrite = z.infer<typeof eventWrite>;
export const batchEvent = z.strictObject({
  id: f.id,
  version: f.version,
  ...eventFields,
  by: author,
});
export type BatchEvent = z.infer<typeof batchEvent>;

/** All that was written down of one batch, beside what its board says of it. */
export const batchRecord = z.strictObject({
  batchId: f.id,
  /** In order of time. */
  readings: z.array(reading),
  /** Newest first. */
  notes: z.array(batchNote),
  events: z.array(batchEvent),
  /** Of the whole brewery. */
  instruments: z.array(instrument),
  check: cakeCheck.nullable(),
  /** When the wort was poured onto its yeast; null: no pour was recorded. */
  pouredAt: z.iso.datetime().nullable(),
});
export type BatchRecord = z.infer<typeof batchRecord>;
