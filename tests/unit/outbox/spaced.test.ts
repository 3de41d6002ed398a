import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import { spaced } from '../../../src/outbox/spaced.ts';

beforeEach(() => vi.useFakeTimers());
afterEach(() => vi.useRealTimers());

test('what is asked for at once is done once now, and once after the pause', () => {
  const work = vi.fn<() => void>();
  const tries = spaced(3_000, work);
  tries.ask();
  tries.ask();
  tries.ask();
  expect(work).toHaveBeenCalledTimes(1);
  vi.advanceTimersByTime(2_999);
  expect(work).toHaveBeenCalledTimes(1);
  vi.advanceTimersByTime(1);
  expect(work).toHaveBeenCalledTimes(2);
  vi.advanceTimersByTime(60_000);
  expect(work).toHaveBeenCalledTimes(2);
});

test('work that asks for itself, as a request does that is lost again, goes at the pace of the pause', () => {
  const work = vi.fn<() => void>(() => tries.ask());
  const tries = spaced(3_000, work);
  tries.ask();
  vi.advanceTimersByTime(30_000);
  expect(work).toHaveBeenCalledTimes(11);
});

test('what is called off does not come, and the next asking is served at once', () => {
  const work = vi.fn<() => void>();
  const tries = spaced(3_000, work);
  tries.ask();
  tries.ask();
  tries.stop();
  vi.advanceTimersByTime(60_000);
  expect(work).toHaveBeenCalledTimes(1);
  tries.ask();
  expect(work).toHaveBeenCalledTimes(2);
});
