import './lift.css';
import {
  DndContext,
  DragOverlay,
  PointerSensor,
  useSensor,
  useSensors,
  type DragEndEvent,
  type DragOverEvent,
} from '@dnd-kit/core';
import { useMemo, type ReactNode } from 'react';
import { useBoard } from '../../../api/board.ts';
import { Announcer, useAnnouncements } from './Announcer.tsx';
import { drop, LiftContext, type LiftMachine } from './liftContext.ts';
import { LiftedCard } from './LiftedCard.tsx';
import { LiftSurface } from './LiftSurface.tsx';
import { PlacesDialog } from './PlacesDialog.tsx';
import { AT_POINTER, AUTO_SCROLL, gapUnderPointer, MEASURING, POINTER, SILENT } from './pointer.ts';
import { useLiftKeys } from './useLiftKeys.ts';
import { useMachine } from './useMachine.ts';
import { YeastDialog } from './YeastDialog.tsx';

const keyOf = ({ over }: DragOverEvent | DragEndEvent) => (over ? String(over.id) : null);

/** What the pointer's drag means for the batch in the hand. */
function usePointerEvents(machine: LiftMachine) {
  return useMemo(
    () => ({
      onDragStart: () => machine.lifting.liftPressed(),
      onDragOver: (event: DragOverEvent) => machine.lifting.goOver(keyOf(event)),
      onDragEnd: (event: DragEndEvent) => drop(machine, keyOf(event)),
      onDragCancel: () => machine.lifting.cancel(),
    }),
    [machine],
  );
}

/**
 * Lifting, around the whole board. Every gesture (pointer, keys, list) becomes the same command of
 * the machine. Pointer and drawing of the carried card come from dnd-kit.
 */
export function LiftProvider({ children }: { children: ReactNode }) {
  const board = useBoard();
  const words = useAnnouncements();
  const machine = useMachine(board, words.say);
  const events = usePointerEvents(machine);
  const sensors = useSensors(useSensor(PointerSensor, POINTER));
  useLiftKeys(machine);
  return (
    <LiftContext value={machine}>
      <DndContext
        sensors={sensors}
        collisionDetection={gapUnderPointer}
        measuring={MEASURING}
        autoScroll={AUTO_SCROLL}
        accessibility={SILENT}
        {...events}
      >
        <LiftSurface>{children}</LiftSurface>
        <DragOverlay dropAnimation={null} modifiers={AT_POINTER} className="pointer-events-none">
          <LiftedCard />
        </DragOverlay>
      </DndContext>
      <PlacesDialog />
      <YeastDialog />
      <Announcer from={words} />
    </LiftContext>
  );
}
