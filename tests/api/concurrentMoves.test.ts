import { randomInt } from 'node:crypto';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { api } from '#shared/api/urls.ts';
import { boardOf, joined, shelve, testSeason, wish, type TestSeason } from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import type { Visitor } from '../support/visitor.ts';

let server: TestServer;
let season: TestSeason;

beforeAll(async () => {
  server = await startTestServer();
  season = await testSeason(server.url);
});
afterAll(() => server.close());

const MOVERS = 12;
const MOVES_EACH = 8;

it('keeps every batch exactly once while a dozen people move at random', async () => {
  const named = (letter: string) =>
    Array.from({ length: 6 }, (_, each) => ({ name: `${letter}${each}`, brewOn: '2027-03-06' }));
  await shelve(season, season.chainA, named('A'));
  await shelve(season, season.chainB, named('B'));
  await shelve(season, null, named('C'));
  const brewer = await joined(season, 'brewer');
  const people = [season.head, brewer];
  const movers = Array.from({ length: MOVERS }, (_, each) => people[each % 2] ?? season.head);
  const statuses = (await Promise.all(movers.map(moveAbout))).flat();
  expect(new Set(statuses)).toEqual(new Set([200, 409].filter((code) => statuses.includes(code))));
  expect(statuses.filter((code) => code === 200).length).toBeGreaterThan(MOVERS);
  const { batches } = await boardOf(season.head, season.slug);
  expect(batches).toHaveLength(18);
  for (const shelf of [season.chainA, season.chainB, null]) {
    const places = batches.filter(({ chainId }) => chainId === shelf).map(({ place }) => place);
    expect(places.sort((x, y) => x - y)).toEqual(places.map((_, at) => at));
  }
}, 60_000);

async function moveAbout(visitor: Visitor): Promise<number[]> {
  const statuses: number[] = [];
  for (let count = 0; count < MOVES_EACH; count += 1) {
    const { batches } = await boardOf(visitor, season.slug);
    const one = batches[randomInt(batches.length)];
    const after = batches[randomInt(batches.length)];
    if (!one || !after || one.id === after.id) continue;
    const body = wish({
      batchId: one.id,
      toChainId: after.chainId ?? 'bench',
      afterBatchId: after.id,
      expectedChainId: one.chainId,
    });
    statuses.push((await visitor.post(api.moves(season.slug), body)).status);
  }
  return statuses;
}
