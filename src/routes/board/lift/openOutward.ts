import { faceOf, type Face } from './liftState.ts';
import type { LiftStore } from './liftStore.ts';
import type { LiftPorts } from './ports.ts';

/** Gaps of one frame: as many as are drawn and styled in a few milliseconds. */
const OPENED = 2;
const CLOSED = 4;
/** A page whose frames take longer than this, ms, opens them one by one. */
const SLOW_MS = 20;

/** What opening needs of the page. */
type Frames = Pick<LiftPorts, 'nextFrame' | 'gapsInSight' | 'onScroll'>;

/** Closes what was opened, a few gaps a frame, unless something is lifted again. */
function close(store: LiftStore, ports: Frames) {
  const { lifted, opened } = store.get();
  if (lifted || opened.size === 0) return;
  store.set({ opened: new Map([...opened].slice(CLOSED)) });
  ports.nextFrame(() => close(store, ports));
}

/**
 * Unfolds a lift frame by frame: first the panel gives way, then the gaps in sight open from the
 * batch outward, the best of them first, and more as shelves scroll into sight. No frame draws them
 * all, and what is out of sight costs nothing. The answer ends it, and closes them as slowly.
 */
export function openOutward(store: LiftStore, ports: Frames, batchId: string): () => void {
  let hasEnded = false;
  let waiting: string[] | null = null;
  let last = Infinity;

  const open = (at: number) => {
    const { lifted, opened } = store.get();
    const next = waiting?.splice(0, at - last > SLOW_MS ? 1 : OPENED) ?? [];
    last = at;
    if (next.length === 0) waiting = null;
    if (hasEnded || !lifted || waiting === null) return;
    const faces = next.flatMap((key): [string, Face][] => {
      const face = faceOf(lifted, key);
      return face ? [[key, face]] : [];
    });
    if (faces.length > 0) store.set({ opened: new Map([...opened, ...faces]) });
    ports.nextFrame(open);
  };

  /** Looks for gaps in sight that are shut; measured once, and again after scrolling. */
  const look = (at: number) => {
    if (hasEnded) return;
    const { lifted, opened } = store.get();
    const isBusy = waiting !== null;
    const shut = ports.gapsInSight(batchId).filter((key) => !opened.has(key));
    const best = shut.filter((key) => lifted?.gaps.get(key)?.best);
    waiting = [...best, ...shut.filter((key) => !best.includes(key))];
    if (!isBusy) open(at);
  };

  const unfold = () => {
    if (hasEnded) return;
    store.set({ isUnfolded: true });
    ports.nextFrame(look);
  };

  ports.nextFrame(() => ports.nextFrame(unfold));
  const stop = ports.onScroll(look);
  return () => {
    hasEnded = true;
    stop();
    ports.nextFrame(() => close(store, ports));
  };
}
