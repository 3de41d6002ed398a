import { describe, expect, it } from 'vitest';
import type { Moved, MoveRequest } from '#shared/api/move.ts';
import { BehindFailure, createMoveQueue, type Job } from '../../../src/api/moveQueue.ts';
import { createStillness } from '../../../src/api/stillness.ts';
import { beer } from './board.ts';

const wish = (number: number): MoveRequest => ({
  id: beer(100 + number),
  batchId: beer(number),
  toChainId: 'bench',
  afterBatchId: null,
  expectedChainId: null,
  dates: 'pull',
});
const move = (number: number): Job => ({ kind: 'move', request: wish(number) });
const answer: Moved = {
  changeId: beer(1),
  what: '',
  revision: 2,
  batches: [],
  chains: [],
  removedChainIds: [],
  shifted: [],
  cleared: [],
  undo: null,
  redo: null,
};

/** A queue whose sends are answered by hand. */
function handQueue() {
  const sent: { job: Job; resolve: (moved: Moved) => void; reject: (error: Error) => void }[] = [];
  const told: string[] = [];
  const stillness = createStillness();
  let shown: string[] = [];
  const queue = createMoveQueue({
    send: (job) => new Promise((resolve, reject) => sent.push({ job, resolve, reject })),
    quiet: stillness.quiet,
    take: () => told.push(`took, ${shown.length} shown`),
    show: (pending) => {
      shown = pending.map((request) => request.batchId);
    },
    idle: () => told.push('idle'),
  });
  return { queue, sent, told, stillness, shown: () => shown };
}

const settled = () => new Promise((resolve) => setTimeout(resolve, 0));

describe('moves on their way', () => {
  it('are shown at once and sent one after the other', async () => {
    const { queue, sent, shown } = handQueue();
    void queue.add(move(1));
    void queue.add(move(2));
    expect(shown()).toEqual([beer(1), beer(2)]);
    expect(sent).toHaveLength(1);
    sent[0]?.resolve(answer);
    await settled();
    expect(sent).toHaveLength(2);
    expect(shown()).toEqual([beer(2)]);
  });

  it('leave alone when they fail: those behind stay', async () => {
    const { queue, sent, shown } = handQueue();
    const first = queue.add(move(1));
    void queue.add(move(2));
    sent[0]?.reject(new Error('no'));
    await expect(first).rejects.toThrow('no');
    await settled();
    expect(shown()).toEqual([beer(2)]);
    expect(sent).toHaveLength(2);
  });

  it('take an undo that waits behind a failure with them', async () => {
    const { queue, sent } = handQueue();
    const first = queue.add(move(1));
    const undo = queue.add({ kind: 'undo' });
    const third = queue.add({ kind: 'move', request: wish(3), hangsOnPrevious: true });
    sent[0]?.reject(new Error('no'));
    await expect(first).rejects.toThrow('no');
    await expect(undo).rejects.toBeInstanceOf(BehindFailure);
    await expect(third).rejects.toBeInstanceOf(BehindFailure);
    expect(sent).toHaveLength(1);
  });

  it('are taken into the board before they stop being shown, and idle is told last', async () => {
    const { queue, sent, told } = handQueue();
    void queue.add(move(1));
    sent[0]?.resolve(answer);
    await settled();
    expect(told).toEqual(['took, 1 shown', 'idle']);
  });

  it('wait with their answer while a batch is carried', async () => {
    const { queue, sent, told, stillness, shown } = handQueue();
    void queue.add(move(1));
    const letGo = stillness.hold();
    sent[0]?.resolve(answer);
    await settled();
    expect(told).toEqual([]);
    expect(shown()).toEqual([beer(1)]);
    letGo();
    await settled();
    expect(shown()).toEqual([]);
  });
});

describe('stillness', () => {
  it('ends with its last holder, each of whom lets go once', async () => {
    const { hold, quiet } = createStillness();
    const [one, two] = [hold(), hold()];
    let isQuiet = false;
    void quiet().then(() => (isQuiet = true));
    one();
    one();
    await settled();
    expect(isQuiet).toBe(false);
    two();
    await settled();
    expect(isQuiet).toBe(true);
  });
});
