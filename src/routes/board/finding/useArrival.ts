import { useEffect } from 'react';
import { useLocation, useSearchParams } from 'react-router-dom';

/** What the address points at: a batch or a shelf that was looked for. */
export const useSought = (): string | null => useSearchParams()[0].get('at');

/** Brings what was looked for into sight, and the focus to its name, each time it is looked for. */
export function useArrival() {
  const sought = useSought();
  const { key } = useLocation();
  useEffect(() => {
    if (sought === null) return;
    // The dialog it was chosen in gives the focus back first.
    const frame = requestAnimationFrame(() => {
      const id = CSS.escape(sought);
      const place = document.querySelector(`[data-batch="${id}"], [data-chain="${id}"]`);
      const name = place?.querySelector<HTMLElement>(':is(h1, h2, h3) :is(a, button)');
      place?.scrollIntoView({ block: 'center', inline: 'center' });
      name?.focus({ preventScroll: true });
    });
    return () => cancelAnimationFrame(frame);
  }, [sought, key]);
}
