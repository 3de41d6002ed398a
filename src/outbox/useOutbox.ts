import { useEffect, useSyncExternalStore } from 'react';
import { outbox, watchOutbox } from './outbox.ts';
import type { Entries } from './queue.ts';

/** What waits to be sent for whoever is signed in, oldest first. */
export const useOutbox = (): Entries => useSyncExternalStore(outbox.subscribe, outbox.get);

/** Keeps sending for as long as the shell is there. */
export function useSending() {
  useEffect(watchOutbox, []);
}
