import type pg from 'pg';

/** The demo's people: their password stands in the README, so nothing that has them may face a network. */
export const DEMO_EMAILS = [
  'mo@saltmarsh.example',
  'tamsin@saltmarsh.example',
  'ruth@saltmarsh.example',
] as const;

export async function hasDemoAccounts(pool: pg.Pool): Promise<boolean> {
  const rows = await pool.query('select 1 from person where email = any($1) limit 1', [
    DEMO_EMAILS,
  ]);
  return rows.rows.length > 0;
}
