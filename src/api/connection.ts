/**
 * Whether the server can be reached, as the page last saw it. The browser's own flag only knows
 * of the network card; a request that got no answer counts too.
 */
let reachable = true;
const listeners = new Set<() => void>();

export const isOnline = () => navigator.onLine && reachable;

export function setReachable(next: boolean) {
  if (next === reachable) return;
  reachable = next;
  for (const listener of listeners) listener();
}

export function onConnectionChange(listener: () => void) {
  listeners.add(listener);
  window.addEventListener('online', listener);
  window.addEventListener('offline', listener);
  return () => {
    listeners.delete(listener);
    window.removeEventListener('online', listener);
    window.removeEventListener('offline', listener);
  };
}
