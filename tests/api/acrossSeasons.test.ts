import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { ListedSeason } from '#shared/api/brewery.ts';
import { recordPage } from '#shared/api/record.ts';
import { api, placeOf } from '#shared/api/urls.ts';
import { aChain } from '../support/bodies.ts';
import { whileHeld } from '../support/held.ts';
import { batchOf, boardOf, good, shelve, testSeason, type TestSeason } from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';

let server: TestServer;
let season: TestSeason;
let first = '';
let other = '';
/** The second season, as an address names it. */
let there = '';

beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());
beforeEach(async () => {
  season = await testSeason(server.url);
  first = (await boardOf(season.head, season.slug)).season.id;
  other = (await aSeason('Autumn')).id;
  there = placeOf(season.slug, other);
});

const aSeason = (name: string) =>
  good<ListedSeason>(
    season.head.post(api.seasons(season.slug), {
      id: randomUUID(),
      name,
      firstDay: null,
      lastDay: null,
      brewWeekdays: [6],
      brewsPerDay: 1,
      copy: null,
    }),
  );

const yeastAt = (place: string) => api.yeast(place, season.yeastId);
const vesselAt = (place: string) => api.vessel(place, season.vesselId);
const yeastNow = async () => (await boardOf(season.head, season.slug)).yeasts[0];
const revisionOf = async (place: string) => (await boardOf(season.head, place)).season.revision;
const putRules = (place: string, body: unknown, version: number) =>
  season.head.ask('PUT', api.houseRules(place), { body, version });

describe('two who change the same thing from different seasons', () => {
  const statuses = (replies: { status: number }[]) =>
    replies.map(({ status }) => status).toSorted();

  it('a yeast: the second is told what the first made of it', async () => {
    const { head, slug } = season;
    const replies = await whileHeld(
      server.pool,
      ['select 1 from yeast where id = $1 for update', [season.yeastId]],
      2,
      () =>
        Promise.all([
          head.patch(yeastAt(slug), { attenuation: 0.7 }, 1),
          head.patch(yeastAt(there), { generationLimit: 5 }, 1),
        ]),
    );
    expect(statuses(replies)).toEqual([200, 412]);
    expect((await yeastNow())?.version).toBe(2);
  });

  it('a vessel, changed and deleted: the deletion is not of what it had not seen', async () => {
    const { head, slug, chainA } = season;
    const board = await boardOf(head, slug);
    const version = board.chains.find(({ id }) => id === chainA)?.version;
    await good(head.patch(api.chain(slug, chainA), { vesselId: null }, version));
    const replies = await whileHeld(
      server.pool,
      ['select 1 from vessel where id = $1 for update', [season.vesselId]],
      2,
      () =>
        Promise.all([
          head.patch(vesselAt(slug), { capacityL: 40 }, 1),
          head.ask('DELETE', vesselAt(there), { version: 1 }),
        ]),
    );
    expect(replies.filter(({ status }) => status < 300)).toHaveLength(1);
    expect(replies.map(({ status }) => status)).not.toContain(500);
  });

  it('the house rules', async () => {
    const replies = await whileHeld(
      server.pool,
      [
        'select 1 from house_rules where brewery_id = (select id from brewery where slug = $1) for update',
        [season.slug],
      ],
      2,
      () =>
        Promise.all([putRules(season.slug, { darkSrm: 5 }, 1), putRules(there, { darkSrm: 6 }, 1)]),
    );
    expect(statuses(replies)).toEqual([200, 412]);
  });

  it('an edit and an undo: what was changed since is not taken back', async () => {
    const { head, slug } = season;
    await good(head.patch(yeastAt(slug), { attenuation: 0.7 }, 1));
    const { undo } = await boardOf(head, slug);
    const [edited, undone] = await whileHeld(
      server.pool,
      ['select 1 from yeast where id = $1 for update', [season.yeastId]],
      2,
      () =>
        Promise.all([
          head.patch(yeastAt(there), { attenuation: 0.8 }, 2),
          head.post(api.undo(slug), { changeId: undo?.id }),
        ]),
    );
    const isEditFirst = edited?.status === 200;
    expect([edited?.status, undone?.status]).toEqual(isEditFirst ? [200, 409] : [412, 200]);
    expect((await yeastNow())?.attenuation).toBe(isEditFirst ? 0.8 : 0.75);
  });

  it('many at once wait for each other, and none fails', async () => {
    const { head, slug } = season;
    const third = placeOf(slug, (await aSeason('Winter')).id);
    for (const place of [there, third])
      await good(head.post(api.chains(place), aChain(season.yeastId)));
    const editAndUndo = async (place: string, attenuation: number) => {
      const { yeasts, undo } = await boardOf(head, place);
      const edited = await head.patch(yeastAt(place), { attenuation }, yeasts[0]?.version);
      const undone = await head.post(api.undo(place), { changeId: undo?.id });
      return [edited.status, undone.status];
    };
    const rulesAndShelf = async (place: string, darkSrm: number) => {
      const { version } = await good<{ version: number }>(head.get(api.houseRules(place)));
      const put = await putRules(place, { darkSrm }, version);
      const added = await head.post(api.chains(place), aChain(season.yeastId));
      return [put.status, added.status];
    };
    const work = [slug, there, third].flatMap((place) =>
      [0, 1, 2].flatMap((round) => [
        editAndUndo(place, 0.6 + round / 100),
        rulesAndShelf(place, 5 + round),
      ]),
    );
    const statuses = (await Promise.all(work)).flat();
    for (const status of statuses) expect([200, 201, 409, 412]).toContain(status);
    // Each shelf is added, whatever became of the edits beside it.
    expect(statuses.filter((status) => status === 201)).toHaveLength(9);
  }, 30_000);
});

describe('a change of what all seasons share', () => {
  let b = '';
  const reason = 'Strong on strong';
  beforeEach(async () => {
    const chain = aChain(season.yeastId, { vesselId: season.vesselId, name: 'Lower shelf' });
    await good(season.head.post(api.chains(there), chain));
    // 1.095 is above the hold of a tired cake.
    [, b = ''] = await shelve({ ...season, slug: there }, chain.id, [
      { name: 'Avocet', og: 1.095, fg: 1.02, brewOn: '2027-03-06' },
      { name: 'Bittern', og: 1.095, fg: 1.02 },
    ]);
    await accept();
  });
  const accept = async () => {
    const { version } = await batchOf(season.head, there, b);
    await good(season.head.ask('PUT', api.acceptance(there, b), { body: { reason }, version }));
  };
  const acceptance = async () => (await batchOf(season.head, there, b)).link.acceptance;
  const undo = async (place: string) => {
    const board = await boardOf(season.head, place);
    await good(season.head.post(api.undo(place), { changeId: board.undo?.id }));
  };
  const said = async () =>
    recordPage
      .parse(await good(season.head.get(api.changes(season.slug, other))))
      .changes.map(({ what }) => what);

  it('ends the acceptances of another season whose link it changes, and says so there', async () => {
    const before = await revisionOf(there);
    await good(season.head.patch(yeastAt(season.slug), { generationLimit: 5 }, 1));
    expect(await acceptance()).toBeNull();
    expect(await revisionOf(there)).toBe(before + 1);
    expect((await said())[0]).toMatch(/^Ended the acceptance under Bittern: .*Harbour ale/);
  });

  it('leaves those alone whose link it does not change', async () => {
    await good(season.head.patch(yeastAt(season.slug), { notes: 'From the cold room' }, 1));
    expect(await acceptance()).toMatchObject({ reason });
  });

  it('so of house rules: where the link says something else, and only there', async () => {
    await good(putRules(season.slug, { underBeerHold: 90 }, 1));
    expect(await acceptance()).toMatchObject({ reason });
    await good(putRules(season.slug, { softened: ['tired-cake'] }, 2));
    expect(await acceptance()).toBeNull();
  });

  it('so of an undo, which tells the other seasons too', async () => {
    await good(season.head.patch(yeastAt(season.slug), { generationLimit: 5 }, 1));
    await accept();
    const before = await revisionOf(there);
    await undo(season.slug);
    expect(await acceptance()).toBeNull();
    expect(await revisionOf(there)).toBe(before + 1);
  });

  it('so of the undo of house rules', async () => {
    await good(putRules(season.slug, { tiredOgHold: 1.09 }, 1));
    await accept();
    await good(putRules(season.slug, { tiredOgHold: 1.09, softened: ['tired-cake'] }, 2));
    expect(await acceptance()).toBeNull();
    await undo(season.slug);
    await accept();
    await good(putRules(season.slug, { softened: ['tired-cake'] }, 4));
    expect(await acceptance()).toBeNull();
  });

  it('an undo of the brewery’s own facts is told to the other seasons', async () => {
    const { version } = await good<{ version: number }>(season.head.get(api.brewery(season.slug)));
    await good(season.head.patch(api.brewery(season.slug), { currency: 'GBP' }, version));
    const before = await revisionOf(there);
    await undo(season.slug);
    expect(await revisionOf(there)).toBe(before + 1);
  });

  it('changes nothing on an archived season', async () => {
    const row = (await good<ListedSeason[]>(season.head.get(api.seasons(season.slug)))).find(
      ({ id }) => id === other,
    );
    await good(
      season.head.ask('POST', api.seasonArchive(season.slug, other), { version: row?.version }),
    );
    await good(season.head.patch(yeastAt(season.slug), { generationLimit: 5 }, 1));
    expect(await acceptance()).toMatchObject({ reason });
  });

  it('ends those of its own season as before', async () => {
    expect(first).not.toBe(other);
    await good(season.head.patch(yeastAt(there), { generationLimit: 5 }, 1));
    expect(await acceptance()).toBeNull();
    await undo(there);
    expect(await acceptance()).toMatchObject({ reason });
  });
});
