import { isRecord } from '../app/isRecord.ts';
import { equalDeep } from './equalDeep.ts';

/**
 * What was read anew, with everything that is as it was still the same object, so that it is not
 * drawn anew; where that is so already, what was read itself. Rows are known by their ids: one that
 * was moved changes the place of all behind it, and compared place by place every one of those would
 * be another.
 */
export function keepEqualRows(before: unknown, now: unknown): unknown {
  if (!isRecord(before) || !isRecord(now)) return keepEqual(before, now);
  const kept = Object.entries(now).map(([key, value]) => [key, keepEqual(before[key], value)]);
  const isLike = (other: Record<string, unknown>) =>
    Object.keys(other).length === kept.length &&
    kept.every(([key, value]) => Object.is(value, other[String(key)]));
  if (isLike(before)) return before;
  return isLike(now) ? now : Object.fromEntries(kept);
}

function keepEqual(before: unknown, now: unknown): unknown {
  if (Array.isArray(before) && Array.isArray(now)) return keepRows(before, now);
  return equalDeep(before, now) ? before : now;
}

function keepRows(before: readonly unknown[], now: readonly unknown[]): readonly unknown[] {
  const known = new Map(before.map((row) => [idOf(row), row]));
  const rows = now.map((row, at) => {
    const id = idOf(row);
    const was = id === undefined ? before[at] : known.get(id);
    return equalDeep(was, row) ? was : row;
  });
  const isLike = (other: readonly unknown[]) =>
    rows.length === other.length && rows.every((row, at) => row === other[at]);
  if (isLike(before)) return before;
  return isLike(now) ? now : rows;
}

const idOf = (row: unknown): unknown => (isRecord(row) ? row.id : undefined);
