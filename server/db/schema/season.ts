import { sql } from 'drizzle-orm';
import {
  check,
  date,
  index,
  integer,
  pgTable,
  primaryKey,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';
import { brewery } from './brewery.ts';
import { id, instant, madeAt, version } from './columns.ts';

export const season = pgTable(
  'season',
  {
    id: id(),
    breweryId: uuid()
      .notNull()
      .references(() => brewery.id, { onDelete: 'cascade' }),
    version: version(),
    name: text().notNull(),
    /** Raised by every change of anything on this season's board. */
    revision: integer().notNull().default(0),
    brewWeekdays: integer().array().notNull().default([6, 7]),
    brewsPerDay: integer().notNull().default(1),
    /** When it is meant to begin and to end. */
    firstDay: date({ mode: 'string' }),
    lastDay: date({ mode: 'string' }),
    /** Put away: it is read, not changed. */
    archivedAt: instant(),
    createdAt: madeAt(),
  },
  (t) => [
    index('season_brewery').on(t.breweryId),
    unique('season_in_brewery').on(t.breweryId, t.id),
    check('season_days', sql`${t.lastDay} >= ${t.firstDay}`),
  ],
);

/** A day on which nobody is free to brew. */
export const blockedDay = pgTable(
  'blocked_day',
  {
    seasonId: uuid()
      .notNull()
      .references(() => season.id, { onDelete: 'cascade' }),
    day: date({ mode: 'string' }).notNull(),
  },
  (t) => [primaryKey({ name: 'blocked_day_key', columns: [t.seasonId, t.day] })],
);
