import type { LiveState } from './connection.ts';

export interface LiveView {
  state: LiveState;
  /** Ids of the people who have the season open. */
  here: readonly string[];
}

const AT_FIRST: LiveView = { state: 'connecting', here: [] };

let view = AT_FIRST;
const listeners = new Set<() => void>();

/** How live the page is, for the bar. A page shows one season, so there is one. */
export const liveStore = {
  get: () => view,
  set(part: Partial<LiveView>) {
    view = { ...view, ...part };
    for (const listener of listeners) listener();
  },
  reset: () => liveStore.set(AT_FIRST),
  subscribe(listener: () => void) {
    listeners.add(listener);
    return () => listeners.delete(listener);
  },
};
