import { getTableColumns, sql, type SQL } from 'drizzle-orm';
import type { PgTable } from 'drizzle-orm/pg-core';

/** As the `casing` setting names columns. */
const inDatabase = (key: string) => key.replace(/[A-Z]/g, (letter) => `_${letter.toLowerCase()}`);

/** `json_build_object` of a table's columns under their names in the code; days come as strings. */
export function jsonObject(table: PgTable, alias: string, without: readonly string[] = []): string {
  const keys = Object.keys(getTableColumns(table)).filter((key) => !without.includes(key));
  return `json_build_object(${keys.map((key) => `'${key}', ${alias}.${inDatabase(key)}`).join(', ')})`;
}

/**
 * All rows of a subquery as one JSON list. Put together as text once, so that a query made of many
 * of them costs nothing to build. For tables with instants leave those out: JSON has none.
 */
export const jsonList = <T>(object: string, fromWhere: string, order: string): SQL<T[]> =>
  sql.raw(
    `(select coalesce(json_agg(${object} order by ${order}), '[]'::json) from ${fromWhere})`,
  ) as SQL<T[]>;
