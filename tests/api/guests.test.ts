import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, expect, it } from 'vitest';
import type { Batch } from '#shared/api/batch.ts';
import type { ChainGuest } from '#shared/api/guest.ts';
import type { Moved } from '#shared/api/move.ts';
import type { RecordPage } from '#shared/api/record.ts';
import { api } from '#shared/api/urls.ts';
import { testClock } from '../support/clock.ts';
import { guestOn, invited } from '../support/guests.ts';
import {
  batchOf,
  boardOf,
  good,
  joined,
  namesOn,
  shelve,
  testSeason,
  wish,
} from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import { newcomer, Visitor } from '../support/visitor.ts';

const clock = testClock('2027-03-01T09:00:00Z');
let server: TestServer;

beforeAll(async () => {
  server = await startTestServer({ clock });
});
afterAll(() => server.close());

/** Shelf A shared with a guest; shelf B and the bench are nobody else's business. */
async function scene(role: 'brewer' | 'taster' = 'brewer') {
  const season = await testSeason(server.url);
  const [low = '', jetty = '', chandler = ''] = await shelve(season, season.chainA, [
    { name: 'Low Tide', brewOn: '2027-03-06' },
    { name: 'Jetty', brewOn: '2027-03-20' },
    { name: 'Chandler', brewOn: '2027-04-03' },
  ]);
  const [hidden = ''] = await shelve(season, season.chainB, [{ name: 'Hidden' }]);
  const [benched = ''] = await shelve(season, null, [{ name: 'Benched' }]);
  const guest = await guestOn(season, season.chainA, role);
  return { ...season, low, jetty, chandler, hidden, benched, guest };
}

const behind = (s: { jetty: string; chandler: string; chainA: string }) =>
  wish({
    batchId: s.jetty,
    toChainId: s.chainA,
    afterBatchId: s.chandler,
    expectedChainId: s.chainA,
  });

it('puts the chain on the guest’s own board, and shows that chain alone', async () => {
  const s = await scene();
  const { visitor, slug, guestId } = s.guest;
  const own = await boardOf(visitor, slug);
  expect(own.guests).toEqual([
    {
      guestId,
      role: 'brewer',
      fromBrewery: 'Test brewery',
      ownerSlug: s.slug,
      seasonId: (await boardOf(s.head, s.slug)).season.id,
      chainId: s.chainA,
      chainName: 'Shelf A',
    },
  ]);
  const board = await boardOf(visitor, s.slug);
  expect(board.chains.map(({ id }) => id)).toEqual([s.chainA]);
  expect(board.batches.map(({ name }) => name)).toEqual(['Low Tide', 'Jetty', 'Chandler']);
  expect([board.members, board.guests, board.unread]).toEqual([[], [], {}]);
  expect(board.chains[0]?.start).toEqual({ kind: 'pack', price: null });
  expect(board.yeasts.map(({ packPrice }) => packPrice)).toEqual([null]);
  const text = JSON.stringify(board);
  for (const secret of ['Hidden', 'Benched', 'Shelf B', s.hidden, s.person.name])
    expect(text).not.toContain(secret);
  expect(board.me.can).toEqual({
    editBatches: true,
    moveBatches: true,
    moveAcross: false,
    setStages: false,
    editChains: false,
    editYeastsAndVessels: false,
    editSeason: false,
    acceptHolds: false,
    invite: false,
  });
});

it('lets a guest brewer move within the chain and undo it; it stays in the record', async () => {
  const s = await scene();
  const { visitor } = s.guest;
  const moved = await good<Moved>(visitor.post(api.moves(s.slug), behind(s)));
  expect(moved.chains).toEqual([]);
  expect(await namesOn(s.head, s.slug, s.chainA)).toEqual(['Low Tide', 'Chandler', 'Jetty']);
  const { rows } = await server.pool.query<{ name: string; what: string }>(
    'select p.name, c.what from change c join person p on p.id = c.person_id where c.id = $1',
    [moved.changeId],
  );
  expect(rows[0]?.what).toBe('Moved Jetty after Chandler');
  expect(rows[0]?.name).not.toBe(s.person.name);
  await good(visitor.post(api.undo(s.slug), { changeId: moved.changeId }));
  expect(await namesOn(s.head, s.slug, s.chainA)).toEqual(['Low Tide', 'Jetty', 'Chandler']);
});

it('lets a guest brewer edit a batch and its link, and nothing beyond', async () => {
  const s = await scene();
  const { visitor } = s.guest;
  const { version } = await batchOf(s.head, s.slug, s.jetty);
  const edited = await good<Batch>(visitor.patch(api.batch(s.slug, s.jetty), { ibu: 31 }, version));
  expect(edited.ibu).toBe(31);
  const linked = await visitor.patch(api.link(s.slug, s.jetty), { starter: true }, edited.version);
  expect(linked.status).toBe(200);
  const stale = await visitor.patch(api.batch(s.slug, s.jetty), { ibu: 9 }, version);
  expect([stale.status, stale.body]).toMatchObject([412, { current: { ibu: 31 } }]);
  const other = await s.head.post(api.vessels(s.slug), {
    ...(await boardOf(s.head, s.slug)).vessels[0],
    id: randomUUID(),
    version: undefined,
    name: 'Unseen',
  });
  const vesselId = (other.body as { id: string }).id;
  const now = (await batchOf(s.head, s.slug, s.jetty)).version;
  expect((await visitor.patch(api.batch(s.slug, s.jetty), { vesselId }, now)).status).toBe(422);
});

it('answers 404 for whatever is not on the chain, and for moves that leave it', async () => {
  const s = await scene();
  const { visitor } = s.guest;
  const { slug } = s;
  const jetty = { batchId: s.jetty, expectedChainId: s.chainA };
  const asked = [
    visitor.patch(api.batch(slug, s.hidden), { ibu: 1 }, 1),
    visitor.patch(api.batch(slug, s.benched), { ibu: 1 }, 1),
    visitor.patch(api.link(slug, s.hidden), { starter: true }, 1),
    visitor.post(api.moves(slug), wish(jetty)),
    visitor.post(api.moves(slug), wish({ ...jetty, toChainId: s.chainB })),
    visitor.post(
      api.moves(slug),
      wish({ batchId: s.benched, toChainId: s.chainA, afterBatchId: s.low }),
    ),
    visitor.post(api.batchStage(slug, s.low), { stage: 'pencilled' }, 1),
    visitor.ask('PUT', api.acceptance(slug, s.jetty), { body: { reason: 'Fine' }, version: 1 }),
    visitor.ask('DELETE', api.batch(slug, s.jetty), { version: 1 }),
    visitor.patch(api.chain(slug, s.chainA), { name: 'Mine' }, 1),
    visitor.get(api.members(slug)),
    visitor.get(api.brewery(slug)),
    visitor.get(api.shareLinks(slug, s.chainA)),
    visitor.get(api.guests(slug, s.chainA)),
  ];
  const statuses = (await Promise.all(asked)).map(({ status }) => status);
  expect(statuses).toEqual(statuses.map(() => 404));
  expect(await namesOn(s.head, slug, s.chainA)).toEqual(['Low Tide', 'Jetty', 'Chandler']);
});

it('lets a guest taster look and change nothing', async () => {
  const s = await scene('taster');
  const { visitor } = s.guest;
  expect((await boardOf(visitor, s.slug)).batches).toHaveLength(3);
  expect((await visitor.post(api.moves(s.slug), behind(s))).status).toBe(403);
  expect((await visitor.patch(api.batch(s.slug, s.jetty), { ibu: 1 }, 1)).status).toBe(403);
});

it('asks the role on each chain, where somebody is a guest of two', async () => {
  const s = await scene('taster');
  const { visitor, slug: own } = s.guest;
  const second = await invited(s, s.chainB, 'brewer');
  await good(visitor.post(api.guestInvitation(second.token), { brewerySlug: own }));
  const version = async (id: string) => (await batchOf(s.head, s.slug, id)).version;
  const edit = async (id: string) =>
    (await visitor.patch(api.batch(s.slug, id), { ibu: 12 }, await version(id))).status;
  expect([await edit(s.hidden), await edit(s.jetty)]).toEqual([200, 403]);
});

it('pulls no date of another shelf along, and takes acceptances away that hang on it', async () => {
  const s = await scene();
  const { head, slug } = s;
  const { version } = await batchOf(head, slug, s.jetty);
  await good(head.patch(api.batch(slug, s.jetty), { og: 1.095, fg: 1.024 }, version));
  const start = { kind: 'cake', batchId: s.jetty };
  const branch = { id: randomUUID(), name: 'Branch', yeastId: s.yeastId, vesselId: null, start };
  await good(head.post(api.chains(slug), branch));
  const [far = ''] = await shelve(s, branch.id, [{ name: 'Far', brewOn: '2027-04-05' }]);
  const before = await batchOf(head, slug, far);
  const accept = { body: { reason: 'We like it so' }, version: before.version };
  await good(head.ask('PUT', api.acceptance(slug, far), accept));
  const moved = await good<Moved>(s.guest.visitor.post(api.moves(slug), behind(s)));
  expect(moved.batches.map(({ id }) => id)).not.toContain(far);
  expect(moved.cleared).not.toContain(far);
  const after = await batchOf(head, slug, far);
  expect([after.brewOn, after.link.acceptance]).toEqual([before.brewOn, null]);
  const back = { ...behind(s), afterBatchId: s.low };
  await good(head.post(api.moves(slug), back));
  await good(head.post(api.moves(slug), behind(s)));
  expect((await batchOf(head, slug, far)).brewOn).not.toBe(before.brewOn);
});

it('ends when the head brewer withdraws it; what was done stays', async () => {
  const s = await scene();
  const { visitor, slug: own, guestId } = s.guest;
  await good(visitor.post(api.moves(s.slug), behind(s)));
  expect((await s.head.ask('DELETE', api.guest(s.slug, guestId))).status).toBe(204);
  expect((await visitor.get(api.board(s.slug))).status).toBe(404);
  expect((await visitor.patch(api.batch(s.slug, s.jetty), { ibu: 1 }, 1)).status).toBe(404);
  expect((await boardOf(visitor, own)).guests).toEqual([]);
  expect(await namesOn(s.head, s.slug, s.chainA)).toEqual(['Low Tide', 'Chandler', 'Jetty']);
  const [listed] = await good<ChainGuest[]>(s.head.get(api.guests(s.slug, s.chainA)));
  expect(listed).toMatchObject({ fromBrewery: 'Estuary Ales', role: 'brewer' });
  expect(listed?.withdrawnAt).not.toBeNull();
});

it('is accepted once, within seven days, by somebody who is not of the brewery', async () => {
  const s = await scene();
  const { token } = await invited(s, s.chainB);
  const preview = await new Visitor(server.url).get(api.guestInvitation(token));
  expect(preview.body).toMatchObject({ chainName: 'Shelf B', role: 'brewer' });
  expect(preview.headers.get('referrer-policy')).toBe('no-referrer');
  const accept = (visitor: Visitor, brewerySlug: string, which = token) =>
    visitor.post(api.guestInvitation(which), { brewerySlug });
  expect((await accept(new Visitor(server.url), s.slug)).status).toBe(401);
  expect((await accept(s.head, s.slug)).status).toBe(409);
  const [one, two] = [await newcomer(server.url), await newcomer(server.url)];
  expect((await accept(one.visitor, two.slug)).status).toBe(422);
  const both = await Promise.all([accept(one.visitor, one.slug), accept(two.visitor, two.slug)]);
  expect(both.map(({ status }) => status).toSorted()).toEqual([201, 410]);
  const late = await invited(s, s.chainB);
  clock.advance(7 * 24 * 60 * 60 * 1000);
  expect((await accept(two.visitor, two.slug, late.token)).status).toBe(410);
  clock.advance(-7 * 24 * 60 * 60 * 1000);
});

it('stores the invitation’s hash alone', async () => {
  const s = await scene();
  const { token } = await invited(s, s.chainA);
  const { rows } = await server.pool.query('select * from chain_guest');
  expect(JSON.stringify(rows)).not.toContain(token);
});

it('leaves no door open through an undo, once somebody is only a guest', async () => {
  const s = await scene();
  const { visitor, slug: own, guestId } = s.guest;
  const moved = await good<Moved>(visitor.post(api.moves(s.slug), behind(s)));
  await good(s.head.ask('DELETE', api.guest(s.slug, guestId)));
  const second = await invited(s, s.chainB);
  await good(visitor.post(api.guestInvitation(second.token), { brewerySlug: own }));
  const undone = await visitor.post(api.undo(s.slug), { changeId: moved.changeId });
  expect([undone.status, undone.body]).toMatchObject([409, { type: '/problems/not-undoable' }]);
  expect(await namesOn(s.head, s.slug, s.chainA)).toEqual(['Low Tide', 'Chandler', 'Jetty']);
});

it('does not outlast the guest’s own brewery: who left it is no guest', async () => {
  const s = await scene();
  const { visitor: owner, slug: own } = await newcomer(server.url);
  const brewer = await joined({ head: owner, slug: own }, 'brewer');
  const { token } = await invited(s, s.chainA);
  await good(brewer.post(api.guestInvitation(token), { brewerySlug: own }));
  expect((await boardOf(owner, own)).guests).toEqual([]);
  expect((await brewer.get(api.board(s.slug))).status).toBe(200);
  await good(brewer.ask('DELETE', api.membership(own), { version: 1 }));
  expect((await brewer.get(api.board(s.slug))).status).toBe(404);
  const listed = await good<ChainGuest[]>(s.head.get(api.guests(s.slug, s.chainA)));
  expect(listed.find(({ name }) => name === 'The brewer')?.withdrawnAt).toEqual(expect.any(String));
  const { season } = await boardOf(s.head, s.slug);
  const { changes } = await good<RecordPage>(s.head.get(api.changes(s.slug, season.id)));
  expect(changes[0]).toMatchObject({
    what: 'Left Shelf A, as its guest',
    person: { name: 'The brewer' },
  });
});

it('begins anew for who left the brewery with the shelf, and has another one', async () => {
  const s = await scene();
  const { visitor: owner, slug: own } = await newcomer(server.url);
  const brewer = await joined({ head: owner, slug: own }, 'brewer');
  const first = await invited(s, s.chainA);
  await good(brewer.post(api.guestInvitation(first.token), { brewerySlug: own }));
  await good(brewer.ask('DELETE', api.membership(own), { version: 1 }));
  const { brewerySlug } = await good<{ brewerySlug: string }>(
    brewer.post(api.breweries, { id: randomUUID(), name: 'Sandbar' }),
  );
  const second = await invited(s, s.chainA);
  const accepted = brewer.post(api.guestInvitation(second.token), { brewerySlug });
  expect((await accepted).status).toBe(201);
  expect((await boardOf(brewer, brewerySlug)).guests).toMatchObject([{ chainId: s.chainA }]);
  expect((await brewer.get(api.board(s.slug))).status).toBe(200);
});

it('tells a guest whose undo is refused nothing of what they do not see', async () => {
  const s = await scene();
  const { visitor } = s.guest;
  const moved = await good<Moved>(visitor.post(api.moves(s.slug), behind(s)));
  const { version } = await batchOf(s.head, s.slug, s.chandler);
  await good(s.head.patch(api.batch(s.slug, s.chandler), { og: 1.095, fg: 1.024 }, version));
  const accept = {
    body: { reason: 'Our own business' },
    version: (await batchOf(s.head, s.slug, s.jetty)).version,
  };
  await good(s.head.ask('PUT', api.acceptance(s.slug, s.jetty), accept));
  const refused = await visitor.post(api.undo(s.slug), { changeId: moved.changeId });
  expect(refused).toMatchObject({
    status: 409,
    body: {
      type: '/problems/not-undoable',
      detail: 'Something that it hangs on was changed since',
    },
  });
  expect(refused.body).not.toHaveProperty('current');
});
