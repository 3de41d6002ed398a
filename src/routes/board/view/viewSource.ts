/**
 * Where the view of a board is found. It stays the same while the view changes: a context that
 * changed would have React go through all that stands on hundreds of shelves.
 */
export interface ViewSource<View> {
  get(): View | null;
  subscribe(listener: () => void): () => void;
  /** What is drawn from now on; what is drawn already hears of it by `tell`. */
  show(view: View): void;
  tell(): void;
}

export function createViewSource<View>(): ViewSource<View> {
  let shown: View | null = null;
  const listeners = new Set<() => void>();
  return {
    get: () => shown,
    subscribe(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    show(view) {
      shown = view;
    },
    tell() {
      for (const listener of listeners) listener();
    },
  };
}
