import { sql } from 'drizzle-orm';
import { boolean, check, index, integer, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { brewery } from './brewery.ts';
import { chain } from './chain.ts';
import { id, instant, madeAt, version } from './columns.ts';
import { person } from './people.ts';

/** A read-only look at one chain for whoever holds the link. The token is shown once; here is its SHA-256. */
export const shareLink = pgTable(
  'share_link',
  {
    id: id(),
    version: version(),
    breweryId: uuid()
      .notNull()
      .references(() => brewery.id, { onDelete: 'cascade' }),
    chainId: uuid()
      .notNull()
      .references(() => chain.id, { onDelete: 'cascade' }),
    /** Whom it is for, in the brewer's words. */
    name: text().notNull(),
    tokenHash: text().notNull().unique('share_link_token'),
    showPrices: boolean().notNull().default(false),
    createdBy: uuid()
      .notNull()
      .references(() => person.id),
    createdAt: madeAt(),
    expiresAt: instant().notNull(),
    withdrawnAt: instant(),
    visits: integer().notNull().default(0),
    lastVisitAt: instant(),
  },
  (t) => [index('share_link_brewery').on(t.breweryId), index('share_link_chain').on(t.chainId)],
);

/** Somebody of another brewery on one chain. Until the join link is used, nobody yet. */
export const chainGuest = pgTable(
  'chain_guest',
  {
    id: id(),
    /** Whose chain it is. */
    breweryId: uuid()
      .notNull()
      .references(() => brewery.id, { onDelete: 'cascade' }),
    chainId: uuid()
      .notNull()
      .references(() => chain.id, { onDelete: 'cascade' }),
    role: text().$type<'brewer' | 'taster'>().notNull(),
    tokenHash: text().notNull().unique('chain_guest_token'),
    createdBy: uuid()
      .notNull()
      .references(() => person.id),
    createdAt: madeAt(),
    /** End of the join link; a guest who came in time stays. */
    expiresAt: instant().notNull(),
    personId: uuid().references(() => person.id),
    /** The guest's own brewery, on whose board the shelf stands. */
    guestBreweryId: uuid().references(() => brewery.id, { onDelete: 'cascade' }),
    joinedAt: instant(),
    withdrawnAt: instant(),
  },
  (t) => [
    index('chain_guest_brewery').on(t.breweryId),
    index('chain_guest_chain').on(t.chainId),
    index('chain_guest_person').on(t.personId),
    index('chain_guest_board').on(t.guestBreweryId),
    check('chain_guest_role', sql`${t.role} in ('brewer', 'taster')`),
    check('chain_guest_joined', sql`(${t.personId} is null) = (${t.joinedAt} is null)`),
  ],
);
