import type { LiftStore } from './liftState.ts';
import { partOf } from './places.ts';
import type { LiftPorts } from './ports.ts';

/** Gaps of one frame: a usual shelf. */
const MOST = 12;

/** Closes what was unfolded, a part a frame, unless something is lifted again. */
function foldBack(store: LiftStore, ports: LiftPorts) {
  const { lifted, unfolded } = store.get();
  const [, ...rest] = unfolded;
  if (lifted || unfolded.size === 0) return;
  store.set({ unfolded: new Set(rest) });
  ports.nextFrame(() => foldBack(store, ports));
}

/**
 * Unfolds a lift frame by frame: first the panel gives way, then the gaps in sight open shelf by
 * shelf from the batch outward, and more of them as shelves scroll into sight. No frame draws them
 * all, and what is out of sight costs nothing. The answer ends it, and folds part after part.
 */
export function openOutward(store: LiftStore, ports: LiftPorts, batchId: string): () => void {
  let hasEnded = false;
  let isBusy = false;

  const open = () => {
    if (hasEnded) return;
    const { opened, unfolded } = store.get();
    const [first, ...rest] = ports.gapsInSight(batchId).filter((key) => !opened.has(key));
    isBusy = first !== undefined;
    if (first === undefined) return;
    const part = partOf(first);
    const mates = rest.filter((key) => partOf(key) === part).slice(0, MOST - 1);
    store.set({
      opened: new Set([...opened, first, ...mates]),
      unfolded: new Set([...unfolded, part]),
    });
    ports.nextFrame(open);
  };

  const unfold = () => {
    if (hasEnded) return;
    store.set({ isUnfolded: true });
    ports.nextFrame(open);
  };

  ports.nextFrame(() => ports.nextFrame(unfold));
  const stop = ports.onScroll(() => {
    if (!isBusy) open();
  });
  return () => {
    hasEnded = true;
    stop();
    foldBack(store, ports);
  };
}
