// @vitest-environment jsdom
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { stepWhenIdle } from '../../../src/routes/board/head/idleSteps.ts';

/** Idle moments that the test gives, each with so many milliseconds to spare. */
let waiting: IdleRequestCallback[] = [];
let spareMs = 0;
let inUse = false;

/** Steps taken, each of which costs this much. */
let taken = 0;
const STEP_MS = 8;

function giveMoment(): void {
  const [first] = waiting.splice(0, 1);
  const start = taken;
  first?.({ didTimeout: false, timeRemaining: () => spareMs - STEP_MS * (taken - start) });
}

function* threeSteps(done: string[]): Generator<void, string, void> {
  for (const step of ['one', 'two', 'three']) {
    done.push(step);
    taken += 1;
    yield;
  }
  return 'answer';
}

beforeEach(() => {
  waiting = [];
  inUse = false;
  vi.stubGlobal('requestIdleCallback', (run: IdleRequestCallback) => waiting.push(run));
  vi.stubGlobal('cancelIdleCallback', () => {
    waiting = [];
  });
});
afterEach(() => {
  vi.unstubAllGlobals();
  vi.useRealTimers();
});

describe('steps in idle moments', () => {
  it('takes one step in a moment that has room for one, and tells the answer once', () => {
    const done: string[] = [];
    const tell = vi.fn<(answer: string) => void>();
    spareMs = 9;
    stepWhenIdle(threeSteps(done), tell, () => inUse);
    expect(done).toEqual([]);
    giveMoment();
    expect(done).toEqual(['one']);
    giveMoment();
    giveMoment();
    expect(tell).not.toHaveBeenCalled();
    giveMoment();
    expect(tell.mock.calls).toEqual([['answer']]);
    expect(waiting).toEqual([]);
  });

  it('takes more where the page has long to spare', () => {
    const tell = vi.fn<(answer: string) => void>();
    spareMs = 40;
    stepWhenIdle(threeSteps([]), tell, () => inUse);
    giveMoment();
    expect(tell).toHaveBeenCalledWith('answer');
  });

  it('takes none in a moment that is too short, or while the page is in use', () => {
    const done: string[] = [];
    const tell = vi.fn<(answer: string) => void>();
    stepWhenIdle(threeSteps(done), tell, () => inUse);
    spareMs = 7;
    giveMoment();
    spareMs = 40;
    inUse = true;
    giveMoment();
    expect(done).toEqual([]);
    inUse = false;
    giveMoment();
    expect(tell).toHaveBeenCalledWith('answer');
  });

  it('takes no step and tells nothing once it is stopped', () => {
    const done: string[] = [];
    const tell = vi.fn<(answer: string) => void>();
    spareMs = 9;
    const stop = stepWhenIdle(threeSteps(done), tell, () => inUse);
    giveMoment();
    const late = waiting[0];
    stop();
    expect(waiting).toEqual([]);
    late?.({ didTimeout: false, timeRemaining: () => 40 });
    expect(done).toEqual(['one']);
    expect(tell).not.toHaveBeenCalled();
  });

  it('pauses between steps in a browser that tells of no idle moments', () => {
    vi.unstubAllGlobals();
    vi.useFakeTimers();
    Reflect.deleteProperty(window, 'requestIdleCallback');
    const done: string[] = [];
    const tell = vi.fn<(answer: string) => void>();
    stepWhenIdle(threeSteps(done), tell, () => inUse);
    vi.advanceTimersByTime(16);
    expect(done).toEqual(['one']);
    vi.advanceTimersByTime(48);
    expect(tell).toHaveBeenCalledWith('answer');
  });
});
