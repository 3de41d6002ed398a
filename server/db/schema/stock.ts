import { sql } from 'drizzle-orm';
import {
  boolean,
  check,
  date,
  foreignKey,
  index,
  integer,
  pgTable,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';
import type { VesselShape } from '#shared/api/vessel.ts';
import type { YeastKind } from '#shared/rules/vocabulary.ts';
import { brewery } from './brewery.ts';
import { id, madeAt, note, quantity, typedTexts, version } from './columns.ts';

/** What a yeast is: the strain and its ranges. Who it came from is a line's business. */
export const yeast = pgTable(
  'yeast',
  {
    id: id(),
    breweryId: uuid()
      .notNull()
      .references(() => brewery.id, { onDelete: 'cascade' }),
    version: version(),
    name: text().notNull(),
    kind: text().$type<YeastKind>().notNull(),
    character: boolean().notNull(),
    fermentMinC: quantity(),
    fermentMaxC: quantity(),
    pourMinC: quantity(),
    pourMaxC: quantity(),
    neverAboveC: quantity(),
    generationLimit: integer(),
    attenuation: quantity(),
    packPrice: integer(),
    notes: note(),
    typed: typedTexts(),
  },
  (t) => [
    index('yeast_brewery').on(t.breweryId),
    unique('yeast_in_brewery').on(t.breweryId, t.id),
    check('yeast_kind', sql`${t.kind} in ('ale', 'lager')`),
  ],
);

/** One pack, or one slurry from outside, and all that came of it, across chains. */
export const yeastLine = pgTable(
  'yeast_line',
  {
    id: id(),
    breweryId: uuid().notNull(),
    yeastId: uuid().notNull(),
    createdAt: madeAt(),
  },
  (t) => [
    foreignKey({
      name: 'yeast_line_yeast',
      columns: [t.breweryId, t.yeastId],
      foreignColumns: [yeast.breweryId, yeast.id],
    }),
    index('yeast_line_yeast_index').on(t.yeastId),
    unique('yeast_line_in_brewery').on(t.breweryId, t.id),
  ],
);

export const vessel = pgTable(
  'vessel',
  {
    id: id(),
    breweryId: uuid()
      .notNull()
      .references(() => brewery.id, { onDelete: 'cascade' }),
    version: version(),
    name: text().notNull(),
    shape: text().$type<VesselShape>().notNull(),
    capacityL: quantity().notNull(),
    blowOff: boolean().notNull(),
    minC: quantity(),
    maxC: quantity(),
    cleanedOn: date({ mode: 'string' }),
    notes: note(),
    typed: typedTexts(),
  },
  (t) => [
    index('vessel_brewery').on(t.breweryId),
    unique('vessel_in_brewery').on(t.breweryId, t.id),
    check('vessel_shape', sql`${t.shape} in ('bucket', 'carboy', 'conical', 'keg')`),
  ],
);
