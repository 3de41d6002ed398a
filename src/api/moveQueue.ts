import type { Moved, MoveRequest } from '#shared/api/move.ts';

export type Job =
  | { kind: 'move'; request: MoveRequest; hangsOnPrevious?: boolean }
  /** Which change is asked for when its turn comes: the newest one then. */
  | { kind: 'undo' }
  | { kind: 'redo' };

export interface QueuePorts {
  send(job: Job): Promise<Moved>;
  /** Resolves when the board may change under the brewer's hand. */
  quiet(): Promise<void>;
  /** Takes the answer into the board. Runs in the same breath as the wish leaves the queue. */
  take(moved: Moved): void;
  /** Shows the wishes that the server has not answered yet, oldest first. */
  show(pending: readonly MoveRequest[]): void;
  /** Nothing is on its way any more. */
  idle(): void;
}

/** An undo that waits behind a change that failed would undo something else: it is let go. */
export class BehindFailure extends Error {
  override readonly name = 'BehindFailure';
  constructor(cause: unknown) {
    super('The change before it failed', { cause });
  }
}

const hangsOnPrevious = (job: Job) => (job.kind === 'move' ? job.hangsOnPrevious === true : true);

export interface MoveQueue {
  add(job: Job): Promise<Moved>;
}

interface Waiting {
  job: Job;
  resolve(moved: Moved): void;
  reject(error: unknown): void;
}

/**
 * Moves of one board, sent one after the other in the order in which they were made. Each is shown
 * at once; one that fails leaves alone.
 */
export function createMoveQueue(ports: QueuePorts): MoveQueue {
  let waiting: Waiting[] = [];
  let isWorking = false;

  const remember = (left: Waiting[]) => {
    waiting = left;
    ports.show(left.flatMap(({ job }) => (job.kind === 'move' ? [job.request] : [])));
  };

  const fail = (one: Waiting, error: unknown) => {
    const behind = waiting.filter((other) => other !== one && hangsOnPrevious(other.job));
    remember(waiting.filter((other) => other !== one && !behind.includes(other)));
    one.reject(error);
    for (const other of behind) other.reject(new BehindFailure(error));
  };

  const serve = async (one: Waiting) => {
    try {
      const moved = await ports.send(one.job);
      await ports.quiet();
      ports.take(moved);
      remember(waiting.filter((other) => other !== one));
      one.resolve(moved);
    } catch (error) {
      await ports.quiet();
      fail(one, error);
    }
  };

  const work = async () => {
    if (isWorking) return;
    isWorking = true;
    for (let one = waiting[0]; one; one = waiting[0]) await serve(one);
    isWorking = false;
    ports.idle();
  };

  return {
    add: (job) =>
      new Promise((resolve, reject) => {
        remember([...waiting, { job, resolve, reject }]);
        void work();
      }),
  };
}
