import { getTableColumns, sql, type SQL } from 'drizzle-orm';
import type { PgTable } from 'drizzle-orm/pg-core';

/**
 * A whole table's rows as one JSON value, for a query that brings several small tables at once.
 * Days arrive as strings; a table with instants needs a query of its own.
 */
export function jsonRows<T extends PgTable>(
  table: T,
  where: SQL,
  order: SQL,
): SQL<T['$inferSelect'][]> {
  const pairs = Object.entries(getTableColumns(table)).flatMap(([key, column]) => [
    sql`${sql.raw(`'${key}'`)}`,
    sql`${column}`,
  ]);
  return sql<
    T['$inferSelect'][]
  >`(select coalesce(json_agg(json_build_object(${sql.join(pairs, sql`, `)}) order by ${order}), '[]'::json) from ${table} where ${where})`;
}
