import type { ComponentType } from 'react';
import { isOnline } from '../api/connection.ts';

const KEY = 'barmkin-reloaded-for';

/** Where a click leads that is not there yet; null: nowhere. The router tells. */
let onTheWay: () => string | null = () => null;

export function tellTheWay(where: () => string | null) {
  onTheWay = where;
}

/**
 * Loads a page's chunk. After a new release the old chunk is gone: the page that was wanted
 * is then loaded from the server, once for an address, so that a real fault does not go round in circles.
 */
export async function lazyPage<Props extends object = object>(
  load: () => Promise<ComponentType<Props>>,
) {
  try {
    const Component = await load();
    sessionStorage.removeItem(KEY);
    return { Component };
  } catch (error) {
    // Without a connection loading anew would only lose the page that is here.
    if (!isOnline()) throw error;
    const wanted = new URL(onTheWay() ?? location.href, location.href).href;
    if (sessionStorage.getItem(KEY) === wanted) throw error;
    sessionStorage.setItem(KEY, wanted);
    if (wanted === location.href) location.reload();
    else location.assign(wanted);
    // The new page is on its way; nothing is to be drawn before it.
    return new Promise<never>(() => undefined);
  }
}
