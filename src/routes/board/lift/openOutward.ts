import type { LiftStore } from './liftState.ts';
import type { LiftPorts } from './ports.ts';

/** Gaps of the first frame; each frame after it opens twice as many as the one before. */
const FIRST = 6;

/**
 * Unfolds a lift frame by frame: first the page gives way, then the gaps in sight open from the
 * batch outward, and more of them as shelves scroll into sight. No frame draws them all, and what
 * is out of sight costs nothing. The answer ends it.
 */
export function openOutward(store: LiftStore, ports: LiftPorts, batchId: string): () => void {
  let hasEnded = false;
  let isBusy = false;

  const open = (count: number) => {
    if (hasEnded) return;
    const { opened } = store.get();
    const closed = ports.gapsInSight(batchId).filter((key) => !opened.has(key));
    isBusy = closed.length > 0;
    if (!isBusy) return;
    store.set({ opened: new Set([...opened, ...closed.slice(0, count)]) });
    ports.nextFrame(() => open(count * 2));
  };

  const unfold = () => {
    if (hasEnded) return;
    store.set({ isUnfolded: true });
    ports.nextFrame(() => open(FIRST));
  };

  ports.nextFrame(() => ports.nextFrame(unfold));
  const stop = ports.onScroll(() => {
    if (!isBusy) open(FIRST * 2);
  });
  return () => {
    hasEnded = true;
    stop();
  };
}
