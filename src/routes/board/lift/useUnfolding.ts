import { useEffect, useRef } from 'react';
import { useLiftMachine } from './liftContext.ts';

/**
 * Marks a shelf, the bench or the room for a new shelf while its gaps are open. Written to the
 * element and to no other, so that nothing is drawn anew and only what is in sight is styled anew.
 */
export function useUnfolding<E extends HTMLElement>(part: string) {
  const { store } = useLiftMachine();
  const ref = useRef<E>(null);
  useEffect(() => {
    const mark = () => ref.current?.toggleAttribute('data-lifting', store.get().unfolded.has(part));
    mark();
    return store.subscribe(mark);
  }, [store, part]);
  return ref;
}
