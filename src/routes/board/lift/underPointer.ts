import type { Point } from './pointer.ts';

/** Something as it was measured. */
interface Box {
  element: Element;
  box: DOMRect;
}

interface GapBox extends Box {
  key: string | null;
}

export interface Under {
  /** The open gap; null: none. */
  gap: string | null;
  /** What scrolls sideways there. */
  run: Element | null;
}

export interface UnderPointer {
  /** What lies at a point; to be asked once in a frame. */
  at(point: Point): Under;
  /** Something scrolled: what was measured is elsewhere by now. */
  forget(): void;
}

/** While gaps open, a few in each frame, boxes may be so many frames old: to measure costs as much. */
const OLDEST_FRAMES = 6;

const holds =
  ({ x, y }: Point) =>
  ({ box: { left, right, top, bottom } }: Box) =>
    x >= left && x < right && y >= top && y < bottom;

const boxesOf = (elements: Iterable<Element>): Box[] =>
  [...elements].map((element) => ({ element, box: element.getBoundingClientRect() }));

/**
 * What lies under the pointer of a drag, by boxes that are measured when gaps open or something
 * scrolls: a hit test goes through the whole board, which takes a third of a frame. Bars that lie
 * over the shelves are marked with `data-cover`.
 * @param opened changes whenever a gap opens or closes.
 */
export function createUnderPointer(opened: () => unknown): UnderPointer {
  let gaps: readonly GapBox[] = [];
  let runs: readonly Box[] = [];
  let covers: readonly Box[] = [];
  let measured: unknown = null;
  let seen: unknown = null;
  let age = 0;

  const keepUp = () => {
    const now = opened();
    const isChanging = now !== seen;
    seen = now;
    age += 1;
    if (measured === now) return;
    const mayWait = measured !== null && isChanging && age < OLDEST_FRAMES;
    if (!mayWait) measure();
  };
  const measure = () => {
    measured = opened();
    age = 0;
    const found = [...document.querySelectorAll<HTMLElement>('[data-gap-open]')];
    gaps = found.map((element) => ({
      element,
      key: element.dataset.gapOpen ?? null,
      box: element.getBoundingClientRect(),
    }));
    runs = boxesOf(new Set(found.flatMap((element) => element.closest('[data-run]') ?? [])));
    covers = boxesOf(document.querySelectorAll('[data-cover]'));
  };
  return {
    at(point) {
      keepUp();
      const isHere = holds(point);
      const cover = covers.find(isHere)?.element;
      const gap = gaps.filter(isHere).find(({ element }) => !cover || cover.contains(element));
      const run = cover ? undefined : runs.find(isHere);
      return { gap: gap?.key ?? null, run: run?.element ?? null };
    },
    forget() {
      measured = null;
    },
  };
}
