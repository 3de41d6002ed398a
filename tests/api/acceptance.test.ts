import { afterAll, beforeAll, beforeEach, expect, it } from 'vitest';
import type { Batch } from '#shared/api/batch.ts';
import { judgeBoard } from '#shared/chain/judgeBoard.ts';
import { api } from '#shared/api/urls.ts';
import {
  batchOf,
  boardOf,
  good,
  joined,
  moveTo,
  shelve,
  testSeason,
  type TestSeason,
} from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import type { Visitor } from '../support/visitor.ts';

let server: TestServer;
let season: TestSeason;

beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());
beforeEach(async () => {
  season = await testSeason(server.url);
});

const strong = { name: 'Strong', og: 1.095, fg: 1.024, srm: 42, ibu: 60, brewOn: '2027-03-06' };
const reason = { reason: 'We like it so' };

async function accept(id: string, visitor: Visitor = season.head) {
  const { version } = await batchOf(season.head, season.slug, id);
  return visitor.ask('PUT', api.acceptance(season.slug, id), { body: reason, version });
}

it('stores the reason, the rules and who took the hold on, and can be taken back', async () => {
  const [, b = ''] = await shelve(season, season.chainA, [strong, { name: 'Blonde' }]);
  const { status, body } = await accept(b);
  expect(status).toBe(200);
  const { link, version } = body as Batch;
  expect(link.acceptance).toMatchObject({ ...reason, by: season.person.name });
  expect(link.acceptance?.rules).toContain('tired-cake');
  const judged = judgeBoard(await boardOf(season.head, season.slug)).links.get(b);
  expect(judged).toMatchObject({ verdict: 'hold', accepted: true });
  const back = await season.head.ask('DELETE', api.acceptance(season.slug, b), { version });
  expect(back.body).toMatchObject({ link: { acceptance: null } });
});

it('is the head brewer’s alone', async () => {
  const [, b = ''] = await shelve(season, season.chainA, [strong, { name: 'Blonde' }]);
  for (const role of ['brewer', 'taster'] as const)
    expect((await accept(b, await joined(season, role))).status).toBe(403);
});

const NEVER =
  'An allergen, a wild culture or an overfull vessel cannot be accepted: declare it, or change the plan';

it.each([
  ['nothing holds', {}, {}, 'Nothing holds here'],
  ['an allergen', { allergens: ['gluten', 'tree-nuts'] as const }, {}, NEVER],
  ['a wild culture', { cultures: ['brettanomyces'] as const }, {}, NEVER],
  ['an overfull vessel', {}, { volumeL: 32 }, NEVER],
])('is refused: %s', async (_, first, second, detail) => {
  const [, b = ''] = await shelve(season, season.chainA, [
    { name: 'First', brewOn: '2027-03-06', ...copied(first) },
    { name: 'Second', ...copied(second) },
  ]);
  const { status, body } = await accept(b);
  expect(status).toBe(409);
  expect(body).toMatchObject({ type: '/problems/not-acceptable', detail });
});

/** Plain arrays in place of read-only ones. */
const copied = (facts: object) => structuredClone(facts);

it('lapses when a fact of the link changes, on either side, and not with a name', async () => {
  const [a = '', b = ''] = await shelve(season, season.chainA, [strong, { name: 'Blonde' }]);
  const edit = async (id: string, patch: object) => {
    const { version } = await batchOf(season.head, season.slug, id);
    await good(season.head.patch(api.batch(season.slug, id), patch, version));
    return (await batchOf(season.head, season.slug, b)).link.acceptance;
  };
  await accept(b);
  expect(await edit(b, { name: 'Pale blonde', notes: 'For June' })).not.toBeNull();
  expect(await edit(b, { ibu: 22 })).toBeNull();
  await accept(b);
  expect(await edit(a, { og: 1.096 })).toBeNull();
});

it('lapses when the batch moves, and undo brings it back', async () => {
  const [, b = ''] = await shelve(season, season.chainA, [strong, { name: 'Blonde' }]);
  await accept(b);
  const answer = await moveTo(season.head, season.slug, {
    batchId: b,
    expectedChainId: season.chainA,
  });
  expect(answer.cleared).toEqual([b]);
  expect((await batchOf(season.head, season.slug, b)).link.acceptance).toBeNull();
  await good(season.head.post(api.undo(season.slug), { changeId: answer.changeId }));
  expect((await batchOf(season.head, season.slug, b)).link.acceptance).toMatchObject(reason);
});
