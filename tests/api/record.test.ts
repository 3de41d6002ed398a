import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { recordPage, type RecordPage } from '#shared/api/record.ts';
import { api } from '#shared/api/urls.ts';
import { aBatch } from '../support/bodies.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import { testClock } from '../support/clock.ts';
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
import type { Visitor } from '../support/visitor.ts';

let server: TestServer;
let season: TestSeason;
let seasonId = '';
let a = '';
let b = '';

beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());
beforeEach(async () => {
  season = await testSeason(server.url);
  seasonId = (await boardOf(season.head, season.slug)).season.id;
  [a = '', b = ''] = await shelve(season, season.chainA, [
    { name: 'Avocet', brewOn: '2027-03-06' },
    { name: 'Bittern', ibu: 24 },
  ]);
});

const read = async (query = '', who: Visitor = season.head): Promise<RecordPage> =>
  recordPage.parse(await good(who.get(`${api.changes(season.slug, seasonId)}${query}`)));
const said = async (query = '') => (await read(query)).changes.map(({ what }) => what);
const edit = async (id: string, body: object, who = season.head) =>
  good(who.patch(api.batch(season.slug, id), body, (await batchOf(who, season.slug, id)).version));

it('tells all that happened, newest first, with who and on which day', async () => {
  expect(await said()).toEqual([
    'Moved Bittern after Avocet',
    'Added Bittern',
    'Moved Avocet to the start of Shelf A',
    'Added Avocet',
    'Added the shelf Shelf B',
    'Added the shelf Shelf A',
    'Added the vessel Bucket',
    'Added the yeast Harbour ale',
  ]);
  const [newest] = (await read()).changes;
  expect(newest).toMatchObject({
    kind: 'move',
    person: { id: season.person.id, name: season.person.name },
    undone: false,
  });
  expect(newest?.touches[0]).toBe(b);
});

it('says of a move what the link then said, and why', async () => {
  await edit(a, { og: 1.095, fg: 1.02 });
  await moveTo(season.head, season.slug, { batchId: b, expectedChainId: season.chainA });
  await moveTo(season.head, season.slug, {
    batchId: b,
    toChainId: season.chainA,
    afterBatchId: a,
  });
  const [onto, off, changed] = (await read()).changes;
  // An earlier beer of 1.095 is above the hold of a tired cake.
  expect(onto?.links).toMatchObject([
    { batchId: b, name: 'Bittern', from: null, to: { verdict: 'hold' } },
  ]);
  expect(onto?.links[0]?.to?.reason).toEqual(expect.any(String));
  expect(off?.links).toMatchObject([{ batchId: b, from: { verdict: 'hold' }, to: null }]);
  expect(changed?.links).toMatchObject([
    { batchId: b, from: { verdict: 'pour' }, to: { verdict: 'hold' } },
  ]);
});

it('keeps each fact of an edit, from and to', async () => {
  await edit(b, { ibu: 28, srm: 6, notes: 'For the fair' });
  const [newest] = (await read()).changes;
  expect(newest).toMatchObject({
    what: 'Changed Bittern: colour from 4 to 6 SRM, bitterness from 24 to 28 IBU and 1 more',
    facts: [
      { label: 'colour', from: '4 SRM', to: '6 SRM' },
      { label: 'bitterness', from: '24 IBU', to: '28 IBU' },
      { label: 'notes', from: null, to: '“For the fair”' },
    ],
  });
});

it('marks what was undone, and tells the undo too', async () => {
  await edit(b, { ibu: 28 });
  const changeId = (await boardOf(season.head, season.slug)).undo?.id;
  await good(season.head.post(api.undo(season.slug), { changeId }));
  const [undo, change] = (await read()).changes;
  expect([undo?.kind, undo?.what]).toEqual([
    'undo',
    'Undone: Set the bitterness of Bittern from 24 to 28 IBU',
  ]);
  expect(change?.undone).toBe(true);
});

describe('a filter', () => {
  it('by person shows that person’s changes alone', async () => {
    const partner = await joined(season, 'brewer');
    await edit(b, { ibu: 30 }, partner);
    const { personId } = (await boardOf(partner, season.slug)).me;
    expect(await said(`?person=${personId}`)).toEqual([
      'Set the bitterness of Bittern from 24 to 30 IBU',
    ]);
  });

  it('by batch and by chain shows what touches them', async () => {
    expect(await said(`?batch=${a}`)).toEqual([
      'Moved Avocet to the start of Shelf A',
      'Added Avocet',
    ]);
    await edit(b, { ibu: 30 });
    expect(await said(`?chain=${season.chainA}`)).toEqual([
      'Set the bitterness of Bittern from 24 to 30 IBU',
      'Moved Bittern after Avocet',
      'Moved Avocet to the start of Shelf A',
      'Added the shelf Shelf A',
    ]);
    expect(await said(`?chain=${season.chainB}`)).toEqual(['Added the shelf Shelf B']);
  });

  it('that is no filter is refused at its name', async () => {
    const path = api.changes(season.slug, seasonId);
    for (const [query, pointer] of [
      ['?person=nobody', '/person'],
      ['?from=2027-02-30', '/from'],
      ['?before=-1', '/before'],
      [`?batch=${a}&batch=${b}`, '/batch'],
    ]) {
      const { status, body } = await season.head.get(path + query);
      expect([status, body]).toMatchObject([422, { errors: [{ pointer }] }]);
    }
  });
});

it('by day counts days in the brewery’s time zone, both included', async () => {
  const clock = testClock('2027-03-05T23:30:00Z');
  const dated = await startTestServer({ clock });
  try {
    const own = await testSeason(dated.url);
    const board = await boardOf(own.head, own.slug);
    // Half past ten on the 6th in Auckland, while London still has the 5th.
    const { version } = board.brewery;
    await good(own.head.patch(api.brewery(own.slug), { timeZone: 'Pacific/Auckland' }, version));
    const path = api.changes(own.slug, board.season.id);
    const all = recordPage.parse(await good(own.head.get(path)));
    expect(new Set(all.changes.map(({ day }) => day))).toEqual(new Set(['2027-03-06']));
    const on = async (query: string) =>
      recordPage.parse(await good(own.head.get(path + query))).changes.length;
    expect(await on('?from=2027-03-06&to=2027-03-06')).toBe(all.changes.length);
    expect(await on('?to=2027-03-05')).toBe(0);
    expect(await on('?from=2027-03-07')).toBe(0);
  } finally {
    await dated.close();
  }
});

it('comes a page at a time, none missed and none twice, whatever happens meanwhile', async () => {
  for (let nr = 0; nr < 60; nr += 1)
    await good(season.head.post(api.batches(season.slug), aBatch({ name: `Batch ${nr}` })));
  const first = await read();
  expect(first.changes).toHaveLength(50);
  await edit(b, { ibu: 30 });
  const second = await read(`?before=${first.next ?? ''}`);
  expect(second.next).toBeNull();
  const ids = [...first.changes, ...second.changes].map(({ id }) => id);
  expect(new Set(ids).size).toBe(68);
  expect(ids).toHaveLength(68);
});

it('of a season of another brewery does not exist', async () => {
  const other = await testSeason(server.url);
  const { status } = await other.head.get(api.changes(other.slug, seasonId));
  expect(status).toBe(404);
});

it('pulls the dates of a chain along as one change, with one undo', async () => {
  const { head, slug, chainA } = season;
  const c = aBatch({ name: 'Curlew' });
  await good(head.post(api.batches(slug), c));
  await moveTo(head, slug, { batchId: c.id, toChainId: chainA, afterBatchId: b, dates: 'keep' });
  await edit(b, { brewOn: '2027-04-17' });
  const days = async () =>
    (await boardOf(head, slug)).batches
      .filter(({ chainId }) => chainId === chainA)
      .sort((x, y) => x.place - y.place)
      .map(({ brewOn }) => brewOn);
  const before = await days();
  await good(head.post(api.pullDates(slug, chainA), undefined));
  expect(await days()).toEqual(['2027-03-06', '2027-03-20', '2027-04-03']);
  const { undo } = await boardOf(head, slug);
  expect(undo?.what).toBe('Pulled 2 dates on Shelf A along');
  await good(head.post(api.undo(slug), { changeId: undo?.id }));
  expect(await days()).toEqual(before);
});

it('tells that something was said and about what, and keeps the words out', async () => {
  const { head, slug, chainA } = season;
  const talk = (kind: 'chain' | 'link' | 'batch', batchId?: string) => ({
    id: randomUUID(),
    about: kind === 'chain' ? { kind } : { kind, batchId },
    text: 'Between us',
  });
  const chain = talk('chain');
  await good(head.post(api.comments(slug, chainA), chain));
  await good(head.post(api.comments(slug, chainA), chain));
  await good(head.post(api.comments(slug, chainA), talk('link', b)));
  const about = talk('batch', a);
  await good(head.post(api.comments(slug, chainA), about));
  const single = api.comment(slug, chainA, about.id);
  await good(head.patch(single, { text: 'Better so' }, 1));
  await good(head.ask('DELETE', single, { version: 2 }));
  await good(head.patch(single, { removed: false }, 3));
  expect((await said()).slice(0, 6)).toEqual([
    'Put a removed comment about Avocet back',
    'Removed a comment about Avocet',
    'Changed a comment about Avocet',
    'Said something about Avocet',
    'Said something about the link to Bittern',
    'Said something about the shelf Shelf A',
  ]);
  expect(JSON.stringify(await read())).not.toMatch(/Between us|Better so/);
  const rows = await server.pool.query('select before, after from change');
  expect(JSON.stringify(rows.rows)).not.toMatch(/Between us|Better so/);
});

it('does not offer to undo what was said', async () => {
  const { head, slug, chainA } = season;
  const before = (await boardOf(head, slug)).undo;
  const body = { id: randomUUID(), about: { kind: 'chain' }, text: 'Hello' };
  await good(head.post(api.comments(slug, chainA), body));
  expect((await boardOf(head, slug)).undo).toEqual(before);
});

it('tells what changed of the brewery, and takes it back', async () => {
  const { head, slug } = season;
  const { version } = (await boardOf(head, slug)).brewery;
  const units = { system: 'us', gravity: 'plato', colour: 'srm', temperature: 'c' };
  await good(head.patch(api.brewery(slug), { currency: 'SEK', units }, version));
  await good(head.patch(api.brewery(slug), { name: 'Creek Brewers' }, version + 1));
  const [renamed, changed] = (await read()).changes;
  expect(renamed?.what).toBe('Renamed the brewery from Test brewery to Creek Brewers');
  expect(changed?.facts.map(({ label, to }) => [label, to])).toEqual([
    ['currency', 'SEK'],
    ['unit of volumes', 'US gallons'],
    ['unit of gravities', '°P'],
  ]);
  const { undo } = await boardOf(head, slug);
  await good(head.post(api.undo(slug), { changeId: undo?.id }));
  expect((await boardOf(head, slug)).brewery).toMatchObject({
    name: 'Test brewery',
    currency: 'SEK',
  });
  const rules = await good<{ history: unknown[] }>(head.get(api.houseRules(slug)));
  expect(rules.history).toEqual([]);
});
