import { afterAll, beforeAll, expect, it } from 'vitest';
import { checkChainAnswer } from '#shared/api/check.ts';
import { api } from '#shared/api/urls.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import { newcomer, Visitor } from '../support/visitor.ts';

let server: TestServer;
let visitor: Visitor;

beforeAll(async () => {
  server = await startTestServer();
  ({ visitor } = await newcomer(server.url));
});
afterAll(() => server.close());

const batch = (id: string, change: object = {}) => ({
  id,
  volumeL: 23,
  og: 1.044,
  fg: 1.011,
  srm: 4,
  ibu: 20,
  fermentC: 20,
  daysUnderBeer: 14,
  brewOn: '2027-03-06',
  dryHop: null,
  additions: [],
  allergens: [],
  cultures: [],
  ...change,
});
const request = (change: object = {}) => ({
  yeast: { kind: 'ale', fermentMinC: 18, fermentMaxC: 22, generationLimit: 7 },
  vessel: { capacityL: 32, blowOff: false },
  firstGeneration: 1,
  houseRules: {},
  batches: [
    batch('a'),
    batch('b', { og: 1.052, fg: 1.013, srm: 7, ibu: 38, brewOn: '2027-03-20' }),
  ],
  ...change,
});

it('answers for a chain that is stored nowhere', async () => {
  const { status, body } = await visitor.post(api.checkChain, request());
  expect(status).toBe(200);
  expect(checkChainAnswer.parse(body)).toMatchObject({
    verdict: 'pour',
    chain: { rackOn: ['2027-03-20', '2027-04-03'], generations: [1, 2] },
    links: [{ from: 'a', to: 'b', waitDays: 0, findings: [] }],
  });
  const rows = await server.pool.query('select 1 from batch');
  expect(rows.rows).toHaveLength(0);
});

it('refuses all that is wrong at once', async () => {
  const wrong = request({
    surprise: 1,
    batches: [batch('a', { og: 2, keepL: 1 }), batch('b', { beer: 'x', srm: -1 })],
  });
  const { status, body } = await visitor.post(api.checkChain, wrong);
  expect(status).toBe(422);
  const pointers = (body as { errors: { pointer: string }[] }).errors.map((each) => each.pointer);
  for (const pointer of ['/surprise', '/batches/0/og', '/batches/1/beer', '/batches/1/srm'])
    expect(pointers).toContain(pointer);
  expect(pointers).toContain('/batches/0/keepL');
  expect((await visitor.post(api.checkChain, request({ batches: [] }))).status).toBe(422);
});

it('is for people who are signed in', async () => {
  const { status } = await new Visitor(server.url).post(api.checkChain, request());
  expect(status).toBe(401);
});
