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

/** One step of scrolling for a pointer near an edge: of the page, and of the shelf under it. */
export function scrollAt({ x, y }: Point, shelf: Element | null): void {
  const down = scrollStep(y, 0, innerHeight);
  if (down !== 0) window.scrollBy({ top: down, behavior: 'instant' });
  if (!shelf) return;
  const { left, right } = shelf.getBoundingClientRect();
  const along = scrollStep(x, Math.max(left, 0), Math.min(right, innerWidth));
  if (along !== 0) shelf.scrollBy({ left: along, behavior: 'instant' });
}
