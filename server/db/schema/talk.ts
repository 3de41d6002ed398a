import { sql } from 'drizzle-orm';
import { bigint, check, index, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import type { Verdict } from '#shared/rules/vocabulary.ts';
import { brewery } from './brewery.ts';
import { batch, chain } from './chain.ts';
import { id, instant, madeAt, version } from './columns.ts';
import { person } from './people.ts';

/** What people say about a chain, a link of it (named by its later batch) or a batch. */
export const comment = pgTable(
  'comment',
  {
    id: id(),
    version: version(),
    /** The order in which they were written. */
    seq: bigint({ mode: 'number' }).generatedAlwaysAsIdentity().notNull(),
    breweryId: uuid()
      .notNull()
      .references(() => brewery.id, { onDelete: 'cascade' }),
    chainId: uuid()
      .notNull()
      .references(() => chain.id, { onDelete: 'cascade' }),
    about: text().$type<'chain' | 'link' | 'batch'>().notNull(),
    /** The batch, or the later batch of the link. */
    batchId: uuid().references(() => batch.id, { onDelete: 'cascade' }),
    /** What the link said when it was written. */
    verdict: jsonb().$type<{ verdict: Verdict; findings: number; reason: string }>(),
    personId: uuid()
      .notNull()
      .references(() => person.id),
    text: text().notNull(),
    createdAt: madeAt(),
    editedAt: instant(),
    deletedAt: instant(),
  },
  (t) => [
    index('comment_chain').on(t.chainId, t.seq),
    index('comment_brewery').on(t.breweryId),
    index('comment_batch').on(t.batchId),
    check('comment_about', sql`${t.about} in ('chain', 'link', 'batch')`),
    check('comment_about_what', sql`(${t.about} = 'chain') = (${t.batchId} is null)`),
  ],
);

/** How far somebody has read the talk of a chain. */
export const commentSeen = pgTable(
  'comment_seen',
  {
    personId: uuid()
      .notNull()
      .references(() => person.id, { onDelete: 'cascade' }),
    chainId: uuid()
      .notNull()
      .references(() => chain.id, { onDelete: 'cascade' }),
    seq: bigint({ mode: 'number' }).notNull(),
  },
  (t) => [primaryKey({ name: 'comment_seen_key', columns: [t.personId, t.chainId] })],
);
