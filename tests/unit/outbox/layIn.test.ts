import { QueryClient } from '@tanstack/react-query';
import { expect, it } from 'vitest';
import type { BatchRecord } from '#shared/api/reading.ts';
import { api } from '#shared/api/urls.ts';
import { layIn } from '../../../src/api/layIn.ts';
import type { Entry } from '../../../src/outbox/entry.ts';

const uuid = (last: number) => `f0000000-0000-4000-8000-${String(last).padStart(12, '0')}`;
const BATCH = uuid(1);
const RECORD = ['batch-record', 'reedbed', BATCH];
const POUR = ['pour', 'reedbed', BATCH];
const EMPTY: BatchRecord = {
  batchId: BATCH,
  readings: [],
  notes: [],
  events: [],
  instruments: [],
  check: null,
  pouredAt: null,
};
const entry = (more: Partial<Entry> = {}): Entry => ({
  id: uuid(30),
  personId: uuid(9),
  contract: 1,
  madeAt: '2027-04-03T13:00:00.000Z',
  method: 'POST',
  url: api.notes('reedbed', BATCH),
  body: { id: uuid(30), text: 'Bready' },
  what: '',
  page: '',
  touches: [RECORD, POUR],
  refusal: null,
  ...more,
});
const ANSWER = {
  id: uuid(30),
  version: 1,
  text: 'Bready',
  by: { personId: uuid(9), name: 'Ned Quill' },
  at: '2027-04-03T13:00:05.000Z',
  editedAt: null,
};
const taken = (answer: unknown, more: Partial<Entry> = {}) => ({
  entry: entry(more),
  answer,
  name: 'Ned Quill',
});
function page() {
  const client = new QueryClient();
  client.setQueryData(RECORD, EMPTY);
  const texts = () => client.getQueryData<BatchRecord>(RECORD)?.notes.map(({ text }) => text);
  return { client, texts };
}

it('puts a note into the record at once, and needs no read for it', () => {
  const { client, texts } = page();
  expect(layIn(client, RECORD, taken(ANSWER))).toBe(true);
  expect(texts()).toEqual(['Bready']);
});

it('has the record read where another tab has the answer, and shows the note until then', () => {
  const { client, texts } = page();
  expect(layIn(client, RECORD, taken(undefined))).toBe(false);
  expect(texts()).toEqual(['Bready']);
});

it('has the record read anew where a read had begun before', async () => {
  const { client, texts } = page();
  let arrive = (_: BatchRecord) => {};
  const queryFn = () => new Promise<BatchRecord>((resolve) => (arrive = resolve));
  const reading = client.fetchQuery({ queryKey: RECORD, queryFn });
  expect(layIn(client, RECORD, taken(ANSWER))).toBe(false);
  expect(texts()).toEqual(['Bready']);
  arrive(EMPTY);
  await reading;
});

it('takes a whole answer as the data of its query, and leaves all others to be read', () => {
  const { client } = page();
  const state = { run: null, now: '2027-04-03T13:00:00.000Z' };
  expect(layIn(client, POUR, taken(state, { answers: POUR }))).toBe(true);
  expect(client.getQueryData(POUR)).toEqual(state);
  expect(layIn(client, POUR, taken(undefined, { answers: POUR }))).toBe(false);
  expect(layIn(client, ['board', 'reedbed'], taken(ANSWER))).toBe(false);
});

it('has a run read anew where a read had begun before: it may still show the step before', async () => {
  const { client } = page();
  const state = { run: null, now: '2027-04-03T13:00:00.000Z' };
  let arrive = (_: typeof state) => {};
  const queryFn = () => new Promise<typeof state>((resolve) => (arrive = resolve));
  const reading = client.fetchQuery({ queryKey: POUR, queryFn });
  expect(layIn(client, POUR, taken(state, { answers: POUR }))).toBe(false);
  expect(client.getQueryData(POUR)).toEqual(state);
  arrive(state);
  await reading;
});

it('makes no record where none was read', () => {
  const client = new QueryClient();
  expect(layIn(client, RECORD, taken(ANSWER))).toBe(false);
  expect(client.getQueryData(RECORD)).toBeUndefined();
});
