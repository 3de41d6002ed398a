import { memo, useMemo, useSyncExternalStore } from 'react';

export interface Announcements {
  say(words: string): void;
  /** Says it unless something else comes soon. */
  sayAtRest(words: string): void;
  get(): string;
  subscribe(listener: () => void): () => void;
}

/** As long as a pointer stays on what it has come for. */
const REST_MS = 150;

/** Words for the live region; the same sentence twice in a row is read twice. */
function createAnnouncements(): Announcements {
  let words = '';
  let rest: ReturnType<typeof setTimeout> | undefined;
  const listeners = new Set<() => void>();
  const say = (next: string) => {
    clearTimeout(rest);
    words = next === words ? `${next}\u00a0` : next;
    for (const listener of listeners) listener();
  };
  return {
    say,
    sayAtRest(next) {
      clearTimeout(rest);
      rest = setTimeout(() => say(next), REST_MS);
    },
    get: () => words,
    subscribe(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}

export const useAnnouncements = (): Announcements => useMemo(() => createAnnouncements(), []);

/** The board's one live region for gestures. */
export const Announcer = memo(function Announcer({ from }: { from: Announcements }) {
  const words = useSyncExternalStore(from.subscribe, from.get);
  return (
    <output className="sr-only" aria-live="polite" aria-atomic="true" data-lift-words>
      {words}
    </output>
  );
});
