import { check, index, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { sql } from 'drizzle-orm';
import type { HouseRuleChanges } from '#shared/api/board.ts';
import type { Role } from '#shared/api/people.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import { id, instant, madeAt, version } from './columns.ts';
import { person } from './people.ts';

export const brewery = pgTable('brewery', {
  id: id(),
  version: version(),
  slug: text().notNull().unique('brewery_slug'),
  name: text().notNull(),
  timeZone: text().notNull(),
  currency: text().notNull(),
  units: jsonb().$type<UnitPrefs>().notNull(),
  /** The season that the board opens; null: the oldest. No reference, since a season refers here. */
  currentSeasonId: uuid(),
  createdAt: madeAt(),
});

export const membership = pgTable(
  'membership',
  {
    breweryId: uuid()
      .notNull()
      .references(() => brewery.id, { onDelete: 'cascade' }),
    personId: uuid()
      .notNull()
      .references(() => person.id, { onDelete: 'cascade' }),
    role: text().$type<Role>().notNull(),
    /** Raised when the role changes. */
    version: version(),
    joinedAt: madeAt(),
  },
  (t) => [
    primaryKey({ name: 'membership_key', columns: [t.breweryId, t.personId] }),
    index('membership_person').on(t.personId),
    check('membership_role', sql`${t.role} in ('head-brewer', 'brewer', 'taster')`),
  ],
);

/** A one-use invitation. The token is shown once; here is only its SHA-256. */
export const joinLink = pgTable(
  'join_link',
  {
    id: id(),
    breweryId: uuid()
      .notNull()
      .references(() => brewery.id, { onDelete: 'cascade' }),
    role: text().$type<Role>().notNull(),
    tokenHash: text().notNull().unique('join_link_token'),
    createdBy: uuid()
      .notNull()
      .references(() => person.id),
    createdAt: madeAt(),
    expiresAt: instant().notNull(),
    usedAt: instant(),
    usedBy: uuid().references(() => person.id),
  },
  (t) => [
    index('join_link_brewery').on(t.breweryId),
    check('join_link_role', sql`${t.role} in ('head-brewer', 'brewer', 'taster')`),
  ],
);

/** Only what differs from the defaults of `shared/rules/houseRules`. */
export const houseRules = pgTable('house_rules', {
  breweryId: uuid()
    .primaryKey()
    .references(() => brewery.id, { onDelete: 'cascade' }),
  version: version(),
  changes: jsonb().$type<HouseRuleChanges>().notNull().default({}),
});
