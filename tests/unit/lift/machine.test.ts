import { describe, expect, it } from 'vitest';
import type { Board } from '#shared/api/board.ts';
import type { Moved, MoveRequest } from '#shared/api/move.ts';
import { OfflineError, ProblemError } from '../../../src/api/errors.ts';
import { withPending } from '../../../src/api/pendingMoves.ts';
import { drop } from '../../../src/routes/board/lift/liftContext.ts';
import { createLifting } from '../../../src/routes/board/lift/lifting.ts';
import { createLiftStore } from '../../../src/routes/board/lift/liftStore.ts';
import { createPutting } from '../../../src/routes/board/lift/putting.ts';
import type { LiftPorts } from '../../../src/routes/board/lift/ports.ts';
import { ALE, beer, LAGER, twoShelves } from './board.ts';

const answerTo = (request: MoveRequest): Moved => ({
  changeId: request.id,
  what: 'Moved',
  revision: 2,
  batches: [],
  chains: [],
  removedChainIds: [],
  shifted: [],
  cleared: [],
  undo: null,
  redo: null,
});

/** The machine over a board that shows moves at once and answers as it is told. */
function scene(answer: (request: MoveRequest) => Promise<Moved> = async (r) => answerTo(r)) {
  let board: Board = twoShelves();
  let ids = 900;
  const said: string[] = [];
  const focused: string[] = [];
  const sent: MoveRequest[] = [];
  const foreseen: MoveRequest[] = [];
  let held = 0;
  let arrive = (_board: Board) => {};
  const move = (request: MoveRequest) => {
    sent.push(request);
    board = withPending(board, [request]);
    return answer(request);
  };
  const ports: LiftPorts = {
    board: () => board,
    foresee: (request) => void foreseen.push(request),
    move,
    moveAgain: move,
    undo: () => Promise.reject(new OfflineError()),
    redo: () => Promise.reject(new OfflineError()),
    isOnline: () => true,
    holdStill: (look) => {
      held += 1;
      arrive = look;
      return () => (held -= 1);
    },
    say: (words) => said.push(words),
    sayAtRest: (words) => said.push(words),
    focusBatch: (batchId) => focused.push(batchId),
    newId: () => beer((ids += 1)),
    gapsInSight: () => [],
    onScroll: () => () => undefined,
    nextFrame: (run) => run(0),
  };
  const store = createLiftStore();
  const machine = {
    store,
    lifting: createLifting(store, ports),
    putting: createPutting(store, ports),
  };
  return {
    ...machine,
    machine,
    said,
    focused,
    sent,
    foreseen,
    ports,
    held: () => held,
    arrive: (next: Board) => arrive(next),
    change: (next: Board) => (board = next),
    board: () => board,
  };
}

const settled = () => new Promise((resolve) => setTimeout(resolve, 0));

describe('lifting', () => {
  it('says which batch, where it stands, and the best gap with its verdict and day', () => {
    const { lifting, said } = scene();
    lifting.lift(beer(3), 'keys');
    expect(said[0]).toMatch(
      /^Lifted Beer 3, on Harbour ale, place 3 of 3\. (Best gap: .+, place \d of \d.*\. (Pour|Mind \d|Hold \d)|It is in its best place)/,
    );
  });

  it('says shelf, position and verdict of each place that is walked', () => {
    const { lifting, said } = scene();
    lifting.lift(beer(6), 'keys');
    lifting.walk('next');
    expect(said.at(-1)).toMatch(
      /^(Best gap\. )?Harbour ale, place 2 of 4, after Beer 1\. (Pour|Mind \d|Hold \d)/,
    );
  });

  it('refuses what is poured, with the reason', () => {
    const { lifting, store, said } = scene();
    lifting.lift(beer(1), 'keys');
    expect(store.get().lifted).toBeNull();
    expect(said).toEqual(['It is racked, so it stays where it was poured']);
  });

  it('is put back with a word, and the focus with it', () => {
    const { lifting, store, said, focused } = scene();
    lifting.lift(beer(6), 'keys');
    lifting.cancel();
    expect(store.get().lifted).toBeNull();
    expect(said.at(-1)).toBe('Beer 6 put back on the bench.');
    expect(focused).toEqual([beer(6)]);
  });

  it('keeps the board still for a pointer, and only while it carries', () => {
    const { lifting, held } = scene();
    lifting.lift(beer(6), 'keys');
    expect(held()).toBe(0);
    lifting.release();
    lifting.lift(beer(6), 'pointer');
    expect(held()).toBe(1);
    lifting.cancel();
    expect(held()).toBe(0);
  });
});

describe('a board that changes under a lifted batch', () => {
  it('ends the lift where the batch is gone', () => {
    const { lifting, store, said, board } = scene();
    lifting.lift(beer(6), 'keys');
    const rest = board().batches.filter((row) => row.id !== beer(6));
    lifting.boardChanged({ ...board(), batches: rest });
    expect(store.get().lifted).toBeNull();
    expect(said.at(-1)).toMatch(/^Beer 6 is no longer on this board\./);
  });

  it('ends a pointer’s drag, and its stillness, where what waits is without the batch', () => {
    const { lifting, store, said, board, held, arrive } = scene();
    lifting.lift(beer(6), 'pointer');
    arrive({ ...board(), today: '2027-03-02' });
    expect([store.get().lifted?.batchId, held()]).toEqual([beer(6), 1]);
    arrive({ ...board(), batches: board().batches.filter((row) => row.id !== beer(6)) });
    expect([store.get().lifted, held()]).toEqual([null, 0]);
    expect(said.at(-1)).toMatch(/^Beer 6 is no longer on this board\./);
  });

  it('ends it where somebody moved the batch, and says where to', () => {
    const { lifting, store, said, board } = scene();
    lifting.lift(beer(6), 'keys');
    const moved = board().batches.map((row) =>
      row.id === beer(6) ? { ...row, chainId: LAGER, place: 2 } : row,
    );
    lifting.boardChanged({ ...board(), batches: moved });
    expect(store.get().lifted).toBeNull();
    expect(said.at(-1)).toContain(
      'it is on Lantern lager, place 3 of 3. Nothing of yours was lost.',
    );
  });

  it('judges anew and keeps the place that was walked to, where it still stands', () => {
    const { lifting, store, board } = scene();
    lifting.lift(beer(6), 'keys');
    lifting.goOver(`${LAGER}:${beer(5)}`);
    lifting.boardChanged({ ...board(), today: '2027-03-02' });
    expect(store.get().over).toBe(`${LAGER}:${beer(5)}`);
    const rest = board().batches.filter((row) => row.id !== beer(5));
    lifting.boardChanged({ ...board(), batches: rest });
    expect(store.get().over).toBeNull();
    expect(store.get().lifted?.batchId).toBe(beer(6));
  });
});

describe('putting down', () => {
  const dropAt = (s: ReturnType<typeof scene>, number: number, key: string) => {
    s.lifting.lift(beer(number), 'keys');
    drop(s.machine, key);
  };

  it('sends the wish with its neighbours and says what came of it', async () => {
    const s = scene();
    dropAt(s, 6, `${ALE}:${beer(3)}`);
    expect(s.sent).toMatchObject([
      {
        batchId: beer(6),
        toChainId: ALE,
        afterBatchId: beer(3),
        expectedChainId: null,
        dates: 'pull',
      },
    ]);
    expect(s.said.at(-1)).toMatch(
      /^Beer 6 put down on Harbour ale, place 4 of 4\. (Pour|Mind|Hold)/,
    );
    expect(s.focused).toEqual([beer(6)]);
    await settled();
    expect(s.store.get().change).toMatchObject({ status: 'saved', changeId: s.sent[0]?.id });
  });

  it('puts back what is dropped beside every gap', () => {
    const s = scene();
    dropAt(s, 6, 'nowhere');
    expect(s.sent).toEqual([]);
    expect(s.said.at(-1)).toBe('Beer 6 put back on the bench.');
  });

  it('refuses a drop where somebody moved the batch while it was carried, and says where to', () => {
    const s = scene();
    s.lifting.lift(beer(6), 'pointer');
    const moved = s
      .board()
      .batches.map((row) => (row.id === beer(6) ? { ...row, chainId: LAGER, place: 2 } : row));
    s.change({ ...s.board(), batches: moved });
    drop(s.machine, `${ALE}:${beer(3)}`);
    expect(s.sent).toEqual([]);
    expect(s.store.get().refusal).toBe(
      'Beer 6 is now on the shelf Lantern lager. Nothing of yours was lost.',
    );
  });

  it('uses the yeast that the batch asks for on a new shelf', () => {
    const s = scene();
    dropAt(s, 6, 'new');
    expect(s.sent[0]).toMatchObject({ toChainId: 'new', newChain: { name: 'Creek ale 1' } });
  });

  it('asks for the yeast where the batch names none, and can be given up', () => {
    const s = scene();
    dropAt(s, 7, 'new');
    expect(s.sent).toEqual([]);
    expect(s.store.get().yeastFor?.batchId).toBe(beer(7));
    s.putting.giveUp();
    expect(s.said.at(-1)).toBe('Beer 7 put back on the bench.');
    dropAt(s, 7, 'new');
    const gap = s.store.get().yeastFor?.gap;
    if (gap) s.putting.put(beer(7), gap, { yeastId: s.board().yeasts[1]?.id ?? '' });
    expect(s.sent[0]).toMatchObject({ newChain: { yeastId: s.board().yeasts[1]?.id } });
  });

  it('repeats the drop with the dates kept', async () => {
    const s = scene();
    dropAt(s, 6, `${ALE}:${beer(3)}`);
    await settled();
    s.putting.keepDates();
    expect(s.sent[1]).toMatchObject({ batchId: beer(6), afterBatchId: beer(3), dates: 'keep' });
    expect(s.sent[1]?.id).not.toBe(s.sent[0]?.id);
  });

  it('tells a conflict in the server’s words, and that nothing was lost', async () => {
    const s = scene(async () => {
      throw new ProblemError({
        type: '/problems/moved-elsewhere',
        title: 'The batch is somewhere else by now',
        status: 409,
        detail: 'Tamsin moved Beer 6 to Lantern lager.',
      });
    });
    dropAt(s, 6, `${ALE}:${beer(3)}`);
    await settled();
    const words = 'Tamsin moved Beer 6 to Lantern lager. Nothing of yours was lost.';
    expect(s.store.get()).toMatchObject({ refusal: words, change: null });
    expect(s.said.at(-1)).toBe(words);
  });

  it('tells that the connection went in the middle', async () => {
    const s = scene(() => Promise.reject(new OfflineError()));
    dropAt(s, 6, `${ALE}:${beer(3)}`);
    await settled();
    expect(s.store.get().refusal).toBe('No connection to the server. Beer 6 is back where it was.');
  });
});
