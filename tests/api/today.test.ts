import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, expect, test } from 'vitest';
import type { TodayFacts } from '#shared/api/today.ts';
import { api } from '#shared/api/urls.ts';
import { testClock } from '../support/clock.ts';
import { hand, opened, racked, type TestPour } from '../support/pours.ts';
import { good, joined, testSeason, type TestSeason } from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import { newcomer, type Visitor } from '../support/visitor.ts';

const clock = testClock('2027-04-03T13:00:00Z');
let server: TestServer;
let season: TestSeason;
let brewer: Visitor;
let pour: Omit<TestPour, 'runId'>;

beforeAll(async () => {
  server = await startTestServer({ clock });
});
afterAll(() => server.close());
beforeEach(async () => {
  season = await testSeason(server.url);
  brewer = await joined(season, 'brewer');
  pour = await racked(season, clock);
});

const today = (who: Visitor = season.head) => good<TodayFacts>(who.get(api.today(season.slug)));

test('a pour in hand is told, with who holds it, until it is left', async () => {
  expect((await today()).runs).toEqual([]);
  const mine = await opened(brewer, pour);
  expect((await today()).runs).toEqual([
    { batchId: mine.batchId, heldBy: 'The brewer', openedAt: '2027-04-03T13:00:00.000Z' },
  ]);
  await good(hand(brewer, mine, clock).leave());
  expect((await today()).runs).toEqual([]);
});

test('leave that is asked for is told until it is answered', async () => {
  const run = await opened(brewer, pour);
  const mine = hand(brewer, run, clock);
  await good(mine.read(25));
  await good(mine.ask());
  const [asked] = (await today()).overrides;
  expect(asked).toMatchObject({ batchId: pour.batchId, askedBy: 'The brewer' });
  expect(asked?.holds).not.toBe('');
  await good(hand(season.head, run, clock).answer(asked?.id ?? '', 'refused'));
  expect((await today()).overrides).toEqual([]);
});

test('a pour without leave waits for a signature, and what is left of the cake for a jar', async () => {
  const mine = hand(brewer, await opened(brewer, pour), clock);
  const surplus = { id: randomUUID(), what: 'jar', volumeL: 0.7 };
  await good(mine.pour({ surplus }));
  const facts = await today();
  expect(facts.unsigned).toEqual([{ batchId: pour.batchId, at: '2027-04-03T13:00:00.000Z' }]);
  expect(facts.jars).toEqual([
    expect.objectContaining({
      id: surplus.id,
      batchId: pour.cakeBatchId,
      day: '2027-04-03',
      volumeL: 0.7,
      generation: expect.any(Number),
    }),
  ]);
});

test('another brewery hears nothing of it', async () => {
  await opened(brewer, pour);
  const other = await newcomer(server.url, 'Elsewhere');
  expect((await other.visitor.get(api.today(season.slug))).status).toBe(404);
  const own = await good<TodayFacts>(other.visitor.get(api.today(other.slug)));
  expect(own).toEqual({
    now: clock.now().toISOString(),
    overrides: [],
    runs: [],
    unsigned: [],
    events: [],
    jars: [],
  });
});
