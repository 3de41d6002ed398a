import type pg from 'pg';

/**
 * Runs requests against a lock that is held: all of them have begun, and wait, before it is let go.
 * @param lock a statement that takes the lock; what it writes is taken back
 * @param waiting how many are expected to wait
 */
export async function whileHeld<T>(
  pool: pg.Pool,
  [lock, values]: readonly [string, readonly unknown[]],
  waiting: number,
  ask: () => Promise<T>,
): Promise<T> {
  const client = await pool.connect();
  try {
    await client.query('begin');
    await client.query(lock, [...values]);
    const asked = ask();
    await Promise.race([asked, untilWaiting(pool, waiting)]);
    await client.query('rollback');
    return await asked;
  } finally {
    client.release();
  }
}

async function untilWaiting(pool: pg.Pool, waiting: number): Promise<void> {
  const end = performance.now() + 5_000;
  while (performance.now() < end) {
    const { rows } = await pool.query<{ n: number }>(
      `select count(*)::int as n from pg_stat_activity
       where datname = current_database() and wait_event_type = 'Lock'`,
    );
    if ((rows[0]?.n ?? 0) >= waiting) return;
    await new Promise((later) => setTimeout(later, 10));
  }
  throw new Error(`No ${waiting} requests came to wait`);
}
