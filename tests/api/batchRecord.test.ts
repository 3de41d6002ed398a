import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { CakeCheck, CakeCheckWrite } from '#shared/api/cakeCheck.ts';
import {
  batchRecord as contract,
  type BatchEvent,
  type BatchNote,
  type BatchRecord,
  type Instrument,
  type Reading,
  type ReadingCreate,
} from '#shared/api/reading.ts';
import type { RecordPage } from '#shared/api/record.ts';
import { api } from '#shared/api/urls.ts';
import { judgeBoard } from '#shared/chain/judgeBoard.ts';
import { boardOf, good, joined, shelve, testSeason, type TestSeason } from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import { newcomer, type Visitor } from '../support/visitor.ts';

let server: TestServer;
let season: TestSeason;
let brewer: Visitor;
let blonde: string;
let pale: string;

const NOW = new Date('2027-03-20T12:00:00Z');

beforeAll(async () => {
  server = await startTestServer({ clock: { now: () => NOW } });
  season = await testSeason(server.url);
  [blonde = '', pale = ''] = await shelve(season, season.chainA, [
    { name: 'Blonde', og: 1.05, fg: 1.012, brewOn: '2027-03-06' },
    { name: 'Pale', og: 1.052, brewOn: '2027-03-27' },
  ]);
  brewer = await joined(season, 'brewer');
  const { version = 0 } = (await batchOf(blonde)) ?? {};
  const brewed = { stage: 'fermenting', brewedOn: '2027-03-06', volumeL: 22, og: 1.05 };
  await good(season.head.post(api.batchStage(season.slug, blonde), brewed, version));
});
afterAll(() => server.close());

const board = () => boardOf(season.head, season.slug);
const batchOf = async (id: string) => (await board()).batches.find((each) => each.id === id);
const recordOf = (id = blonde) =>
  good<BatchRecord>(season.head.get(api.batchRecord(season.slug, id)));
const aReading = (change: Partial<ReadingCreate> = {}): ReadingCreate => ({
  id: randomUUID(),
  kind: 'gravity',
  takenAt: '2027-03-10T09:00:00.000Z',
  shown: 1.02,
  method: 'hydrometer',
  sampleC: null,
  instrumentId: null,
  notes: '',
  typed: { shown: { text: '1,020', unit: 'SG' } },
  ...change,
});
const add = (change: Partial<ReadingCreate> = {}, id = blonde) =>
  brewer.post(api.readings(season.slug, id), aReading(change));
const added = (change: Partial<ReadingCreate> = {}, id = blonde) => good<Reading>(add(change, id));
const fault = async (change: Partial<ReadingCreate>) => {
  const { status, body } = await add(change);
  return [status, (body as { errors?: { pointer: string }[] }).errors?.[0]?.pointer];
};

describe('readings of a batch', () => {
  it('are corrected here for the sample’s temperature and the instrument', async () => {
    const own = await good<Instrument>(
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
    const { value, shown, typed } = await added({ sampleC: 30, instrumentId: own.id });
    // Water at 20 and 30 °C: 998.207 and 995.650 kg/m³ (usual tables, from memory).
    expect(value).toBeCloseTo((1.018 * 998.207) / 995.65, 4);
    expect([shown, typed.shown?.text]).toEqual([1.02, '1,020']);
    expect(await fault({ kind: 'ph', method: null, shown: 4.3, instrumentId: own.id })).toEqual([
      422,
      '/instrumentId',
    ]);
  });

  it.each<[string, Partial<ReadingCreate>, string]>([
    ['a gravity of 200', { shown: 200 }, '/shown'],
    ['a temperature of −6 °C', { kind: 'temperature', method: null, shown: -6 }, '/shown'],
    ['a sample at 60 °C', { sampleC: 60 }, '/sampleC'],
    ['a gravity without a method', { method: null }, '/method'],
    ['a time to come', { takenAt: '2027-03-20T12:06:00.000Z' }, '/takenAt'],
    ['beer by refractometer', { method: 'refractometer', shown: 9 }, '/method'],
    ['an instrument of nobody', { instrumentId: randomUUID() }, '/instrumentId'],
  ])('refuse %s at its field', async (_, change, pointer) =>
    expect(await fault(change)).toEqual([422, pointer]),
  );

  it('take a refractometer on the brew day', async () => {
    const takenAt = '2027-03-06T09:00:00.000Z';
    const { value } = await added({ method: 'refractometer', shown: 12.87, takenAt });
    // 12.87 °Bx are 12.375 °P of wort, which is 1.050 (ASBC table, from memory: 12.39).
    expect(value).toBeCloseTo(1.05, 3);
  });

  it('are written once, however often they are sent', async () => {
    const body = aReading();
    const send = () => brewer.post(api.readings(season.slug, blonde), body);
    const first = await good<Reading>(send());
    expect(await good<Reading>(send())).toEqual(first);
    const other = await brewer.post(api.readings(season.slug, blonde), { ...body, shown: 1.03 });
    expect(other.status).toBe(409);
    expect((await recordOf()).readings.filter(({ id }) => id === body.id)).toHaveLength(1);
  });

  it('are changed from the version that was seen, and deleted', async () => {
    const { id, version } = await added();
    const { id: _, ...body } = aReading({ shown: 1.018 });
    const at = api.reading(season.slug, blonde, id);
    const changed = await good<Reading>(brewer.put(at, body, version));
    expect([changed.value, changed.version]).toEqual([1.018, version + 1]);
    expect((await brewer.put(at, body, version)).status).toBe(412);
    expect((await brewer.ask('DELETE', at, { version: version + 1 })).status).toBe(204);
    expect((await recordOf()).readings.some((each) => each.id === id)).toBe(false);
  });

  it('stand on the change record, and are not undone with the board', async () => {
    await added({ kind: 'temperature', method: null, shown: 19.4 });
    const { season: own, undo } = await boardOf(brewer, season.slug);
    const page = await good<RecordPage>(brewer.get(api.changes(season.slug, own.id)));
    expect(page.changes[0]).toMatchObject({ what: 'Read Blonde at 19.4 °C', kind: 'edit' });
    expect(undo).toBeNull();
  });

  it('keep their batch: it is not deleted with them', async () => {
    const [spare = ''] = await shelve(season, season.chainB, [{ name: 'Spare' }]);
    await added({}, spare);
    const { version = 0 } = (await batchOf(spare)) ?? {};
    const path = api.batch(season.slug, spare);
    expect((await season.head.ask('DELETE', path, { version })).status).toBe(409);
    const undo = async () =>
      season.head.post(api.undo(season.slug), { changeId: (await board()).undo?.id });
    expect((await undo()).status).toBe(200);
    const second = await undo();
    expect(second.status).toBe(409);
    expect((second.body as { detail: string }).detail).toBe(
      'Spare has 1 reading, which would go with it',
    );
    expect((await recordOf(spare)).readings).toHaveLength(1);
  });

  it('are nobody else’s', async () => {
    const { visitor } = await newcomer(server.url, 'Elsewhere');
    expect((await visitor.get(api.batchRecord(season.slug, blonde))).status).toBe(404);
  });
});

describe('notes and events', () => {
  it('a note is its writer’s; the head brewer may delete it', async () => {
    const note = await good<BatchNote>(
      brewer.post(api.notes(season.slug, blonde), { id: randomUUID(), text: 'Smells of bread' }),
    );
    const at = api.note(season.slug, blonde, note.id);
    expect((await season.head.put(at, { text: 'No' }, note.version)).status).toBe(403);
    const { text, version } = await good<BatchNote>(
      brewer.put(at, { text: 'Bread, and a little fruit' }, note.version),
    );
    expect(text).toBe('Bread, and a little fruit');
    expect((await season.head.ask('DELETE', at, { version })).status).toBe(204);
  });

  it('dry hops are planned, then done', async () => {
    const plan = { kind: 'dry-hop', plannedOn: '2027-03-22', doneAt: null, text: '46 g' } as const;
    const made = await good<BatchEvent>(
      brewer.post(api.events(season.slug, blonde), { id: randomUUID(), ...plan }),
    );
    const done = { ...plan, doneAt: '2027-03-20T08:00:00.000Z' };
    const at = api.event(season.slug, blonde, made.id);
    expect(await good(brewer.put(at, done, made.version))).toMatchObject(done);
    const nothing = { id: randomUUID(), ...plan, plannedOn: null };
    expect((await brewer.post(api.events(season.slug, blonde), nothing)).status).toBe(422);
  });
});

describe('the cake check', () => {
  const aCheck = (change: Partial<CakeCheckWrite> = {}): CakeCheckWrite => ({
    tasted: 'clean',
    faults: [],
    volumeL: 1.1,
    massKg: null,
    fullKg: null,
    tareKg: null,
    layers: null,
    colour: 'cream',
    smells: ['bread'],
    count: null,
    judged: 'fit',
    notes: '',
    typed: {},
    ...change,
  });
  const at = () => api.cakeCheck(season.slug, blonde);
  const sign = async (change: Partial<CakeCheckWrite>) =>
    brewer.put(at(), aCheck(change), (await recordOf()).check?.version ?? 0);
  const linkNow = async () => judgeBoard(await board()).links.get(pale);

  it('puts what was measured in place of the estimate, in every verdict after it', async () => {
    const before = await linkNow();
    expect(before?.cake.measured).toBe(false);
    const count = { living: 190, dead: 10, squares: 5, dilution: 100 };
    const signed = await good<CakeCheck>(sign({ count }));
    expect(signed).toMatchObject({ judged: 'fit', version: 1 });
    // 200 cells in 5 of 25 squares at 1 in 100: 200 × 5 × 1e4 × 100 (ASBC MOA Yeast-4).
    expect((await batchOf(blonde))?.cake).toEqual({
      state: 'growing',
      check: { judged: 'fit', tasted: 'clean' },
      measured: { volumeL: 1.1, massKg: null, viability: 0.95, cellsPerMl: 1e9 },
    });
    const after = await linkNow();
    expect([after?.cake.measured, after?.cake.volumeL]).toEqual([true, 1.1]);
  });

  it('weighs the cake by the vessel, full and empty', async () => {
    await good(sign({ volumeL: null, fullKg: 3.4, tareKg: 2.1 }));
    expect((await batchOf(blonde))?.cake?.measured?.massKg).toBeCloseTo(1.3, 9);
    const half = await sign({ fullKg: 3.4 });
    expect([half.status, half.body]).toMatchObject([422, { errors: [{ pointer: '/tareKg' }] }]);
  });

  it('an off taste holds the next link, whoever called it what', async () => {
    const fit = await sign({ tasted: 'off', faults: ['vinegar'], judged: 'fit' });
    expect([fit.status, fit.body]).toMatchObject([422, { errors: [{ pointer: '/judged' }] }]);
    await good(sign({ tasted: 'off', faults: ['vinegar'], judged: 'unfit' }));
    const found = (await linkNow())?.findings.find(({ rule }) => rule === 'cake-check');
    expect(found).toMatchObject({ verdict: 'hold' });
  });

  it('is undone as it was signed', async () => {
    await good(sign({ judged: 'with-care' }));
    const { undo } = await boardOf(brewer, season.slug);
    expect(undo?.what).toBe('Judged the cake of Blonde to be used with care');
    await good(brewer.post(api.undo(season.slug), { changeId: undo?.id }));
    expect((await recordOf()).check).toMatchObject({ judged: 'unfit', faults: ['vinegar'] });
  });

  it('is refused from another version, and can be taken back', async () => {
    const { check } = await recordOf();
    expect((await brewer.put(at(), aCheck(), 0)).status).toBe(412);
    const { status } = await brewer.ask('DELETE', at(), { version: check?.version ?? 0 });
    expect(status).toBe(204);
    expect((await batchOf(blonde))?.cake).toMatchObject({ check: null, measured: null });
  });

  it('is not for a cake that is not there', async () => {
    const path = api.cakeCheck(season.slug, pale);
    expect((await brewer.put(path, aCheck(), 0)).status).toBe(409);
  });
});

it('a stuck fermentation holds the next link', async () => {
  const [first = '', next = ''] = await shelve(season, season.chainB, [
    { name: 'Slow', og: 1.05, fg: 1.012, brewOn: '2027-03-01' },
    { name: 'After', og: 1.05, brewOn: '2027-04-10' },
  ]);
  const { version = 0 } = (await batchOf(first)) ?? {};
  const brewed = { stage: 'fermenting', brewedOn: '2027-03-01', volumeL: 22, og: 1.05 };
  await good(season.head.post(api.batchStage(season.slug, first), brewed, version));
  for (const day of ['02', '10', '14'])
    await added({ takenAt: `2027-03-${day}T09:00:00.000Z`, shown: 1.024 }, first);
  const link = judgeBoard(await board()).links.get(next);
  expect(link?.findings.find(({ rule }) => rule === 'cake-check')).toMatchObject({
    verdict: 'hold',
    title: 'Stuck fermentation',
  });
});

it('answers what its contract says', async () => {
  const record = await recordOf();
  expect(contract.parse(record)).toEqual(record);
  expect(record.readings.map(({ takenAt }) => takenAt)).toEqual(
    record.readings.map(({ takenAt }) => takenAt).toSorted(),
  );
});
