import type { PointerEvent, ReactNode, RefObject } from 'react';
import { useBoard } from '../../../api/board.ts';
import { useOnline } from '../../../app/useOnline.ts';
import type { Grab } from './Hand.tsx';
import { useLiftMachine } from './liftContext.ts';
import { whyFixed } from './lifting.ts';
import { pressed } from './pointer.ts';

interface LiftSurfaceProps {
  grab: RefObject<Grab | null>;
  children: ReactNode;
}

/** Everything that can be lifted from or put into. */
export function LiftSurface({ grab, children }: LiftSurfaceProps) {
  const board = useBoard();
  const online = useOnline();
  const { store, lifting } = useLiftMachine();

  const onPointerDown = (event: PointerEvent) => {
    if (!event.isPrimary || event.button !== 0) return;
    const batchId = pressed(event.target, event.pointerType);
    if (!batchId || !online || store.get().lifted || whyFixed(board, batchId)) return;
    lifting.press(batchId);
    grab.current?.(event.nativeEvent);
  };

  return (
    <div className="contents" onPointerDown={onPointerDown}>
      {children}
    </div>
  );
}
