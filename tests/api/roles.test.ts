import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { JoinLinkMade } from '#shared/api/people.ts';
import type { ShareLinkMade } from '#shared/api/share.ts';
import { api } from '#shared/api/urls.ts';
import { routes } from '../../server/routes/routes.ts';
import { guestOn, invited } from '../support/guests.ts';
import { boardOf, good, joined, shelve, testSeason, type TestSeason } from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import { newcomer, Visitor, type Reply } from '../support/visitor.ts';

type Role = 'head-brewer' | 'brewer' | 'taster';
/** Everybody who may come by. Only the first three belong to the brewery. */
const WHO = [
  'taster',
  'brewer',
  'head-brewer',
  'guest taster',
  'guest brewer',
  'link visitor',
  'stranger',
  'other brewery',
] as const;
type Who = (typeof WHO)[number];

const ALL: Who[] = ['head-brewer', 'brewer', 'taster'];
const BREWERS: Who[] = ['head-brewer', 'brewer'];
const HEAD: Who[] = ['head-brewer'];
const WITH_GUESTS: Who[] = [...ALL, 'guest brewer', 'guest taster'];
/** On the guest's own chain; each such route asks it again of the batch. */
const WITH_GUEST_BREWER: Who[] = [...BREWERS, 'guest brewer'];

/** Who may do what inside a brewery. Written out, so that a policy cannot change unseen. */
const MAY: Record<string, Who[]> = {
  readBoard: WITH_GUESTS,
  readToday: ALL,
  watchSeason: ALL,
  readBrewery: ALL,
  listMembers: ALL,
  changeRole: HEAD,
  removeMember: HEAD,
  handOver: HEAD,
  leaveBrewery: ALL,
  editBrewery: HEAD,
  listJoinLinks: HEAD,
  makeJoinLink: HEAD,
  withdrawJoinLink: HEAD,
  listSeasons: ALL,
  addSeason: HEAD,
  editSeason: HEAD,
  deleteSeason: HEAD,
  makeSeasonCurrent: HEAD,
  archiveSeason: HEAD,
  reopenSeason: HEAD,
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
  editBatch: WITH_GUEST_BREWER,
  deleteBatch: BREWERS,
  setStage: BREWERS,
  editLink: WITH_GUEST_BREWER,
  readBatchRecord: ALL,
  addReading: BREWERS,
  editReading: BREWERS,
  deleteReading: BREWERS,
  signCakeCheck: BREWERS,
  withdrawCakeCheck: BREWERS,
  addBatchNote: BREWERS,
  editBatchNote: BREWERS,
  deleteBatchNote: BREWERS,
  addBatchEvent: BREWERS,
  editBatchEvent: BREWERS,
  deleteBatchEvent: BREWERS,
  listInstruments: ALL,
  addInstrument: BREWERS,
  editInstrument: BREWERS,
  readPour: ALL,
  openPour: BREWERS,
  stepPour: BREWERS,
  readWort: BREWERS,
  withdrawWortReading: BREWERS,
  askOverride: BREWERS,
  answerOverride: HEAD,
  recordPour: BREWERS,
  signPour: HEAD,
  takeOverPour: BREWERS,
  leavePour: BREWERS,
  acceptHold: HEAD,
  withdrawAcceptance: HEAD,
  listShareLinks: BREWERS,
  makeShareLink: HEAD,
  editShareLink: HEAD,
  withdrawShareLink: HEAD,
  copySharedChain: BREWERS,
  listGuests: BREWERS,
  inviteGuest: HEAD,
  withdrawGuest: HEAD,
  moveBatch: WITH_GUEST_BREWER,
  undo: WITH_GUEST_BREWER,
  redo: WITH_GUEST_BREWER,
};
/** What needs a person, in whatever brewery, with the answer to a request that says nothing. */
const SIGNED_IN: Record<string, number> = {
  whoIsSignedIn: 200,
  editAccount: 428,
  changeEmail: 428,
  changePassword: 422,
  listSignIns: 200,
  endSignIn: 404,
  endOtherSignIns: 204,
  readClosing: 200,
  takeDataAlong: 200,
  closeAccount: 422,
  makeBrewery: 422,
  leaveGuestShelf: 404,
  checkChain: 422,
  checkPour: 422,
  acceptGuestInvitation: 422,
};
/** What anybody may ask, and the answer. A link's own token opens its chain; made-up ones open nothing. */
const OPEN: Record<string, number> = {
  openApi: 200,
  health: 200,
  ready: 200,
  tellFault: 422,
  signIn: 422,
  signOut: 204,
  signUp: 422,
  readJoinLink: 404,
  join: 404,
  readGuestInvitation: 404,
  readSharedChain: 200,
};

let server: TestServer;
let season: TestSeason;
let people: Record<Who, Visitor>;
let ids: Record<string, string>;
/** Of a read-only link to the chain. */
let token: string;

beforeAll(async () => {
  server = await startTestServer();
  season = await testSeason(server.url);
  const [batch = ''] = await shelve(season, season.chainA, [{ name: 'A' }]);
  people = {
    'head-brewer': season.head,
    brewer: await joined(season, 'brewer'),
    taster: await joined(season, 'taster'),
    'guest brewer': (await guestOn(season, season.chainA, 'brewer')).visitor,
    'guest taster': (await guestOn(season, season.chainA, 'taster')).visitor,
    'link visitor': new Visitor(server.url),
    stranger: new Visitor(server.url),
    'other brewery': (await newcomer(server.url, 'Elsewhere')).visitor,
  };
  const { today } = await boardOf(season.head, season.slug);
  const share = (name: string) => {
    const body = { id: randomUUID(), name, expiresOn: today, showPrices: false };
    return good<ShareLinkMade>(season.head.post(api.shareLinks(season.slug, season.chainA), body));
  };
  const shared = await share('To be withdrawn');
  token = (await share('To stay')).token;
  await good(people['link visitor'].get(api.shared(token)));
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
    'share-links': shared.id,
    instruments: await anInstrument(),
    guests: (await invited(season, season.chainA)).id,
    members: season.person.id,
  };
});
afterAll(() => server.close());

async function anInstrument(): Promise<string> {
  const body = { name: 'Glass', kind: 'hydrometer', correction: 0, calibratedC: 20 };
  const id = randomUUID();
  const made = { id, ...body, notes: '', typed: {} };
  await good(season.head.post(api.instruments(season.slug), made));
  return id;
}

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
    .replace(':id', ids[resource] ?? randomUUID())
    .replace(':season', ids.seasons ?? '')
    .replace(/:[a-z]+Id/, randomUUID())
    .replace(':mark', 'made-up')
    .replace(':token', name === 'readSharedChain' ? token : 'made-up');
  return visitor.ask(method, address, body ? { body: {} } : {});
}

/** What the one who may is answered: the request says nothing, so it is not carried out where it must say something. */
function answerOf(name: string): number {
  const { ifMatch, body, status } = called(name);
  return ifMatch ? 428 : body ? 422 : status;
}

/** Others are told no more than they know already: strangers to sign in, other breweries that there is nothing. */
function refusalOf(name: string, who: Who): number {
  if (who === 'stranger' || who === 'link visitor') return 401;
  if (who === 'other brewery') return 404;
  if (who === 'guest brewer' || who === 'guest taster')
    return MAY[name]?.includes('guest brewer') ? 403 : 404;
  return 403;
}

const KIND: Readonly<Record<number, string>> = {
  401: '/problems/not-signed-in',
  403: '/problems/not-allowed',
  404: '/problems/not-found',
};

/** Refused for what it is, not by a border before it or an address that leads nowhere. */
function expectRefusal(reply: Reply, status: number): void {
  expect([reply.status, reply.body]).toEqual([
    status,
    expect.objectContaining({ type: KIND[status] }),
  ]);
}

it('lists every operation', () => {
  const listed = [MAY, SIGNED_IN, OPEN].flatMap((table) => Object.keys(table));
  expect(operations.map(({ name }) => name).toSorted()).toEqual(listed.toSorted());
});

describe.each(Object.entries(MAY))('%s', (name, allowed) => {
  it.each(WHO)(`is for ${allowed.join(', ')}: %s`, async (who) => {
    const reply = await ask(people[who], name);
    if (!allowed.includes(who)) return expectRefusal(reply, refusalOf(name, who));
    expect(reply.status).toBe(answerOf(name));
  });
});

describe.each(Object.entries(SIGNED_IN))('%s needs a person and no brewery', (name, answer) => {
  it.each(WHO)('%s', async (who) => {
    const reply = await ask(people[who], name);
    if (who === 'stranger' || who === 'link visitor') expectRefusal(reply, 401);
    else expect(reply.status).toBe(answer);
  });
});

describe.each(Object.entries(OPEN))('%s is open', (name, answer) => {
  // Signing out would end the session of whoever asks.
  const who = name === 'signOut' ? (['stranger', 'link visitor'] as const) : WHO;
  it.each(who)('to %s', async (each) => {
    expect((await ask(people[each], name)).status).toBe(answer);
  });
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
