import type { LiftStore } from './liftState.ts';
import type { LiftPorts } from './ports.ts';

/** Gaps of the first frame; each frame after it opens twice as many as the one before. */
const FIRST = 6;

/** Opens the gaps around a lifted batch, so that no frame has to draw two hundred of them. */
export function openOutward(store: LiftStore, ports: LiftPorts, batchId: string): void {
  const keys = ports.gapsAround(batchId);
  const lifted = store.get().lifted;
  const open = (count: number, step: number) => {
    if (store.get().lifted?.batchId !== lifted?.batchId || lifted === null) return;
    store.set({ opened: new Set(keys.slice(0, count)) });
    if (count < keys.length) ports.nextFrame(() => open(count + step * 2, step * 2));
  };
  open(FIRST, FIRST);
}
