import { randomUUID } from 'node:crypto';
import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { AccountData, ClosingPreview, SignInPlace } from '#shared/api/account.ts';
import type { Person } from '#shared/api/people.ts';
import type { RecordPage } from '#shared/api/record.ts';
import { api } from '#shared/api/urls.ts';
import { LEFT_OUT, tablesOf } from '../../server/routes/account/takeAlong.ts';
import { guestOn } from '../support/guests.ts';
import { batchOf, boardOf, good, joined, shelve, testSeason } from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import { newcomer, PASSWORD, Visitor } from '../support/visitor.ts';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({
    limits: { passwordByPersonAndAddress: { points: 3, seconds: 600 } },
  });
});
afterAll(() => server.close());

async function signedIn(email: string, password = PASSWORD, userAgent?: string) {
  const visitor = new Visitor(server.url);
  const headers: Record<string, string> = userAgent ? { 'User-Agent': userAgent } : {};
  await good(visitor.ask('POST', api.session, { body: { email, password }, headers }));
  return visitor;
}
const NEW = 'another long sentence';

describe('the address', () => {
  it('changes with the password, from the version that was seen', async () => {
    const { visitor, person } = await newcomer(server.url);
    const email = `new-${person.email}`;
    const change = (body: object, version = 1) =>
      visitor.ask('PUT', api.accountEmail, { body, version });
    const wrong = await change({ email, password: 'not the password' });
    expect([wrong.status, wrong.body]).toMatchObject([
      422,
      { errors: [{ pointer: '/password', detail: expect.stringContaining('not your password') }] },
    ]);
    const body = await good<Person>(change({ email, password: PASSWORD }));
    expect(body).toMatchObject({ email, version: 2 });
    expect((await change({ email, password: PASSWORD })).status).toBe(412);
    await signedIn(email);
    const old = { email: person.email, password: PASSWORD };
    expect((await new Visitor(server.url).post(api.session, old)).status).toBe(401);
  });

  it('of somebody else is refused at its field', async () => {
    const [one, other] = [await newcomer(server.url), await newcomer(server.url)];
    const body = { email: other.email.toUpperCase(), password: PASSWORD };
    const refused = await one.visitor.ask('PUT', api.accountEmail, { body, version: 1 });
    expect([refused.status, refused.body]).toMatchObject([
      409,
      { errors: [{ pointer: '/email' }] },
    ]);
  });
});

describe('the password', () => {
  it('changes, and signs out everywhere but here', async () => {
    const { visitor, email } = await newcomer(server.url);
    const other = await signedIn(email);
    const body = { password: PASSWORD, newPassword: NEW };
    expect((await visitor.ask('PUT', api.accountPassword, { body })).status).toBe(204);
    expect((await other.get(api.session)).status).toBe(401);
    expect((await visitor.get(api.session)).status).toBe(200);
    await signedIn(email, NEW);
  });

  it.each([
    ['at sign-up', api.account, 'password', { name: 'Tam', email: 'tam-common@x.example' }],
    ['when it is changed', api.accountPassword, 'newPassword', { password: PASSWORD }],
  ] as const)('is no common one %s, whatever its capitals', async (_, url, field, rest) => {
    const { visitor } = await newcomer(server.url);
    const method = url === api.account ? 'POST' : 'PUT';
    const body = { ...rest, [field]: 'QwertyUiop' };
    const refused = await visitor.ask(method, url, { body });
    expect([refused.status, refused.body]).toMatchObject([
      422,
      { errors: [{ pointer: `/${field}`, detail: expect.stringContaining('choose another') }] },
    ]);
  });

  it('is not guessed on and on by who found a browser open; the owner still signs in', async () => {
    const { visitor, email } = await newcomer(server.url);
    const tryOne = (password: string) =>
      visitor.ask('PUT', api.accountPassword, { body: { password, newPassword: NEW } });
    for (let tries = 0; tries < 3; tries += 1) expect((await tryOne('guess it')).status).toBe(422);
    const stopped = await tryOne(PASSWORD);
    expect(stopped.status).toBe(429);
    expect(Number(stopped.headers.get('retry-after'))).toBeGreaterThan(0);
    await signedIn(email);
  });
});

describe('sign-ins', () => {
  const FIREFOX = 'Mozilla/5.0 (X11; Linux x86_64; rv:128.0) Gecko/20100101 Firefox/128.0';
  const list = (visitor: Visitor) => good<SignInPlace[]>(visitor.get(api.signIns));

  it('are listed by device, and end one at a time or all but this', async () => {
    const { visitor, email } = await newcomer(server.url);
    const [one, two, three] = [
      await signedIn(email, PASSWORD, FIREFOX),
      await signedIn(email),
      await signedIn(email),
    ];
    const places = await list(visitor);
    expect(places.map(({ isThisOne }) => isThisOne).filter(Boolean)).toHaveLength(1);
    const firefox = places.find(({ device }) => device === 'Firefox on Linux');
    expect((await visitor.ask('DELETE', api.signInOf(firefox?.mark ?? ''))).status).toBe(204);
    expect((await one.get(api.session)).status).toBe(401);
    expect((await two.get(api.session)).status).toBe(200);
    expect((await visitor.ask('DELETE', api.signIns)).status).toBe(204);
    expect((await two.get(api.session)).status).toBe(401);
    expect((await three.get(api.session)).status).toBe(401);
    expect(await list(visitor)).toHaveLength(1);
  });

  it('are nobody else’s: a mark opens and ends nothing, and tells no token', async () => {
    const [one, other] = [await newcomer(server.url), await newcomer(server.url)];
    const [place] = await list(one.visitor);
    expect((await other.visitor.ask('DELETE', api.signInOf(place?.mark ?? ''))).status).toBe(404);
    const { rows } = await server.pool.query<{ token_hash: string }>(
      'select token_hash from session',
    );
    expect(rows.map(({ token_hash }) => token_hash)).not.toContain(place?.mark);
    expect((await one.visitor.get(api.session)).status).toBe(200);
  });
});

const comment = () => ({ id: randomUUID(), about: { kind: 'chain' }, text: 'Hazy' });
const preview = (visitor: Visitor) => good<ClosingPreview>(visitor.get(api.accountClosing));
const close = (visitor: Visitor, losing: string[], password = PASSWORD) =>
  visitor.post(api.accountClosing, { password, losing });

describe('closing the account', () => {
  it('is refused to the only head brewer among others, naming the brewery', async () => {
    const season = await testSeason(server.url);
    await joined(season, 'brewer');
    expect(await preview(season.head)).toMatchObject({ goes: [], heldBy: [{ slug: season.slug }] });
    const refused = await close(season.head, []);
    expect([refused.status, refused.body]).toMatchObject([
      409,
      { type: '/problems/last-head-brewer', detail: expect.stringContaining('Test brewery') },
    ]);
    expect((await season.head.get(api.session)).status).toBe(200);
  });

  it('asks for the password, and for what will be lost to have been seen', async () => {
    const { visitor, person } = await newcomer(server.url);
    const id = person.breweries[0]?.brewery.id ?? '';
    expect((await close(visitor, [id], 'not the password')).status).toBe(422);
    const unseen = await close(visitor, []);
    expect([unseen.status, unseen.body]).toMatchObject([412, { current: { goes: [{ id }] } }]);
    expect((await visitor.get(api.session)).status).toBe(200);
  });

  it('takes a brewery along that nobody else belongs to, and nothing of any other', async () => {
    const [season, other] = [await testSeason(server.url), await testSeason(server.url)];
    const { head, slug, chainA } = season;
    const [low = ''] = await shelve(season, chainA, [{ name: 'Low' }, { name: 'Jetty' }]);
    await good(head.post(api.comments(slug, chainA), comment()));
    const start = { kind: 'cake', batchId: low };
    const branch = {
      id: randomUUID(),
      name: 'Branch',
      yeastId: season.yeastId,
      vesselId: null,
      start,
    };
    await good(head.post(api.chains(slug), branch));
    const guest = await guestOn(season, chainA);
    const { goes } = await preview(head);
    expect(goes).toMatchObject([
      { seasons: 1, chains: 3, batches: 2, yeasts: 1, vessels: 1, shared: 1 },
    ]);
    const rows = async () =>
      (
        await server.pool.query<{ n: number }>(
          'select count(*)::int as n from change where brewery_id = $1',
          [goes[0]?.id],
        )
      ).rows[0]?.n;
    expect(await rows()).toBeGreaterThan(0);
    expect((await close(head, [goes[0]?.id ?? ''])).status).toBe(204);
    expect((await head.get(api.session)).status).toBe(401);
    expect(await rows()).toBe(0);
    for (const { table, rows: picked } of await tablesOf(server.db, goes[0]?.id ?? '')) {
      if (picked === null) continue;
      const left = await server.db.execute(
        sql`select 1 from ${sql.identifier(table)} t where ${picked}`,
      );
      expect([table, left.rows.length]).toEqual([table, 0]);
    }
    expect((await boardOf(guest.visitor, guest.slug)).guests).toEqual([]);
    expect((await boardOf(other.head, other.slug)).chains).toHaveLength(2);
  });

  it('leaves the others’ record whole, with "a former brewer" for the name', async () => {
    const season = await testSeason(server.url);
    const { head, slug, chainA } = season;
    const ned = await joined(season, 'head-brewer');
    const batches = [
      { name: 'Long Night', og: 1.095, fg: 1.024, srm: 42, ibu: 60, brewOn: '2027-03-06' },
      { name: 'Pale', brewOn: '2027-03-20' },
    ];
    const [, pale = ''] = await shelve(season, chainA, batches);
    const { version } = await batchOf(ned, slug, pale);
    await good(
      ned.ask('PUT', api.acceptance(slug, pale), { body: { reason: 'We like it so' }, version }),
    );
    const { email } = await good<Person>(ned.get(api.session));
    expect(await preview(ned)).toMatchObject({ goes: [], heldBy: [], stays: [{ slug }] });
    expect((await close(ned, [])).status).toBe(204);
    const { season: row, members } = await boardOf(head, slug);
    expect(members).toHaveLength(1);
    const page = await good<RecordPage>(head.get(api.changes(slug, row.id)));
    const [left, accepted] = page.changes;
    expect([left?.what, left?.person.name]).toEqual(['Left the brewery', 'A former brewer']);
    expect(accepted?.person.name).toBe('A former brewer');
    expect((await batchOf(head, slug, pale)).link.acceptance?.by).toBe('A former brewer');
    const dump = await server.pool.query(
      'select to_jsonb(c) as row from change c where c.season_id = $1',
      [row.id],
    );
    expect(JSON.stringify(dump.rows)).not.toContain('The head-brewer');
    expect(
      (await new Visitor(server.url).post(api.session, { email, password: PASSWORD })).status,
    ).toBe(401);
    // The address is free again.
    const again = { name: 'Ned', email, password: PASSWORD };
    expect((await new Visitor(server.url).post(api.account, again)).status).toBe(201);
  });

  it('keeps the record append-only for everything else', async () => {
    const season = await testSeason(server.url);
    await shelve(season, season.chainA, [{ name: 'A' }]);
    for (const statement of [
      'delete from change',
      "update change set what = ''",
      'truncate change cascade',
    ])
      await expect(server.pool.query(statement)).rejects.toThrow('append-only');
  });
});

describe('the data to take along', () => {
  it('holds every table that belongs to a brewery, and no secret', async () => {
    const season = await testSeason(server.url);
    await shelve(season, season.chainA, [{ name: 'Creek Blonde' }]);
    await guestOn(season, season.chainA);
    const reply = await season.head.get(api.accountData);
    expect(reply.headers.get('content-disposition')).toContain('barmkin-data.json');
    const { account, breweries } = reply.body as AccountData;
    expect(account.email).toBe(season.person.email);
    const [data] = breweries;
    expect(data?.batch).toMatchObject([{ name: 'Creek Blonde' }]);
    expect(data?.chain).toHaveLength(2);
    expect(data?.change?.length).toBeGreaterThan(0);
    expect(JSON.stringify(reply.body)).not.toMatch(/token_hash|password/);
    const tables = await tablesOf(server.db, season.person.breweries[0]?.brewery.id ?? '');
    for (const { table, rows } of tables) {
      const isKnown = LEFT_OUT.includes(table) || (rows !== null && data?.[table] !== undefined);
      expect([table, isKnown]).toEqual([table, true]);
    }
  });
});
