import { useEffect, useRef } from 'react';
import type { Board } from '#shared/api/board.ts';
import { rehearsal } from './judging.ts';
import type { LiftStore } from './liftStore.ts';

/** Less than this is left of an idle time for nothing. */
const LEAST_MS = 4;

/** Makes the first lift of a page ready while the page has nothing to do, and none is under way. */
export function useRehearsal(board: Board, store: LiftStore): void {
  const first = useRef(board);
  useEffect(() => {
    if (!('requestIdleCallback' in window)) return;
    const steps = rehearsal(first.current);
    const run = (idle: IdleDeadline) => {
      if (store.get().lifted) return;
      const isDone = idle.timeRemaining() >= LEAST_MS && steps.next().done;
      if (!isDone) handle = requestIdleCallback(run);
    };
    let handle = requestIdleCallback(run);
    return () => cancelIdleCallback(handle);
  }, [store]);
}
