/** Whether a newer release of the pages lies ready, and how it is taken into use. */
let takeOver: (() => void) | null = null;
const listeners = new Set<() => void>();

export const releaseStore = {
  isReady: () => takeOver !== null,
  subscribe(listener: () => void) {
    listeners.add(listener);
    return () => void listeners.delete(listener);
  },
  ready(take: () => void) {
    takeOver = take;
    for (const listener of listeners) listener();
  },
  take: () => takeOver?.(),
};
