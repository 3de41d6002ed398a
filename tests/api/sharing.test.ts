import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, expect, it } from 'vitest';
import type { ShareLink, ShareLinkMade, SharedChain } from '#shared/api/share.ts';
import { api } from '#shared/api/urls.ts';
import { judgeBoard } from '#shared/chain/judgeBoard.ts';
import { testClock } from '../support/clock.ts';
import { boardOf, good, joined, namesOn, shelve, testSeason } from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import { newcomer, Visitor } from '../support/visitor.ts';

const clock = testClock('2027-03-29T09:00:00Z');
let server: TestServer;

beforeAll(async () => {
  server = await startTestServer({ clock });
});
afterAll(() => server.close());

const wish = (change: object = {}) => ({
  id: randomUUID(),
  name: 'For the festival',
  expiresOn: '2027-04-30',
  showPrices: false,
  ...change,
});

async function shared(change: object = {}) {
  const season = await testSeason(server.url);
  const ids = await shelve(season, season.chainA, [
    { name: 'Low Tide', brewOn: '2027-03-06', allergens: ['gluten'], notes: 'ask Ruth Udall' },
    { name: 'Jetty', brewOn: '2027-03-20', allergens: ['gluten', 'milk'] },
  ]);
  await shelve(season, season.chainB, [{ name: 'Another shelf' }]);
  await shelve(season, null, [{ name: 'On the bench' }]);
  const body = wish(change);
  const { head, slug, chainA } = season;
  const link = await good<ShareLinkMade>(head.post(api.shareLinks(slug, chainA), body));
  return { ...season, ids, body, link };
}

const look = (token: string, visitor = new Visitor(server.url)) => visitor.get(api.shared(token));

it('shows one chain to whoever has the link, and nothing else of the brewery', async () => {
  const { link, ids, person, slug, head, chainA, vesselId, yeastId } = await shared();
  const { status, body, headers } = await look(link.token);
  expect(status).toBe(200);
  const chain = body as SharedChain;
  expect(chain.batches.map(({ name }) => name)).toEqual(['Low Tide', 'Jetty']);
  expect(chain).toMatchObject({ sharedOn: '2027-03-29', until: '2027-04-30', costPerBatch: null });
  expect(chain.carries).toMatchObject({ allergens: ['gluten', 'milk'], allergensUnknown: false });
  const text = JSON.stringify(body);
  const { brewery, season } = await boardOf(head, slug);
  const secrets = ['Another shelf', 'On the bench', 'Ruth Udall', person.name, '1400', slug];
  for (const secret of [...secrets, ...ids, chainA, vesselId, yeastId, brewery.id, season.id])
    expect(text).not.toContain(secret);
  expect(headers.get('referrer-policy')).toBe('no-referrer');
  expect(headers.get('x-robots-tag')).toContain('noindex');
  expect(headers.get('cache-control')).toBe('no-store');
  expect(headers.getSetCookie()).toEqual([]);
});

it('lets the visitor come to the verdicts of those who keep the chain', async () => {
  const { link, head, slug, ids } = await shared();
  const chain = (await look(link.token)).body as SharedChain;
  const board = await boardOf(head, slug);
  const theirs = judgeBoard(board).links.get(ids[1] ?? '');
  const { today, houseRules, yeasts, vessels, batches } = chain;
  const view = { today, houseRules, yeasts, vessels, batches, chains: [chain.chain] };
  const ours = judgeBoard({ ...view, season: board.season }).links.get(batches[1]?.id ?? '');
  expect(ours?.verdict).toBe(theirs?.verdict);
  expect(ours?.findings.map(({ rule }) => rule)).toEqual(theirs?.findings.map(({ rule }) => rule));
});

it('tells prices only where that was chosen', async () => {
  const { link } = await shared({ showPrices: true });
  expect((await look(link.token)).body).toMatchObject({
    costPerBatch: 700,
    chain: { start: { kind: 'pack', price: 1400 } },
  });
});

it('of the cake of another chain tells only its generation and what it hands down', async () => {
  const { head, slug, ids, yeastId } = await shared();
  const chain = {
    id: randomUUID(),
    name: 'Branch',
    yeastId,
    vesselId: null,
    start: { kind: 'cake', batchId: ids[1] },
  };
  await good(head.post(api.chains(slug), chain));
  const link = await good<ShareLinkMade>(head.post(api.shareLinks(slug, chain.id), wish()));
  const { body } = await look(link.token);
  expect(body).toMatchObject({
    startsFromCake: true,
    carries: { allergens: ['gluten', 'milk'] },
    chain: { start: { kind: 'outside', generation: 3, allergens: ['gluten', 'milk'] } },
  });
  expect(JSON.stringify(body)).not.toContain('Jetty');
});

it('stores the token’s hash alone; a repeated request gives a new token for the same link', async () => {
  const { head, slug, chainA, link, body } = await shared();
  const { rows } = await server.pool.query('select * from share_link');
  expect(JSON.stringify(rows)).not.toContain(link.token);
  expect(Buffer.from(link.token, 'base64url')).toHaveLength(32);
  const again = await good<ShareLinkMade>(head.post(api.shareLinks(slug, chainA), body));
  expect(again.token).not.toBe(link.token);
  expect((await look(link.token)).status).toBe(404);
  expect(await good<ShareLink[]>(head.get(api.shareLinks(slug, chainA)))).toHaveLength(1);
});

it('is another link where it is asked for otherwise under the same id', async () => {
  const { head, slug, chainA, link, body } = await shared();
  const path = api.shareLinks(slug, chainA);
  for (const change of [{ name: 'Mine' }, { expiresOn: '2027-05-30' }, { showPrices: true }])
    expect(await head.post(path, { ...body, ...change })).toMatchObject({
      status: 409,
      body: { type: '/problems/already-exists' },
    });
  const [listed] = await good<ShareLink[]>(head.get(path));
  const { id: _, ...facts } = body;
  expect(listed).toMatchObject({ ...facts, version: 1 });
  expect((await look(link.token)).status).toBe(200);
});

it('counts those who look, but not the brewery’s own people', async () => {
  const { head, slug, chainA, link, ...season } = await shared();
  const brewer = await joined({ head, slug, ...season }, 'brewer');
  const { visitor: elsewhere } = await newcomer(server.url);
  await look(link.token);
  await look(link.token, elsewhere);
  await look(link.token, head);
  await look(link.token, brewer);
  const [listed] = await good<ShareLink[]>(brewer.get(api.shareLinks(slug, chainA)));
  expect(listed).toMatchObject({ visits: 2 });
  expect(listed?.lastVisitAt).toContain('2027-03-29');
});

it('ends with its last day in the brewery’s time zone, or when it is withdrawn', async () => {
  const { head, slug, link, chainA } = await shared({ expiresOn: '2027-03-30' });
  const other = await good<ShareLinkMade>(head.post(api.shareLinks(slug, chainA), wish()));
  expect((await head.ask('DELETE', api.shareLink(slug, other.id))).status).toBe(204);
  const gone = await look(other.token);
  expect([gone.status, gone.body]).toMatchObject([410, { type: '/problems/link-used' }]);
  expect(gone.headers.get('referrer-policy')).toBe('no-referrer');
  expect((await look(link.token)).status).toBe(200);
  clock.advance(39 * 60 * 60 * 1000);
  expect((await look(link.token)).status).toBe(410);
  clock.advance(-39 * 60 * 60 * 1000);
  expect((await look('no-such-token')).status).toBe(404);
});

it('is renamed and prolonged from the version that was seen', async () => {
  const { head, slug, link } = await shared();
  const patch = { name: 'For Tam', expiresOn: '2027-05-31', showPrices: true };
  const edited = await head.patch(api.shareLink(slug, link.id), patch, 1);
  expect([edited.status, edited.body]).toMatchObject([200, { ...patch, version: 2 }]);
  expect((await head.patch(api.shareLink(slug, link.id), patch, 1)).status).toBe(412);
  const past = await head.patch(api.shareLink(slug, link.id), { expiresOn: '2027-03-28' }, 2);
  expect(past.body).toMatchObject({ errors: [{ pointer: '/expiresOn' }] });
});

it('is not made for a chain of another brewery, nor seen or withdrawn from there', async () => {
  const { link, chainA, slug } = await shared();
  const { visitor, slug: own } = await newcomer(server.url);
  expect((await visitor.post(api.shareLinks(own, chainA), wish())).status).toBe(404);
  expect((await visitor.get(api.shareLinks(own, chainA))).status).toBe(404);
  expect((await visitor.ask('DELETE', api.shareLink(own, link.id))).status).toBe(404);
  expect((await visitor.ask('DELETE', api.shareLink(slug, link.id))).status).toBe(404);
});

it('is copied into another brewery as a plan: yeast, shelf and pencilled batches', async () => {
  const { link } = await shared();
  const { visitor, slug } = await newcomer(server.url);
  const id = randomUUID();
  const made = await visitor.post(api.copies(slug), { id, token: link.token });
  expect([made.status, made.body]).toMatchObject([201, { id, start: { kind: 'pack' } }]);
  const again = await visitor.post(api.copies(slug), { id, token: link.token });
  expect(again.status).toBe(201);
  const board = await boardOf(visitor, slug);
  expect(await namesOn(visitor, slug, id)).toEqual(['Low Tide', 'Jetty']);
  expect(board.batches.map(({ stage, brewOn }) => [stage, brewOn])).toEqual([
    ['pencilled', '2027-03-06'],
    ['pencilled', '2027-03-20'],
  ]);
  expect(board.batches.map(({ notes }) => notes)).toEqual(['', '']);
  expect(board.yeasts).toHaveLength(1);
  const { rows } = await server.pool.query<{ what: string }>(
    'select what from change where $1 = any(touches)',
    [id],
  );
  expect(rows).toEqual([{ what: 'Copied Shelf A from Test brewery' }]);
  await good(visitor.post(api.copies(slug), { id: randomUUID(), token: link.token }));
  expect((await boardOf(visitor, slug)).yeasts).toHaveLength(1);
});

it('carries over what slurry brings along', async () => {
  const { head, slug, ids, yeastId } = await shared();
  const start = { kind: 'cake', batchId: ids[1] };
  const branch = { id: randomUUID(), name: 'Branch', yeastId, vesselId: null, start };
  await good(head.post(api.chains(slug), branch));
  const link = await good<ShareLinkMade>(head.post(api.shareLinks(slug, branch.id), wish()));
  const { visitor, slug: own } = await newcomer(server.url);
  const copy = { id: randomUUID(), token: link.token };
  expect((await visitor.post(api.copies(own), copy)).body).toMatchObject({
    start: { kind: 'outside', generation: 3, allergens: ['gluten', 'milk'] },
  });
});

it('is not copied once it is no longer good, nor by a taster', async () => {
  const { head, slug, link } = await shared();
  const copy = () => ({ id: randomUUID(), token: link.token });
  const other = await testSeason(server.url);
  const taster = await joined(other, 'taster');
  expect((await taster.post(api.copies(other.slug), copy())).status).toBe(403);
  await head.ask('DELETE', api.shareLink(slug, link.id));
  expect((await other.head.post(api.copies(other.slug), copy())).status).toBe(410);
  const unknown = { id: randomUUID(), token: 'x' };
  expect((await other.head.post(api.copies(other.slug), unknown)).status).toBe(404);
});

it('is limited by address', async () => {
  const strict = await startTestServer({
    clock,
    limits: { sharedByAddress: { points: 2, seconds: 60 } },
  });
  const visitor = new Visitor(strict.url);
  const statuses = [];
  for (const _ of [1, 2, 3]) statuses.push((await visitor.get(api.shared('unknown'))).status);
  await strict.close();
  expect(statuses).toEqual([404, 404, 429]);
});
