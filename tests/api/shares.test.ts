import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { sharesOf } from '#shared/chain/shares.ts';
import { api } from '#shared/api/urls.ts';
import { aBatch, aChain } from '../support/bodies.ts';
import {
  batchOf,
  boardOf,
  good,
  moveTo,
  shelve,
  testSeason,
  wish,
  type TestSeason,
} from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';

let server: TestServer;
let season: TestSeason;
let source: string;
let next: string;
let branched: string;

/** A blonde's cake under a pale on its own shelf, and under a bitter on a shelf that starts from it. */
beforeAll(async () => {
  server = await startTestServer();
  season = await testSeason(server.url);
  const { head, slug, chainA, yeastId } = season;
  [source = '', next = ''] = await shelve(season, chainA, [{ name: 'Blonde' }, { name: 'Pale' }]);
  const bitter = aBatch({ name: 'Bitter', og: 1.038 });
  await good(head.post(api.batches(slug), bitter));
  branched = bitter.id;
  const newChain = aChain(yeastId, {
    id: randomUUID(),
    name: 'Second shelf',
    start: { kind: 'cake', batchId: source },
  });
  const move = wish({ batchId: branched, toChainId: 'new', newChain });
  await good(head.post(api.moves(slug), move));
});
afterAll(() => server.close());

async function keep(id: string, change: object) {
  const { version } = await batchOf(season.head, season.slug, id);
  return season.head.patch(api.link(season.slug, id), change, version);
}

const shares = async () => sharesOf(await boardOf(season.head, season.slug), source);

describe('a cake that goes under two worts', () => {
  it('is divided by one move that makes the second shelf', async () => {
    expect((await shares()).takers.map(({ name, asked }) => [name, asked])).toEqual([
      ['Pale', 'recommended'],
      ['Bitter', 'recommended'],
    ]);
  });

  it('is not given away twice: the field says who has the rest', async () => {
    const { wholeL } = await shares();
    const half = (wholeL ?? 0) / 2;
    await good(keep(next, { keepL: half }));
    await good(keep(branched, { keepL: half }));
    const { status, body } = await keep(branched, { keepL: half * 1.2 });
    expect([status, body]).toMatchObject([
      422,
      { errors: [{ pointer: '/keepL', detail: expect.stringContaining('Pale has') }] },
    ]);
    const { takers } = await shares();
    expect(takers.reduce((sum, { litres }) => sum + (litres ?? 0), 0)).toBeCloseTo(wholeL ?? 0, 6);
  });

  it('gives the rest to whoever keeps all', async () => {
    const { wholeL } = await shares();
    await good(keep(next, { keepL: 0.2 }));
    await good(keep(branched, { keepWhole: true }));
    const { takers, leftL } = await shares();
    expect(takers[1]?.litres).toBeCloseTo((wholeL ?? 0) - 0.2, 6);
    expect(leftL).toBeCloseTo(0, 6);
  });

  it('belongs to one wort again when the other goes back to the bench', async () => {
    const { chainId } = await batchOf(season.head, season.slug, branched);
    await moveTo(season.head, season.slug, { batchId: branched, expectedChainId: chainId });
    expect((await shares()).takers.map(({ name }) => name)).toEqual(['Pale']);
    expect((await keep(next, { keepL: 5 })).status).toBe(200);
  });
});
