import { describe, expect, it } from 'vitest';
import type { BatchRecord } from '#shared/api/reading.ts';
import { api, placeOf } from '#shared/api/urls.ts';
import { withRecordWaiting, withTaken } from '../../../src/api/recordWaiting.ts';
import type { Entry } from '../../../src/outbox/entry.ts';

const uuid = (last: number) => `f0000000-0000-4000-8000-${String(last).padStart(12, '0')}`;
const BATCH = uuid(1);
const me = { personId: uuid(9), name: 'Ned Quill' };
const where = { slug: 'reedbed', batchId: BATCH, me };
const HYDROMETER = {
  id: uuid(5),
  version: 1,
  name: 'Ours',
  kind: 'hydrometer' as const,
  correction: 0.002,
  calibratedC: 20,
  notes: '',
  typed: {},
  retired: false,
};
const EMPTY: BatchRecord = {
  batchId: BATCH,
  readings: [],
  notes: [],
  events: [],
  instruments: [HYDROMETER],
  check: null,
  pouredAt: null,
};
const entry = (method: Entry['method'], url: string, body?: object): Entry => ({
  id: uuid(100),
  personId: me.personId,
  contract: 1,
  madeAt: '2027-04-03T13:00:00.000Z',
  method,
  url,
  ...(body && { body }),
  what: '',
  page: '',
  touches: [],
  refusal: null,
});
const read = (id: number, shown: number, takenAt: string) => ({
  id: uuid(id),
  kind: 'gravity',
  takenAt,
  shown,
  method: 'hydrometer',
  sampleC: null,
  instrumentId: HYDROMETER.id,
  notes: '',
  typed: {},
});
const after = (record: BatchRecord, ...entries: Entry[]) =>
  withRecordWaiting(record, entries, where);
const readings = api.readings('reedbed', BATCH);
const [early, late] = ['2027-04-01T08:00:00Z', '2027-04-03T08:00:00Z'];

describe('a batch’s record that waits to be sent', () => {
  it('shows a reading at its time, by the instrument’s own correction', () => {
    const shown = after(
      EMPTY,
      entry('POST', readings, read(20, 1.012, late)),
      entry('POST', readings, read(21, 1.02, early)),
    );
    expect(shown.readings.map(({ id, value }) => [id, value])).toEqual([
      [uuid(21), 1.022],
      [uuid(20), 1.014],
    ]);
    expect(shown.readings[0]?.by).toEqual(me);
  });

  it('shows a change and a deletion of what has arrived, and of what has not', () => {
    const made = entry('POST', readings, read(20, 1.012, late));
    const { id: _, ...write } = read(20, 1.013, late);
    const one = api.reading('reedbed', BATCH, uuid(20));
    const changed = after(EMPTY, made, entry('PUT', one, write));
    expect(changed.readings).toMatchObject([{ shown: 1.013, version: 1 }]);
    expect(after(changed, entry('DELETE', one)).readings).toEqual([]);
  });

  it('does not show twice what has arrived already', () => {
    const made = entry('POST', readings, read(20, 1.012, late));
    expect(after(after(EMPTY, made), made).readings).toHaveLength(1);
  });

  it('shows notes newest first, and what was done', () => {
    const notes = api.notes('reedbed', BATCH);
    const shown = after(
      EMPTY,
      entry('POST', notes, { id: uuid(30), text: 'First' }),
      entry('POST', notes, { id: uuid(31), text: 'Second' }),
      entry('PUT', api.note('reedbed', BATCH, uuid(30)), { text: 'First, put right' }),
      entry('POST', api.events('reedbed', BATCH), {
        id: uuid(40),
        kind: 'dry-hop',
        plannedOn: '2027-04-05',
        doneAt: null,
        text: '',
      }),
    );
    expect(shown.notes.map(({ text }) => text)).toEqual(['Second', 'First, put right']);
    expect(shown.events).toMatchObject([{ kind: 'dry-hop', by: me }]);
  });

  it('shows the cake as it was judged, signed by whoever did it', () => {
    const judged = {
      tasted: 'clean',
      faults: [],
      volumeL: 1.2,
      massKg: null,
      fullKg: null,
      tareKg: null,
      layers: null,
      colour: null,
      smells: [],
      count: null,
      judged: 'fit',
      notes: '',
      typed: {},
    };
    const shown = after(EMPTY, entry('PUT', api.cakeCheck('reedbed', BATCH), judged));
    expect(shown.check).toMatchObject({ judged: 'fit', volumeL: 1.2, signedBy: me });
    expect(after(shown, entry('DELETE', api.cakeCheck('reedbed', BATCH))).check).toBeNull();
  });

  it('shows what was written at the address of a season at any other address of the same batch', () => {
    const ofSeason = api.readings(placeOf('reedbed', uuid(8)), BATCH);
    expect(ofSeason).toContain('?season=');
    const made = entry('POST', ofSeason, read(20, 1.012, late));
    expect(after(EMPTY, made).readings).toHaveLength(1);
    const { id: _, ...write } = read(20, 1.013, late);
    const one = api.reading(placeOf('reedbed', uuid(8)), BATCH, uuid(20));
    expect(after(EMPTY, made, entry('PUT', one, write)).readings).toMatchObject([{ shown: 1.013 }]);
  });

  it('of another batch is left alone', () => {
    const other = entry('POST', api.readings('reedbed', uuid(7)), read(20, 1.012, late));
    expect(after(EMPTY, other)).toBe(EMPTY);
  });
});

describe('a batch’s record once the server has taken an entry', () => {
  const notes = api.notes('reedbed', BATCH);
  const made = entry('POST', notes, { id: uuid(30), text: 'Bready' });
  const note = (version: number, text: string) => ({
    id: uuid(30),
    version,
    text,
    by: me,
    at: '2027-04-03T13:00:05.000Z',
    editedAt: null,
  });
  const changed = entry('PUT', api.note('reedbed', BATCH, uuid(30)), { text: 'Pears' });

  it('has the row as the server answered it', () => {
    expect(withTaken(EMPTY, made, note(1, 'Bready'), where).notes).toEqual([note(1, 'Bready')]);
    const before = { ...EMPTY, notes: [note(1, 'Bready')] };
    expect(withTaken(before, changed, note(2, 'Pears'), where).notes).toEqual([note(2, 'Pears')]);
  });

  it('keeps a row that was read anew since', () => {
    const newer = { ...EMPTY, notes: [note(3, 'Apples')] };
    expect(withTaken(newer, changed, note(2, 'Pears'), where).notes).toEqual([note(3, 'Apples')]);
  });

  it('has it as it was written where the answer went to another tab', () => {
    const before = { ...EMPTY, notes: [note(1, 'Bready')] };
    expect(withTaken(before, changed, undefined, where).notes).toMatchObject([{ text: 'Pears' }]);
  });

  it('is without what was deleted', () => {
    const gone = entry('DELETE', api.note('reedbed', BATCH, uuid(30)));
    expect(withTaken({ ...EMPTY, notes: [note(1, 'Bready')] }, gone, undefined, where)).toEqual(
      EMPTY,
    );
  });
});
