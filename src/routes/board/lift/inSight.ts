/** A little more than is in sight, so that a shelf is open when it scrolls in. */
const MARGIN = 240;

export const handleOf = (batchId: string) =>
  document.querySelector<HTMLElement>(`[data-lift-handle="${CSS.escape(batchId)}"]`);

/** Gives the focus to a batch's handle. Waits for the drawing, and for a closing dialog that would give the focus elsewhere. */
export function focusBatch(batchId: string) {
  const focus = () => handleOf(batchId)?.focus();
  requestAnimationFrame(() => requestAnimationFrame(focus));
}

/** Height of a box above or below a line; 0 where the line crosses it. */
const away = ({ top, bottom }: DOMRect, y: number) => Math.max(top - y, y - bottom, 0);

/**
 * Gaps of the shelves in sight, those of the nearest shelf first. Only shelves are measured: what
 * is out of sight inside them is not laid out, and asking for its place would make it so.
 */
export function gapsInSight(batchId: string): string[] {
  const y = handleOf(batchId)?.getBoundingClientRect().top ?? 0;
  const boxes = new Map<Element, DOMRect>();
  const boxOf = (node: Element) => {
    const shelf = node.closest('[data-chain]') ?? node;
    const box = boxes.get(shelf) ?? shelf.getBoundingClientRect();
    boxes.set(shelf, box);
    return box;
  };
  return [...document.querySelectorAll<HTMLElement>('[data-gap]')]
    .map((node) => ({ key: node.dataset.gap ?? '', box: boxOf(node) }))
    .filter(({ box }) => box.bottom > -MARGIN && box.top < innerHeight + MARGIN)
    .map(({ key, box }) => ({ key, distance: away(box, y) }))
    .toSorted((a, b) => a.distance - b.distance)
    .map(({ key }) => key);
}

/** Scrolling of the page, told at most once in a frame. */
export function onScroll(run: (at: number) => void): () => void {
  let frame = 0;
  const listen = () => {
    cancelAnimationFrame(frame);
    frame = requestAnimationFrame(run);
  };
  window.addEventListener('scroll', listen, { passive: true });
  return () => {
    cancelAnimationFrame(frame);
    window.removeEventListener('scroll', listen);
  };
}
