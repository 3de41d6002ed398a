import { describe, expect, it } from 'vitest';
import type { PourState } from '#shared/api/pour.ts';
import { api, placeOf } from '#shared/api/urls.ts';
import { ofPour, withWaiting } from '../../../src/api/pourWaiting.ts';
import type { Entry } from '../../../src/outbox/entry.ts';

const uuid = (last: number) => `f0000000-0000-4000-8000-${String(last).padStart(12, '0')}`;
const [BATCH, CAKE, RUN] = [uuid(1), uuid(2), uuid(3)];
const me = { personId: uuid(9), name: 'Ned Quill' };
const where = { slug: 'reedbed', batchId: BATCH, cakeBatchId: CAKE, me };
const NOTHING: PourState = { run: null, now: '2027-04-03T13:00:00.000Z' };
const device = (minute: number) => ({
  deviceAt: `2027-04-03T13:${String(minute).padStart(2, '0')}:00.000Z`,
  clockOffsetMs: 60_000,
});

let count = 100;
const entry = (url: string, body: object): Entry => ({
  id: uuid((count += 1)),
  personId: me.personId,
  contract: 1,
  madeAt: '2027-04-03T13:00:00.000Z',
  method: 'POST',
  url,
  body,
  what: '',
  page: '',
  touches: [],
  refusal: null,
});
const at = <K extends 'pour' | 'pourStep' | 'pourReadings' | 'pourDone' | 'pourLeaving'>(
  which: K,
  body: object,
) => entry(api[which]('reedbed', BATCH), body);

const begin = at('pour', { id: RUN });
const step = at('pourStep', { runId: RUN, step: 'wort', found: { cleaned: true } });
const read = (id: number, c: number, minute: number) =>
  at('pourReadings', { runId: RUN, id: uuid(id), c, typed: {}, ...device(minute) });
const pour = (minute: number) =>
  at('pourDone', {
    runId: RUN,
    id: uuid(50),
    ...device(minute),
    volumeL: 22,
    og: 1.05,
    typed: {},
    surplus: null,
  });

describe('a pour that waits to be sent', () => {
  it('is begun, stepped, read and poured on the device, by its own times put right', () => {
    const { run } = withWaiting(NOTHING, [begin, step, read(20, 24, 5), pour(9)], where);
    expect(run).toMatchObject({
      id: RUN,
      cakeBatchId: CAKE,
      heldBy: me,
      state: 'poured',
      step: 'after',
      found: { cleaned: true },
      readings: [{ c: 24, at: '2027-04-03T13:06:00.000Z' }],
      pour: { at: '2027-04-03T13:10:00.000Z', volumeL: 22, readingC: 24 },
    });
  });

  it('shows what was written at the address of a season, too', () => {
    const ofSeason = api.pour(placeOf('reedbed', uuid(8)), BATCH);
    expect(ofSeason).toContain('?season=');
    expect(withWaiting(NOTHING, [entry(ofSeason, { id: RUN })], where).run?.id).toBe(RUN);
    expect(ofPour([entry(ofSeason, { id: RUN })], where)).toHaveLength(1);
  });

  it('has no leave that the server never gave', () => {
    const { run } = withWaiting(NOTHING, [begin, read(20, 21, 5), pour(6)], where);
    expect(run?.pour).toMatchObject({ cleared: false, verdict: 'hold' });
  });

  it('has the leave that was given before, for its time and for its reading', () => {
    const opened = withWaiting(NOTHING, [begin, read(20, 21, 0)], where);
    const run = opened.run;
    if (!run) throw new Error('There is a run');
    const clearance = {
      id: uuid(60),
      kind: 'reading' as const,
      readingId: uuid(20),
      askedBy: me,
      askedAt: '2027-04-03T13:01:00.000Z',
      findings: [],
      answer: 'granted' as const,
      answeredBy: null,
      answeredAt: '2027-04-03T13:01:00.000Z',
      reason: '',
      expiresAt: '2027-04-03T13:16:00.000Z',
    };
    const known: PourState = { ...opened, run: { ...run, clearances: [clearance] } };
    const cleared = (...entries: Entry[]) => withWaiting(known, entries, where).run?.pour?.cleared;
    expect(cleared(pour(14))).toBe(true);
    expect(cleared(pour(16))).toBe(false);
    expect(cleared(read(21, 25, 10), pour(14))).toBe(false);
  });

  it('is not laid over twice where it has arrived already', () => {
    const once = withWaiting(NOTHING, [begin, read(20, 24, 5), pour(9)], where);
    expect(withWaiting(once, [begin, read(20, 24, 5), pour(9)], where).run).toEqual(once.run);
  });

  it('leaves others alone', () => {
    const other = entry(api.pourReadings('reedbed', uuid(7)), {});
    expect(withWaiting(NOTHING, [other], where)).toBe(NOTHING);
  });

  it('that was left is over', () => {
    const { run } = withWaiting(NOTHING, [begin, at('pourLeaving', { runId: RUN })], where);
    expect(run).toMatchObject({ state: 'left' });
  });
});
