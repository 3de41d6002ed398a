import { sql } from 'drizzle-orm';
import { check, date, index, integer, jsonb, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import type { Cake, CakeState } from '#shared/api/batch.ts';
import { batch } from './chain.ts';
import { brewery } from './brewery.ts';
import { id, madeAt, note, quantity, version } from './columns.ts';

/** The yeast under a batch, from its brew day on. Its generation is the batch's, so it is not stored. */
export const cake = pgTable(
  'cake',
  {
    batchId: uuid()
      .primaryKey()
      .references(() => batch.id, { onDelete: 'cascade' }),
    state: text().$type<CakeState>().notNull(),
    measured: jsonb().$type<NonNullable<Cake['measured']>>(),
  },
  (t) => [
    check('cake_state', sql`${t.state} in ('growing', 'bare', 'poured', 'jarred', 'dumped')`),
  ],
);

/** Slurry put by, from a cake of one's own or, later, from another brewery. */
export const jar = pgTable(
  'jar',
  {
    id: id(),
    breweryId: uuid()
      .notNull()
      .references(() => brewery.id, { onDelete: 'cascade' }),
    version: version(),
    cakeBatchId: uuid().references(() => cake.batchId),
    filledOn: date({ mode: 'string' }),
    volumeL: quantity(),
    massKg: quantity(),
    generation: integer(),
    label: text().notNull().default(''),
    notes: note(),
    createdAt: madeAt(),
  },
  (t) => [index('jar_brewery').on(t.breweryId), index('jar_cake').on(t.cakeBatchId)],
);
