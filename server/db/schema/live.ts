import { index, pgTable, uuid } from 'drizzle-orm/pg-core';
import { instant } from './columns.ts';
import { person } from './people.ts';
import { season } from './season.ts';

/** Who has a season's board open: a row a stream, renewed by its heartbeat, whichever process serves it. */
export const presence = pgTable(
  'presence',
  {
    streamId: uuid().primaryKey(),
    seasonId: uuid()
      .notNull()
      .references(() => season.id, { onDelete: 'cascade' }),
    personId: uuid()
      .notNull()
      .references(() => person.id, { onDelete: 'cascade' }),
    seenAt: instant().notNull(),
  },
  (t) => [
    index('presence_season').on(t.seasonId, t.seenAt),
    index('presence_person').on(t.personId),
  ],
);
