import { useDraggable } from '@dnd-kit/core';
import type { PointerEvent, ReactNode } from 'react';
import { useLiftMachine, useLiftState } from './liftContext.ts';
import { useBoard } from '../../../api/board.ts';
import { useOnline } from '../../../app/useOnline.ts';
import { whyFixed } from './lifting.ts';

/** Things inside a batch that are pressed for themselves. */
const OWN_PRESS = 'a, button:not([data-lift-handle]), input, select, textarea, summary, label';

/** The batch that a press would lift. A finger lifts by the handle only, so that it can scroll. */
function pressed(event: PointerEvent): { batchId: string; node: HTMLElement } | null {
  if (!(event.target instanceof Element) || event.target.closest(OWN_PRESS)) return null;
  const handle = event.target.closest<HTMLElement>('[data-lift-handle]');
  if (event.pointerType !== 'mouse' && !handle) return null;
  const node = event.target.closest<HTMLElement>('[data-batch]') ?? handle;
  const batchId = node?.dataset.batch ?? node?.dataset.liftHandle;
  return node && batchId ? { batchId, node } : null;
}

/**
 * The board as one draggable for all of its batches: a press says which one it is. With a
 * draggable for each, two hundred of them would be drawn anew at every gap that is passed.
 */
export function LiftSurface({ children }: { children: ReactNode }) {
  const board = useBoard();
  const online = useOnline();
  const { store, lifting } = useLiftMachine();
  const isLifting = useLiftState((state) => state.lifted !== null);
  const { setNodeRef, listeners } = useDraggable({ id: 'hand' });

  const onPointerDown = (event: PointerEvent) => {
    const press = pressed(event);
    if (!press || !online || store.get().lifted || whyFixed(board, press.batchId)) return;
    lifting.press(press.batchId);
    setNodeRef(press.node);
    listeners?.onPointerDown?.(event);
  };

  return (
    <div className="contents" onPointerDown={onPointerDown} data-lifting={isLifting || undefined}>
      {children}
    </div>
  );
}
