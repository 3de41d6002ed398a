import './lift.css';
import { useRef, type ReactNode } from 'react';
import { useBoard } from '../../../api/board.ts';
import { Announcer, useAnnouncements } from './Announcer.tsx';
import { Hand, type Grab } from './Hand.tsx';
import { LiftContext } from './liftContext.ts';
import { LiftSurface } from './LiftSurface.tsx';
import { PlacesDialog } from './PlacesDialog.tsx';
import { useLiftKeys } from './useLiftKeys.ts';
import { useMachine } from './useMachine.ts';
import { YeastDialog } from './YeastDialog.tsx';

interface LiftProviderProps {
  children: ReactNode;
  /** The keys for undo are the page's own board's. */
  takesUndo?: boolean;
}

/**
 * Lifting, around the whole board. Every gesture (pointer, keys, list) becomes the same command of
 * one machine.
 */
export function LiftProvider({ children, takesUndo = true }: LiftProviderProps) {
  const board = useBoard();
  const words = useAnnouncements();
  const machine = useMachine(board, words);
  const grab = useRef<Grab | null>(null);
  useLiftKeys(machine, takesUndo);
  return (
    <LiftContext value={machine}>
      <LiftSurface grab={grab}>{children}</LiftSurface>
      <Hand grab={grab} />
      <PlacesDialog />
      <YeastDialog />
      <Announcer from={words} />
    </LiftContext>
  );
}
