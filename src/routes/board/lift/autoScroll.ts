import type { Point } from './pointer.ts';

/** Depth of the edge in which things scroll, and the fastest step of a frame, in pixels. */
const EDGE = 56;
const FASTEST = 18;

/** Step of a frame for a pointer at `at` in the range: none inside, faster towards the edge. */
export function scrollStep(at: number, from: number, to: number): number {
  const depth = Math.min(EDGE, (to - from) / 4);
  if (at < from + depth) return -FASTEST * Math.min(1, (from + depth - at) / depth);
  if (at > to - depth) return FASTEST * Math.min(1, (at - to + depth) / depth);
  return 0;
}

/** The nearest thing around an element that can scroll sideways: a shelf, the bench. */
function sidewaysOf(element: Element | null): Element | null {
  for (let node = element; node; node = node.parentElement) {
    if (node.scrollWidth <= node.clientWidth + 1) continue;
    const { overflowX } = getComputedStyle(node);
    if (overflowX === 'auto' || overflowX === 'scroll') return node;
  }
  return null;
}

/** Scrolls by a step; true where there was room to go. */
function scrolled(target: Element | Window, left: number, top: number): boolean {
  if (left === 0 && top === 0) return false;
  const place = () =>
    target instanceof Element ? target.scrollLeft + target.scrollTop : target.scrollY;
  const before = place();
  target.scrollBy({ left, top, behavior: 'instant' });
  return place() !== before;
}

/**
 * One step of scrolling for a pointer near an edge: of the shelf under it, and of the page. True
 * where anything moved.
 */
export function scrollAt({ x, y }: Point, under: Element | null): boolean {
  const down = scrolled(window, 0, scrollStep(y, 0, innerHeight));
  const shelf = sidewaysOf(under);
  if (!shelf) return down;
  const { left, right } = shelf.getBoundingClientRect();
  const step = scrollStep(x, Math.max(left, 0), Math.min(right, innerWidth));
  return scrolled(shelf, step, 0) || down;
}
