import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { api } from '#shared/api/urls.ts';
import { testClock } from '../support/clock.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import { newcomer, PASSWORD, Visitor } from '../support/visitor.ts';

const DAY = 24 * 60 * 60 * 1000;
const clock = testClock('2027-03-01T09:00:00Z');
let server: TestServer;

beforeAll(async () => {
  server = await startTestServer({ clock });
});
afterAll(() => server.close());

describe('signing up and in', () => {
  it('makes a person, a brewery, a season and a head brewer', async () => {
    const { visitor, person, slug } = await newcomer(server.url, 'Ebb & Flood');
    expect(slug).toBe('ebb-flood');
    expect(person.breweries[0]?.role).toBe('head-brewer');
    const board = await visitor.get(api.board(slug));
    expect(board.status).toBe(200);
    expect(board.body).toMatchObject({
      season: { brewWeekdays: [6, 7], revision: 0 },
      batches: [],
      me: { role: 'head-brewer', can: { invite: true } },
    });
  });

  it('gives a second brewery of the same name an address of its own', async () => {
    const first = await newcomer(server.url, 'Twin');
    const second = await newcomer(server.url, 'Twin');
    expect([first.slug, second.slug]).toEqual(['twin', 'twin-2']);
  });

  it('refuses an address that has an account, whatever its capitals', async () => {
    const { email } = await newcomer(server.url);
    const body = { name: 'Again', email: email.toUpperCase(), password: PASSWORD };
    const again = await new Visitor(server.url).post(api.account, body);
    expect(again.status).toBe(409);
    expect(again.body).toMatchObject({ type: '/problems/already-exists' });
  });

  it('answers all that is wrong at once, each at its field', async () => {
    const body = { name: ' ', email: 'nobody', password: 'short', colour: 'red' };
    const {
      status,
      headers,
      body: document,
    } = await new Visitor(server.url).post(api.account, body);
    expect(status).toBe(422);
    expect(headers.get('content-type')).toContain('application/problem+json');
    const { errors } = document as { errors: { pointer: string }[] };
    const pointers = errors.map(({ pointer }) => pointer);
    expect(new Set(pointers)).toEqual(new Set(['/name', '/email', '/password', '/colour']));
  });

  it('signs in and out; after that the cookie opens nothing', async () => {
    const { email } = await newcomer(server.url);
    const visitor = new Visitor(server.url);
    expect((await visitor.get(api.session)).status).toBe(401);
    const signedIn = await visitor.post(api.session, { email: ` ${email} `, password: PASSWORD });
    expect(signedIn.status).toBe(200);
    expect(signedIn.body).toMatchObject({ email });
    const { cookie } = visitor;
    expect((await visitor.get(api.session)).status).toBe(200);
    expect((await visitor.ask('DELETE', api.session)).status).toBe(204);
    const stolen = await visitor.ask('GET', api.session, { headers: { Cookie: cookie } });
    expect(stolen.status).toBe(401);
  });

  it('stores neither the token nor the password', async () => {
    const { visitor } = await newcomer(server.url);
    const [, value = ''] = /barmkin=([^;]+)/.exec(visitor.cookie) ?? [];
    const { token } = JSON.parse(Buffer.from(value, 'base64').toString()) as { token: string };
    const sessions = await server.pool.query('select * from session');
    expect(JSON.stringify(sessions.rows)).not.toContain(token);
    const people = await server.pool.query('select password_hash from person');
    expect(JSON.stringify(people.rows)).not.toContain(PASSWORD);
    expect(JSON.stringify(people.rows)).toContain('$argon2id$v=19$m=19456,t=2,p=1$');
  });

  it('answers an unknown address and a wrong password alike', async () => {
    const { email } = await newcomer(server.url);
    const visitor = new Visitor(server.url);
    const wrong = await visitor.post(api.session, { email, password: 'not the password' });
    const unknown = await visitor.post(api.session, { email: 'no@one.example', password: 'x' });
    const said = ({ body }: { body: unknown }) => ({ ...(body as object), instance: '' });
    expect(wrong.status).toBe(401);
    expect(said(unknown)).toEqual(said(wrong));
  });

  it('takes a password in either Unicode form', async () => {
    const visitor = new Visitor(server.url);
    const account = {
      name: 'Zoé',
      email: 'zoe@saltmarsh.example',
      password: 'cafe\u0301 cafe\u0301 cafe',
    };
    expect((await visitor.post(api.account, account)).status).toBe(201);
    const composed = { email: account.email, password: 'caf\u00e9 caf\u00e9 cafe' };
    expect((await visitor.post(api.session, composed)).status).toBe(200);
  });

  it('keeps a session for thirty days of disuse, and longer with use', async () => {
    const { visitor } = await newcomer(server.url);
    clock.advance(29 * DAY);
    expect((await visitor.get(api.session)).status).toBe(200);
    clock.advance(29 * DAY);
    expect((await visitor.get(api.session)).status).toBe(200);
    clock.advance(31 * DAY);
    expect((await visitor.get(api.session)).status).toBe(401);
  });

  it('edits the account from the version that was seen', async () => {
    const { visitor, person } = await newcomer(server.url);
    expect((await visitor.patch(api.account, { theme: 'dark' })).status).toBe(428);
    const edited = await visitor.patch(api.account, { theme: 'dark' }, person.version);
    expect(edited.body).toMatchObject({ theme: 'dark', version: 2 });
    expect(edited.headers.get('etag')).toBe('"2"');
    const stale = await visitor.patch(api.account, { theme: 'light' }, person.version);
    expect(stale.status).toBe(412);
    expect(stale.body).toMatchObject({ current: { theme: 'dark', version: 2 } });
  });
});

describe('defence', () => {
  const sites: [string, Record<string, string>, number][] = [
    ['same-origin', { 'Sec-Fetch-Site': 'same-origin' }, 401],
    ['same-site', { 'Sec-Fetch-Site': 'same-site' }, 403],
    ['cross-site', { 'Sec-Fetch-Site': 'cross-site' }, 403],
    ['none', { 'Sec-Fetch-Site': 'none' }, 403],
  ];
  it.each(sites)(
    'takes a change that the browser calls %s as it should',
    async (_, headers, status) => {
      const body = { email: 'no@one.example', password: 'x' };
      const reply = await new Visitor(server.url).ask('POST', api.session, { body, headers });
      expect(reply.status).toBe(status);
    },
  );

  it('falls back to the origin where a browser says nothing', async () => {
    const ask = (origin: string | undefined) =>
      fetch(server.url + api.session, {
        method: 'POST',
        headers: { 'Content-Type': 'application/json', ...(origin && { Origin: origin }) },
        body: JSON.stringify({ email: 'no@one.example', password: 'x' }),
      }).then(({ status }) => status);
    expect(await ask(server.url)).toBe(401);
    expect(await ask('https://elsewhere.example')).toBe(403);
    expect(await ask(undefined)).toBe(403);
  });

  it('takes JSON alone', async () => {
    const headers = { 'Content-Type': 'application/x-www-form-urlencoded' };
    const form = await new Visitor(server.url).ask('POST', api.session, {
      raw: 'email=a',
      headers,
    });
    expect(form.status).toBe(415);
  });

  it('sends a strict content policy and a cookie that scripts cannot read', async () => {
    const visitor = new Visitor(server.url);
    const body = { name: 'Cookie', email: 'cookie@saltmarsh.example', password: PASSWORD };
    const { headers } = await visitor.post(api.account, body);
    const policy = headers.get('content-security-policy') ?? '';
    expect(policy).toContain("default-src 'self'");
    expect(policy).toContain("script-src 'self'");
    expect(policy).not.toContain('unsafe');
    for (const line of headers.getSetCookie()) expect(line).toMatch(/samesite=lax; httponly/i);
  });

  it('answers what is not there, or not done that way, as problems', async () => {
    const visitor = new Visitor(server.url);
    expect((await visitor.get('/api/nothing')).body).toMatchObject({ status: 404 });
    const wrong = await visitor.ask('PUT', api.session, { body: {} });
    expect(wrong.status).toBe(405);
    expect(wrong.headers.get('allow')).toBe('POST, GET, DELETE, HEAD');
    expect((await visitor.get('/api/breweries/%E0%A4%A/board')).status).toBe(400);
    const large = await visitor.post(api.session, { email: 'x'.repeat(300_000), password: '' });
    expect(large.status).toBe(413);
    expect((await visitor.ask('POST', api.session, { raw: '{"email":' })).status).toBe(400);
  });

  it('is healthy and ready', async () => {
    const visitor = new Visitor(server.url);
    expect((await visitor.get(api.health)).body).toEqual({ status: 'ok' });
    expect((await visitor.get(api.ready)).body).toEqual({ status: 'ok' });
  });
});
