import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Batch } from '#shared/api/batch.ts';
import type { Chain } from '#shared/api/chain.ts';
import { api } from '#shared/api/urls.ts';
import { aBatch, aChain, aVessel, aYeast } from '../support/bodies.ts';
import {
  batchOf,
  boardOf,
  good,
  namesOn,
  shelve,
  testSeason,
  type TestSeason,
} from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';

let server: TestServer;
let season: TestSeason;

beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());
beforeEach(async () => {
  season = await testSeason(server.url);
});

const head = () => season.head;
const path = (id: string) => api.batch(season.slug, id);

describe('a batch', () => {
  it('reads after saving as it was sent', async () => {
    const body = aBatch({
      name: 'Žitný  ‘Ale’',
      og: 1.0523,
      volumeL: 22.712470704,
      dryHops: [{ gramsPerLitre: 2.5, contained: 'bagged', timing: 'after-taking' }],
      cultures: null,
      typed: { volumeL: { text: '6', unit: 'gal' } },
    });
    const made = await head().post(api.batches(season.slug), body);
    expect(made.status).toBe(201);
    expect(made.headers.get('etag')).toBe('"1"');
    expect(await batchOf(head(), season.slug, body.id)).toMatchObject({ ...body, place: 0 });
  });

  it('is made once, however often its create is sent', async () => {
    const body = aBatch();
    const all = api.batches(season.slug);
    const first = await head().post(all, body);
    const again = await head().post(all, body);
    expect(again.body).toEqual(first.body);
    expect((await boardOf(head(), season.slug)).batches).toHaveLength(1);
    const other = await head().post(all, { ...body, name: 'Another' });
    expect([other.status, other.body]).toMatchObject([409, { current: { id: body.id } }]);
  });

  it('cannot take an id of another brewery, and learns nothing of it', async () => {
    const elsewhere = await testSeason(server.url);
    const body = aBatch({ name: 'Secret' });
    await good(elsewhere.head.post(api.batches(elsewhere.slug), body));
    const { status, body: document } = await head().post(api.batches(season.slug), body);
    expect(status).toBe(409);
    expect(JSON.stringify(document)).not.toContain('Secret');
  });

  it('is edited from the version that was seen', async () => {
    const body = aBatch();
    await good(head().post(api.batches(season.slug), body));
    expect((await head().patch(path(body.id), { ibu: 25 })).status).toBe(428);
    const edited = await head().patch(path(body.id), { ibu: 25 }, 1);
    expect(edited.headers.get('etag')).toBe('"2"');
    const stale = await head().patch(path(body.id), { srm: 9 }, 1);
    expect(stale.status).toBe(412);
    expect(stale.body).toMatchObject({ current: { ibu: 25, srm: 4, version: 2 } });
    const strange = { 'If-Match': '"abc"' };
    const odd = await head().ask('PATCH', path(body.id), { body: { srm: 9 }, headers: strange });
    expect(odd.status).toBe(412);
  });

  it('is checked together with what is stored', async () => {
    const body = aBatch({ og: 1.044 });
    await good(head().post(api.batches(season.slug), body));
    const { status, body: document } = await head().patch(path(body.id), { fg: 1.06 }, 1);
    expect(status).toBe(422);
    expect(document).toMatchObject({ errors: [{ pointer: '/fg' }] });
    const elsewhere = await testSeason(server.url);
    const foreign = await head().patch(path(body.id), { vesselId: elsewhere.vesselId }, 1);
    expect(foreign.body).toMatchObject({ errors: [{ pointer: '/vesselId' }] });
  });

  it('closes up behind it when it is deleted, and the next link starts anew', async () => {
    const [, b = '', c = ''] = await shelve(season, season.chainA, [
      { name: 'A' },
      { name: 'B' },
      { name: 'C' },
    ]);
    const { version } = await batchOf(head(), season.slug, c);
    await good(head().patch(api.link(season.slug, c), { keepL: 0.5 }, version));
    const deleted = await head().ask('DELETE', path(b), {
      version: (await batchOf(head(), season.slug, b)).version,
    });
    expect(deleted.status).toBe(204);
    expect(await batchOf(head(), season.slug, c)).toMatchObject({
      place: 1,
      link: { keepL: null },
    });
  });
});

describe('a stage', () => {
  const stage = (id: string, body: object, version: number) =>
    head().post(api.batchStage(season.slug, id), body, version);
  const now = async (id: string, body: object) =>
    good<Batch>(stage(id, body, (await batchOf(head(), season.slug, id)).version));
  const fermenting = { stage: 'fermenting', brewedOn: '2027-03-06', volumeL: 22, og: 1.045 };
  const racked = { stage: 'racked', rackedOn: '2027-03-21', volumeL: null, fg: 1.01 };

  it('keeps what was read beside the plan, and follows the cake', async () => {
    const [a = '', b = ''] = await shelve(season, season.chainA, [{ name: 'A' }, { name: 'B' }]);
    expect(await now(a, fermenting)).toMatchObject({
      stage: 'fermenting',
      brewOn: '2027-03-06',
      og: 1.044,
      read: { volumeL: 22, og: 1.045 },
      cake: { state: 'growing' },
    });
    expect(await now(a, racked)).toMatchObject({
      read: { volumeL: 22, fg: 1.01, rackedOn: '2027-03-21' },
      cake: { state: 'bare' },
    });
    await now(b, { ...fermenting, brewedOn: '2027-03-21' });
    expect((await batchOf(head(), season.slug, a)).cake?.state).toBe('poured');
    const back = await stage(
      a,
      { stage: 'pencilled' },
      (await batchOf(head(), season.slug, a)).version,
    );
    expect([back.status, back.body]).toMatchObject([409, { detail: 'B was poured on its cake' }]);
    await now(b, { stage: 'pencilled' });
    expect((await batchOf(head(), season.slug, a)).cake?.state).toBe('bare');
    expect(await now(a, { stage: 'pencilled' })).toMatchObject({ cake: null, read: { og: null } });
  });

  it('comes in order', async () => {
    const [a = '', b = ''] = await shelve(season, season.chainA, [{ name: 'A' }, { name: 'B' }]);
    const [loose = ''] = await shelve(season, null, [{ name: 'Loose' }]);
    const version = async (id: string) => (await batchOf(head(), season.slug, id)).version;
    expect((await stage(a, racked, await version(a))).status).toBe(422);
    const early = await stage(b, fermenting, await version(b));
    expect(early.body).toMatchObject({ errors: [{ pointer: '/stage' }] });
    expect((await stage(loose, fermenting, await version(loose))).status).toBe(422);
    await now(a, fermenting);
    const tooSoon = await stage(a, { ...racked, rackedOn: '2027-03-01' }, await version(a));
    expect(tooSoon.body).toMatchObject({ errors: [{ pointer: '/rackedOn' }] });
    const tooHigh = await stage(a, { ...racked, fg: 1.05 }, await version(a));
    expect(tooHigh.body).toMatchObject({ errors: [{ pointer: '/fg' }] });
  });

  it('of a scrapped batch takes it off its shelf, and back it comes to the bench', async () => {
    const [a = ''] = await shelve(season, season.chainA, [{ name: 'A' }, { name: 'B' }]);
    expect(await now(a, { stage: 'scrapped', reason: 'Smelt of plaster' })).toMatchObject({
      stage: 'scrapped',
      chainId: null,
      scrapReason: 'Smelt of plaster',
    });
    expect(await namesOn(head(), season.slug, season.chainA)).toEqual(['B']);
    expect(await now(a, { stage: 'pencilled' })).toMatchObject({ scrapReason: '' });
    expect(await namesOn(head(), season.slug, null)).toEqual(['A']);
  });
});

describe('a shelf', () => {
  it('gives its pencilled batches back to the bench when it is taken down', async () => {
    await shelve(season, null, [{ name: 'Waiting' }]);
    await shelve(season, season.chainA, [{ name: 'A' }, { name: 'B' }]);
    const gone = await head().ask('DELETE', api.chain(season.slug, season.chainA), { version: 1 });
    expect(gone.status).toBe(204);
    expect(await namesOn(head(), season.slug, null)).toEqual(['Waiting', 'A', 'B']);
    const { chains } = await boardOf(head(), season.slug);
    expect(chains.map(({ name, position }) => [name, position])).toEqual([['Shelf B', 0]]);
  });

  it('stays while something in it was brewed, or another hangs on its cake', async () => {
    const [a = ''] = await shelve(season, season.chainA, [{ name: 'A' }]);
    const start = { kind: 'cake', batchId: a } as const;
    const branch = aChain(season.yeastId, { name: 'Branch', start });
    const made = await good<Chain>(head().post(api.chains(season.slug), branch));
    const line = (await boardOf(head(), season.slug)).chains.find(({ id }) => id === season.chainA);
    expect(made.lineId).toBe(line?.lineId);
    const shelf = api.chain(season.slug, season.chainA);
    const hung = await head().ask('DELETE', shelf, { version: 1 });
    expect(hung.body).toMatchObject({ type: '/problems/in-use' });
    const { version } = await batchOf(head(), season.slug, a);
    expect((await head().ask('DELETE', path(a), { version })).status).toBe(409);
    await good(head().ask('DELETE', api.chain(season.slug, branch.id), { version: 1 }));
    const body = { stage: 'fermenting', brewedOn: '2027-03-06', volumeL: null, og: null };
    await good(head().post(api.batchStage(season.slug, a), body, version));
    const brewed = await head().ask('DELETE', shelf, { version: 1 });
    expect(brewed.body).toMatchObject({ detail: 'A is fermenting, so its shelf stays' });
  });

  it('cannot start from its own cake, nor from one of another yeast', async () => {
    const [a = ''] = await shelve(season, season.chainA, [{ name: 'A' }]);
    const start = { kind: 'cake', batchId: a } as const;
    const own = await head().patch(api.chain(season.slug, season.chainA), { start }, 1);
    expect(own.body).toMatchObject({ errors: [{ pointer: '/start/batchId' }] });
    const lager = aYeast({ name: 'Lantern lager', kind: 'lager' });
    await good(head().post(api.yeasts(season.slug), lager));
    const other = await head().post(api.chains(season.slug), aChain(lager.id, { start }));
    expect(other.body).toMatchObject({ errors: [{ pointer: '/yeastId' }] });
  });

  it('moves among the shelves', async () => {
    const shelf = api.chain(season.slug, season.chainB);
    await good(head().patch(shelf, { position: 0, name: 'First' }, 1));
    const { chains } = await boardOf(head(), season.slug);
    expect(chains.map(({ name, position }) => [name, position])).toEqual([
      ['First', 0],
      ['Shelf A', 1],
    ]);
  });
});

describe('a yeast or a vessel', () => {
  it('that is used cannot be deleted, and says by what', async () => {
    const yeast = api.yeast(season.slug, season.yeastId);
    const { status, body } = await head().ask('DELETE', yeast, { version: 1 });
    expect(status).toBe(409);
    expect(body).toMatchObject({ detail: 'Harbour ale is used by Shelf A, Shelf B' });
    const vessel = api.vessel(season.slug, season.vesselId);
    expect((await head().ask('DELETE', vessel, { version: 1 })).status).toBe(409);
  });

  it('that is not used can', async () => {
    const [yeast, vessel] = [aYeast(), aVessel()];
    await good(head().post(api.yeasts(season.slug), yeast));
    await good(head().post(api.vessels(season.slug), vessel));
    const gone = [api.yeast(season.slug, yeast.id), api.vessel(season.slug, vessel.id)];
    for (const each of gone)
      expect((await head().ask('DELETE', each, { version: 1 })).status).toBe(204);
  });

  it('keeps both ends of a range or neither', async () => {
    const yeast = api.yeast(season.slug, season.yeastId);
    const half = await head().patch(yeast, { pourMinC: null }, 1);
    expect(half.status).toBe(422);
    expect((await head().patch(yeast, { pourMinC: null, pourMaxC: null }, 1)).status).toBe(200);
  });
});

describe('the season', () => {
  it('keeps brew days and blocked days in order, each once', async () => {
    const { season: row } = await boardOf(head(), season.slug);
    const body = {
      name: 'Autumn',
      brewWeekdays: [7, 5, 7],
      blockedDays: ['2027-05-02', '2027-05-01', '2027-05-02'],
    };
    const edited = await head().patch(api.season(season.slug, row.id), body, row.version);
    expect(edited.body).toMatchObject({
      name: 'Autumn',
      brewWeekdays: [5, 7],
      blockedDays: ['2027-05-01', '2027-05-02'],
      version: row.version + 1,
    });
    expect((await boardOf(head(), season.slug)).season).toEqual(edited.body);
  });
});
