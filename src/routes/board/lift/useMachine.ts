import { useQueryClient, type QueryClient } from '@tanstack/react-query';
import { useEffect, useMemo } from 'react';
import type { Board } from '#shared/api/board.ts';
import { foresee, readBoard, useBoardSlug } from '../../../api/board.ts';
import { isOnline } from '../../../api/connection.ts';
import { moverOf } from '../../../api/moves.ts';
import { boardStillness } from '../../../api/stillness.ts';
import { newId } from '../../../app/newId.ts';
import type { Announcements } from './Announcer.tsx';
import { createLifting } from './lifting.ts';
import { focusBatch, gapsInSight, onScroll } from './inSight.ts';
import type { LiftMachine } from './liftContext.ts';
import { createLiftStore } from './liftStore.ts';
import type { LiftPorts } from './ports.ts';
import { createPutting } from './putting.ts';
import { useRehearsal } from './useRehearsal.ts';

function portsOf(client: QueryClient, slug: string, words: Announcements): LiftPorts {
  return {
    board: () => readBoard(client, slug),
    foresee: (wish) => foresee(client, slug, wish),
    ...moverOf(client, slug),
    isOnline,
    holdStill: boardStillness.hold,
    say: words.say,
    sayAtRest: words.sayAtRest,
    focusBatch,
    newId,
    gapsInSight,
    onScroll,
    nextFrame: (run) => requestAnimationFrame(run),
  };
}

function createMachine(ports: LiftPorts): LiftMachine {
  const store = createLiftStore();
  return { store, lifting: createLifting(store, ports), putting: createPutting(store, ports) };
}

/** The machine behind the board's gestures, made once; it reads the board as it is shown. */
export function useMachine(board: Board, words: Announcements): LiftMachine {
  const client = useQueryClient();
  const slug = useBoardSlug();
  const machine = useMemo(() => createMachine(portsOf(client, slug, words)), [client, slug, words]);
  useEffect(() => machine.lifting.boardChanged(board), [board, machine]);
  useEffect(() => machine.lifting.release, [machine]);
  useRehearsal(board, machine.store);
  return machine;
}
