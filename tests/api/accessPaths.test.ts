import { afterAll, beforeAll, expect, it } from 'vitest';
import { boardQuery, sceneQuery } from '../../server/routes/board/load.ts';
import { boardOf, testSeason, type TestSeason } from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';

let server: TestServer;
let season: TestSeason;

const BREWERIES = 500;
const BATCHES_EACH = 100;

beforeAll(async () => {
  server = await startTestServer();
  season = await testSeason(server.url);
  await server.pool.query(
    `with b as (
       insert into brewery (id, slug, name, time_zone, currency, units)
       select gen_random_uuid(), 'crowd-' || n, 'Crowd', 'UTC', 'EUR', '{}' from generate_series(1, $1::int) n
       returning id
     ), s as (
       insert into season (id, brewery_id, name) select gen_random_uuid(), id, 'Crowd' from b
       returning id, brewery_id
     )
     insert into batch (id, brewery_id, season_id, name, place)
     select gen_random_uuid(), brewery_id, id, 'Crowd ' || n, n from s, generate_series(1, $2::int) n`,
    [BREWERIES, BATCHES_EACH],
  );
  await server.pool.query('analyze');
});
afterAll(() => server.close());

interface Plan {
  'Node Type': string;
  'Relation Name'?: string;
  Plans?: Plan[];
}
const nodes = (plan: Plan): Plan[] => [plan, ...(plan.Plans ?? []).flatMap(nodes)];

const QUERIES = {
  board: { query: boardQuery, first: [] },
  'board under the locks of a command': { query: sceneQuery, first: [[]] },
} as const;

it.each(Object.keys(QUERIES) as (keyof typeof QUERIES)[])(
  'finds a %s among 50,000 batches by an index',
  async (name) => {
    const { query, first } = QUERIES[name];
    const count = await server.pool.query<{ n: number }>('select count(*)::int as n from batch');
    expect(count.rows[0]?.n).toBeGreaterThanOrEqual(BREWERIES * BATCHES_EACH);
    const { brewery, season: row } = await boardOf(season.head, season.slug);
    const { rows } = await server.pool.query<{ 'QUERY PLAN': [{ Plan: Plan }] }>(
      `explain (format json) ${query(server.db).getQuery().sql}`,
      [...first, brewery.id, row.id],
    );
    const plan = rows[0]?.['QUERY PLAN'][0].Plan;
    const onBatch = plan ? nodes(plan).filter((node) => node['Relation Name'] === 'batch') : [];
    expect(onBatch.length).toBeGreaterThan(0);
    expect(onBatch.map((node) => node['Node Type'])).not.toContain('Seq Scan');
  },
);
