import { useCallback, useSyncExternalStore } from 'react';
import { PHONE } from '../../../app/isPhone.ts';

const lists = new Map<string, MediaQueryList>();

/** One list for each question, since making one lets the browser lay out the page first. */
function listOf(query: string): MediaQueryList {
  const known = lists.get(query);
  if (known) return known;
  const list = window.matchMedia(query);
  lists.set(query, list);
  return list;
}

export function useMedia(query: string): boolean {
  const subscribe = useCallback(
    (listener: () => void) => {
      const list = listOf(query);
      list.addEventListener('change', listener);
      return () => list.removeEventListener('change', listener);
    },
    [query],
  );
  return useSyncExternalStore(subscribe, () => listOf(query).matches);
}

/** One chain down the page instead of shelves side by side. */
export const usePhone = () => useMedia(PHONE);
/** Room for a panel beside the shelves. */
export const useWide = () => useMedia('(min-width: 68.75rem)');
