import { lazy, Suspense, type ComponentType, type ReactNode } from 'react';
import { lazyPage } from './lazyPage.ts';

/**
 * A part of a page that is loaded when it is first shown, such as a form or a dialog, with what
 * stands in its place until then.
 */
export function lazyPart<Props extends object>(
  load: () => Promise<ComponentType<Props>>,
  meanwhile: ReactNode = null,
) {
  const Part = lazy(async () => {
    const { Component } = await lazyPage(load);
    return { default: Component };
  });
  return function LazyPart(props: Props) {
    return (
      <Suspense fallback={meanwhile}>
        <Part {...props} />
      </Suspense>
    );
  };
}
