import { sql } from 'drizzle-orm';
import { index, jsonb, pgTable, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import type { Theme, UnitPrefs } from '#shared/api/units.ts';
import { id, instant, madeAt, version } from './columns.ts';

export const person = pgTable(
  'person',
  {
    id: id(),
    version: version(),
    name: text().notNull(),
    email: text().notNull(),
    passwordHash: text().notNull(),
    units: jsonb().$type<UnitPrefs>().notNull(),
    theme: text().$type<Theme>().notNull().default('system'),
    /** Closed accounts keep their row for the record, under "a former brewer". */
    closedAt: instant(),
    createdAt: madeAt(),
  },
  (t) => [uniqueIndex('person_email').on(sql`lower(${t.email})`)],
);

/** A sign-in. The cookie holds the token; here is only its SHA-256. */
export const session = pgTable(
  'session',
  {
    tokenHash: text().primaryKey(),
    personId: uuid()
      .notNull()
      .references(() => person.id, { onDelete: 'cascade' }),
    createdAt: madeAt(),
    /** What signed in, for the list of one's sign-ins: "Firefox on Linux". */
    device: text().notNull().default(''),
    seenAt: instant(),
    expiresAt: instant().notNull(),
  },
  (t) => [index('session_person').on(t.personId), index('session_expiry').on(t.expiresAt)],
);
