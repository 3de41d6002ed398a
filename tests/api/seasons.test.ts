import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { type ListedSeason, type SeasonCreate } from '#shared/api/brewery.ts';
import { recordPage } from '#shared/api/record.ts';
import { api, placeOf } from '#shared/api/urls.ts';
import { aBatch, aChain } from '../support/bodies.ts';
import { guestOn } from '../support/guests.ts';
import {
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

let server: TestServer;
let season: TestSeason;
let first = '';
let a = '';

beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());
beforeEach(async () => {
  season = await testSeason(server.url);
  first = (await boardOf(season.head, season.slug)).season.id;
  [a = ''] = await shelve(season, season.chainA, [
    { name: 'Avocet', brewOn: '2027-03-06' },
    { name: 'Bittern', brewOn: '2027-03-20' },
  ]);
});

const aSeason = (change: Partial<SeasonCreate> = {}): SeasonCreate => ({
  id: randomUUID(),
  name: 'Autumn',
  firstDay: null,
  lastDay: null,
  brewWeekdays: [6],
  brewsPerDay: 1,
  copy: null,
  ...change,
});
const list = () => good<ListedSeason[]>(season.head.get(api.seasons(season.slug)));
async function make(change: Partial<SeasonCreate> = {}): Promise<ListedSeason> {
  return good(season.head.post(api.seasons(season.slug), aSeason(change)));
}
const placed = (id: string) => placeOf(season.slug, id);
const archive = (id: string, version: number) =>
  season.head.ask('POST', api.seasonArchive(season.slug, id), { version });
const current = (id: string, version: number) =>
  season.head.ask('POST', api.currentSeason(season.slug, id), { version });
const said = async (id: string) =>
  recordPage
    .parse(await good(season.head.get(api.changes(season.slug, id))))
    .changes.map(({ what }) => what);

describe('a new season', () => {
  it('stands beside the current one, empty', async () => {
    const made = await make({ firstDay: '2027-09-01', lastDay: '2027-11-30' });
    expect(await list()).toMatchObject([
      { id: first, isCurrent: true, chains: 2, batches: 2 },
      { id: made.id, isCurrent: false, isArchived: false, firstDay: '2027-09-01', batches: 0 },
    ]);
    expect((await boardOf(season.head, season.slug)).season.id).toBe(first);
    const board = await boardOf(season.head, placed(made.id));
    expect(board).toMatchObject({ season: { name: 'Autumn', brewWeekdays: [6] }, chains: [] });
    expect(board.yeasts).toHaveLength(1);
    expect(await said(made.id)).toEqual(['Made the season Autumn']);
  });

  it('is made once, however often it is sent', async () => {
    const body = aSeason();
    const all = api.seasons(season.slug);
    const once = await season.head.post(all, body);
    expect((await season.head.post(all, body)).body).toEqual(once.body);
    expect(await list()).toHaveLength(2);
    expect((await season.head.post(all, { ...body, name: 'Winter' })).status).toBe(409);
  });

  it('cannot end before it begins', async () => {
    const days = { firstDay: '2027-09-01', lastDay: '2027-08-01' };
    const refused = await season.head.post(api.seasons(season.slug), aSeason(days));
    expect(refused).toMatchObject({ status: 422, body: { errors: [{ pointer: '/lastDay' }] } });
    const { id, version } = await make({ firstDay: '2027-09-01' });
    const patch = { lastDay: '2027-08-01' };
    const edited = await season.head.patch(api.season(season.slug, id), patch, version);
    expect(edited).toMatchObject({ status: 422, body: { errors: [{ pointer: '/lastDay' }] } });
  });
});

describe('another season than the current one', () => {
  it('has its own moves, undo, edits and record', async () => {
    const { id } = await make();
    const place = placed(id);
    const chain = aChain(season.yeastId, { name: 'Lower shelf' });
    await good(season.head.post(api.chains(place), chain));
    const [x = '', y = ''] = await shelve({ ...season, slug: place }, chain.id, [
      { name: 'Curlew' },
      { name: 'Dunlin' },
    ]);
    await moveTo(season.head, place, {
      batchId: x,
      toChainId: chain.id,
      afterBatchId: y,
      expectedChainId: chain.id,
    });
    expect(await namesOn(season.head, place, chain.id)).toEqual(['Dunlin', 'Curlew']);
    const { undo } = await boardOf(season.head, place);
    await good(season.head.post(api.undo(place), { changeId: undo?.id }));
    expect(await namesOn(season.head, place, chain.id)).toEqual(['Curlew', 'Dunlin']);
    expect((await season.head.patch(api.batch(place, x), { ibu: 9 }, 3)).status).not.toBe(404);
    expect((await said(id))[0]).toContain('Curlew');
    expect(await said(first)).not.toContain('Added Curlew');
    // What stands in one season is not found in the other.
    expect((await season.head.patch(api.batch(season.slug, x), { ibu: 9 }, 1)).status).toBe(404);
    expect((await season.head.patch(api.batch(place, a), { ibu: 9 }, 1)).status).toBe(404);
  });

  it('tells of changes of what all seasons share', async () => {
    const { id } = await make();
    const before = (await boardOf(season.head, placed(id))).season.revision;
    const { version } = (await boardOf(season.head, season.slug)).yeasts[0] ?? { version: 0 };
    await good(
      season.head.patch(api.yeast(season.slug, season.yeastId), { attenuation: 0.7 }, version),
    );
    expect((await boardOf(season.head, placed(id))).season.revision).toBe(before + 1);
  });

  it.each(['nothing', '00000000-0000-4000-8000-000000000000', "' or 1=1 --", ''])(
    'is not found under %j',
    async (odd) => {
      const { status } = await season.head.get(
        `${api.board(season.slug)}?season=${encodeURIComponent(odd)}`,
      );
      expect(status).toBe(404);
    },
  );

  it('is not found under another brewery', async () => {
    const other = await testSeason(server.url);
    expect((await other.head.get(api.board(placeOf(other.slug, first)))).status).toBe(404);
    expect((await other.head.get(api.board(placed(first)))).status).toBe(404);
  });

  it('is read by a guest of a chain in it, and no other one', async () => {
    const { id } = await make();
    const chain = aChain(season.yeastId);
    await good(season.head.post(api.chains(placed(id)), chain));
    const { visitor, slug } = await guestOn({ ...season, slug: placed(id) }, chain.id);
    const [shelf] = (await boardOf(visitor, slug)).guests;
    expect(shelf).toMatchObject({ seasonId: id, chainId: chain.id });
    expect((await boardOf(visitor, placed(id))).chains.map((each) => each.id)).toEqual([chain.id]);
    expect((await visitor.get(api.board(placed(first)))).status).toBe(404);
  });
});

describe('a copy of a season', () => {
  it('has its plan with the dates shifted, and starts a record of its own', async () => {
    await good(
      season.head.post(
        api.batchStage(season.slug, a),
        { stage: 'fermenting', brewedOn: '2027-03-06', volumeL: 22, og: 1.046 },
        (await boardOf(season.head, season.slug)).batches.find((row) => row.id === a)?.version,
      ),
    );
    const copy: SeasonCreate['copy'] = {
      seasonId: first,
      chainIds: [season.chainA],
      bench: true,
      brewed: 'pencilled',
      dates: { shiftDays: 180 },
    };
    const made = await make({ copy });
    expect(made).toMatchObject({ chains: 1, batches: 2 });
    const { batches, chains } = await boardOf(season.head, placed(made.id));
    expect(chains).toMatchObject([{ name: 'Shelf A', vesselId: season.vesselId, position: 0 }]);
    expect(batches).toMatchObject([
      { name: 'Avocet', brewOn: '2027-09-04', stage: 'pencilled', cake: null },
      { name: 'Bittern', brewOn: '2027-09-18', chainId: chains[0]?.id, place: 1 },
    ]);
    expect(batches[0]?.read).toEqual({ volumeL: null, og: null, fg: null, rackedOn: null });
    expect(batches.map(({ id }) => id)).not.toContain(a);
    expect(await said(made.id)).toEqual([
      'Made the season Autumn, copied from First season: 1 shelf, 2 batches',
    ]);
  });

  it('keeps a cake that feeds two shelves, and their yeast one line', async () => {
    const branch = aChain(season.yeastId, { name: 'Branch', start: { kind: 'cake', batchId: a } });
    await good(season.head.post(api.chains(season.slug), branch));
    const copy: SeasonCreate['copy'] = {
      seasonId: first,
      chainIds: [branch.id, season.chainA],
      bench: false,
      brewed: 'pencilled',
      dates: { startOn: '2027-09-04' },
    };
    const made = await make({ copy });
    const { chains, batches } = await boardOf(season.head, placed(made.id));
    const avocet = batches.find(({ name }) => name === 'Avocet')?.id;
    const lines = new Set(chains.map(({ lineId }) => lineId));
    expect(chains.find(({ name }) => name === 'Branch')?.start).toEqual({
      kind: 'cake',
      batchId: avocet,
    });
    expect(lines.size).toBe(1);
    expect(lines).not.toContain(season.chainA);
  });

  it('is of this brewery’s seasons and their shelves alone', async () => {
    const other = await testSeason(server.url);
    const foreign = (await boardOf(other.head, other.slug)).season.id;
    const copy = { bench: true, brewed: 'left-out', dates: { shiftDays: 0 } } as const;
    const all = api.seasons(season.slug);
    const elsewhere = { ...copy, seasonId: foreign, chainIds: [] };
    const strange = { ...copy, seasonId: first, chainIds: [other.chainA] };
    expect(await season.head.post(all, aSeason({ copy: elsewhere }))).toMatchObject({
      status: 422,
      body: { errors: [{ pointer: '/copy/seasonId' }] },
    });
    expect(await season.head.post(all, aSeason({ copy: strange }))).toMatchObject({
      status: 422,
      body: { errors: [{ pointer: '/copy/chainIds' }] },
    });
    expect(await list()).toHaveLength(1);
  });
});

describe('the current season', () => {
  it('is another one from when it is chosen, for everybody', async () => {
    const taster = await joined(season, 'taster');
    const made = await make();
    expect((await current(made.id, made.version + 1)).status).toBe(412);
    expect(await good(current(made.id, made.version))).toMatchObject({ isCurrent: true });
    expect((await boardOf(taster, season.slug)).season.id).toBe(made.id);
    expect((await boardOf(taster, placed(first))).season.id).toBe(first);
    expect((await list()).map(({ id }) => id)).toEqual([made.id, first]);
    expect(await said(made.id)).toEqual([
      'Made Autumn the current season',
      'Made the season Autumn',
    ]);
  });

  it('can neither be archived nor deleted', async () => {
    const [{ version = 0 } = {}] = await list();
    expect((await archive(first, version)).status).toBe(409);
    const gone = await season.head.ask('DELETE', api.season(season.slug, first), { version });
    expect(gone).toMatchObject({ status: 409, body: { type: '/problems/in-use' } });
  });
});

describe('an archived season', () => {
  let version = 0;
  beforeEach(async () => {
    const made = await make();
    await good(current(made.id, made.version));
    const row = (await list()).find(({ id }) => id === first);
    version = (await good<ListedSeason>(archive(first, row?.version ?? 0))).version;
  });

  const refused = { status: 409, body: { type: '/problems/season-archived' } };

  it('is read, and says that nothing can be done on it', async () => {
    const board = await boardOf(season.head, placed(first));
    expect(board.season.isArchived).toBe(true);
    expect(board.batches).toHaveLength(2);
    expect(Object.entries(board.me.can).filter(([, may]) => may)).toEqual([['invite', true]]);
    expect((await list()).at(-1)).toMatchObject({ id: first, isArchived: true });
    expect((await said(first))[0]).toBe('Archived the season First season');
  });

  it.each<[string, () => Promise<unknown>]>([
    [
      'a move',
      () =>
        season.head.post(
          api.moves(placed(first)),
          wish({ batchId: a, expectedChainId: season.chainA }),
        ),
    ],
    ['an edit', () => season.head.patch(api.batch(placed(first), a), { ibu: 9 }, 2)],
    ['a new batch', () => season.head.post(api.batches(placed(first)), aBatch())],
    ['a new shelf', () => season.head.post(api.chains(placed(first)), aChain(season.yeastId))],
    ['a link', () => season.head.patch(api.link(placed(first), a), { starter: true }, 2)],
    [
      'an undo',
      async () => {
        const { undo } = await boardOf(season.head, placed(first));
        return season.head.post(api.undo(placed(first)), { changeId: undo?.id });
      },
    ],
    ['its name', () => season.head.patch(api.season(season.slug, first), { name: 'X' }, version)],
    [
      'a comment',
      () =>
        season.head.post(api.comments(season.slug, season.chainA), {
          id: randomUUID(),
          about: { kind: 'chain' },
          text: 'Too late',
        }),
    ],
    ['being current', () => current(first, version)],
  ])('is not changed: %s', async (_, ask) => {
    expect(await ask()).toMatchObject(refused);
  });

  it('is changed again once it is taken out', async () => {
    const out = { version };
    await good(season.head.ask('DELETE', api.seasonArchive(season.slug, first), out));
    const reply = season.head.post(api.batches(placed(first)), aBatch());
    expect((await reply).status).toBe(201);
    expect(await said(first)).toContain('Took the season First season out of the archive');
  });
});

describe('a season is deleted', () => {
  it('where nothing stands on it; the current one tells of it', async () => {
    const { id, version } = await make();
    await good(season.head.ask('DELETE', api.season(season.slug, id), { version }));
    expect((await list()).map((each) => each.id)).toEqual([first]);
    expect((await said(first))[0]).toBe('Deleted the season Autumn, which was empty');
    expect((await season.head.get(api.board(placed(id)))).status).toBe(404);
  });

  it('and not where something does', async () => {
    const { id, version } = await make();
    await good(season.head.post(api.batches(placed(id)), aBatch()));
    const kept = await season.head.ask('DELETE', api.season(season.slug, id), { version });
    expect(kept).toMatchObject({ status: 409, body: { type: '/problems/in-use' } });
    expect(await list()).toHaveLength(2);
  });
});
