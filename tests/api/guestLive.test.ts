import { randomUUID } from 'node:crypto';
import { afterAll, afterEach, beforeAll, expect, it } from 'vitest';
import { LIVE_EVENTS } from '#shared/api/live.ts';
import type { Person } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { aVessel } from '../support/bodies.ts';
import { guestOn, type TestGuest } from '../support/guests.ts';
import { batchOf, boardOf, good, joined, moveTo, shelve, testSeason } from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import type { Visitor } from '../support/visitor.ts';
import { Watching } from '../support/watching.ts';

let server: TestServer;
const open: Watching[] = [];

beforeAll(async () => {
  server = await startTestServer({ settings: { HEARTBEAT_SECONDS: '0.3' } });
});
afterEach(() => {
  for (const each of open.splice(0)) each.close();
});
afterAll(() => server.close());

async function watch(visitor: Visitor, slug: string): Promise<Watching> {
  const { season } = await boardOf(visitor, slug);
  const watching = await Watching.open(visitor, slug, season.id);
  open.push(watching);
  await watching.heard('hello');
  return watching;
}

/** Shelf A is shared with a guest; shelf B, its yeast and the bench are nobody else's business. */
async function scene() {
  const season = await testSeason(server.url);
  const [shared = ''] = await shelve(season, season.chainA, [{ name: 'Jetty' }]);
  const [hidden = ''] = await shelve(season, season.chainB, [{ name: 'Hidden' }]);
  const [benched = ''] = await shelve(season, null, [{ name: 'Benched' }]);
  const guest = await guestOn(season, season.chainA);
  return { ...season, shared, hidden, benched, guest };
}

/** The guest's own stream, after what everybody is told who comes with a chain on their board. */
async function watchAsGuest({ visitor, slug }: TestGuest): Promise<Watching> {
  const watching = await watch(visitor, slug);
  await watching.heard('revision');
  await watching.heard('elsewhere');
  watching.told.length = 0;
  return watching;
}

/** Beside who is here on the guest's own board. */
const told = (guest: Watching) =>
  guest.told.map(({ name }) => name).filter((name) => name !== 'here');

const edit = async (visitor: Visitor, slug: string, id: string, patch: object, as = visitor) =>
  good(as.patch(api.batch(slug, id), patch, (await batchOf(visitor, slug, id)).version));

it('tells a guest at once that something of their chain changed, and not what', async () => {
  const s = await scene();
  const guest = await watchAsGuest(s.guest);
  await edit(s.head, s.slug, s.shared, { ibu: 31 });
  expect(await guest.heard('elsewhere', undefined, 1_000)).toEqual({});
  expect(told(guest)).toEqual(['elsewhere']);
});

it('tells of nothing else of the brewery', async () => {
  const s = await scene();
  const guest = await watchAsGuest(s.guest);
  await edit(s.head, s.slug, s.hidden, { ibu: 31 });
  await edit(s.head, s.slug, s.benched, { og: 1.06 });
  await moveTo(s.head, s.slug, {
    batchId: s.benched,
    toChainId: s.chainB,
    afterBatchId: s.hidden,
    expectedChainId: null,
  });
  await good(s.head.post(api.vessels(s.slug), aVessel({ name: 'Unseen' })));
  const about = { kind: 'chain' };
  const words = { id: randomUUID(), about, text: 'Between us' };
  await good(s.head.post(api.comments(s.slug, s.chainA), words));
  const partner = await joined(s, 'brewer');
  const here = await watch(partner, s.slug);
  await here.heard('here');
  await guest.quiet();
  expect(told(guest)).toEqual([]);
  await edit(s.head, s.slug, s.shared, { ibu: 33 });
  await guest.heard('elsewhere', undefined, 1_000);
  expect(told(guest)).toEqual(['elsewhere']);
  const text = JSON.stringify(guest.told);
  const { season } = await boardOf(s.head, s.slug);
  const ids = await Promise.all(
    [s.head, partner].map((each) => good<Person>(each.get(api.session))),
  );
  for (const secret of [...ids.map(({ id }) => id), season.id, s.hidden, s.shared, s.chainA])
    expect(text).not.toContain(secret);
  expect(Object.keys(LIVE_EVENTS.elsewhere.shape)).toEqual([]);
});

it('does not open the season’s own stream to a guest', async () => {
  const s = await scene();
  const { season } = await boardOf(s.head, s.slug);
  const address = api.seasonEvents(s.slug, season.id);
  expect((await s.guest.visitor.get(address)).status).toBe(404);
});

it('tells the guest alone, not those of their brewery', async () => {
  const s = await scene();
  const colleague = await joined({ head: s.guest.visitor, slug: s.guest.slug }, 'brewer');
  const theirs = await watch(colleague, s.guest.slug);
  const guest = await watchAsGuest(s.guest);
  await edit(s.head, s.slug, s.shared, { ibu: 35 });
  await guest.heard('elsewhere', undefined, 1_000);
  await theirs.quiet();
  expect(theirs.all('elsewhere')).toEqual([]);
});

it('tells of what the chain’s verdicts rest on: its vessel', async () => {
  const s = await scene();
  const guest = await watchAsGuest(s.guest);
  const { vessels } = await boardOf(s.head, s.slug);
  await good(
    s.head.patch(api.vessel(s.slug, s.vesselId), { capacityL: 60 }, vessels[0]?.version ?? 1),
  );
  await guest.heard('elsewhere', undefined, 1_000);
  expect(told(guest)).toEqual(['elsewhere']);
});

it('ends with the guest’s access, and begins with a new one', async () => {
  const s = await scene();
  const guest = await watchAsGuest(s.guest);
  expect((await s.guest.visitor.ask('DELETE', api.guestShelf(s.guest.guestId))).status).toBe(204);
  await guest.heard('revision');
  expect((await boardOf(s.guest.visitor, s.guest.slug)).guests).toEqual([]);
  expect((await s.guest.visitor.get(api.board(s.slug))).status).toBe(404);
  expect((await s.guest.visitor.ask('DELETE', api.guestShelf(s.guest.guestId))).status).toBe(404);
  guest.told.length = 0;
  await edit(s.head, s.slug, s.shared, { ibu: 36 });
  const own = await testSeason(server.url);
  await guestOn(own, own.chainA);
  await guest.quiet();
  expect(guest.all('elsewhere')).toEqual([]);
});

it('lets nobody leave a chain for another', async () => {
  const s = await scene();
  const other = await guestOn(s, s.chainA);
  expect((await s.head.ask('DELETE', api.guestShelf(s.guest.guestId))).status).toBe(404);
  expect((await other.visitor.ask('DELETE', api.guestShelf(s.guest.guestId))).status).toBe(404);
  expect((await boardOf(s.guest.visitor, s.guest.slug)).guests).toHaveLength(1);
});
