import { getTableColumns } from 'drizzle-orm';
import { toSnakeCase } from 'drizzle-orm/casing';
import type { PgTable } from 'drizzle-orm/pg-core';
import { brewery, houseRules } from '../db/schema/brewery.ts';
import { cake, cakeCheck } from '../db/schema/cake.ts';
import { batch, chain } from '../db/schema/chain.ts';
import { season } from '../db/schema/season.ts';
import { vessel, yeast, yeastLine } from '../db/schema/stock.ts';

/** The tables whose rows make a board. A row is written after what it refers to, and goes before it. */
export const TABLES = {
  brewery: { table: brewery, key: 'id' },
  season: { table: season, key: 'id' },
  house_rules: { table: houseRules, key: 'brewery_id' },
  yeast: { table: yeast, key: 'id' },
  yeast_line: { table: yeastLine, key: 'id' },
  vessel: { table: vessel, key: 'id' },
  chain: { table: chain, key: 'id' },
  batch: { table: batch, key: 'id' },
  cake: { table: cake, key: 'batch_id' },
  cake_check: { table: cakeCheck, key: 'batch_id' },
} as const satisfies Record<string, { table: PgTable; key: string }>;

export type TableName = keyof typeof TABLES;
export const TABLE_NAMES = Object.keys(TABLES) as TableName[];

/** Columns that an edit raises, or that follow from the others. */
const COUNTED = ['version', 'revision', 'place', 'position', 'shelf_id', 'chain_id'];
/** What follows from the readings, which have a record of their own. */
const FOLLOWED = ['followed'];
/** Which season is current, and which is put away: said in words, and not undone with the board. */
const OF_SEASONS = ['archived_at', 'current_season_id'];
const APART = new Set([...COUNTED, ...FOLLOWED, ...OF_SEASONS]);

/** What the record compares: everything of a row that somebody wrote. */
export const isCompared = (column: string): boolean => !APART.has(column);

const writable = new Map<TableName, ReadonlySet<string>>();

/** Columns of a table, as the database names them, that can be written. */
export function columnsOf(name: TableName): ReadonlySet<string> {
  const known = writable.get(name);
  if (known) return known;
  const columns = Object.values(getTableColumns(TABLES[name].table as PgTable));
  const names = new Set(
    columns.filter((column) => !column.generated).map(({ name: own }) => toSnakeCase(own)),
  );
  writable.set(name, names);
  return names;
}
