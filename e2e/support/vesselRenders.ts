import type { Page } from '@playwright/test';

/** The part of React's own tree that is read here. */
interface Fiber {
  type: unknown;
  flags: number;
  stateNode: unknown;
  child: Fiber | null;
  sibling: Fiber | null;
  return: Fiber | null;
}

interface Counting {
  __REACT_DEVTOOLS_GLOBAL_HOOK__?: unknown;
  vesselRenders?: number;
}

/**
 * Counts in the page, as React's developer tools do, how often the vessels on the shelves are
 * rendered: at each commit, the component above each drawn vessel, if it did any work since. Must
 * run before the page's own scripts, alone, since it is sent there as text.
 */
export function countVessels(): void {
  const PERFORMED_WORK = 1;
  const seen = new Map<unknown, Fiber>();
  const counting = window as Window & Counting;
  counting.vesselRenders = 0;
  const isVessel = (node: unknown) =>
    node instanceof SVGElement &&
    node.getAttribute('viewBox') === '0 0 84 132' &&
    node.querySelector('clipPath') !== null &&
    node.closest('[data-batch]') !== null;
  const visit = (fiber: Fiber | null): void => {
    for (let one = fiber; one; one = one.sibling) {
      const above = one.return;
      if (one.type === 'svg' && above && isVessel(one.stateNode)) {
        if (seen.get(one.stateNode) !== above && (above.flags & PERFORMED_WORK) !== 0)
          counting.vesselRenders = (counting.vesselRenders ?? 0) + 1;
        seen.set(one.stateNode, above);
      }
      visit(one.child);
    }
  };
  counting.__REACT_DEVTOOLS_GLOBAL_HOOK__ = {
    supportsFiber: true,
    inject: () => 1,
    checkDCE: () => undefined,
    onCommitFiberUnmount: () => undefined,
    onPostCommitFiberRoot: () => undefined,
    onCommitFiberRoot: (_id: number, root: { current: Fiber }) => visit(root.current.child),
  };
}

/** Renders since the last time that this was asked. */
export const vesselRenders = (page: Page): Promise<number> =>
  page.evaluate(() => {
    const counting = window as Window & Counting;
    const count = counting.vesselRenders ?? Number.NaN;
    counting.vesselRenders = 0;
    return count;
  });
