import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { problem } from '#shared/api/problem.ts';
import { api } from '#shared/api/urls.ts';
import { openApiDocument } from '../../server/openapi.ts';
import { routes } from '../../server/routes/routes.ts';
import { BROKEN_BODIES, mutations, type JsonSchema } from '../support/malformed.ts';
import { boardOf, good, shelve, testSeason, type TestSeason } from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import { PASSWORD, Visitor, type Reply } from '../support/visitor.ts';

const many = { points: 1_000_000, seconds: 60 };
let server: TestServer;
let season: TestSeason;
let ids: Record<string, string>;

beforeAll(async () => {
  server = await startTestServer({
    limits: {
      signInByAccountAndAddress: many,
      signInByAddress: many,
      passwordByPersonAndAddress: many,
      breweriesByPerson: many,
      signUpByAddress: many,
      joinByAddress: many,
      sharedByAddress: many,
      clientErrorsByAddress: many,
      checksByPerson: many,
    },
  });
  season = await testSeason(server.url);
  const [batch = ''] = await shelve(season, season.chainA, [{ name: 'A' }]);
  ids = {
    seasons: (await boardOf(season.head, season.slug)).season.id,
    yeasts: season.yeastId,
    vessels: season.vesselId,
    chains: season.chainA,
    batches: batch,
    'join-links': batch,
    'share-links': batch,
    guests: batch,
    members: batch,
    instruments: batch,
  };
});
afterAll(() => server.close());

/** A session for each operation: some end it. */
async function signedIn(): Promise<Visitor> {
  const visitor = new Visitor(server.url);
  const { email } = season.person;
  await good(visitor.post(api.session, { email, password: PASSWORD }));
  return visitor;
}

interface Operation {
  name: string;
  method: string;
  path: string;
  schema: JsonSchema | undefined;
}

/** Every operation of the document, as somebody from outside would read it. */
function operations(): Operation[] {
  const document = JSON.parse(JSON.stringify(openApiDocument(routes))) as {
    paths: Record<string, Record<string, Described>>;
  };
  return Object.entries(document.paths).flatMap(([path, methods]) =>
    Object.entries(methods).map(([method, described]) => ({
      name: described.operationId,
      method,
      path,
      schema: described.requestBody?.content['application/json'].schema,
    })),
  );
}
interface Described {
  operationId: string;
  requestBody?: { content: { 'application/json': { schema: JsonSchema } } };
}

const ODD_NAMES = ['%00', '%E0%A4%A', '..%2f..', "'%20or%201=1", 'x'.repeat(3000), '%F0%9F%8D%BA'];
const ODD_IDS = [...ODD_NAMES, '1', 'c0ffee00-0000-4000-8000-00000000000', 'null', '-1', '0x10'];
const ODD_TAGS = ['', '*', 'W/"x"', '"99999999999999999999"', '"-1"', '"1.5"', '1', '"1", "2"'];
const ODD_COOKIES = ['barmkin=x', 'barmkin=e30=; barmkin.sig=x', '=;=', `a=${'x'.repeat(4000)}`];
const ENDS_SESSIONS = ['signIn', 'signOut'];

function address({ path }: Operation): string {
  const resource = /\{brewery\}\/([a-z-]+)\/\{id\}/.exec(path)?.[1] ?? '';
  return path
    .replace('{brewery}', season.slug)
    .replace('{id}', ids[resource] ?? season.chainA)
    .replace('{mark}', 'no-such-mark')
    .replace('{season}', ids.seasons ?? '')
    .replace(/\{[a-z]+Id\}/, ids[resource] ?? '')
    .replace('{token}', 'no-such-token');
}

/** At least twenty requests, none of which is as it should be. */
async function badRequests(operation: Operation, visitor: Visitor): Promise<Reply[]> {
  const { method, path, schema } = operation;
  const url = address(operation);
  const tag = { 'If-Match': '"9999"' };
  const replies: Reply[] = [];
  const ask = async (to: string, options: Parameters<Visitor['ask']>[2]) =>
    void replies.push(await visitor.ask(method, to, options));
  if (schema) {
    for (const raw of BROKEN_BODIES) await ask(url, { raw, headers: tag });
    for (const body of mutations(schema)) await ask(url, { body, headers: tag });
    await ask(url, { raw: '{}', headers: { ...tag, 'Content-Type': 'text/plain' } });
    await ask(url, { raw: '{}', headers: { ...tag, 'Content-Encoding': 'gzip' } });
  }
  const full = schema ? { body: {} } : {};
  for (const odd of ODD_NAMES)
    if (path.includes('{brewery}'))
      await ask(path.replace('{brewery}', odd).replace(/\{(id|season)\}/, season.chainA), full);
  for (const odd of ODD_IDS)
    if (/\{(id|season|token)\}/.test(path))
      await ask(path.replace('{brewery}', season.slug).replace(/\{(id|season|token)\}/, odd), full);
  for (const odd of ODD_IDS)
    if (path.includes('{brewery}')) await ask(`${url}?season=${odd}`, { ...full, headers: tag });
  for (const odd of ODD_TAGS) await ask(url, { ...full, headers: { 'If-Match': odd } });
  for (const odd of ['?a[b]=c', '?%00', '?x=%E0%A4%A', `?${'q=1&'.repeat(500)}`, '?__proto__=1'])
    await ask(url + odd, { ...full, headers: tag });
  for (const site of ['cross-site', 'x', ''])
    await ask(url, { ...full, headers: { 'Sec-Fetch-Site': site } });
  // Last: the answer to one may take the good cookie away.
  for (const cookie of ODD_COOKIES) await ask(url, { ...full, headers: { Cookie: cookie } });
  return replies;
}

const all = operations();

it('covers every route', () => {
  expect(all.map(({ name }) => name).toSorted()).toEqual(
    routes.map(({ operation }) => operation.name).toSorted(),
  );
});

describe.each(all)('$name', (operation) => {
  it('answers malformed requests with a problem, never with a fault of its own', async () => {
    const visitor = await signedIn();
    const replies = await badRequests(operation, visitor);
    expect(replies.length).toBeGreaterThanOrEqual(20);
    expect(replies.filter(({ status }) => status >= 500)).toEqual([]);
    const refused = replies.filter(({ status }) => status >= 400);
    for (const { body, status } of refused) expect(problem.parse(body).status).toBe(status);
    // Whoever asks is let in, so that it is the request that is judged.
    const strangers = replies.filter(({ status }) => status === 401);
    if (!ENDS_SESSIONS.includes(operation.name))
      expect(strangers.length).toBeLessThanOrEqual(ODD_COOKIES.length);
    if (operation.schema) expect(refused.length).toBeGreaterThan(BROKEN_BODIES.length);
  }, 60_000);
});
