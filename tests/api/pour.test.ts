import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { api } from '#shared/api/urls.ts';
import { testClock } from '../support/clock.ts';
import { hand, opened, racked, runIn, type TestPour } from '../support/pours.ts';
import { batchOf, good, joined, testSeason, type TestSeason } from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import type { Visitor } from '../support/visitor.ts';

const clock = testClock('2027-04-03T13:00:00Z');
const minutes = (count: number) => clock.advance(count * 60_000);
let server: TestServer;
let season: TestSeason;
let brewer: Visitor;
let pour: TestPour;

beforeAll(async () => {
  server = await startTestServer({ clock });
});
afterAll(() => server.close());
beforeEach(async () => {
  season = await testSeason(server.url);
  brewer = await joined(season, 'brewer');
  pour = await opened(brewer, await racked(season, clock));
});

const by = (visitor: Visitor, of: TestPour = pour) => hand(visitor, of, clock);
/** What spoke against it. Nobody judged the cake in these pours, which is a mind by itself. */
const said = (findings: readonly { rule: string; verdict: string }[] = []) =>
  findings.map(({ rule, verdict }) => `${rule} ${verdict}`);
const body = <T>(reply: { body: unknown }) => reply.body as T;
const recorded = async () => {
  const { rows } = await server.pool.query<{ what: string }>(
    'select what from change where brewery_id = (select id from brewery where slug = $1) order by seq',
    [season.slug],
  );
  return rows.map(({ what }) => what);
};

describe('a run', () => {
  it('belongs to one person; the second is told who holds it, and sees it', async () => {
    const reply = await season.head.post(api.pour(pour.slug, pour.batchId), { id: randomUUID() });
    expect(reply.status).toBe(409);
    expect(reply.body).toMatchObject({
      type: '/problems/pour-held',
      detail: 'The brewer has it in hand',
      current: { id: pour.runId, step: 'racked', heldBy: { name: 'The brewer' } },
    });
    expect((await by(season.head).read(20)).status).toBe(409);
    expect(await by(season.head).state()).toMatchObject({ id: pour.runId, readings: [] });
  });

  it('is opened once, however often it is sent, and by two at once by one of them', async () => {
    await by(brewer).leave();
    const id = randomUUID();
    const url = api.pour(pour.slug, pour.batchId);
    const all = await Promise.all([
      brewer.post(url, { id }),
      brewer.post(url, { id }),
      season.head.post(url, { id: randomUUID() }),
    ]);
    const good = all.filter(({ status }) => status === 200);
    expect(good.length === 2 || good.length === 1).toBe(true);
    expect(all.filter(({ status }) => status === 409).length).toBe(3 - good.length);
    const open = await server.pool.query(
      "select 1 from pour_run where batch_id = $1 and state = 'open'",
      [pour.batchId],
    );
    expect(open.rows).toHaveLength(1);
  });

  it('goes to each step and back, and keeps what was found', async () => {
    await good(by(brewer).step('keep', { rest: 'jar' }));
    await good(by(brewer).step('wort', { coolantC: 12, cleaned: true, sanitised: true }));
    const back = await good(by(brewer).step('clean'));
    expect(runIn(back)).toMatchObject({
      step: 'clean',
      found: { rest: 'jar', coolantC: 12, cleaned: true, sanitised: true },
    });
    expect((await by(brewer).step('dance')).status).toBe(422);
  });

  it('can be taken over, and left and opened again', async () => {
    await good(by(season.head).takeOver());
    expect((await by(brewer).read(20)).status).toBe(409);
    await good(by(season.head).read(20));
    await good(by(season.head).leave());
    const again = await by(season.head).read(20);
    expect(again.status).toBe(409);
    expect(again.body).toMatchObject({ type: '/problems/pour-over' });
    const next = await opened(brewer, pour);
    expect(await by(brewer, next).state()).toMatchObject({ id: next.runId, state: 'open' });
  });

  it('tells others at once: the season’s revision is raised by each reading', async () => {
    const before = (await good<{ season: { revision: number } }>(brewer.get(api.board(pour.slug))))
      .season.revision;
    await good(by(brewer).read(33));
    const after = (await good<{ season: { revision: number } }>(brewer.get(api.board(pour.slug))))
      .season.revision;
    expect(after).toBeGreaterThan(before);
  });

  it('is not opened for what is brewed or on the bench', async () => {
    const url = api.pour(pour.slug, pour.cakeBatchId);
    const reply = await brewer.post(url, { id: randomUUID() });
    expect(reply.body).toMatchObject({ type: '/problems/pour-over' });
  });
});

describe('readings and leave', () => {
  it('gives leave for a fresh reading inside the window, for a quarter of an hour', async () => {
    const run = runIn(await good(by(brewer).read(21)));
    expect(run.clearances).toMatchObject([
      { kind: 'reading', answer: 'granted', expiresAt: '2027-04-03T13:15:00.000Z' },
    ]);
  });

  it('gives none where it is too warm, nor for one that took too long to arrive', async () => {
    expect(runIn(await good(by(brewer).read(24.6))).clearances).toEqual([]);
    const old = new Date(clock.now().getTime() - 16 * 60_000).toISOString();
    expect(runIn(await good(by(brewer).read(21, { deviceAt: old }))).clearances).toEqual([]);
  });

  it('puts a device’s clock right, keeps what it said, and lets nothing come from the future', async () => {
    const deviceAt = new Date(clock.now().getTime() - 3_600_000).toISOString();
    const arrivedAt = clock.now().toISOString();
    const right = runIn(await good(by(brewer).read(21, { deviceAt, clockOffsetMs: 3_540_000 })));
    expect(right.readings[0]).toMatchObject({
      deviceAt,
      clockOffsetMs: 3_540_000,
      arrivedAt,
      at: new Date(clock.now().getTime() - 60_000).toISOString(),
    });
    const ahead = runIn(await good(by(brewer).read(22, { clockOffsetMs: 3_600_000 })));
    expect(ahead.readings[1]?.at).toBe(arrivedAt);
  });

  it('takes a reading once, and counts one that was withdrawn for nothing', async () => {
    const id = randomUUID();
    await good(by(brewer).read(21, { id }));
    expect(runIn(await good(by(brewer).read(21, { id }))).readings).toHaveLength(1);
    const run = runIn(await good(by(brewer).withdraw(id)));
    expect(run.readings).toMatchObject([{ id, withdrawn: true }]);
    const done = runIn(await good(by(brewer).pour()));
    expect(done.pour).toMatchObject({ cleared: false, verdict: 'hold', readingC: null });
  });

  it.each([[200], [-6], ['warm'], [null]])('refuses %s', async (c) => {
    const reply = await by(brewer).read(0, { c });
    expect(reply.status).toBe(422);
    expect(body<{ errors: unknown[] }>(reply).errors).toMatchObject([{ pointer: '/c' }]);
  });
});

describe('an override', () => {
  it('is asked by a brewer and given by the head brewer, with a reason on the record', async () => {
    await good(by(brewer).read(24.6));
    const asked = runIn(await good(by(brewer).ask()));
    const clearance = asked.clearances[0];
    expect(clearance).toMatchObject({ kind: 'override', answer: null });
    expect(said(clearance?.findings)).toEqual(['too-warm hold', 'cake-check mind']);
    expect((await by(brewer).answer(clearance?.id ?? '', 'granted')).status).toBe(403);
    await good(by(season.head).answer(clearance?.id ?? '', 'granted', 'It cools in the vessel'));
    minutes(5);
    const { pour: record } = runIn(await good(by(brewer).pour()));
    expect(record).toMatchObject({ cleared: true, verdict: 'hold' });
    expect(await recorded()).toEqual(
      expect.arrayContaining([
        'Asked for leave to pour Breakwater (2.6 °C too warm)',
        'Gave leave to pour Breakwater: It cools in the vessel',
      ]),
    );
  });

  it('lasts no longer than a reading', async () => {
    await good(by(brewer).read(24.6));
    const id = randomUUID();
    await good(by(brewer).ask(null, id));
    await good(by(season.head).answer(id, 'granted'));
    minutes(16);
    expect(runIn(await good(by(brewer).pour())).pour).toMatchObject({ cleared: false });
  });

  it('may be refused, and is answered once', async () => {
    await good(by(brewer).read(24.6));
    const id = randomUUID();
    await good(by(brewer).ask(null, id));
    const refused = runIn(await good(by(season.head).answer(id, 'refused', 'Wait for it')));
    expect(refused.clearances).toMatchObject([{ answer: 'refused', reason: 'Wait for it' }]);
    expect((await by(season.head).answer(id, 'refused', 'Wait for it')).status).toBe(200);
    expect((await by(season.head).answer(id, 'granted')).status).toBe(409);
  });

  it('needs a reason in words', async () => {
    await good(by(brewer).read(24.6));
    const id = randomUUID();
    await good(by(brewer).ask(null, id));
    expect((await by(season.head).answer(id, 'granted', '  ')).status).toBe(422);
  });

  it('is given to oneself by a head brewer, with a reason', async () => {
    await good(by(season.head).takeOver());
    await good(by(season.head).read(24.6));
    const run = runIn(await good(by(season.head).ask('A warm day, and it cools')));
    expect(run.clearances).toMatchObject([
      { answer: 'granted', reason: 'A warm day, and it cools' },
    ]);
    const brewers = await good(by(brewer).takeOver());
    expect(runIn(brewers).heldBy.name).toBe('The brewer');
    // A brewer's own reason answers nothing.
    const id = randomUUID();
    const { clearances } = runIn(await good(by(brewer).ask('Because', id)));
    expect(clearances.find((one) => one.id === id)?.answer).toBeNull();
  });

  it.each([
    ['a temperature that kills', 41, {}, 'Nobody can override this'],
    ['nothing read', null, {}, 'Nobody can override this'],
    ['nothing that holds', 20, {}, 'Nothing holds'],
  ])('is not for %s', async (_name, c, _change, detail) => {
    if (c !== null) await good(by(brewer).read(c));
    const reply = await by(brewer).ask();
    expect(reply.status).toBe(409);
    expect(reply.body).toMatchObject({ type: '/problems/not-cleared' });
    expect(body<{ detail: string }>(reply).detail).toContain(detail);
  });

  it.each([
    ['an allergen', { allergens: ['gluten', 'tree-nuts'] }],
    ['a wild culture', { cultures: ['brettanomyces'] }],
  ])('is never for %s, whatever the temperature', async (_name, first) => {
    const other = await testSeason(server.url);
    const theirs = await opened(other.head, await racked(other, clock, { first }));
    const run = runIn(await good(hand(other.head, theirs, clock).read(20)));
    expect(run.clearances).toEqual([]);
    const reply = await hand(other.head, theirs, clock).ask('We want to');
    expect(reply.status).toBe(409);
    expect(body<{ detail: string }>(reply).detail).toContain('Nobody can override this');
  });

  it('does not outlive a reading that kills', async () => {
    await good(by(brewer).read(24.6));
    const id = randomUUID();
    await good(by(brewer).ask(null, id));
    await good(by(season.head).answer(id, 'granted'));
    minutes(1);
    await good(by(brewer).read(40));
    expect(runIn(await good(by(brewer).pour())).pour).toMatchObject({ cleared: false });
  });
});

describe('the pour', () => {
  it('makes the batch ferment from its day, with what was read, and the cake poured', async () => {
    await good(by(brewer).read(33));
    minutes(20);
    await good(by(brewer).read(21));
    minutes(2);
    const surplusId = randomUUID();
    const run = runIn(
      await good(by(brewer).pour({ surplus: { id: surplusId, what: 'jar', volumeL: 0.6 } })),
    );
    expect(run).toMatchObject({ state: 'poured', step: 'after' });
    expect(run.pour).toMatchObject({ cleared: true, readingC: 21, volumeL: 22.5, og: 1.053 });
    expect(await batchOf(brewer, pour.slug, pour.batchId)).toMatchObject({
      stage: 'fermenting',
      brewOn: '2027-04-03',
      read: { volumeL: 22.5, og: 1.053 },
      cake: { state: 'growing' },
    });
    expect((await batchOf(brewer, pour.slug, pour.cakeBatchId)).cake?.state).toBe('poured');
    const jars = await server.pool.query('select * from surplus where id = $1', [surplusId]);
    expect(jars.rows).toMatchObject([
      { what: 'jar', cake_batch_id: pour.cakeBatchId, generation: 1, volume_l: 0.6 },
    ]);
    expect((await recorded()).at(-1)).toBe(
      'Poured Breakwater onto the cake of Jetty Pale at 21 °C',
    );
    await good(by(brewer).step('after', { aerated: true, lidOn: true }));
  });

  it('is recorded once, and not twice', async () => {
    await good(by(brewer).read(21));
    const id = randomUUID();
    await good(by(brewer).pour({ id }));
    expect((await by(brewer).pour({ id })).status).toBe(200);
    const other = await by(brewer).pour();
    expect(other.status).toBe(409);
    expect(other.body).toMatchObject({ type: '/problems/pour-over' });
  });

  it('is judged by its own time, when it arrives late', async () => {
    await good(by(brewer).read(21));
    const deviceAt = new Date(clock.now().getTime() + 10 * 60_000).toISOString();
    minutes(120);
    const run = runIn(await good(by(brewer).pour({ deviceAt })));
    expect(run.pour).toMatchObject({ at: deviceAt, cleared: true });
    // By the time of its arrival the reading would have been too old.
    expect(run.pour?.findings.map(({ rule }) => rule)).not.toContain('no-reading');
  });

  it('without leave is recorded as that, and red until a head brewer signs', async () => {
    await good(by(brewer).read(24.6));
    const run = runIn(await good(by(brewer).pour()));
    expect(run.pour).toMatchObject({ cleared: false, verdict: 'hold', signedBy: null });
    expect(said(run.pour?.findings)).toEqual(['too-warm hold', 'cake-check mind']);
    expect((await recorded()).at(-1)).toContain('without leave');
    expect((await by(brewer).sign('I did it')).status).toBe(403);
    const signed = runIn(await good(by(season.head).sign('The chiller broke')));
    expect(signed.pour).toMatchObject({
      cleared: false,
      reason: 'The chiller broke',
      signedBy: { personId: season.person.id },
    });
    expect((await by(season.head).sign('Another reason')).status).toBe(409);
  });

  it('crosses midnight by the brewery’s own calendar', async () => {
    clock.set('2027-04-03T23:58:00Z');
    await good(by(brewer).read(21));
    minutes(4);
    await good(by(brewer).pour());
    expect(await batchOf(brewer, pour.slug, pour.batchId)).toMatchObject({ brewOn: '2027-04-04' });
    clock.set('2027-04-03T13:00:00Z');
  });
});
