import { describe, expect, it } from 'vitest';
import type { Entry, Refusal } from '../../../src/outbox/entry.ts';
import { afterSending, nextOf, tryAgain, withNew, without } from '../../../src/outbox/queue.ts';

const entry = (id: string, more: Partial<Entry> = {}): Entry => ({
  id,
  personId: 'orla',
  contract: 1,
  madeAt: '2027-03-20T14:05:00.000Z',
  method: 'POST',
  url: '/api/rows',
  body: { id },
  what: id,
  page: '/b/reedbed',
  touches: [],
  refusal: null,
  ...more,
});
const conflict = (current: unknown): Refusal => ({
  status: 412,
  kind: 'changed-since',
  sentence: 'Somebody changed it in the meantime.',
  errors: [],
  current,
});
const patch = (id: string, body: object, ifMatch: number) =>
  entry(id, { method: 'PATCH', url: '/api/rows/r', body, ifMatch });

describe('the outbox', () => {
  it('sends the oldest first, and only what the person who is signed in wrote', () => {
    const entries = [entry('a', { personId: 'ned' }), entry('b'), entry('c')];
    expect(nextOf(entries, 'orla')?.id).toBe('b');
    expect(nextOf(entries, 'ned')?.id).toBe('a');
    expect(nextOf(entries, 'ivy')).toBeNull();
    expect(nextOf(entries, null)).toBeNull();
  });

  it('takes an entry once', () => {
    expect(withNew([entry('a')], entry('a', { what: 'again' }))).toEqual([entry('a')]);
  });

  it('stops at one that was refused, and goes on once it is discarded', () => {
    const before = [entry('a'), entry('b')];
    const refusal = { ...conflict({ id: 'a' }), status: 409, kind: 'already-exists' };
    const after = afterSending(before, before[0] ?? entry('a'), { kind: 'refused', refusal });
    expect(after).toHaveLength(2);
    expect(nextOf(after, 'orla')).toBeNull();
    expect(nextOf(without(after, 'a'), 'orla')?.id).toBe('b');
    expect(nextOf(tryAgain(after, 'a', 'as-it-was'), 'orla')?.id).toBe('a');
  });

  it('keeps what was not answered', () => {
    const before = [entry('a')];
    for (const kind of ['lost', 'later'] as const)
      expect(afterSending(before, entry('a'), { kind })).toEqual(before);
  });

  it('lets a second change of a row follow on the first', () => {
    const [first, second] = [patch('a', { text: 'one' }, 3), patch('b', { text: 'two' }, 3)];
    const after = afterSending([first, second], first, { kind: 'done', answer: { version: 4 } });
    expect(after).toEqual([{ ...second, ifMatch: 4 }]);
  });

  it('leaves a change alone that was made from another version than the one that was sent', () => {
    const [first, second] = [patch('a', { text: 'one' }, 3), patch('b', { text: 'two' }, 2)];
    expect(afterSending([first, second], first, { kind: 'done', answer: { version: 4 } })).toEqual([
      second,
    ]);
  });

  it('knows a change whose answer was lost by what stands in the row', () => {
    const change = patch('a', { text: 'one', typed: { volume: '20 L' } }, 3);
    const done = conflict({ id: 'r', version: 4, text: 'one', typed: { volume: '20 L' } });
    expect(afterSending([change], change, { kind: 'refused', refusal: done })).toEqual([]);
    const theirs = conflict({ id: 'r', version: 4, text: 'other', typed: { volume: '20 L' } });
    expect(afterSending([change], change, { kind: 'refused', refusal: theirs })).toEqual([
      { ...change, refusal: theirs },
    ]);
  });

  it('takes a row that is gone as deleted, and nothing else', () => {
    const gone: Refusal = { status: 404, kind: 'not-found', sentence: '', errors: [] };
    const removal = entry('a', { method: 'DELETE', body: undefined });
    expect(afterSending([removal], removal, { kind: 'refused', refusal: gone })).toEqual([]);
    const change = patch('b', { text: 'one' }, 1);
    expect(afterSending([change], change, { kind: 'refused', refusal: gone })).toHaveLength(1);
  });

  it('puts mine over theirs from the version that is there now', () => {
    const stopped = { ...patch('a', { text: 'one' }, 3), refusal: conflict({ version: 7 }) };
    expect(tryAgain([stopped], 'a', 'over-theirs')).toEqual([
      { ...stopped, refusal: null, ifMatch: 7 },
    ]);
  });
});
