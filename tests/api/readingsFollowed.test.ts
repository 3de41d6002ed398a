import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, expect, it } from 'vitest';
import type { CakeCheckWrite } from '#shared/api/cakeCheck.ts';
import type { BatchEvent, Instrument, Reading, ReadingCreate } from '#shared/api/reading.ts';
import { judgeBoard } from '#shared/chain/judgeBoard.ts';
import { api } from '#shared/api/urls.ts';
import {
  batchOf,
  boardOf,
  good,
  joined,
  shelve,
  testSeason,
  type TestSeason,
} from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import type { Visitor } from '../support/visitor.ts';

const NOW = new Date('2027-03-20T12:00:00Z');
let server: TestServer;
let season: TestSeason;
let brewer: Visitor;
let slow = '';
let next = '';

beforeAll(async () => {
  server = await startTestServer({ clock: { now: () => NOW } });
});
afterAll(() => server.close());
beforeEach(async () => {
  season = await testSeason(server.url);
  brewer = await joined(season, 'brewer');
  [slow = '', next = ''] = await shelve(season, season.chainA, [
    { name: 'Slow', og: 1.05, fg: 1.012, brewOn: '2027-03-01' },
    { name: 'After', og: 1.05, brewOn: '2027-04-10' },
  ]);
  const { version } = await batch(slow);
  const brewed = { stage: 'fermenting', brewedOn: '2027-03-01', volumeL: 22, og: 1.05 };
  await good(season.head.post(api.batchStage(season.slug, slow), brewed, version));
});

const batch = (id: string) => batchOf(season.head, season.slug, id);
const aReading = (change: Partial<ReadingCreate> = {}): ReadingCreate => ({
  id: randomUUID(),
  kind: 'gravity',
  takenAt: '2027-03-10T09:00:00.000Z',
  shown: 1.02,
  method: 'hydrometer',
  sampleC: null,
  instrumentId: null,
  notes: '',
  typed: {},
  ...change,
});
const read = (change: Partial<ReadingCreate>) =>
  good<Reading>(brewer.post(api.readings(season.slug, slow), aReading(change)));
const acceptance = async () => (await batch(next)).link.acceptance;
const linkNow = async () => judgeBoard(await boardOf(season.head, season.slug)).links.get(next);

/** Somebody's judgement of the cake under the slow one. */
const judge = (change: Partial<CakeCheckWrite>, version = 0) =>
  good(season.head.put(api.cakeCheck(season.slug, slow), { ...aCheck, ...change }, version));

const aCheck: CakeCheckWrite = {
  tasted: 'clean',
  faults: [],
  volumeL: null,
  massKg: null,
  fullKg: null,
  tareKg: null,
  layers: null,
  colour: 'cream',
  smells: [],
  count: null,
  judged: 'fit',
  notes: '',
  typed: {},
};

async function accept() {
  const { version } = await batch(next);
  const body = { reason: 'We taste it again on the day' };
  await good(season.head.ask('PUT', api.acceptance(season.slug, next), { body, version }));
  expect(await acceptance()).toMatchObject({ ...body, rules: ['cake-check'] });
}

it('a hold accepted for one reason does not cover what the readings find later', async () => {
  await judge({ tasted: 'off', faults: ['vinegar'], judged: 'unfit' });
  await accept();
  await read({ takenAt: '2027-03-02T09:00:00Z', shown: 1.024 });
  await read({ takenAt: '2027-03-10T09:00:00Z', shown: 1.024 });
  await read({ takenAt: '2027-03-14T09:00:00Z', shown: 1.024 });
  const hold = (await linkNow())?.findings.find(({ rule }) => rule === 'cake-check');
  expect(hold?.verdict).toBe('hold');
  expect(await acceptance()).toBeNull();
  expect((await linkNow())?.accepted).toBe(false);
  const { rows } = await server.pool.query(
    "select 1 from change where what like 'Read Slow%' and $1 = any(touches)",
    [next],
  );
  expect(rows).toHaveLength(1);
});

it('an acceptance outlives readings that say nothing against the cake', async () => {
  await judge({ tasted: 'off', faults: ['vinegar'], judged: 'unfit' });
  await accept();
  await read({ takenAt: '2027-03-02T09:00:00Z', shown: 1.03 });
  await read({ takenAt: '2027-03-03T09:00:00Z', kind: 'ph', method: null, shown: 4.3 });
  expect((await batch(slow)).followed).not.toBeNull();
  expect(await acceptance()).toMatchObject({ rules: ['cake-check'] });
});

it('nor does it cover another judgement of the cake', async () => {
  await judge({ tasted: 'off', faults: ['vinegar'], judged: 'with-care' });
  await accept();
  await judge({ tasted: 'off', faults: ['vinegar'], judged: 'with-care', notes: 'Again' }, 1);
  expect(await acceptance()).not.toBeNull();
  await judge({ tasted: 'off', faults: ['vinegar'], judged: 'unfit' }, 2);
  expect(await acceptance()).toBeNull();
});

it('a reading keeps its value with its words changed, whatever the instrument is corrected by now', async () => {
  const glass = await good<Instrument>(
    brewer.post(api.instruments(season.slug), {
      id: randomUUID(),
      name: 'Old glass',
      kind: 'hydrometer',
      correction: -0.002,
      calibratedC: 20,
      notes: '',
      typed: {},
    }),
  );
  const made = aReading({ instrumentId: glass.id });
  const first = await good<Reading>(brewer.post(api.readings(season.slug, slow), made));
  expect(first.value).toBeCloseTo(1.018, 9);
  await good(
    brewer.patch(api.instrument(season.slug, glass.id), { correction: -0.005 }, glass.version),
  );
  const { id, ...body } = made;
  const at = api.reading(season.slug, slow, id);
  const noted = await good<Reading>(
    brewer.put(at, { ...body, notes: 'In the cellar', takenAt: '2027-03-10T10:00:00Z' }, 1),
  );
  expect(noted).toMatchObject({ notes: 'In the cellar', takenAt: '2027-03-10T10:00:00.000Z' });
  expect(noted.value).toBeCloseTo(1.018, 9);
  const read = await good<Reading>(brewer.put(at, { ...body, shown: 1.021 }, 2));
  expect(read.value).toBeCloseTo(1.016, 9);
});

it('who did something stays who did it, whoever mends its words', async () => {
  const plan = { kind: 'dry-hop', plannedOn: '2027-03-18', doneAt: null, text: '46 g' };
  const events = api.events(season.slug, slow);
  const made = await good<BatchEvent>(brewer.post(events, { id: randomUUID(), ...plan }));
  const at = api.event(season.slug, slow, made.id);
  const doneBy = async () => {
    const { rows } = await server.pool.query<{ name: string | null }>(
      'select p.name from batch_event e left join person p on p.id = e.done_by where e.id = $1',
      [made.id],
    );
    return rows[0]?.name ?? null;
  };
  const done = { ...plan, doneAt: '2027-03-18T08:00:00.000Z' };
  await good(brewer.put(at, done, 1));
  expect(await doneBy()).toBe('The brewer');
  await good(season.head.put(at, { ...done, text: '46 g of whole hops' }, 2));
  expect(await doneBy()).toBe('The brewer');
  await good(season.head.put(at, plan, 3));
  expect(await doneBy()).toBeNull();
  await good(season.head.put(at, done, 4));
  expect(await doneBy()).toBe(season.person.name);
});
