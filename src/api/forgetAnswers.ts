import type { Query, QueryClient, QueryKey } from '@tanstack/react-query';

/**
 * Forgets every answer but one. What a page still shows is forgotten as that page goes: if it were
 * gone before, the page would ask for it anew.
 */
export function forgetAnswers(client: QueryClient, { but }: { but: QueryKey }): void {
  const cache = client.getQueryCache();
  const held = new Set(cache.getAll().filter(({ queryKey }) => queryKey[0] !== but[0]));
  const forget = (query: Query) => {
    if (query.getObserversCount() === 0) cache.remove(query);
  };
  const stop = cache.subscribe(({ type, query }) => {
    if (type === 'removed') held.delete(query);
    if (type === 'observerRemoved' && held.has(query)) forget(query);
    if (held.size === 0) stop();
  });
  held.forEach(forget);
  if (held.size === 0) stop();
  client.getMutationCache().clear();
}
