import type { ComponentType } from 'react';

const KEY = 'barmkin-reloaded-for';

/**
 * Loads a page's chunk. After a new release the old chunk is gone: the page is then reloaded,
 * once for an address, so that a real fault does not go round in circles.
 */
export async function lazyPage<Props extends object = object>(
  load: () => Promise<ComponentType<Props>>,
) {
  try {
    const Component = await load();
    sessionStorage.removeItem(KEY);
    return { Component };
  } catch (error) {
    if (sessionStorage.getItem(KEY) === location.href) throw error;
    sessionStorage.setItem(KEY, location.href);
    location.reload();
    // The reload is on its way; nothing is to be drawn before it.
    return new Promise<never>(() => undefined);
  }
}
