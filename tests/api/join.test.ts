import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, expect, it } from 'vitest';
import type { JoinLink, JoinLinkMade, Person } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { testClock } from '../support/clock.ts';
import { whileHeld } from '../support/held.ts';
import { boardOf, good, joined } from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import { newcomer, PASSWORD, Visitor } from '../support/visitor.ts';

const clock = testClock('2027-03-01T09:00:00Z');
let server: TestServer;

beforeAll(async () => {
  server = await startTestServer({ clock });
});
afterAll(() => server.close());

async function invited(role: 'brewer' | 'taster' = 'brewer') {
  const { visitor: head, slug } = await newcomer(server.url, 'Estuary');
  const body = { id: randomUUID(), role };
  const link = await good<JoinLinkMade>(head.post(api.joinLinks(slug), body));
  return { head, slug, link, body };
}
const account = () => ({
  name: 'Tam',
  email: `${randomUUID()}@saltmarsh.example`,
  password: PASSWORD,
});

it('lets one newcomer in, in its role', async () => {
  const { head, slug, link } = await invited();
  const visitor = new Visitor(server.url);
  const preview = await visitor.get(api.join(link.token));
  expect(preview.body).toMatchObject({ breweryName: 'Estuary', role: 'brewer' });
  const answer = await visitor.post(api.join(link.token), account());
  expect([answer.status, answer.body]).toMatchObject([201, { brewerySlug: slug }]);
  const board = await boardOf(visitor, slug);
  expect(board.me.role).toBe('brewer');
  expect(board.members.map(({ initials }) => initials)).toContain('TA');
  const second = await new Visitor(server.url).post(api.join(link.token), account());
  expect([second.status, second.body]).toMatchObject([410, { type: '/problems/link-used' }]);
  const [listed] = await good<{ usedBy: string }[]>(head.get(api.joinLinks(slug)));
  expect(listed?.usedBy).toBe('Tam');
});

it('used by two at once lets one in', async () => {
  const { link } = await invited();
  const ask = () => new Visitor(server.url).post(api.join(link.token), account());
  const statuses = (await Promise.all([ask(), ask(), ask()])).map(({ status }) => status);
  expect(statuses.sort()).toEqual([201, 410, 410]);
});

it('takes somebody who is signed in as they are', async () => {
  const { slug, link } = await invited('taster');
  const { visitor } = await newcomer(server.url);
  expect((await visitor.post(api.join(link.token), {})).status).toBe(201);
  expect((await boardOf(visitor, slug)).me.role).toBe('taster');
});

it('leaves a member’s role alone, and stays good', async () => {
  const { head, slug, link } = await invited('taster');
  expect((await head.post(api.join(link.token), {})).status).toBe(409);
  expect((await boardOf(head, slug)).me.role).toBe('head-brewer');
  expect((await new Visitor(server.url).get(api.join(link.token))).status).toBe(200);
});

it('asks a visitor for what an account needs', async () => {
  const { link } = await invited();
  const { status, body } = await new Visitor(server.url).post(api.join(link.token), { name: 'T' });
  expect(status).toBe(422);
  expect(body).toMatchObject({ errors: [{ pointer: '/email' }, { pointer: '/password' }] });
});

it('runs out after seven days, and ends when it is withdrawn', async () => {
  const { head, slug, link } = await invited();
  clock.advance(7 * 24 * 60 * 60 * 1000);
  expect((await new Visitor(server.url).get(api.join(link.token))).status).toBe(410);
  const other = await good<JoinLinkMade>(
    head.post(api.joinLinks(slug), { id: randomUUID(), role: 'taster' }),
  );
  expect((await head.ask('DELETE', api.joinLink(slug, other.id))).status).toBe(204);
  expect((await new Visitor(server.url).get(api.join(other.token))).status).toBe(404);
});

/** Two head brewers, one of whom removes the other. */
async function twoHeads() {
  const { visitor: head, slug } = await newcomer(server.url, 'Estuary');
  const other = await joined({ head, slug }, 'head-brewer');
  const { id } = await good<Person>(other.get(api.session));
  const remove = () => head.ask('DELETE', api.member(slug, id), { version: 1 });
  const invite = (role: string) => other.post(api.joinLinks(slug), { id: randomUUID(), role });
  return { head, slug, otherId: id, remove, invite };
}

it('that a head brewer makes as they are removed is good for nobody', async () => {
  const { head, slug, otherId, remove, invite } = await twoHeads();
  const lock = ['select 1 from person where id = $1 for update', [otherId]] as const;
  const [, removed] = await whileHeld(server.pool, lock, 2, () =>
    Promise.all([invite('head-brewer'), remove()]),
  );
  expect(removed.status).toBe(204);
  const links = await good<JoinLink[]>(head.get(api.joinLinks(slug)));
  expect(links.filter(({ usedAt }) => usedAt === null)).toEqual([]);
});

it('of a head brewer who is being removed is used before that, or no more', async () => {
  const { slug, remove, invite } = await twoHeads();
  const { token } = await good<JoinLinkMade>(invite('brewer'));
  const lock = ['select 1 from brewery where slug = $1 for no key update', [slug]] as const;
  const replies = await whileHeld(server.pool, lock, 2, () =>
    Promise.all([new Visitor(server.url).post(api.join(token), account()), remove()]),
  );
  expect([
    [201, 204],
    [404, 204],
  ]).toContainEqual(replies.map(({ status }) => status));
});

it('stores the token’s hash alone; a repeated request gives a new token for the same link', async () => {
  const { head, slug, link, body } = await invited();
  const rows = await server.pool.query('select * from join_link');
  expect(JSON.stringify(rows.rows)).not.toContain(link.token);
  const again = await good<JoinLinkMade>(head.post(api.joinLinks(slug), body));
  expect(again.token).not.toBe(link.token);
  expect((await new Visitor(server.url).get(api.join(link.token))).status).toBe(404);
  expect(await good<unknown[]>(head.get(api.joinLinks(slug)))).toHaveLength(1);
});
