import { useQueryClient, type QueryClient } from '@tanstack/react-query';
import { useMemo } from 'react';
import type { Board } from '#shared/api/board.ts';
import { moved, type Moved, type MoveRequest } from '#shared/api/move.ts';
import { api } from '#shared/api/urls.ts';
import { boardQuery, judgeAhead, useBoardSlug } from './board.ts';
import { request } from './client.ts';
import { createMoveQueue, type Job, type MoveQueue } from './moveQueue.ts';
import { NothingToUndo } from './nothingToUndo.ts';
import { withMoved } from './pendingMoves.ts';
import { pendingOf } from './pendingStore.ts';
import { boardStillness } from './stillness.ts';

function urlAndBody(slug: string, job: Job, board: Board | undefined): [string, unknown] {
  switch (job.kind) {
    case 'move':
      return [api.moves(slug), job.request];
    case 'undo':
    case 'redo': {
      const change = board?.[job.kind];
      if (!change) throw new NothingToUndo();
      return [api[job.kind](slug), { changeId: change.id }];
    }
  }
}

const takenIn = new WeakMap<Moved, { board: Board; result: Board }>();

/** The board with the server's answer, the same object each time: it is judged in a task, and drawn in another. */
function taken(board: Board, answer: Moved): Board {
  const known = takenIn.get(answer);
  if (known?.board === board) return known.result;
  const result = withMoved(board, answer);
  takenIn.set(answer, { board, result });
  return result;
}

const nextTask = () => new Promise<void>((resolve) => setTimeout(resolve));

function createQueue(client: QueryClient, slug: string): MoveQueue {
  const { queryKey } = boardQuery(slug);
  return createMoveQueue({
    async send(job) {
      const [url, body] = urlAndBody(slug, job, client.getQueryData(queryKey));
      const answer = await request(moved, 'POST', url, { body });
      const board = client.getQueryData(queryKey);
      if (board) judgeAhead(client, taken(board, answer));
      await nextTask();
      return answer;
    },
    quiet: boardStillness.quiet,
    take(answer) {
      client.setQueryData<Board>(queryKey, (board) => board && taken(board, answer));
    },
    show: pendingOf(slug).set,
    idle() {
      void client.invalidateQueries({ queryKey });
    },
  });
}

const queues = new WeakMap<QueryClient, Map<string, MoveQueue>>();

function queueOf(client: QueryClient, slug: string): MoveQueue {
  const ofClient = queues.get(client) ?? new Map<string, MoveQueue>();
  const queue = ofClient.get(slug) ?? createQueue(client, slug);
  queues.set(client, ofClient.set(slug, queue));
  return queue;
}

export interface Mover {
  /** Moves a batch: on the page before this returns, on the server when the promise resolves. */
  move(wish: MoveRequest): Promise<Moved>;
  /** Undoes one's newest change and moves again, as one gesture: without the first no second. */
  moveAgain(wish: MoveRequest): Promise<Moved>;
  /**
   * Undoes one's newest change. Not shown before the server agrees: it refuses where somebody
   * changed the same thing since.
   */
  undo(): Promise<Moved>;
  redo(): Promise<Moved>;
}

export function moverOf(client: QueryClient, slug: string): Mover {
  const queue = queueOf(client, slug);
  return {
    move: (request) => queue.add({ kind: 'move', request }),
    moveAgain(request) {
      queue.add({ kind: 'undo' }).catch(() => undefined);
      return queue.add({ kind: 'move', request, hangsOnPrevious: true });
    },
    undo: () => queue.add({ kind: 'undo' }),
    redo: () => queue.add({ kind: 'redo' }),
  };
}

export function useMove(): Mover['move'] {
  const client = useQueryClient();
  const slug = useBoardSlug();
  return useMemo(() => moverOf(client, slug).move, [client, slug]);
}
