import { afterAll, beforeAll, beforeEach, expect, it } from 'vitest';
import { houseRules as contract } from '#shared/api/houseRules.ts';
import { api } from '#shared/api/urls.ts';
import {
  batchOf,
  boardOf,
  good,
  joined,
  shelve,
  testSeason,
  type TestSeason,
} from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import type { Visitor } from '../support/visitor.ts';

let server: TestServer;
let season: TestSeason;
let b = '';

beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());
beforeEach(async () => {
  season = await testSeason(server.url);
  // 1.095 is above the hold of a tired cake.
  [, b = ''] = await shelve(season, season.chainA, [
    { name: 'Avocet', og: 1.095, fg: 1.02, brewOn: '2027-03-06' },
    { name: 'Bittern', og: 1.095, fg: 1.02 },
  ]);
});

const read = async (who: Visitor = season.head) =>
  contract.parse(await good(who.get(api.houseRules(season.slug))));
const put = (body: unknown, version: number, who: Visitor = season.head) =>
  who.ask('PUT', api.houseRules(season.slug), { body, version });

it('starts from the defaults, with an ETag to change them from', async () => {
  const { headers } = await season.head.get(api.houseRules(season.slug));
  expect(await read()).toEqual({ version: 1, changes: {}, history: [] });
  expect(headers.get('etag')).toBe('"1"');
});

it('stores what differs from the defaults, raises the revision and tells who changed what', async () => {
  const before = (await boardOf(season.head, season.slug)).season.revision;
  const body = { colourShiftHold: 4, darkSrm: 3, softened: ['tired-cake', 'tired-cake'] };
  const reply = await put(body, 1);
  expect([reply.status, reply.headers.get('etag')]).toEqual([200, '"2"']);
  expect(contract.parse(reply.body)).toMatchObject({
    version: 2,
    // A limit that is put at its default is none of one's own.
    changes: { colourShiftHold: 4, softened: ['tired-cake'] },
    history: [
      {
        by: season.person.name,
        what: 'Changed the house rules: colour shift for a Hold from ΔE 3 to ΔE 4, a hold of “Tired cake” from a Hold to a Mind',
        facts: [
          { label: 'colour shift for a Hold', from: 'ΔE 3', to: 'ΔE 4' },
          { label: 'a hold of “Tired cake”', from: 'a Hold', to: 'a Mind' },
        ],
      },
    ],
  });
  const board = await boardOf(season.head, season.slug);
  expect(board.houseRules).toEqual({ colourShiftHold: 4, softened: ['tired-cake'] });
  expect(board.season.revision).toBe(before + 1);
});

it('is changed from the version that was seen', async () => {
  await good(put({ darkSrm: 5 }, 1));
  const reply = await put({ darkSrm: 6 }, 1);
  expect([reply.status, reply.body]).toMatchObject([
    412,
    { current: { version: 2, changes: { darkSrm: 5 } } },
  ]);
});

it.each<[string, unknown, string[]]>([
  ['below its bound', { darkSrm: -1 }, ['/darkSrm']],
  ['above its bound', { freeHold: 0.9 }, ['/freeHold']],
  ['a mind behind its hold', { colourShiftMind: 5 }, ['/colourShiftMind']],
  ['a hold before its mind', { tiredOgHold: 1.05 }, ['/tiredOgHold']],
  ['each of several', { colourShiftMind: 5, pitchMind: 0.2 }, ['/colourShiftMind', '/pitchMind']],
  ['a softened allergen', { softened: ['allergen'] }, ['/softened']],
  ['a softened wild culture', { softened: ['wild-culture'] }, ['/softened']],
  ['an unknown limit', { patience: 3 }, ['/patience']],
])('refuses %s at the field', async (_name, body, pointers) => {
  const { status, body: document } = await put(body, 1);
  expect(status).toBe(422);
  const { errors } = document as { errors: { pointer: string; detail: string }[] };
  expect(errors.map(({ pointer }) => pointer).toSorted()).toEqual(pointers);
  expect((await read()).changes).toEqual({});
});

it('ends an acceptance where the link says something else now, and only there', async () => {
  const accept = async () => {
    const { version } = await batchOf(season.head, season.slug, b);
    const body = { reason: 'Strong on strong' };
    await good(season.head.ask('PUT', api.acceptance(season.slug, b), { body, version }));
  };
  await accept();
  await good(put({ underBeerHold: 90 }, 1));
  expect((await batchOf(season.head, season.slug, b)).link.acceptance).not.toBeNull();
  await good(put({ softened: ['tired-cake'] }, 2));
  expect((await batchOf(season.head, season.slug, b)).link.acceptance).toBeNull();
});

it('is undone as any change, with the acceptance that it ended', async () => {
  const { version } = await batchOf(season.head, season.slug, b);
  const body = { reason: 'Strong on strong' };
  await good(season.head.ask('PUT', api.acceptance(season.slug, b), { body, version }));
  await good(put({ softened: ['tired-cake'] }, 1));
  const { undo } = await boardOf(season.head, season.slug);
  await good(season.head.post(api.undo(season.slug), { changeId: undo?.id }));
  expect(await read()).toMatchObject({ version: 3, changes: {} });
  expect((await batchOf(season.head, season.slug, b)).link.acceptance).toMatchObject(body);
});

it('goes back to the defaults, and says so', async () => {
  await good(put({ darkSrm: 5, hopsMind: 0.8 }, 1));
  await good(put({}, 2));
  const { changes, history } = await read();
  expect(changes).toEqual({});
  expect(history[0]?.what).toBe('Put the house rules back to the defaults');
});

it('is read by all and changed by the head brewer', async () => {
  for (const role of ['brewer', 'taster'] as const) {
    const other = await joined(season, role);
    expect((await read(other)).version).toBe(1);
    expect((await put({ darkSrm: 5 }, 1, other)).status).toBe(403);
  }
});
