import { afterAll, beforeAll, expect, it } from 'vitest';
import { api } from '#shared/api/urls.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import { newcomer, PASSWORD, Visitor } from '../support/visitor.ts';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({
    limits: {
      signInByAccountAndAddress: { points: 3, seconds: 600 },
      clientErrorsByAddress: { points: 2, seconds: 600 },
      hashesAtOnce: 1,
      hashesWaiting: 1,
    },
  });
});
afterAll(() => server.close());

it('stops guessing at one account, and lets the others in', async () => {
  const [one, other] = [await newcomer(server.url), await newcomer(server.url)];
  const visitor = new Visitor(server.url);
  const wrong = { email: one.email, password: 'not the password' };
  for (let tries = 0; tries < 3; tries += 1)
    expect((await visitor.post(api.session, wrong)).status).toBe(401);
  const stopped = await visitor.post(api.session, { ...wrong, password: PASSWORD });
  expect(stopped.status).toBe(429);
  expect(Number(stopped.headers.get('retry-after'))).toBeGreaterThan(0);
  const right = { email: other.email, password: PASSWORD };
  for (let times = 0; times < 5; times += 1)
    expect((await visitor.post(api.session, right)).status).toBe(200);
});

it('hashes a few passwords at one time and asks the rest to wait', async () => {
  const tries = Array.from({ length: 8 }, (_, each) =>
    new Visitor(server.url).post(api.session, { email: `${each}@x.example`, password: 'x' }),
  );
  const statuses = (await Promise.all(tries)).map(({ status }) => status);
  expect(statuses).toContain(401);
  expect(statuses).toContain(503);
});

it('takes few faults of pages from one address', async () => {
  const tell = () => new Visitor(server.url).post(api.clientErrors, { message: 'TypeError: x' });
  expect([(await tell()).status, (await tell()).status, (await tell()).status]).toEqual([
    204, 204, 429,
  ]);
});
