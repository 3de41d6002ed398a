import {
  AutoScrollActivator,
  MeasuringStrategy,
  type CollisionDetection,
  type Modifier,
} from '@dnd-kit/core';

/** How far the pointer goes, in pixels, before a press becomes a lift. */
const ACTIVATION_PX = 6;
export const POINTER = { activationConstraint: { distance: ACTIVATION_PX } };

/**
 * The open gap under the pointer. One hit test of the browser instead of two hundred rectangles:
 * it costs the same on any board and is right while a shelf scrolls.
 */
export const gapUnderPointer: CollisionDetection = ({
  pointerCoordinates,
  droppableContainers,
}) => {
  if (!pointerCoordinates) return [];
  const { x, y } = pointerCoordinates;
  const key = document.elementFromPoint(x, y)?.closest<HTMLElement>('[data-gap-open]')
    ?.dataset.gapOpen;
  const found = droppableContainers.find((container) => container.id === key);
  return found ? [{ id: found.id }] : [];
};

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

/** Gaps lie in reserved room and do not move: they are measured once. */
export const MEASURING = { droppable: { strategy: MeasuringStrategy.BeforeDragging } };

export const AUTO_SCROLL = {
  activator: AutoScrollActivator.Pointer,
  threshold: { x: 0.12, y: 0.14 },
};

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
