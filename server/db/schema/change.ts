import { sql } from 'drizzle-orm';
import {
  bigint,
  check,
  index,
  jsonb,
  pgTable,
  text,
  unique,
  uuid,
  type AnyPgColumn,
} from 'drizzle-orm/pg-core';
import { id, madeAt } from './columns.ts';
import { person } from './people.ts';

export const CHANGE_KINDS = ['move', 'edit', 'undo', 'redo'] as const;
export type ChangeKind = (typeof CHANGE_KINDS)[number];

/**
 * Who changed what, when, from what to what. Append-only: a trigger refuses UPDATE and DELETE.
 * An undo or a redo is a further row that speaks of the first one.
 */
export const change = pgTable(
  'change',
  {
    id: id(),
    breweryId: uuid().notNull(),
    /** No reference: the record outlives a season that was deleted. */
    seasonId: uuid().notNull(),
    /** The order in which they happened. */
    seq: bigint({ mode: 'number' }).generatedAlwaysAsIdentity().notNull(),
    personId: uuid()
      .notNull()
      .references(() => person.id),
    at: madeAt(),
    kind: text().$type<ChangeKind>().notNull(),
    /** A sentence in the product's words: "Moved Chandler after Slack Water". */
    what: text().notNull(),
    before: jsonb().notNull(),
    after: jsonb().notNull(),
    /** Rows whose place, dates or facts it changed. */
    touches: uuid().array().notNull(),
    /** The move that this undo or redo speaks of. */
    ofChange: uuid().references((): AnyPgColumn => change.id),
  },
  (t) => [
    unique('change_seq').on(t.seq),
    index('change_season_person').on(t.seasonId, t.personId, t.seq),
    index('change_of').on(t.ofChange, t.seq),
    check('change_kind', sql`${t.kind} in ('move', 'edit', 'undo', 'redo')`),
    check('change_of_what', sql`(${t.kind} in ('undo', 'redo')) = (${t.ofChange} is not null)`),
  ],
);
