import { useQueryClient, type QueryClient } from '@tanstack/react-query';
import { useEffect, useMemo } from 'react';
import type { Board } from '#shared/api/board.ts';
import { readBoard, useBoardSlug } from '../../../api/board.ts';
import { isOnline } from '../../../api/connection.ts';
import { moverOf } from '../../../api/moves.ts';
import { boardStillness } from '../../../api/stillness.ts';
import { createLifting } from './lifting.ts';
import type { LiftMachine } from './liftContext.ts';
import { createLiftStore } from './liftState.ts';
import type { LiftPorts } from './ports.ts';
import { createPutting } from './putting.ts';

export const handleOf = (batchId: string) =>
  document.querySelector<HTMLElement>(`[data-lift-handle="${CSS.escape(batchId)}"]`);

/** Waits for the drawing, and for a closing dialog that would give the focus elsewhere. */
function focusBatch(batchId: string) {
  const focus = () => handleOf(batchId)?.focus();
  requestAnimationFrame(() => requestAnimationFrame(focus));
}

/** Height of a box above or below a line; 0 where the line crosses it. */
const away = ({ top, bottom }: DOMRect, y: number) => Math.max(top - y, y - bottom, 0);

/**
 * Every gap on the page, those of the nearest shelf first. Only shelves are measured: what is out
 * of sight inside them is not laid out, and asking for its place would make it so.
 */
function gapsAround(batchId: string): string[] {
  const y = handleOf(batchId)?.getBoundingClientRect().top ?? 0;
  const distances = new Map<Element, number>();
  const distance = (node: Element) => {
    const shelf = node.closest('[data-chain]') ?? node;
    const known = distances.get(shelf) ?? away(shelf.getBoundingClientRect(), y);
    distances.set(shelf, known);
    return known;
  };
  return [...document.querySelectorAll<HTMLElement>('[data-gap]')]
    .map((node) => ({ key: node.dataset.gap ?? '', distance: distance(node) }))
    .toSorted((a, b) => a.distance - b.distance)
    .map(({ key }) => key);
}

function portsOf(client: QueryClient, slug: string, say: (words: string) => void): LiftPorts {
  return {
    board: () => readBoard(client, slug),
    ...moverOf(client, slug),
    isOnline,
    holdStill: boardStillness.hold,
    say,
    focusBatch,
    newId: () => crypto.randomUUID(),
    gapsAround,
    nextFrame: (run) => requestAnimationFrame(run),
  };
}

function createMachine(ports: LiftPorts): LiftMachine {
  const store = createLiftStore();
  return { store, lifting: createLifting(store, ports), putting: createPutting(store, ports) };
}

/** The machine behind the board's gestures, made once; it reads the board as it is shown. */
export function useMachine(board: Board, say: (words: string) => void): LiftMachine {
  const client = useQueryClient();
  const slug = useBoardSlug();
  const machine = useMemo(() => createMachine(portsOf(client, slug, say)), [client, slug, say]);
  useEffect(() => machine.lifting.boardChanged(board), [board, machine]);
  useEffect(() => machine.lifting.release, [machine]);
  return machine;
}
