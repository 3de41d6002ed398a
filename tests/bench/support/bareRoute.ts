import express from 'express';
import pg from 'pg';

/** The least that a route with a database can be: what the machine gives before any work of ours. */
const pool = new pg.Pool({ connectionString: process.env.DATABASE_URL, max: 10 });
const app = express();
app.get('/', async (_req, res) => {
  res.json((await pool.query('select 1 as one')).rows);
});
const listening = app.listen(0, '127.0.0.1', () => {
  const address = listening.address();
  process.send?.({ port: typeof address === 'object' ? address?.port : null });
});
process.on('disconnect', () => process.exit(0));
