import { problem } from '../problems.ts';

/**
 * At most `atOnce` jobs run, at most `waiting` wait their turn; one more is refused as busy.
 */
export function createQueue(atOnce: number, waiting: number) {
  let running = 0;
  const queue: (() => void)[] = [];

  return async function inTurn<T>(job: () => Promise<T>): Promise<T> {
    if (running >= atOnce) {
      if (queue.length >= waiting) throw problem('busy', { retryAfter: 2 });
      await new Promise<void>((resolve) => queue.push(resolve));
    } else running += 1;
    try {
      return await job();
    } finally {
      // The place passes to the next in the queue, so that nobody slips in between.
      const next = queue.shift();
      if (next) next();
      else running -= 1;
    }
  };
}
