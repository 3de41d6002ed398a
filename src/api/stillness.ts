import type { Board } from '#shared/api/board.ts';

/**
 * While a pointer carries a batch, nothing may slip from under it: whatever arrives from elsewhere
 * waits here until the drag ends.
 */
export function createStillness() {
  const looks = new Set<(arrived: Board) => void>();
  let waiting: (() => void)[] = [];

  return {
    /**
     * Holds the board still; the answer lets go of it, once.
     * @param look told of each board that arrives meanwhile: it may be a reason to let go
     */
    hold(look: (arrived: Board) => void = () => {}): () => void {
      const mine = (arrived: Board) => look(arrived);
      looks.add(mine);
      return () => {
        if (!looks.delete(mine) || looks.size > 0) return;
        const released = waiting;
        waiting = [];
        for (const resolve of released) resolve();
      };
    },
    isHeld: () => looks.size > 0,
    quiet(arrived?: Board): Promise<void> {
      if (arrived) for (const look of looks) look(arrived);
      return looks.size === 0
        ? Promise.resolve()
        : new Promise((resolve) => {
            waiting.push(resolve);
          });
    },
  };
}

export const boardStillness = createStillness();
