import { afterAll, beforeAll, expect, it } from 'vitest';
import { checkPourAnswer } from '#shared/api/checkPour.ts';
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

/** As the contract shows it. */
const request = (change: object = {}) => ({
  yeast: { kind: 'ale', pourMinC: 18, pourMaxC: 22, neverAboveC: null },
  at: '2027-04-03T15:30:00Z',
  wort: { volumeL: 23, og: 1.076 },
  cake: { volumeL: 0.4, c: 17 },
  coolantC: null,
  houseRules: {},
  readings: [
    { at: '2027-04-03T15:05:00Z', c: 33.1 },
    { at: '2027-04-03T15:30:00Z', c: 24.6 },
  ],
  ...change,
});
const asked = async (change: object = {}) => {
  const { status, body } = await visitor.post(api.checkPour, request(change));
  expect(status).toBe(200);
  return checkPourAnswer.parse(body);
};
const pointers = async (change: object) => {
  const { status, body } = await visitor.post(api.checkPour, request(change));
  expect(status).toBe(422);
  return (body as { errors: { pointer: string }[] }).errors.map((each) => each.pointer);
};

it('holds wort that is too warm, and says why there is no forecast from two readings', async () => {
  const answer = await asked();
  expect(answer).toMatchObject({
    verdict: 'hold',
    window: { minC: 18, maxC: 22 },
    readingC: 24.6,
    overridable: true,
    ready: null,
  });
  expect(answer.findings.map((one) => one.rule)).toEqual(['too-warm']);
  expect(answer.whyNotReady).not.toBeNull();
});

it('forecasts from two readings where the coolant is known', async () => {
  const { ready } = await asked({ coolantC: 12 });
  // 12 + 21.1 e^(−kt): k = ln(21.1 ÷ 12.6) ÷ 25 min; 22 °C after a further ln(12.6 ÷ 10) ÷ k = 11.2 min.
  const minutes = (Date.parse(ready?.at ?? '') - Date.parse('2027-04-03T15:30:00Z')) / 60_000;
  expect(minutes).toBeGreaterThan(10.7);
  expect(minutes).toBeLessThan(11.7);
});

it('pours inside the window, in any order of readings and any time zone', async () => {
  const readings = [
    { at: '2027-04-03T17:29:00+02:00', c: 21 },
    { at: '2027-04-03T15:05:00Z', c: 33.1 },
  ];
  expect(await asked({ readings })).toMatchObject({
    verdict: 'pour',
    findings: [],
    overridable: false,
    ready: null,
    whyNotReady: null,
  });
});

it('never lets a temperature that kills be overridden', async () => {
  const answer = await asked({ readings: [{ at: '2027-04-03T15:30:00Z', c: 41 }] });
  expect(answer.findings[0]?.rule).toBe('kills-yeast');
  expect(answer.overridable).toBe(false);
});

it('follows the house rules that are sent', async () => {
  expect(await asked({ houseRules: { pourAboveMind: 3 } })).toMatchObject({ verdict: 'mind' });
});

it('refuses all that is wrong at once', async () => {
  expect(
    await pointers({ surprise: 1, readings: [{ at: '2027-04-03T15:31:00Z', c: 20 }] }),
  ).toEqual(expect.arrayContaining(['/surprise', '/readings']));
  expect(await pointers({ readings: [{ at: '2027-04-03T15:30:00Z', c: 200 }] })).toEqual([
    '/readings/0/c',
  ]);
  expect(await pointers({ readings: [{ at: 'yesterday', c: -5.1 }] })).toEqual(
    expect.arrayContaining(['/readings/0/at', '/readings/0/c']),
  );
  expect(await pointers({ at: '2027-04-03' })).toContain('/at');
  expect(await pointers({ houseRules: { readingMinutes: 61 } })).toContain(
    '/houseRules/readingMinutes',
  );
  expect(await pointers({ yeast: { kind: 'ale', pourMinC: 18 } })).toContain('/yeast/pourMaxC');
});

it('is for people who are signed in', async () => {
  const { status } = await new Visitor(server.url).post(api.checkPour, request());
  expect(status).toBe(401);
});
