import { bigint, index, integer, pgTable, varchar } from 'drizzle-orm/pg-core';

/** Counters of tries, kept by rate-limiter-flexible: in the database, so that all processes count together. */
export const tryCount = pgTable(
  'try_count',
  {
    key: varchar({ length: 255 }).primaryKey(),
    points: integer().notNull().default(0),
    /** Milliseconds since 1970. */
    expire: bigint({ mode: 'number' }),
  },
  (t) => [index('try_count_expire').on(t.expire)],
);
