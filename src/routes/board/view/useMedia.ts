import { useCallback, useSyncExternalStore } from 'react';
import { PHONE } from '../../../app/isPhone.ts';

export function useMedia(query: string): boolean {
  const subscribe = useCallback(
    (listener: () => void) => {
      const list = window.matchMedia(query);
      list.addEventListener('change', listener);
      return () => list.removeEventListener('change', listener);
    },
    [query],
  );
  return useSyncExternalStore(subscribe, () => window.matchMedia(query).matches);
}

/** One chain down the page instead of shelves side by side. */
export const usePhone = () => useMedia(PHONE);
/** Room for a panel beside the shelves. */
export const useWide = () => useMedia('(min-width: 68.75rem)');
