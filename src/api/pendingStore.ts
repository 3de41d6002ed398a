import type { MoveRequest } from '#shared/api/move.ts';

/** The wishes of one board that are on their way to the server. */
export interface PendingStore {
  get(): readonly MoveRequest[];
  set(pending: readonly MoveRequest[]): void;
  subscribe(listener: () => void): () => void;
}

function createPendingStore(): PendingStore {
  let pending: readonly MoveRequest[] = [];
  const listeners = new Set<() => void>();
  return {
    get: () => pending,
    set(next) {
      pending = next;
      for (const listener of listeners) listener();
    },
    subscribe(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}

const stores = new Map<string, PendingStore>();

export function pendingOf(slug: string): PendingStore {
  const store = stores.get(slug) ?? createPendingStore();
  stores.set(slug, store);
  return store;
}
