import { sql } from 'drizzle-orm';
import {
  check,
  date,
  foreignKey,
  index,
  integer,
  jsonb,
  pgTable,
  text,
  uuid,
} from 'drizzle-orm/pg-core';
import type { Cake, CakeState } from '#shared/api/batch.ts';
import type { CakeCheckWrite, CellCount } from '#shared/api/cakeCheck.ts';
import { batch } from './chain.ts';
import { brewery } from './brewery.ts';
import { id, instant, madeAt, note, quantity, typedTexts, version } from './columns.ts';
import { person } from './people.ts';
import { yeast } from './stock.ts';

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

/** How the yeast under a batch was judged at racking. One a cake: a second look edits it. */
export const cakeCheck = pgTable(
  'cake_check',
  {
    batchId: uuid()
      .primaryKey()
      .references(() => batch.id, { onDelete: 'cascade' }),
    breweryId: uuid()
      .notNull()
      .references(() => brewery.id, { onDelete: 'cascade' }),
    version: version(),
    tasted: text().$type<'clean' | 'off'>().notNull(),
    /** The trade's words for what was off. */
    faults: text().array().$type<CakeCheckWrite['faults']>().notNull().default([]),
    /** Of the cake: by volume, or by mass, or by weighing the vessel with it and without. */
    volumeL: quantity(),
    massKg: quantity(),
    fullKg: quantity(),
    tareKg: quantity(),
    layers: text().$type<NonNullable<CakeCheckWrite['layers']>>(),
    colour: text().$type<NonNullable<CakeCheckWrite['colour']>>(),
    smells: text().array().$type<CakeCheckWrite['smells']>().notNull().default([]),
    /** Under the microscope, as it was counted. */
    count: jsonb().$type<CellCount>(),
    judged: text().$type<'fit' | 'with-care' | 'unfit'>().notNull(),
    notes: note(),
    typed: typedTexts(),
    signedBy: uuid()
      .notNull()
      .references(() => person.id),
    signedAt: instant().notNull(),
  },
  (t) => [
    index('cake_check_brewery').on(t.breweryId),
    check('cake_check_tasted', sql`${t.tasted} in ('clean', 'off')`),
    check('cake_check_judged', sql`${t.judged} in ('fit', 'with-care', 'unfit')`),
  ],
);

/** What of a cake was not poured: a jar to be, or thrown out. */
export const surplus = pgTable(
  'surplus',
  {
    id: id(),
    breweryId: uuid()
      .notNull()
      .references(() => brewery.id, { onDelete: 'cascade' }),
    version: version(),
    what: text().$type<'jar' | 'dumped'>().notNull(),
    cakeBatchId: uuid()
      .notNull()
      .references(() => batch.id, { onDelete: 'cascade' }),
    yeastId: uuid().notNull(),
    generation: integer().notNull(),
    day: date({ mode: 'string' }).notNull(),
    volumeL: quantity(),
    massKg: quantity(),
    typed: typedTexts(),
    notes: note(),
    personId: uuid()
      .notNull()
      .references(() => person.id),
    createdAt: madeAt(),
  },
  (t) => [
    foreignKey({
      name: 'surplus_yeast',
      columns: [t.breweryId, t.yeastId],
      foreignColumns: [yeast.breweryId, yeast.id],
    }),
    index('surplus_brewery').on(t.breweryId),
    index('surplus_cake').on(t.cakeBatchId),
    index('surplus_yeast_index').on(t.yeastId),
    check('surplus_what', sql`${t.what} in ('jar', 'dumped')`),
  ],
);
