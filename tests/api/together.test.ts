import { afterAll, beforeAll, expect, it, vi } from 'vitest';
import type { Board } from '#shared/api/board.ts';
import { api } from '#shared/api/urls.ts';
import { lookUpMember } from '../../server/auth/lookUpMember.ts';
import { boardOf, good, testSeason } from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import { newcomer, Visitor } from '../support/visitor.ts';

let server: TestServer;

beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

/** Requests that come in together are looked up in one statement; each must get its own answer. */
it('tells requests apart that come in together', async () => {
  const one = await testSeason(server.url);
  const other = await testSeason(server.url);
  const out = await newcomer(server.url);
  await good(out.visitor.ask('DELETE', api.session));
  const seasonOf = async (visitor: Visitor, slug: string) =>
    (await good<Board>(visitor.get(api.board(slug)))).season.id;
  const own = [await seasonOf(one.head, one.slug), await seasonOf(other.head, other.slug)];
  const asked = [
    one.head.get(api.board(one.slug)),
    other.head.get(api.board(other.slug)),
    one.head.get(api.board(other.slug)),
    other.head.get(api.board(`${other.slug}/seasons/${own[1]}`)),
    other.head.get(api.board(`${other.slug}/seasons/${own[0]}`)),
    new Visitor(server.url).get(api.board(one.slug)),
    out.visitor.get(api.board(out.slug)),
    one.head.get(api.board('nobody-has-this-name')),
    one.head.get(api.board(one.slug)),
  ];
  const answers = await Promise.all(asked);
  expect(answers.map(({ status }) => status)).toEqual([
    200, 200, 404, 200, 404, 401, 401, 404, 200,
  ]);
  const seasons = answers.map(({ body }) => (body as Partial<Board>).season?.id);
  expect([0, 1, 3, 8].map((at) => seasons[at])).toEqual([own[0], own[1], own[1], own[0]]);
});

it('looks them up in one statement', async () => {
  const { slug, head } = await testSeason(server.url);
  await boardOf(head, slug);
  const { rows } = await server.pool.query<{ token_hash: string }>(
    'select token_hash from session order by created_at',
  );
  const query = vi.spyOn(server.pool, 'query');
  const found = await Promise.all(
    [...rows.map((row) => row.token_hash), 'nobody'].map((tokenHash) =>
      lookUpMember(server.db, { tokenHash, now: new Date(), slug, asked: null }),
    ),
  );
  expect(query).toHaveBeenCalledTimes(1);
  expect(rows.length).toBeGreaterThan(1);
  expect(found.map((each) => each !== undefined)).toEqual([...rows.map(() => true), false]);
  expect(found.filter((each) => each?.role === 'head-brewer')).toHaveLength(1);
});
