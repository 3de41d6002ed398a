import { describe, expect, it } from 'vitest';
import { keepEqualRows } from '../../../src/api/keepEqualRows.ts';

const row = (id: string, place: number) => ({ id, place, link: { keepL: null } });
const boardOf = (batches: ReturnType<typeof row>[]) => ({
  season: { id: 's', revision: 1 },
  blockedDays: ['2027-03-01', '2027-03-08'],
  batches,
});
type Board = ReturnType<typeof boardOf>;
const kept = (before: Board, now: Board) => keepEqualRows(before, now) as Board;

describe('what was read anew', () => {
  it('is the same object where it says the same', () => {
    const before = boardOf([row('a', 0), row('b', 1)]);
    expect(keepEqualRows(before, structuredClone(before))).toBe(before);
  });

  it('keeps each row that is as it was, wherever it stands now', () => {
    const before = boardOf([row('a', 0), row('b', 0), row('c', 1)]);
    const now = boardOf([row('b', 0), row('c', 1), row('a', 7)]);
    const after = kept(before, now);
    expect(after).toEqual(now);
    expect(after.batches[0]).toBe(before.batches[1]);
    expect(after.batches[1]).toBe(before.batches[2]);
    expect(after.batches[2]).toBe(now.batches[2]);
    expect(after.season).toBe(before.season);
    expect(after.blockedDays).toBe(before.blockedDays);
  });

  it('takes rows that came, and lets go of those that went', () => {
    const before = boardOf([row('a', 0), row('b', 1)]);
    const now = boardOf([row('c', 0), row('b', 1)]);
    const after = kept(before, now);
    expect(after).toEqual(now);
    expect(after.batches[1]).toBe(before.batches[1]);
    expect(kept(after, boardOf([])).batches).toEqual([]);
  });

  it('tells a field that went or came, and lists without ids', () => {
    expect(keepEqualRows({ a: 1, b: 2 }, { a: 1 })).toEqual({ a: 1 });
    expect(keepEqualRows({ a: 1 }, { a: 1, b: 2 })).toEqual({ a: 1, b: 2 });
    expect(keepEqualRows({ days: ['x', 'y'] }, { days: ['y'] })).toEqual({ days: ['y'] });
  });

  it('takes what is no record as it is', () => {
    expect(keepEqualRows(undefined, { a: 1 })).toEqual({ a: 1 });
    expect(keepEqualRows('a', 'b')).toBe('b');
  });
});
