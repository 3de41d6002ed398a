import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { api } from '#shared/api/urls.ts';
import { aChain } from '../support/bodies.ts';
import { testClock } from '../support/clock.ts';
import { guestOn } from '../support/guests.ts';
import { hand, opened, racked, runIn, type TestPour } from '../support/pours.ts';
import {
  batchOf,
  boardOf,
  good,
  joined,
  moveTo,
  namesOn,
  shelve,
  testSeason,
  wish,
  type TestSeason,
} from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import type { Visitor } from '../support/visitor.ts';

const clock = testClock('2027-04-03T13:00:00Z');
let server: TestServer;
let season: TestSeason;
let brewer: Visitor;
let pour: TestPour;

beforeAll(async () => {
  server = await startTestServer({ clock });
});
afterAll(() => server.close());
beforeEach(async () => {
  season = await testSeason(server.url);
  brewer = await joined(season, 'brewer');
  pour = { ...(await racked(season, clock)), runId: '' };
});

const head = () => season.head;
const slug = () => season.slug;
const of = async (name: string) => {
  const found = (await boardOf(head(), slug())).batches.find((each) => each.name === name);
  if (!found) throw new Error(`No ${name}`);
  return found;
};
const move = (change: Parameters<typeof wish>[0]) => head().post(api.moves(slug()), wish(change));
const stage = async (id: string, body: object) =>
  head().post(api.batchStage(slug(), id), body, (await batchOf(head(), slug(), id)).version);
const remove = async (id: string) =>
  head().ask('DELETE', api.batch(slug(), id), {
    version: (await batchOf(head(), slug(), id)).version,
  });
const chainOf = async (id: string) => {
  const found = (await boardOf(head(), slug())).chains.find((each) => each.id === id);
  if (!found) throw new Error('No such shelf');
  return found;
};
const open = async (batchId = pour.batchId) => opened(brewer, { ...pour, batchId });

/** Refused, since somebody has this pour in hand. */
const held = (name = 'Breakwater') => ({
  status: 409,
  body: {
    type: '/problems/in-use',
    detail: `The brewer has the pour of ${name} in hand: let it be finished or left first`,
  },
});

describe('while a pour is in hand', () => {
  it('nothing is moved in between the cake and its wort', async () => {
    const mine = await open();
    const { id } = await of('Groyne');
    const between = {
      batchId: id,
      toChainId: season.chainA,
      afterBatchId: pour.cakeBatchId,
      expectedChainId: season.chainA,
    };
    expect(await move(between)).toMatchObject(held());
    await good(hand(brewer, mine, clock).leave());
    expect((await move(between)).status).toBe(200);
  });

  it('its batch stays on its shelf, where the pour is recorded', async () => {
    const mine = await open();
    const { batchId } = pour;
    expect(await move({ batchId, expectedChainId: season.chainA })).toMatchObject(held());
    expect(
      await move({ batchId, toChainId: season.chainB, expectedChainId: season.chainA }),
    ).toMatchObject(held());
    const newChain = aChain(season.yeastId, { name: 'Shelf C' });
    expect(
      await move({ batchId, toChainId: 'new', expectedChainId: season.chainA, newChain }),
    ).toMatchObject(held());
    expect((await boardOf(head(), slug())).chains.map(({ name }) => name)).not.toContain('Shelf C');
    await good(hand(brewer, mine, clock).read(21));
    await good(hand(brewer, mine, clock).pour());
    expect((await of('Jetty Pale')).cake?.state).toBe('poured');
  });

  it('what comes behind it is moved as ever', async () => {
    await open();
    const { id } = await of('Groyne');
    expect((await move({ batchId: id, expectedChainId: season.chainA })).status).toBe(200);
    expect(await namesOn(head(), slug(), season.chainA)).toEqual(['Jetty Pale', 'Breakwater']);
  });

  it('its batch is neither deleted nor scrapped, and the cake’s is brewed still', async () => {
    await open();
    expect(await remove(pour.batchId)).toMatchObject(held());
    expect(await stage(pour.batchId, { stage: 'scrapped', reason: 'Spilled' })).toMatchObject(
      held(),
    );
    expect(await stage(pour.cakeBatchId, { stage: 'pencilled' })).toMatchObject(held());
    expect(await stage(pour.cakeBatchId, { stage: 'scrapped', reason: 'Sour' })).toMatchObject(
      held(),
    );
    expect(await of('Breakwater')).toMatchObject({ stage: 'pencilled', chainId: season.chainA });
  });

  it('its shelf is not deleted, and starts where it started', async () => {
    const [first = ''] = await shelve(season, season.chainB, [{ name: 'Mole' }]);
    await open(first);
    const { version } = await chainOf(season.chainB);
    const path = api.chain(slug(), season.chainB);
    expect(await head().ask('DELETE', path, { version })).toMatchObject(held('Mole'));
    const start = { kind: 'cake', batchId: pour.cakeBatchId };
    expect(await head().patch(path, { start }, version)).toMatchObject(held('Mole'));
    expect((await head().patch(path, { name: 'Shelf of the mole' }, version)).status).toBe(200);
    const { id } = await of('Groyne');
    const ahead = { batchId: id, toChainId: season.chainB, expectedChainId: season.chainA };
    expect(await move(ahead)).toMatchObject(held('Mole'));
  });

  it('a guest of its chain hears that somebody has it, and not who', async () => {
    const guest = await guestOn(season, season.chainA);
    await open();
    const { id } = await of('Groyne');
    const change = { batchId: id, toChainId: season.chainA, expectedChainId: season.chainA };
    const between = wish({ ...change, afterBatchId: pour.cakeBatchId });
    expect(await guest.visitor.post(api.moves(slug()), between)).toMatchObject({
      status: 409,
      body: {
        detail: 'Somebody has the pour of Breakwater in hand: let it be finished or left first',
      },
    });
  });

  it('no undo takes its batch away', async () => {
    const { id } = await of('Groyne');
    const moved = await moveTo(head(), slug(), {
      batchId: id,
      toChainId: season.chainB,
      expectedChainId: season.chainA,
    });
    await open(id);
    expect(await head().post(api.undo(slug()), { changeId: moved.changeId })).toMatchObject(
      held('Groyne'),
    );
  });

  it('no undo of an edit takes its cake away', async () => {
    const [first = ''] = await shelve(season, season.chainB, [{ name: 'Mole' }]);
    const { version } = await chainOf(season.chainB);
    const start = { kind: 'cake', batchId: pour.cakeBatchId };
    await good(head().patch(api.chain(slug(), season.chainB), { start }, version));
    const { undo } = await boardOf(head(), slug());
    await open(first);
    expect(await head().post(api.undo(slug()), { changeId: undo?.id })).toMatchObject(held('Mole'));
  });
});

describe('a pour is opened', () => {
  it('not onto the cake of a batch that is not brewed yet', async () => {
    const { id } = await of('Groyne');
    const reply = await brewer.post(api.pour(slug(), id), { id: randomUUID() });
    expect([reply.status, reply.body]).toMatchObject([
      409,
      {
        type: '/problems/pour-over',
        detail: 'Breakwater comes before it and is not brewed yet: say first when it was brewed',
      },
    ]);
  });

  it('and keeps what was read by hand before it was told', async () => {
    const mine = await open();
    const brewed = { stage: 'fermenting', brewedOn: '2027-04-02', volumeL: 21, og: 1.051 };
    await good(stage(pour.batchId, brewed));
    await good(hand(brewer, mine, clock).pour({ volumeL: null, og: null }));
    expect(await of('Breakwater')).toMatchObject({
      stage: 'fermenting',
      brewOn: '2027-04-03',
      read: { volumeL: 21, og: 1.051 },
    });
  });
});

describe('a pour that was recorded', () => {
  const poured = async () => {
    const mine = await open();
    await good(hand(brewer, mine, clock).read(21));
    return good(hand(brewer, mine, clock).pour()).then(runIn);
  };
  const ON_RECORD = {
    detail:
      'The pour of Breakwater is on the record and stays there: correct what was read, or scrap the batch',
  };

  it('is not undone: what was done before it is what can be', async () => {
    const { id } = await of('Groyne');
    await moveTo(brewer, slug(), { batchId: id, expectedChainId: season.chainA });
    await poured();
    expect((await boardOf(brewer, slug())).undo?.what).toBe('Put Groyne on the bench');
    const { rows } = await server.pool.query<{ id: string }>(
      "select id from change where what like 'Poured Breakwater%' and $1 = any(touches)",
      [pour.batchId],
    );
    const reply = await brewer.post(api.undo(slug()), { changeId: rows[0]?.id });
    expect([reply.status, reply.body]).toMatchObject([409, { type: '/problems/not-undoable' }]);
    expect((await of('Breakwater')).stage).toBe('fermenting');
  });

  it('keeps its batch from being pencilled, by hand and by an undo', async () => {
    const mine = await open();
    const brewed = { stage: 'fermenting', brewedOn: '2027-04-02', volumeL: 21, og: 1.051 };
    await good(stage(pour.batchId, brewed));
    const { undo } = await boardOf(head(), slug());
    // The same day, volume and gravity: the undo finds its own values still there.
    const deviceAt = '2027-04-02T18:00:00.000Z';
    await good(hand(brewer, mine, clock).pour({ deviceAt, volumeL: 21, og: 1.051 }));
    const back = await head().post(api.undo(slug()), { changeId: undo?.id });
    expect([back.status, back.body]).toMatchObject([
      409,
      { type: '/problems/not-undoable', ...ON_RECORD },
    ]);
    const reply = await stage(pour.batchId, { stage: 'pencilled' });
    expect([reply.status, reply.body]).toMatchObject([
      409,
      { type: '/problems/in-use', ...ON_RECORD },
    ]);
    expect(await of('Breakwater')).toMatchObject({ stage: 'fermenting', brewOn: '2027-04-02' });
  });

  it('does not go with its batch, nor with the one whose cake it went on', async () => {
    const { pour: record } = await poured();
    for (const id of [pour.batchId, pour.cakeBatchId]) {
      await good(stage(id, { stage: 'scrapped', reason: 'Sour' }));
      expect(await remove(id)).toMatchObject({
        status: 409,
        body: { type: '/problems/in-use', ...ON_RECORD },
      });
    }
    expect((await hand(brewer, pour, clock).state()).pour?.id).toBe(record?.id);
  });
});
