import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { JoinLinkMade } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { routes } from '../../server/routes/routes.ts';
import { boardOf, good, joined, shelve, testSeason, type TestSeason } from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import { newcomer, Visitor } from '../support/visitor.ts';

type Role = 'head-brewer' | 'brewer' | 'taster';
const ALL: Role[] = ['head-brewer', 'brewer', 'taster'];
const BREWERS: Role[] = ['head-brewer', 'brewer'];
const HEAD: Role[] = ['head-brewer'];

/** Who may do what inside a brewery. Written out, so that a policy cannot change unseen. */
const MAY: Record<string, Role[]> = {
  readBoard: ALL,
  watchSeason: ALL,
  readBrewery: ALL,
  listMembers: ALL,
  editBrewery: HEAD,
  listJoinLinks: HEAD,
  makeJoinLink: HEAD,
  withdrawJoinLink: HEAD,
  editSeason: HEAD,
  readRecord: ALL,
  readHouseRules: ALL,
  changeHouseRules: HEAD,
  pullDates: BREWERS,
  addYeast: HEAD,
  editYeast: HEAD,
  deleteYeast: HEAD,
  addVessel: HEAD,
  editVessel: HEAD,
  deleteVessel: HEAD,
  addChain: BREWERS,
  editChain: BREWERS,
  deleteChain: BREWERS,
  readTalk: ALL,
  addComment: ALL,
  editComment: ALL,
  removeComment: ALL,
  markTalkSeen: ALL,
  addBatch: BREWERS,
  editBatch: BREWERS,
  deleteBatch: BREWERS,
  setStage: BREWERS,
  editLink: BREWERS,
  acceptHold: HEAD,
  withdrawAcceptance: HEAD,
  listShareLinks: BREWERS,
  makeShareLink: HEAD,
  editShareLink: HEAD,
  withdrawShareLink: HEAD,
  copySharedChain: BREWERS,
  moveBatch: BREWERS,
  undo: BREWERS,
  redo: BREWERS,
};
/** What needs a person, in whatever brewery. */
const SIGNED_IN = ['whoIsSignedIn', 'editAccount', 'checkChain'];
/** What anybody may ask. */
const OPEN = [
  'openApi',
  'health',
  'ready',
  'tellFault',
  'signIn',
  'signOut',
  'signUp',
  'readJoinLink',
  'readSharedChain',
  'join',
];

let server: TestServer;
let season: TestSeason;
let people: Record<Role, Visitor>;
let stranger: Visitor;
let ids: Record<string, string>;

beforeAll(async () => {
  server = await startTestServer();
  season = await testSeason(server.url);
  const [batch = ''] = await shelve(season, season.chainA, [{ name: 'A' }]);
  people = {
    'head-brewer': season.head,
    brewer: await joined(season, 'brewer'),
    taster: await joined(season, 'taster'),
  };
  stranger = (await newcomer(server.url, 'Elsewhere')).visitor;
  const link = await good<JoinLinkMade>(
    season.head.post(api.joinLinks(season.slug), { id: randomUUID(), role: 'taster' }),
  );
  ids = {
    seasons: (await boardOf(season.head, season.slug)).season.id,
    yeasts: season.yeastId,
    vessels: season.vesselId,
    chains: season.chainA,
    batches: batch,
    'join-links': link.id,
    'share-links': (
      await good<{ id: string }>(
        season.head.post(api.shareLinks(season.slug, season.chainA), {
          id: randomUUID(),
          name: 'Shared',
          expiresOn: (await boardOf(season.head, season.slug)).today,
          showPrices: false,
        }),
      )
    ).id,
  };
});
afterAll(() => server.close());

const operations = routes.map(({ operation }) => operation);
const called = (name: string) => {
  const found = operations.find((operation) => operation.name === name);
  if (!found) throw new Error(`No operation ${name}`);
  return found;
};

/** The real address of what is there, with a body that says nothing: nothing is changed by asking. */
function ask(visitor: Visitor, name: string) {
  const { method, path, body } = called(name);
  const resource = /:brewery\/([a-z-]+)\/:id/.exec(path)?.[1] ?? '';
  const address = path
    .replace(':brewery', season.slug)
    .replace(':id', ids[resource] ?? '')
    .replace(':commentId', randomUUID());
  return visitor.ask(method, address, body ? { body: {} } : {});
}

it('lists every operation', () => {
  const listed = [...Object.keys(MAY), ...SIGNED_IN, ...OPEN];
  expect(operations.map(({ name }) => name).toSorted()).toEqual(listed.toSorted());
});

describe.each(Object.entries(MAY))('%s', (name, roles) => {
  it('does not exist for another brewery’s people', async () => {
    const { status, body } = await ask(stranger, name);
    expect([status, body]).toMatchObject([404, { type: '/problems/not-found' }]);
  });

  it('asks a visitor to sign in', async () => {
    const { status, body } = await ask(new Visitor(server.url), name);
    expect([status, body]).toMatchObject([401, { type: '/problems/not-signed-in' }]);
  });

  it.each(ALL.toReversed())(`is for ${roles.join(', ')}: %s`, async (role) => {
    const { status, body } = await ask(people[role], name);
    if (roles.includes(role)) expect([200, 204, 422, 428]).toContain(status);
    else expect([status, body]).toMatchObject([403, { type: '/problems/not-allowed' }]);
  });
});

it.each(SIGNED_IN)('%s needs a person and no brewery', async (name) => {
  expect((await ask(new Visitor(server.url), name)).status).toBe(401);
  expect([200, 422, 428]).toContain((await ask(stranger, name)).status);
});

it.each<[Role, string[]]>([
  [
    'head-brewer',
    [
      'editBatches',
      'moveBatches',
      'moveAcross',
      'setStages',
      'editChains',
      'editYeastsAndVessels',
      'editSeason',
      'acceptHolds',
      'invite',
    ],
  ],
  ['brewer', ['editBatches', 'moveBatches', 'moveAcross', 'setStages', 'editChains']],
  ['taster', []],
])('tells the page of a %s what is allowed', async (role, granted) => {
  const { can } = (await boardOf(people[role], season.slug)).me;
  const keys = Object.entries(can).filter(([, allowed]) => allowed);
  expect(keys.map(([key]) => key)).toEqual(granted);
});

it('finds nothing of another brewery under one’s own', async () => {
  const other = await testSeason(server.url);
  const [foreign = ''] = await shelve(other, other.chainA, [{ name: 'Foreign' }]);
  const { slug, head } = season;
  const asked = [
    head.patch(api.batch(slug, foreign), { ibu: 1 }, 1),
    head.patch(api.chain(slug, other.chainA), { name: 'Mine' }, 1),
    head.patch(api.yeast(slug, other.yeastId), { name: 'Mine' }, 1),
    head.patch(api.vessel(slug, other.vesselId), { name: 'Mine' }, 1),
    head.ask('DELETE', api.batch(slug, foreign), { version: 1 }),
    head.post(api.batchStage(slug, foreign), { stage: 'pencilled' }, 1),
    head.post(api.moves(slug), {
      id: randomUUID(),
      batchId: foreign,
      toChainId: 'bench',
      afterBatchId: null,
      expectedChainId: other.chainA,
      dates: 'pull',
    }),
  ];
  for (const reply of await Promise.all(asked)) expect(reply.status).toBe(404);
});
