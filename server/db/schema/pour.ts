import { sql } from 'drizzle-orm';
import {
  boolean,
  check,
  foreignKey,
  index,
  integer,
  jsonb,
  pgTable,
  text,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';
import { batch } from './chain.ts';
import { id, instant, madeAt, note, quantity, typedTexts, version } from './columns.ts';
import { person } from './people.ts';
import { season } from './season.ts';

/** One brew day's way from the finished beer to the poured wort, for one link. */
export const pourRun = pgTable(
  'pour_run',
  {
    id: id(),
    version: version(),
    breweryId: uuid().notNull(),
    seasonId: uuid().notNull(),
    /** The batch whose wort is poured; it names the link. */
    batchId: uuid()
      .notNull()
      .references(() => batch.id, { onDelete: 'cascade' }),
    /** Whose cake it goes onto. Null: fresh yeast after all. */
    cakeBatchId: uuid().references(() => batch.id, { onDelete: 'cascade' }),
    openedBy: uuid()
      .notNull()
      .references(() => person.id),
    openedAt: instant().notNull(),
    closedAt: instant(),
    state: text().$type<'open' | 'poured' | 'left'>().notNull().default('open'),
    step: text().notNull(),
    /** What each step found, by its name. */
    steps: jsonb().$type<Record<string, unknown>>().notNull().default({}),
    typed: typedTexts(),
  },
  (t) => [
    foreignKey({
      name: 'pour_run_season',
      columns: [t.breweryId, t.seasonId],
      foreignColumns: [season.breweryId, season.id],
    }).onDelete('cascade'),
    uniqueIndex('pour_run_open')
      .on(t.batchId)
      .where(sql`${t.state} = 'open'`),
    index('pour_run_season_index').on(t.breweryId, t.seasonId, t.state),
    index('pour_run_batch').on(t.batchId),
    index('pour_run_cake').on(t.cakeBatchId),
    check('pour_run_state', sql`${t.state} in ('open', 'poured', 'left')`),
    check('pour_run_closed', sql`(${t.state} = 'open') = (${t.closedAt} is null)`),
  ],
);

const ofRun = () => ({
  id: id(),
  runId: uuid()
    .notNull()
    .references(() => pourRun.id, { onDelete: 'cascade' }),
});

/** When it was on the device's clock, by how much that clock was off, and when it came here. */
const byDevice = () => ({
  deviceAt: instant().notNull(),
  /** The server's clock less the device's, ms, as measured by the device. */
  clockOffsetMs: integer().notNull(),
  arrivedAt: instant().notNull(),
});

/** A temperature of the wort, °C. */
export const pourReading = pgTable(
  'pour_reading',
  {
    ...ofRun(),
    temperatureC: quantity().notNull(),
    typed: typedTexts(),
    ...byDevice(),
    personId: uuid()
      .notNull()
      .references(() => person.id),
    /** Taken back as a mistake; it is kept, and counts for nothing. */
    withdrawnAt: instant(),
  },
  (t) => [index('pour_reading_run').on(t.runId, t.deviceAt)],
);

/** Leave to pour: given by a fresh reading, or asked of a head brewer and answered. */
export const pourClearance = pgTable(
  'pour_clearance',
  {
    ...ofRun(),
    version: version(),
    kind: text().$type<'reading' | 'override'>().notNull(),
    readingId: uuid().references(() => pourReading.id, { onDelete: 'cascade' }),
    askedBy: uuid()
      .notNull()
      .references(() => person.id),
    askedAt: instant().notNull(),
    /** What stood against it when it was asked. */
    findings: jsonb().notNull().default([]),
    answer: text().$type<'granted' | 'refused'>(),
    /** Null where the reading itself granted it. */
    answeredBy: uuid().references(() => person.id),
    answeredAt: instant(),
    reason: note(),
    expiresAt: instant(),
  },
  (t) => [
    index('pour_clearance_run').on(t.runId, t.askedAt),
    index('pour_clearance_reading').on(t.readingId),
    check('pour_clearance_kind', sql`${t.kind} in ('reading', 'override')`),
    check('pour_clearance_answer', sql`${t.answer} in ('granted', 'refused')`),
    check('pour_clearance_answered', sql`(${t.answer} is null) = (${t.answeredAt} is null)`),
    check(
      'pour_clearance_expires',
      sql`${t.answer} is distinct from 'granted' or ${t.expiresAt} is not null`,
    ),
  ],
);

/** That wort was poured onto a cake, judged by its own time. What happened is always recorded. */
export const pourEvent = pgTable(
  'pour_event',
  {
    ...ofRun(),
    version: version(),
    batchId: uuid()
      .notNull()
      .references(() => batch.id, { onDelete: 'cascade' }),
    cakeBatchId: uuid().references(() => batch.id, { onDelete: 'cascade' }),
    ...byDevice(),
    personId: uuid()
      .notNull()
      .references(() => person.id),
    /** The reading that it was judged by. */
    readingId: uuid().references(() => pourReading.id),
    clearanceId: uuid().references(() => pourClearance.id),
    volumeL: quantity(),
    og: quantity(),
    typed: typedTexts(),
    /** Verdict and findings at its own time. */
    judged: jsonb().notNull(),
    cleared: boolean().notNull(),
    /** A head brewer's reason for one without clearance; until then it stays red. */
    signedBy: uuid().references(() => person.id),
    signedAt: instant(),
    reason: note(),
    createdAt: madeAt(),
  },
  (t) => [
    uniqueIndex('pour_event_run').on(t.runId),
    index('pour_event_batch').on(t.batchId),
    index('pour_event_cake').on(t.cakeBatchId),
    index('pour_event_clearance').on(t.clearanceId),
    index('pour_event_reading').on(t.readingId),
    check('pour_event_signed', sql`(${t.signedBy} is null) = (${t.signedAt} is null)`),
    check('pour_event_cleared', sql`not ${t.cleared} or ${t.clearanceId} is not null`),
  ],
);
