import type { ComponentType } from 'react';
import { NotLoadedPage } from '../routes/error/NotLoadedPage.tsx';
import { lazyPage } from './lazyPage.ts';

/**
 * A page of the router. Where its chunk cannot be had there are words in its place: of a first page
 * whose chunk failed the router would draw nothing at all, for good.
 */
export async function lazyRoute(
  load: () => Promise<ComponentType>,
): Promise<{ Component: ComponentType }> {
  try {
    return await lazyPage(load);
  } catch {
    return { Component: NotLoadedPage };
  }
}
