import { AT_REST, type LiftState } from './liftState.ts';

type Listener = () => void;

export interface LiftStore {
  get(): LiftState;
  set(part: Partial<LiftState>): void;
  subscribe(listener: Listener): () => void;
  /**
   * Told only when this gap opens, closes or is reached or left, or this batch is lifted or put
   * down: a board has hundreds of both, and each would ask at every step of the pointer.
   */
  subscribeTo(gapOrBatch: string, listener: Listener): () => void;
}

/** Gaps and batches that look otherwise now. */
function touched(before: LiftState, now: LiftState): Set<string> {
  const keys = new Set<string>();
  const add = (key: string | null | undefined) => key && keys.add(key);
  if (before.over !== now.over) [before.over, now.over].forEach(add);
  if (before.lifted !== now.lifted) [before.lifted?.batchId, now.lifted?.batchId].forEach(add);
  if (before.opened === now.opened) return keys;
  for (const [key, face] of now.opened) if (before.opened.get(key) !== face) keys.add(key);
  for (const key of before.opened.keys()) if (!now.opened.has(key)) keys.add(key);
  return keys;
}

export function createLiftStore(): LiftStore {
  let state = AT_REST;
  const listeners = new Set<Listener>();
  const byKey = new Map<string, Set<Listener>>();
  return {
    get: () => state,
    set(part) {
      const before = state;
      state = { ...state, ...part };
      for (const listener of listeners) listener();
      for (const key of touched(before, state))
        for (const listener of byKey.get(key) ?? []) listener();
    },
    subscribe(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    subscribeTo(key, listener) {
      const own = byKey.get(key) ?? new Set();
      byKey.set(key, own.add(listener));
      return () => {
        own.delete(listener);
        if (own.size === 0 && byKey.get(key) === own) byKey.delete(key);
      };
    },
  };
}
