import { createContext, use, useCallback, useSyncExternalStore } from 'react';
import type { Lifting } from './lifting.ts';
import type { LiftState } from './liftState.ts';
import type { LiftStore } from './liftStore.ts';
import type { Putting } from './putting.ts';

export interface LiftMachine {
  store: LiftStore;
  lifting: Lifting;
  putting: Putting;
}

/** Never changes while the board is open, so that nothing is drawn anew through it. */
export const LiftContext = createContext<LiftMachine | null>(null);

export function useLiftMachine(): LiftMachine {
  const machine = use(LiftContext);
  if (!machine) throw new Error('Lifting needs a LiftProvider around it');
  return machine;
}

/** One fact of the lift; who asks is drawn anew only when that fact changes. */
export function useLiftState<T>(select: (state: LiftState) => T): T {
  const { store } = useLiftMachine();
  return useSyncExternalStore(store.subscribe, () => select(store.get()));
}

/** One fact of one gap or batch; costs nothing while another one's changes. */
export function useLiftStateOf<T>(gapOrBatch: string, select: (state: LiftState) => T): T {
  const { store } = useLiftMachine();
  const subscribe = useCallback(
    (listener: () => void) => store.subscribeTo(gapOrBatch, listener),
    [store, gapOrBatch],
  );
  return useSyncExternalStore(subscribe, () => select(store.get()));
}

export const useIsLifted = (batchId: string) =>
  useLiftStateOf(batchId, (state) => state.lifted?.batchId === batchId);

/** Which of the two panels the board should show beside it, if any. */
export const useLiftPanel = (): 'places' | 'changes' | null =>
  useLiftState((state) => {
    if (state.isUnfolded) return 'places';
    return state.change || state.refusal ? 'changes' : null;
  });

/** Puts the lifted batch into a place, or back where that place is not open. */
export function drop({ store, lifting, putting }: LiftMachine, key: string | null) {
  const { lifted } = store.get();
  const gap = key === null ? undefined : lifted?.gaps.get(key);
  if (!lifted || !gap) return lifting.cancel();
  lifting.release();
  putting.put(lifted.batchId, gap, { from: lifted.chainId });
}
