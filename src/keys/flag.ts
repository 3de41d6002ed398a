/** Something that is open or not, and who is told of it. */
export function createFlag() {
  let isUp = false;
  const listeners = new Set<() => void>();
  return {
    get: () => isUp,
    set(next: boolean) {
      isUp = next;
      for (const listener of listeners) listener();
    },
    subscribe(listener: () => void) {
      listeners.add(listener);
      return () => void listeners.delete(listener);
    },
  };
}
