/**
 * While a pointer carries a batch, nothing may slip from under it: whatever arrives from elsewhere
 * waits here until the drag ends.
 */
export function createStillness() {
  let holders = 0;
  let waiting: (() => void)[] = [];

  return {
    /** Holds the board still; the answer lets go of it, once. */
    hold(): () => void {
      holders += 1;
      let isHeld = true;
      return () => {
        if (!isHeld) return;
        isHeld = false;
        holders -= 1;
        if (holders > 0) return;
        const released = waiting;
        waiting = [];
        for (const resolve of released) resolve();
      };
    },
    quiet(): Promise<void> {
      return holders === 0
        ? Promise.resolve()
        : new Promise((resolve) => {
            waiting.push(resolve);
          });
    },
  };
}

export const boardStillness = createStillness();
