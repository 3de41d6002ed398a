import { api } from '#shared/api/urls.ts';
import { boardQuery } from '../../server/routes/board/load.ts';
import { atWork, type AtWork } from './support/atWork.ts';
import { cookieOf } from './support/cookie.ts';
import { copyBrewery } from './support/crowd.ts';
import { percentile } from './support/percentile.ts';
import type { Part, Row } from './row.ts';

const SIZE = { chains: 12, perChain: 8, bench: 4, seed: 2 };
const BREWERIES = 500;
const BATCHES = 50_000;
const WARM = 30;
const READS = 300;
/** How much longer a board may take among many than alone. */
const MOST_LONGER = 0.2;

/** A board among fifty thousand batches beside the same board alone. */
export const breweries: Part = {
  name: 'breweries',
  run: () =>
    atWork(SIZE, (alone) =>
      atWork(SIZE, async (among) => {
        const pool = among.db.$client;
        await copyBrewery(pool, BREWERIES - 1);
        const { rows } = await pool.query<{ n: number }>('select count(*)::int as n from batch');
        if (rows[0]?.n !== BATCHES) throw new Error(`there are ${rows[0]?.n} batches`);
        return [await readsRow(alone, among), await planRow(among)];
      }),
    ),
};

/** Read in turn, so that whatever else the machine has to do strikes both alike. */
async function readsRow(alone: AtWork, among: AtWork): Promise<Row> {
  const times: [number[], number[]] = [[], []];
  for (let turn = 0; turn < WARM + READS; turn += 1)
    for (const [of, at] of [alone, among].entries()) {
      const took = await readBoard(at);
      if (turn >= WARM) times[of]?.push(took);
    }
  const [one, many] = [percentile(times[0], 0.5), percentile(times[1], 0.5)];
  const longer = many / one - 1;
  return {
    what: `board GET among ${BATCHES} batches of ${BREWERIES} breweries, beside one brewery’s`,
    reach: `p50 at most ${MOST_LONGER * 100} % longer`,
    measured: `${many.toFixed(1)} ms beside ${one.toFixed(1)} ms: ${(longer * 100).toFixed(0)} %`,
    holds: longer <= MOST_LONGER,
  };
}

async function readBoard(at: AtWork): Promise<number> {
  const cookie = cookieOf(at, at.brewery.members['head-brewer'].token);
  const start = performance.now();
  const answer = await fetch(at.url + api.board(at.brewery.slug), { headers: { cookie } });
  const { batches } = (await answer.json()) as { batches: unknown[] };
  const took = performance.now() - start;
  if (batches.length !== BATCHES / BREWERIES)
    throw new Error(`the board has ${batches.length} batches`);
  return took;
}

interface Plan {
  'Node Type': string;
  'Relation Name'?: string;
  Plans?: Plan[];
}
const nodes = (plan: Plan): Plan[] => [plan, ...(plan.Plans ?? []).flatMap(nodes)];

/** How the board's own statement finds the batches, planned for its values and for any. */
async function planRow({ db, brewery }: AtWork): Promise<Row> {
  const ways: string[] = [];
  const client = await db.$client.connect();
  try {
    await client.query(`prepare board_read as ${boardQuery(db).getQuery().sql}`);
    for (const mode of ['force_custom_plan', 'force_generic_plan']) {
      await client.query(`set plan_cache_mode = ${mode}`);
      const { rows } = await client.query<{ 'QUERY PLAN': [{ Plan: Plan }] }>(
        `explain (format json) execute board_read ('${brewery.id}', '${brewery.seasonId}')`,
      );
      const plan = rows[0]?.['QUERY PLAN'][0].Plan;
      const onBatch = plan ? nodes(plan).filter((node) => node['Relation Name'] === 'batch') : [];
      if (onBatch.length === 0) throw new Error('the plan does not read the batches');
      ways.push(...onBatch.map((node) => node['Node Type']));
    }
  } finally {
    client.release();
  }
  return {
    what: 'how it finds the batches there',
    reach: 'no sequential scan',
    measured: [...new Set(ways)].join(', '),
    holds: !ways.includes('Seq Scan'),
  };
}
