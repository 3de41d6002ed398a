/** How far the pointer goes, in pixels, before a press becomes a lift. */
export const LIFT_PX = 6;

/** Things inside a batch that are pressed for themselves. */
const OWN_PRESS =
  'a, button:not([data-lift-handle]), input, select, textarea, summary, label, [popover]';

/** The batch that a press would lift. A finger lifts by the handle only, so that it can scroll. */
export function pressed(target: EventTarget | null, pointerType: string): string | null {
  if (!(target instanceof Element) || target.closest(OWN_PRESS)) return null;
  const handle = target.closest<HTMLElement>('[data-lift-handle]');
  if (pointerType !== 'mouse' && !handle) return null;
  const node = target.closest<HTMLElement>('[data-batch]') ?? handle;
  const batchId = node?.dataset.batch ?? node?.dataset.liftHandle;
  return batchId ?? null;
}

export interface Point {
  x: number;
  y: number;
}

/** The open gap that an element belongs to. */
export const gapIn = (element: Element | null): string | null =>
  element?.closest<HTMLElement>('[data-gap-open]')?.dataset.gapOpen ?? null;

export const pointOf = ({ clientX, clientY }: PointerEvent | MouseEvent): Point => ({
  x: clientX,
  y: clientY,
});

/** Where the pointer holds the carried card, from its corner. */
const GRIP = { x: 22, y: 96 };

/** Hangs the carried card on the pointer, wherever in the batch it was pressed. */
export const atPointer = ({ x, y }: Point): string =>
  `translate3d(${x - GRIP.x}px, ${y - GRIP.y}px, 0)`;
