import { memo, useMemo, useSyncExternalStore } from 'react';

export interface Announcements {
  say(words: string): void;
  get(): string;
  subscribe(listener: () => void): () => void;
}

/** Words for the live region; the same sentence twice in a row is read twice. */
function createAnnouncements(): Announcements {
  let words = '';
  const listeners = new Set<() => void>();
  return {
    say(next) {
      words = next === words ? `${next}\u00a0` : next;
      for (const listener of listeners) listener();
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
