import {
  DndContext,
  DragOverlay,
  PointerSensor,
  useDraggable,
  useSensor,
  useSensors,
} from '@dnd-kit/core';
import { useImperativeHandle, useMemo, type PointerEvent, type RefObject } from 'react';
import { useLiftMachine, type LiftMachine } from './liftContext.ts';
import { LiftedCard } from './LiftedCard.tsx';
import { AT_POINTER, POINTER, SILENT } from './pointer.ts';
import { watchPointer, type Watch } from './watchPointer.ts';

/** Takes hold of a batch's element when the pointer goes down on it. */
export type Grab = (event: PointerEvent, node: HTMLElement) => void;

/**
 * The pointer's drag and the carried card, by dnd-kit. It stands beside the board, not around it,
 * and is its only draggable: dnd-kit draws all that stands under its context anew at each step of
 * the pointer, and measures every droppable at the start. Which gap the pointer is over is one hit
 * test of the browser, which costs the same on any board and is right while a shelf scrolls.
 */
export function Hand({ grab }: { grab: RefObject<Grab | null> }) {
  const machine = useLiftMachine();
  const sensors = useSensors(useSensor(PointerSensor, POINTER));
  const drag = useMemo(() => createDrag(machine), [machine]);
  return (
    <DndContext sensors={sensors} autoScroll={false} accessibility={SILENT} {...drag}>
      <Grip grab={grab} />
      <DragOverlay
        dropAnimation={null}
        modifiers={AT_POINTER}
        className="pointer-events-none will-change-transform"
      >
        <LiftedCard />
      </DragOverlay>
    </DndContext>
  );
}

/** What the steps of a drag mean for the batch in the hand. */
function createDrag(machine: LiftMachine) {
  let watch: Watch | null = null;
  return {
    onDragStart({ activatorEvent }: { activatorEvent: Event }) {
      machine.lifting.liftPressed();
      watch = watchPointer(activatorEvent, machine.lifting.goOver);
    },
    onDragEnd() {
      const key = watch?.stop() ?? null;
      const { lifted } = machine.store.get();
      const gap = key === null ? undefined : lifted?.gaps.get(key);
      if (!lifted || !gap) return machine.lifting.cancel();
      // The hand opens in this frame, the board changes in the next: both at once would be felt.
      machine.lifting.release();
      const from = lifted.chainId;
      requestAnimationFrame(() => machine.putting.put(lifted.batchId, gap, { from }));
    },
    onDragCancel() {
      watch?.stop();
      machine.lifting.cancel();
    },
  };
}

/** The one draggable; the board hands it whichever batch was pressed. */
function Grip({ grab }: { grab: RefObject<Grab | null> }) {
  const { setNodeRef, listeners } = useDraggable({ id: 'hand' });
  useImperativeHandle(
    grab,
    () => (event, node) => {
      setNodeRef(node);
      listeners?.onPointerDown?.(event);
    },
    [setNodeRef, listeners],
  );
  return null;
}
