import type { Clock } from '../../server/clock.ts';

export interface TestClock extends Clock {
  set(instant: string): void;
  advance(milliseconds: number): void;
}

/** A clock that stands still until it is moved. */
export function testClock(instant: string): TestClock {
  let now = new Date(instant).getTime();
  return {
    now: () => new Date(now),
    set: (to) => {
      now = new Date(to).getTime();
    },
    advance: (milliseconds) => {
      now += milliseconds;
    },
  };
}
