import { sql } from 'drizzle-orm';
import { check, date, foreignKey, index, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import { brewery } from './brewery.ts';
import { batch } from './chain.ts';
import { id, instant, madeAt, note, quantity, typedTexts, version } from './columns.ts';
import { person } from './people.ts';

/** What a brewery reads with, and by how much it is off. */
export const instrument = pgTable(
  'instrument',
  {
    id: id(),
    breweryId: uuid()
      .notNull()
      .references(() => brewery.id, { onDelete: 'cascade' }),
    version: version(),
    name: text().notNull(),
    kind: text().$type<'hydrometer' | 'refractometer' | 'thermometer' | 'ph-meter'>().notNull(),
    /** Added to what it shows, in its own scale: SG, °Bx, °C or pH. */
    correction: quantity().notNull().default(0),
    /** Temperature that a hydrometer is made for, °C. */
    calibratedC: quantity(),
    notes: note(),
    typed: typedTexts(),
    /** No longer used; old readings still name it. */
    retiredAt: instant(),
    createdAt: madeAt(),
  },
  (t) => [
    index('instrument_brewery').on(t.breweryId),
    unique('instrument_in_brewery').on(t.breweryId, t.id),
    check(
      'instrument_kind',
      sql`${t.kind} in ('hydrometer', 'refractometer', 'thermometer', 'ph-meter')`,
    ),
  ],
);

const ofBatch = () => ({
  id: id(),
  breweryId: uuid()
    .notNull()
    .references(() => brewery.id, { onDelete: 'cascade' }),
  batchId: uuid()
    .notNull()
    .references(() => batch.id, { onDelete: 'cascade' }),
  version: version(),
  /** Who wrote it. */
  personId: uuid()
    .notNull()
    .references(() => person.id),
  createdAt: madeAt(),
  editedAt: instant(),
});

/** What was read of a batch, once. */
export const reading = pgTable(
  'reading',
  {
    ...ofBatch(),
    kind: text().$type<'gravity' | 'temperature' | 'ph'>().notNull(),
    takenAt: instant().notNull(),
    /** As the instrument showed it: SG, °Bx of a refractometer, °C or pH. */
    shown: quantity().notNull(),
    /** After the correction of the instrument and of the sample's temperature. */
    value: quantity().notNull(),
    /** How a gravity was read. */
    method: text().$type<'hydrometer' | 'refractometer'>(),
    /** Of a hydrometer's sample, °C. */
    sampleC: quantity(),
    instrumentId: uuid(),
    notes: note(),
    typed: typedTexts(),
  },
  (t) => [
    foreignKey({
      name: 'reading_instrument',
      columns: [t.breweryId, t.instrumentId],
      foreignColumns: [instrument.breweryId, instrument.id],
    }),
    index('reading_batch').on(t.batchId, t.takenAt),
    index('reading_brewery').on(t.breweryId),
    index('reading_instrument_index').on(t.instrumentId),
    check('reading_kind', sql`${t.kind} in ('gravity', 'temperature', 'ph')`),
    check('reading_method', sql`(${t.method} is not null) = (${t.kind} = 'gravity')`),
  ],
);

/** Words about a batch, in the order in which they were written. */
export const batchNote = pgTable('batch_note', { ...ofBatch(), text: text().notNull() }, (t) => [
  index('batch_note_batch').on(t.batchId, t.createdAt),
  index('batch_note_brewery').on(t.breweryId),
]);

/** Something that is done to a batch at a time of its own: planned for a day, then done. */
export const batchEvent = pgTable(
  'batch_event',
  {
    ...ofBatch(),
    kind: text().$type<'dry-hop' | 'addition' | 'yeast-taken' | 'other'>().notNull(),
    plannedOn: date({ mode: 'string' }),
    doneAt: instant(),
    doneBy: uuid().references(() => person.id),
    /** What and how much, in the brewer's words. */
    text: text().notNull().default(''),
  },
  (t) => [
    index('batch_event_batch').on(t.batchId),
    index('batch_event_brewery').on(t.breweryId, t.plannedOn),
    check('batch_event_kind', sql`${t.kind} in ('dry-hop', 'addition', 'yeast-taken', 'other')`),
    check('batch_event_day', sql`${t.plannedOn} is not null or ${t.doneAt} is not null`),
  ],
);
