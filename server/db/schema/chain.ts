import { sql } from 'drizzle-orm';
import {
  boolean,
  check,
  date,
  foreignKey,
  index,
  integer,
  jsonb,
  pgTable,
  text,
  unique,
  uuid,
  type AnyPgColumn,
} from 'drizzle-orm/pg-core';
import type { Acceptance, Followed, Stage } from '#shared/api/batch.ts';
import type { Addition, DryHop } from '#shared/rules/facts.ts';
import type { Allergen, Culture, TrubLevel } from '#shared/rules/vocabulary.ts';
import { id, madeAt, note, quantity, typedTexts, version } from './columns.ts';
import { season } from './season.ts';
import { vessel, yeast, yeastLine } from './stock.ts';

/** A shelf: batches that pass one cake on. */
export const chain = pgTable(
  'chain',
  {
    id: id(),
    breweryId: uuid().notNull(),
    seasonId: uuid().notNull(),
    version: version(),
    name: text().notNull(),
    yeastId: uuid().notNull(),
    vesselId: uuid(),
    lineId: uuid().notNull(),
    /** Place on the board, from 0; renumbered in one transaction (deferrable in the migration). */
    position: integer().notNull(),
    startKind: text().$type<'pack' | 'cake' | 'outside'>().notNull(),
    /** Whose cake it starts from. */
    startBatchId: uuid().references((): AnyPgColumn => batch.id),
    startGeneration: integer(),
    /** What slurry from outside brings with it; null: unknown. */
    startAllergens: jsonb().$type<Allergen[]>(),
    startCultures: jsonb().$type<Culture[]>(),
    /** Minor units. */
    startPrice: integer(),
  },
  (t) => [
    foreignKey({
      name: 'chain_season',
      columns: [t.breweryId, t.seasonId],
      foreignColumns: [season.breweryId, season.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'chain_yeast',
      columns: [t.breweryId, t.yeastId],
      foreignColumns: [yeast.breweryId, yeast.id],
    }),
    foreignKey({
      name: 'chain_vessel',
      columns: [t.breweryId, t.vesselId],
      foreignColumns: [vessel.breweryId, vessel.id],
    }),
    foreignKey({
      name: 'chain_line',
      columns: [t.breweryId, t.lineId],
      foreignColumns: [yeastLine.breweryId, yeastLine.id],
    }),
    unique('chain_position').on(t.seasonId, t.position),
    unique('chain_in_season').on(t.seasonId, t.id),
    index('chain_brewery_season').on(t.breweryId, t.seasonId),
    index('chain_start_batch').on(t.startBatchId),
    index('chain_yeast_index').on(t.yeastId),
    index('chain_vessel_index').on(t.vesselId),
    check(
      'chain_start',
      sql`(${t.startKind} = 'pack' and ${t.startBatchId} is null and ${t.startGeneration} is null)
        or (${t.startKind} = 'cake' and ${t.startBatchId} is not null and ${t.startGeneration} is null)
        or (${t.startKind} = 'outside' and ${t.startBatchId} is null and ${t.startGeneration} is not null)`,
    ),
  ],
);

const planned = {
  name: text().notNull(),
  style: text().notNull().default(''),
  volumeL: quantity(),
  og: quantity(),
  fg: quantity(),
  srm: quantity(),
  ibu: quantity(),
  fermentC: quantity(),
  daysUnderBeer: integer(),
  brewOn: date({ mode: 'string' }),
  wantedOn: date({ mode: 'string' }),
  /** Empty: none. Null: unknown. So with the next three. */
  dryHops: jsonb().$type<DryHop[]>(),
  additions: jsonb().$type<Addition[]>(),
  allergens: jsonb().$type<Allergen[]>(),
  cultures: jsonb().$type<Culture[]>(),
  trub: text().$type<TrubLevel>().notNull().default('some'),
  vesselId: uuid(),
  yeastId: uuid(),
  notes: note(),
  typed: typedTexts(),
};

const read = {
  readVolumeL: quantity(),
  readOg: quantity(),
  readFg: quantity(),
  rackedOn: date({ mode: 'string' }),
  scrapReason: note(),
  /** What its readings come to, renewed with each; null: none was taken. */
  followed: jsonb().$type<Followed>(),
};

/** Facts of the link from the batch before. */
const link = {
  takenOn: date({ mode: 'string' }),
  keepL: quantity(),
  keepWhole: boolean().notNull().default(false),
  leftAboveL: quantity(),
  cakeC: quantity(),
  starter: boolean().notNull().default(false),
  linkTyped: typedTexts(),
  acceptance: jsonb().$type<Acceptance>(),
};

export const batch = pgTable(
  'batch',
  {
    id: id(),
    breweryId: uuid().notNull(),
    seasonId: uuid().notNull(),
    version: version(),
    ...planned,
    /** Null: on the bench. */
    chainId: uuid(),
    /** Where it stands: its chain, else the bench, which bears the season's id. */
    shelfId: uuid().generatedAlwaysAs(sql`coalesce(chain_id, season_id)`),
    /** From 0 on its shelf, renumbered in one transaction (deferrable in the migration). Scrapped: null. */
    place: integer(),
    stage: text().$type<Stage>().notNull().default('pencilled'),
    ...read,
    ...link,
    createdAt: madeAt(),
  },
  (t) => [
    foreignKey({
      name: 'batch_season',
      columns: [t.breweryId, t.seasonId],
      foreignColumns: [season.breweryId, season.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'batch_chain',
      columns: [t.seasonId, t.chainId],
      foreignColumns: [chain.seasonId, chain.id],
    }),
    foreignKey({
      name: 'batch_vessel',
      columns: [t.breweryId, t.vesselId],
      foreignColumns: [vessel.breweryId, vessel.id],
    }),
    foreignKey({
      name: 'batch_yeast',
      columns: [t.breweryId, t.yeastId],
      foreignColumns: [yeast.breweryId, yeast.id],
    }),
    unique('batch_place').on(t.shelfId, t.place),
    index('batch_brewery_season').on(t.breweryId, t.seasonId),
    index('batch_season_chain_place').on(t.seasonId, t.chainId, t.place),
    index('batch_vessel_index').on(t.vesselId),
    index('batch_yeast_index').on(t.yeastId),
    check('batch_stage', sql`${t.stage} in ('pencilled', 'fermenting', 'racked', 'scrapped')`),
    check('batch_scrapped_stands_nowhere', sql`(${t.stage} = 'scrapped') = (${t.place} is null)`),
    check('batch_scrapped_off_chain', sql`${t.stage} <> 'scrapped' or ${t.chainId} is null`),
  ],
);
