import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { JoinLinkMade, Member, Person } from '#shared/api/people.ts';
import type { RecordPage } from '#shared/api/record.ts';
import { api } from '#shared/api/urls.ts';
import { boardOf, good, joined, testSeason, type TestSeason } from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import type { Visitor } from '../support/visitor.ts';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const membersOf = ({ head, slug }: TestSeason, as: Visitor = head) =>
  good<Member[]>(as.get(api.members(slug)));
const idOf = async (visitor: Visitor) => (await good<Person>(visitor.get(api.session))).id;

async function memberOf(season: TestSeason, visitor: Visitor, as?: Visitor): Promise<Member> {
  const id = await idOf(visitor);
  const found = (await membersOf(season, as)).find(({ personId }) => personId === id);
  if (!found) throw new Error('Nobody like that');
  return found;
}

const become = (
  season: TestSeason,
  by: Visitor,
  { personId, version }: Pick<Member, 'personId' | 'version'>,
  role: string,
) => by.patch(api.member(season.slug, personId), { role }, version);

const sentences = async ({ head, slug }: TestSeason) => {
  const { season } = await boardOf(head, slug);
  const page = await good<RecordPage>(head.get(api.changes(slug, season.id)));
  return page.changes.map(({ what, person }) => `${person.name}: ${what}`);
};

describe('a role', () => {
  it('is changed from the version that was seen, and told on the board and in the record', async () => {
    const season = await testSeason(server.url);
    const ned = await joined(season, 'brewer');
    const row = await memberOf(season, ned);
    const before = await boardOf(season.head, season.slug);
    const answer = await become(season, season.head, row, 'taster');
    expect([answer.status, answer.body]).toMatchObject([200, { role: 'taster', version: 2 }]);
    const stale = await become(season, season.head, row, 'brewer');
    expect([stale.status, stale.body]).toMatchObject([412, { current: { role: 'taster' } }]);
    const board = await boardOf(ned, season.slug);
    expect(board.season.revision).toBe(before.season.revision + 1);
    expect([board.me.role, board.me.can.editBatches]).toEqual(['taster', false]);
    expect((await sentences(season))[0]).toBe(`${season.person.name}: Made The brewer a taster`);
    expect(board.undo).toBeNull();
  });

  it('is not another brewery’s to change', async () => {
    const [season, other] = [await testSeason(server.url), await testSeason(server.url)];
    const row = await memberOf(other, other.head);
    expect((await become(season, season.head, row, 'taster')).status).toBe(404);
  });

  it('of the last head brewer stays, with a sentence that says what to do', async () => {
    const season = await testSeason(server.url);
    const ned = await joined(season, 'brewer');
    const own = await memberOf(season, season.head);
    const less = await become(season, season.head, own, 'brewer');
    expect([less.status, less.body]).toMatchObject([
      409,
      {
        type: '/problems/last-head-brewer',
        detail: expect.stringMatching(/Make somebody else head brewer first/),
      },
    ]);
    const { slug, head } = season;
    const left = await head.ask('DELETE', api.membership(slug), { version: own.version });
    const removed = await head.ask('DELETE', api.member(slug, own.personId), {
      version: own.version,
    });
    expect([left.status, removed.status]).toEqual([409, 409]);
    expect((await memberOf(season, head)).role).toBe('head-brewer');
    expect((await boardOf(ned, slug)).members).toHaveLength(2);
  });
});

/** Two head brewers, and the two versions that both have seen. */
async function twoHeads() {
  const season = await testSeason(server.url);
  const second = await joined(season, 'head-brewer');
  const rows = [await memberOf(season, season.head), await memberOf(season, second)] as const;
  return { season, second, rows };
}
const headsOf = async (season: TestSeason) => {
  const { rows } = await server.pool.query<{ n: number }>(
    `select count(*)::int as n from membership m join brewery b on b.id = m.brewery_id
     where b.slug = $1 and m.role = 'head-brewer'`,
    [season.slug],
  );
  return rows[0]?.n;
};

describe('never without a head brewer, whoever asks at once', () => {
  it.each([1, 2, 3, 4, 5])('two who step down (%i)', async () => {
    const { season, second, rows } = await twoHeads();
    const answers = await Promise.all([
      become(season, season.head, rows[0], 'brewer'),
      become(season, second, rows[1], 'brewer'),
    ]);
    expect(answers.map(({ status }) => status).toSorted()).toEqual([200, 409]);
    expect(await headsOf(season)).toBe(1);
  });

  it.each([1, 2, 3])('two who demote each other (%i)', async () => {
    const { season, second, rows } = await twoHeads();
    const answers = await Promise.all([
      become(season, season.head, rows[1], 'taster'),
      become(season, second, rows[0], 'taster'),
    ]);
    expect(answers.map(({ status }) => status).toSorted()).toEqual([200, 403]);
    expect(await headsOf(season)).toBe(1);
  });

  it('one who leaves, one who is removed, one who hands over and steps down', async () => {
    const { season, second, rows } = await twoHeads();
    const { slug, head } = season;
    const version = 1;
    const answers = await Promise.all([
      head.ask('DELETE', api.membership(slug), { version }),
      second.ask('DELETE', api.membership(slug), { version }),
      head.ask('DELETE', api.member(slug, rows[1].personId), { version }),
      second.ask('DELETE', api.member(slug, rows[0].personId), { version }),
      second.post(api.handOver(slug, rows[0].personId), { stepDownTo: 'taster' }, version),
    ]);
    for (const { status } of answers) expect(status).toBeLessThan(500);
    expect(await headsOf(season)).toBeGreaterThanOrEqual(1);
  });
});

describe('handing over', () => {
  it('makes the other head brewer and oneself less, in one moment', async () => {
    const season = await testSeason(server.url);
    const ned = await joined(season, 'brewer');
    const row = await memberOf(season, ned);
    const url = api.handOver(season.slug, row.personId);
    const members = await good<Member[]>(season.head.post(url, { stepDownTo: 'brewer' }, 1));
    expect(members.map(({ role }) => role).toSorted()).toEqual(['brewer', 'head-brewer']);
    expect((await boardOf(ned, season.slug)).me.role).toBe('head-brewer');
    expect((await season.head.post(url, { stepDownTo: null }, 2)).status).toBe(403);
    expect(await sentences(season)).toEqual(
      expect.arrayContaining([
        `${season.person.name}: Made The brewer head brewer`,
        `${season.person.name}: Stepped down to a brewer`,
      ]),
    );
  });
});

describe('leaving and being removed', () => {
  it('ends the access, and keeps the name in the record', async () => {
    const season = await testSeason(server.url);
    const { slug, head } = season;
    const ned = await joined(season, 'brewer');
    const yeast = await boardOf(head, slug);
    const chain = yeast.chains[0];
    await good(
      ned.patch(api.chain(slug, chain?.id ?? ''), { name: 'Lantern row' }, chain?.version),
    );
    const row = await memberOf(season, ned);
    const gone = await head.ask('DELETE', api.member(slug, row.personId), { version: row.version });
    expect(gone.status).toBe(204);
    expect((await ned.get(api.board(slug))).status).toBe(404);
    expect((await good<Person>(ned.get(api.session))).breweries).toEqual([]);
    const told = await sentences(season);
    expect(told[0]).toBe(`${season.person.name}: Removed The brewer from the brewery`);
    expect(told.some((each) => each.startsWith('The brewer: '))).toBe(true);
  });

  it('takes one’s open invitations along, so that no way back was kept', async () => {
    const { season, second, rows } = await twoHeads();
    const { slug, head } = season;
    const body = { id: randomUUID(), role: 'head-brewer' };
    const { token } = await good<JoinLinkMade>(second.post(api.joinLinks(slug), body));
    await good(head.ask('DELETE', api.member(slug, rows[1].personId), { version: 1 }));
    expect((await second.post(api.join(token), {})).status).toBe(404);
    expect((await second.get(api.board(slug))).status).toBe(404);
  });

  it('is anybody’s own to do, and a join link leads back', async () => {
    const season = await testSeason(server.url);
    const { slug, head } = season;
    const taster = await joined(season, 'taster');
    expect((await taster.ask('DELETE', api.membership(slug))).status).toBe(428);
    await good(taster.ask('DELETE', api.membership(slug), { version: 1 }));
    expect((await sentences(season))[0]).toBe('The taster: Left the brewery');
    const { token } = await good<JoinLinkMade>(
      head.post(api.joinLinks(slug), { id: randomUUID(), role: 'brewer' }),
    );
    expect((await taster.get(api.join(token))).body).toMatchObject({ memberOf: null });
    await good(taster.post(api.join(token), {}));
    expect((await boardOf(taster, slug)).me.role).toBe('brewer');
  });
});

describe('several breweries', () => {
  it('are made by one person, each with its own season, and asked again made once', async () => {
    const season = await testSeason(server.url);
    const { head } = season;
    const body = { id: randomUUID(), name: 'Far Shore', timeZone: 'Europe/Lisbon' };
    const first = await good<{ brewerySlug: string; person: Person }>(
      head.post(api.breweries, body),
    );
    const again = await good<{ brewerySlug: string }>(head.post(api.breweries, body));
    expect(again.brewerySlug).toBe(first.brewerySlug);
    expect(first.person.breweries.map(({ role }) => role)).toEqual(['head-brewer', 'head-brewer']);
    const board = await boardOf(head, first.brewerySlug);
    expect([board.brewery.timeZone, board.batches.length]).toEqual(['Europe/Lisbon', 0]);
    const stranger = await testSeason(server.url);
    expect((await stranger.head.post(api.breweries, body)).status).toBe(409);
    const nowhere = { ...body, id: randomUUID(), timeZone: 'Nowhere/Else' };
    expect((await head.post(api.breweries, nowhere)).status).toBe(422);
  });

  it('say on a join link that one is in already', async () => {
    const season = await testSeason(server.url);
    const { head, slug } = season;
    const { token } = await good<JoinLinkMade>(
      head.post(api.joinLinks(slug), { id: randomUUID(), role: 'taster' }),
    );
    expect((await head.get(api.join(token))).body).toMatchObject({ memberOf: slug });
    const other = await testSeason(server.url);
    expect((await other.head.get(api.join(token))).body).toMatchObject({ memberOf: null });
    const body = await good<{ person: Person }>(other.head.post(api.join(token), {}));
    expect(body.person.breweries.map(({ role }) => role)).toEqual(['head-brewer', 'taster']);
  });
});
