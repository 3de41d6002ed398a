import { lazy, Suspense, type ComponentType, type ReactNode } from 'react';
import { isOnline } from '../api/connection.ts';
import { lazyPage } from './lazyPage.ts';

const NotLoaded = () => (
  <p
    role="alert"
    className="my-3 rounded-xl border-[1.5px] border-mind bg-mind-l px-4 py-3 text-mind"
  >
    This part is not on the device yet. Reload the page once the connection is back.
  </p>
);

/**
 * A part of a page that is loaded when it is first shown, such as a form or a dialog, with what
 * stands in its place until then.
 */
export function lazyPart<Props extends object>(
  load: () => Promise<ComponentType<Props>>,
  meanwhile: ReactNode = null,
) {
  const Part = lazy(async (): Promise<{ default: ComponentType<Props> }> => {
    try {
      const { Component } = await lazyPage(load);
      return { default: Component };
    } catch (error) {
      // The rest of the page, with what was typed in it, stays.
      if (isOnline()) throw error;
      return { default: NotLoaded };
    }
  });
  return function LazyPart(props: Props) {
    return (
      <Suspense fallback={meanwhile}>
        <Part {...props} />
      </Suspense>
    );
  };
}
