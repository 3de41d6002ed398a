import { useEffect, useRef } from 'react';
import { useLocation } from 'react-router-dom';

/** Brings what an address names by its anchor into sight, with the focus, also where it arrives late. */
export function useShownByAnchor(id: string) {
  const element = useRef<HTMLElement>(null);
  const { hash, key } = useLocation();
  useEffect(() => {
    if (hash !== `#${id}`) return;
    element.current?.scrollIntoView({ block: 'center' });
    element.current?.focus({ preventScroll: true });
  }, [hash, id, key]);
  return element;
}
