import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Board } from '#shared/api/board.ts';
import type { Moved } from '#shared/api/move.ts';
import { api } from '#shared/api/urls.ts';
import { aBatch, aChain, aYeast } from '../support/bodies.ts';
import {
  batchOf,
  boardOf,
  good,
  joined,
  moveTo,
  namesOn,
  shelve,
  testSeason,
  type TestSeason,
} from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import type { Visitor } from '../support/visitor.ts';

let server: TestServer;
let season: TestSeason;
let a = '';
let b = '';
let c = '';

beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());
beforeEach(async () => {
  season = await testSeason(server.url);
  [a = '', b = '', c = ''] = await shelve(season, season.chainA, [
    { name: 'Avocet', brewOn: '2027-03-06' },
    { name: 'Bittern', ibu: 24 },
    { name: 'Curlew' },
  ]);
});

const head = () => season.head;
const board = () => boardOf(season.head, season.slug);
const versionOf = async (id: string) => {
  const now = await board();
  const rows = [...now.batches, ...now.chains, ...now.yeasts, ...now.vessels, now.season];
  return rows.find((row) => row.id === id)?.version ?? 0;
};
const patch = async (path: string, id: string, body: unknown, who: Visitor = head()) =>
  good(who.patch(path, body, await versionOf(id)));
const remove = async (path: string, id: string) =>
  good(head().ask('DELETE', path, { version: await versionOf(id) }));

/** A board without what is only counted. */
function standing({ season: { revision: _, version: __, ...rest }, ...now }: Board) {
  const bare = <T extends { version: number }>(rows: T[]) =>
    rows.map(({ version: _version, ...row }) => row);
  const { undo: _undo, redo: _redo, ...others } = now;
  return {
    ...others,
    season: rest,
    batches: bare(now.batches),
    chains: bare(now.chains),
    yeasts: bare(now.yeasts),
    vessels: bare(now.vessels),
  };
}

async function turn(way: 'undo' | 'redo', who: Visitor = head()): Promise<Moved> {
  const change = (await boardOf(who, season.slug))[way];
  if (!change) throw new Error(`There is nothing to ${way}`);
  return good<Moved>(who.post(api[way](season.slug), { changeId: change.id }));
}

/** Each kind of edit, with what the undo button calls it. */
const EDITS: [string, string | RegExp, () => Promise<unknown>][] = [
  [
    'a fact of a batch',
    'Set the bitterness of Bittern from 24 to 28 IBU',
    () => patch(api.batch(season.slug, b), b, { ibu: 28 }),
  ],
  [
    'several facts of a batch',
    'Changed Bittern: original gravity from 1.044 to 1.048, colour from 4 to 6 SRM and 1 more',
    () => patch(api.batch(season.slug, b), b, { og: 1.048, srm: 6, allergens: ['gluten', 'milk'] }),
  ],
  [
    'a name',
    'Renamed Bittern to Booming',
    () => patch(api.batch(season.slug, b), b, { name: 'Booming' }),
  ],
  [
    'a fact of a link',
    'Set the kept part of the cake under Bittern from the recommended part to 400 mL',
    () => patch(api.link(season.slug, b), b, { keepL: 0.4 }),
  ],
  [
    'a new batch',
    'Added Dunlin',
    () => good(head().post(api.batches(season.slug), aBatch({ name: 'Dunlin' }))),
  ],
  ['a deleted batch', 'Deleted Bittern', () => remove(api.batch(season.slug, b), b)],
  [
    'a brewed batch',
    'Brewed Avocet on Sat 6 March, 22 L at 1.046',
    async () =>
      head().post(
        api.batchStage(season.slug, a),
        { stage: 'fermenting', brewedOn: '2027-03-06', volumeL: 22, og: 1.046 },
        await versionOf(a),
      ),
  ],
  [
    'a scrapped batch',
    'Scrapped Bittern: no malt',
    async () =>
      head().post(
        api.batchStage(season.slug, b),
        { stage: 'scrapped', reason: 'no malt' },
        await versionOf(b),
      ),
  ],
  [
    'a new shelf',
    'Added the shelf Mud',
    () => good(head().post(api.chains(season.slug), aChain(season.yeastId, { name: 'Mud' }))),
  ],
  [
    'a deleted shelf',
    'Deleted the shelf Shelf A',
    () => remove(api.chain(season.slug, season.chainA), season.chainA),
  ],
  [
    'the place of a shelf',
    'Set the place of the shelf Shelf A from 1 to 2',
    () => patch(api.chain(season.slug, season.chainA), season.chainA, { position: 1 }),
  ],
  [
    'the start of a shelf',
    'Set the start of the shelf Shelf B from a fresh pack at €14.00 to the cake of Avocet',
    () =>
      patch(api.chain(season.slug, season.chainB), season.chainB, {
        start: { kind: 'cake', batchId: a },
      }),
  ],
  [
    'a new yeast',
    'Added the yeast Reed',
    () => good(head().post(api.yeasts(season.slug), aYeast({ name: 'Reed' }))),
  ],
  [
    'a yeast',
    'Set the generation limit of Harbour ale from 7 to 5',
    () => patch(api.yeast(season.slug, season.yeastId), season.yeastId, { generationLimit: 5 }),
  ],
  [
    'a vessel',
    'Set the capacity of Bucket from 32 to 40 L',
    () => patch(api.vessel(season.slug, season.vesselId), season.vesselId, { capacityL: 40 }),
  ],
  [
    'the season',
    'Blocked Sat 20 March for brewing',
    async () => {
      const { id } = (await board()).season;
      return patch(api.season(season.slug, id), id, { blockedDays: ['2027-03-20'] });
    },
  ],
];

describe.each(EDITS)('undo of %s', (_name, what, edit) => {
  it('gives back what was before, redo what was after, also after a reload', async () => {
    const before = standing(await board());
    await edit();
    const after = standing(await board());
    expect(after).not.toEqual(before);
    expect((await board()).undo?.what).toEqual(what);
    await turn('undo');
    expect(standing(await board())).toEqual(before);
    expect((await board()).redo?.what).toEqual(what);
    await turn('redo');
    expect(standing(await board())).toEqual(after);
    await turn('undo');
    expect(standing(await board())).toEqual(before);
  });
});

describe('undo of an edit', () => {
  it('raises the version, so that an older form is told', async () => {
    const was = await versionOf(b);
    await patch(api.batch(season.slug, b), b, { ibu: 28 });
    await turn('undo');
    expect(await versionOf(b)).toBe(was + 2);
  });

  it('answers a repeated request again, and does it once', async () => {
    await patch(api.batch(season.slug, b), b, { ibu: 28 });
    const changeId = (await board()).undo?.id ?? '';
    const first = await good<Moved>(head().post(api.undo(season.slug), { changeId }));
    const again = await good<Moved>(head().post(api.undo(season.slug), { changeId }));
    expect(again).toMatchObject({ changeId: first.changeId, revision: first.revision });
    expect(again.batches).toEqual(first.batches);
  });

  it('leaves alone what somebody else changed beside it', async () => {
    const partner = await joined(season, 'brewer');
    await patch(api.batch(season.slug, b), b, { ibu: 28 });
    await patch(api.batch(season.slug, b), b, { srm: 9 }, partner);
    await turn('undo');
    expect(await batchOf(head(), season.slug, b)).toMatchObject({ ibu: 24, srm: 9 });
  });

  it('is refused with who did what since, where somebody changed the same thing', async () => {
    const partner = await joined(season, 'brewer');
    await patch(api.batch(season.slug, b), b, { ibu: 28 });
    await patch(api.batch(season.slug, b), b, { ibu: 31 }, partner);
    const changeId = (await board()).undo?.id;
    const reply = await head().post(api.undo(season.slug), { changeId });
    expect([reply.status, reply.body]).toMatchObject([
      409,
      {
        type: '/problems/not-undoable',
        detail:
          'Bittern was changed since. The brewer: Set the bitterness of Bittern from 28 to 31 IBU',
        current: { id: b, ibu: 31 },
      },
    ]);
    expect(await batchOf(head(), season.slug, b)).toMatchObject({ ibu: 31 });
  });

  it('is refused where the two together would not fit', async () => {
    const partner = await joined(season, 'brewer');
    await patch(api.batch(season.slug, b), b, { og: 1.07 });
    await patch(api.batch(season.slug, b), b, { fg: 1.05 }, partner);
    const reply = await head().post(api.undo(season.slug), { changeId: (await board()).undo?.id });
    expect([reply.status, reply.body]).toMatchObject([409, { type: '/problems/not-undoable' }]);
  });

  it('of a new yeast is refused while a shelf lives on it', async () => {
    const yeast = aYeast({ name: 'Reed' });
    await good(head().post(api.yeasts(season.slug), yeast));
    const { undo } = await board();
    const partner = await joined(season, 'brewer');
    await good(partner.post(api.chains(season.slug), aChain(yeast.id, { name: 'Mud' })));
    const reply = await head().post(api.undo(season.slug), { changeId: undo?.id });
    expect([reply.status, reply.body]).toMatchObject([
      409,
      { detail: expect.stringContaining('The shelf Mud needs the yeast') },
    ]);
  });

  it('of a deletion puts the batch back between its neighbours, whatever came behind', async () => {
    const partner = await joined(season, 'brewer');
    await remove(api.batch(season.slug, b), b);
    const more = aBatch({ name: 'Dunlin' });
    await good(partner.post(api.batches(season.slug), more));
    await moveTo(partner, season.slug, {
      batchId: more.id,
      toChainId: season.chainA,
      afterBatchId: c,
    });
    await turn('undo');
    expect(await namesOn(head(), season.slug, season.chainA)).toEqual([
      'Avocet',
      'Bittern',
      'Curlew',
      'Dunlin',
    ]);
  });

  it('of a deletion is refused where another batch took the place', async () => {
    const partner = await joined(season, 'brewer');
    await remove(api.batch(season.slug, b), b);
    const more = aBatch({ name: 'Dunlin' });
    await good(partner.post(api.batches(season.slug), more));
    await moveTo(partner, season.slug, {
      batchId: more.id,
      toChainId: season.chainA,
      afterBatchId: a,
    });
    const reply = await head().post(api.undo(season.slug), { changeId: (await board()).undo?.id });
    expect([reply.status, reply.body]).toMatchObject([
      409,
      { detail: 'Curlew was changed since. The brewer: Moved Dunlin after Avocet' },
    ]);
  });

  it('is one’s own, newest first, moves and edits in one row', async () => {
    await patch(api.batch(season.slug, b), b, { ibu: 28 });
    await moveTo(head(), season.slug, { batchId: c, expectedChainId: season.chainA });
    await patch(api.batch(season.slug, c), c, { srm: 12 });
    const partner = await joined(season, 'brewer');
    expect((await boardOf(partner, season.slug)).undo).toBeNull();
    const done: string[] = [];
    for (let left = 3; left > 0; left -= 1) done.push((await turn('undo')).what);
    expect(done).toEqual([
      'Undone: Set the colour of Curlew from 4 to 12 SRM',
      'Undone: Put Curlew on the bench',
      'Undone: Set the bitterness of Bittern from 24 to 28 IBU',
    ]);
    expect(await namesOn(head(), season.slug, season.chainA)).toEqual([
      'Avocet',
      'Bittern',
      'Curlew',
    ]);
  });

  it('ends redoing at a new change', async () => {
    await patch(api.batch(season.slug, b), b, { ibu: 28 });
    await turn('undo');
    expect((await board()).redo).not.toBeNull();
    await patch(api.batch(season.slug, c), c, { srm: 12 });
    expect((await board()).redo).toBeNull();
  });

  it('is for whoever may still edit it', async () => {
    const other = await joined(season, 'head-brewer');
    await patch(
      api.yeast(season.slug, season.yeastId),
      season.yeastId,
      { generationLimit: 5 },
      other,
    );
    const { undo } = await boardOf(other, season.slug);
    await server.pool.query(
      `update membership set role = 'brewer' where person_id =
        (select person_id from change where id = $1)`,
      [undo?.id],
    );
    const reply = await other.post(api.undo(season.slug), { changeId: undo?.id });
    expect([reply.status, reply.body]).toMatchObject([403, { type: '/problems/not-allowed' }]);
  });
});

describe('an acceptance', () => {
  const reason = 'We want it dark';
  const accept = async () =>
    good(
      head().ask('PUT', api.acceptance(season.slug, b), {
        body: { reason },
        version: await versionOf(b),
      }),
    );
  beforeEach(async () => {
    await patch(api.batch(season.slug, a), a, { og: 1.095, fg: 1.02 });
    await patch(api.batch(season.slug, a), a, { volumeL: 20 });
  });

  it('comes back with the undo of the edit that made it lapse, and goes with its own', async () => {
    await accept();
    expect((await batchOf(head(), season.slug, b)).link.acceptance).toMatchObject({ reason });
    await patch(api.batch(season.slug, b), b, { ibu: 30 });
    expect((await batchOf(head(), season.slug, b)).link.acceptance).toBeNull();
    await turn('undo');
    expect((await batchOf(head(), season.slug, b)).link.acceptance).toMatchObject({ reason });
    await turn('undo');
    expect((await batchOf(head(), season.slug, b)).link.acceptance).toBeNull();
    await turn('redo');
    expect((await batchOf(head(), season.slug, b)).link.acceptance).toMatchObject({ reason });
  });

  it('does not come back to a link that is another one by then', async () => {
    await accept();
    await patch(api.batch(season.slug, b), b, { ibu: 30 });
    const partner = await joined(season, 'brewer');
    await patch(api.batch(season.slug, a), a, { srm: 20 }, partner);
    await turn('undo');
    expect(await batchOf(head(), season.slug, b)).toMatchObject({
      ibu: 24,
      link: { acceptance: null },
    });
  });
});

it('tells apart whose change it is of a change that never was', async () => {
  const reply = await head().post(api.undo(season.slug), { changeId: randomUUID() });
  expect(reply.status).toBe(409);
});
