import { board as contract } from '#shared/api/board.ts';
import { api } from '#shared/api/urls.ts';
import { atWork, type AtWork } from './support/atWork.ts';
import { cookieOf } from './support/cookie.ts';
import { load, type Load } from './support/load.ts';
import { withBareRoute } from './support/withBareRoute.ts';
import type { Part, Row } from './row.ts';

const SIZE = { chains: 12, perChain: 8, bench: 0, seed: 2 };
const MANY = 20;

/** A season's board over HTTP: server, database and load generator share this machine. */
export const board: Part = {
  name: 'board',
  run: () =>
    atWork(SIZE, async (at) => {
      const target = await boardOf(at);
      const [one, many] = [await load(target, 1), await load(target, MANY)];
      const bare = await withBareRoute(at.databaseUrl, async (url) => {
        const route = { url, headers: {} };
        return { one: await load(route, 1), many: await load(route, MANY) };
      });
      return [
        oneRow('board GET, 96 batches, one connection', one, 25),
        manyRow('board GET, 96 batches, 20 closed-loop connections', many, { rate: 150, p95: 160 }),
        oneRow('beside it: a bare route with `select 1`, one connection', bare.one, null),
        manyRow('beside it: a bare route with `select 1`, 20 connections', bare.many, null),
      ];
    }),
};

/** What to ask for, and as whom; one whole answer is read beforehand. */
async function boardOf(at: AtWork) {
  const url = `${at.url}${api.board(at.brewery.slug)}`;
  const cookie = cookieOf(at, at.brewery.members['head-brewer'].token);
  const headers = { cookie, 'accept-encoding': 'gzip, deflate, br' };
  const answer = await fetch(url, { headers });
  const { batches } = contract.parse(await answer.json());
  if (batches.length !== 96) throw new Error(`the board answers ${batches.length} batches of 96`);
  return { url, headers };
}

const ms = (took: number) => `p95 ${took.toFixed(1)} ms`;

function oneRow(what: string, { p95 }: Load, most: number | null): Row {
  return {
    what,
    reach: most === null ? '–' : `p95 ≤ ${most} ms`,
    measured: ms(p95),
    holds: most === null || p95 <= most,
  };
}

function manyRow(what: string, { rate, p95 }: Load, reach: Load | null): Row {
  return {
    what,
    reach: reach === null ? '–' : `≥ ${reach.rate} a second, p95 ≤ ${reach.p95} ms`,
    measured: `${rate.toFixed(0)} a second, ${ms(p95)}`,
    holds: reach === null || (rate >= reach.rate && p95 <= reach.p95),
  };
}
