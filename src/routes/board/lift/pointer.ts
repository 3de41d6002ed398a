import type { Modifier } from '@dnd-kit/core';

/** How far the pointer goes, in pixels, before a press becomes a lift. */
const ACTIVATION_PX = 6;
export const POINTER = { activationConstraint: { distance: ACTIVATION_PX } };

/** Things inside a batch that are pressed for themselves. */
const OWN_PRESS =
  'a, button:not([data-lift-handle]), input, select, textarea, summary, label, [popover]';

/** The batch that a press would lift. A finger lifts by the handle only, so that it can scroll. */
export function pressed(
  target: EventTarget | null,
  pointerType: string,
): { batchId: string; node: HTMLElement } | null {
  if (!(target instanceof Element) || target.closest(OWN_PRESS)) return null;
  const handle = target.closest<HTMLElement>('[data-lift-handle]');
  if (pointerType !== 'mouse' && !handle) return null;
  const node = target.closest<HTMLElement>('[data-batch]') ?? handle;
  const batchId = node?.dataset.batch ?? node?.dataset.liftHandle;
  return node && batchId ? { batchId, node } : null;
}

export interface Point {
  x: number;
  y: number;
}

/** The open gap that an element belongs to. */
export const gapIn = (element: Element | null): string | null =>
  element?.closest<HTMLElement>('[data-gap-open]')?.dataset.gapOpen ?? null;

/** Where the pointer holds the carried card, from its corner. */
const GRIP = { x: 22, y: 96 };

/** Hangs the carried card on the pointer, wherever in the batch it was pressed. */
export const AT_POINTER: Modifier[] = [
  ({ activatorEvent, draggingNodeRect, transform }) => {
    if (!(activatorEvent instanceof PointerEvent) || !draggingNodeRect) return transform;
    return {
      ...transform,
      x: transform.x + activatorEvent.clientX - draggingNodeRect.left - GRIP.x,
      y: transform.y + activatorEvent.clientY - draggingNodeRect.top - GRIP.y,
    };
  },
];

const nothing = () => undefined;

/** dnd-kit's own announcements know neither shelf nor verdict; the board has its own. */
export const SILENT = {
  announcements: {
    onDragStart: nothing,
    onDragOver: nothing,
    onDragEnd: nothing,
    onDragCancel: nothing,
  },
  screenReaderInstructions: { draggable: '' },
  container: document.createElement('div'),
};
