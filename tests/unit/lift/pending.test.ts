import { describe, expect, it } from 'vitest';
import type { MoveRequest } from '#shared/api/move.ts';
import { indexBoard } from '#shared/chain/board.ts';
import { newShelfFor } from '#shared/chain/newShelf.ts';
import { keepEqualRows } from '../../../src/api/keepEqualRows.ts';
import { withMoved, withPending } from '../../../src/api/pendingMoves.ts';
import { ALE, beer, LAGER, twoShelves } from './board.ts';
import { idOf, makeBatch } from '../../support/boards.ts';

const wish = (number: number, own: Partial<MoveRequest>): MoveRequest => ({
  id: beer(100 + number),
  batchId: beer(number),
  toChainId: ALE,
  afterBatchId: null,
  expectedChainId: null,
  dates: 'pull',
  ...own,
});
const rowOf = (board: ReturnType<typeof twoShelves>, chainId: string) =>
  indexBoard(board)
    .batchesOf(chainId)
    .map((batch) => batch.id);

describe('wishes laid over the board', () => {
  it('show each move in order, the later on the place that the earlier made', () => {
    const board = withPending(twoShelves(), [
      wish(6, { afterBatchId: beer(3) }),
      wish(7, { afterBatchId: beer(6) }),
    ]);
    expect(rowOf(board, ALE)).toEqual([1, 2, 3, 6, 7].map(beer));
  });

  it('without a failed one leave the others, and the change of somebody else, in place', () => {
    const theirs = withPending(twoShelves(), [
      wish(5, { expectedChainId: LAGER, toChainId: ALE, afterBatchId: beer(3) }),
    ]);
    const board = withPending(theirs, [wish(7, { afterBatchId: beer(5) })]);
    expect(rowOf(board, ALE)).toEqual([1, 2, 3, 5, 7].map(beer));
    expect(rowOf(board, LAGER)).toEqual([beer(4)]);
  });

  it('leave out a wish that no longer fits', () => {
    const before = twoShelves();
    const board = withPending(before, [
      wish(6, { expectedChainId: LAGER, afterBatchId: beer(3) }),
      wish(6, { afterBatchId: beer(99) }),
      wish(1, { expectedChainId: ALE, toChainId: LAGER }),
    ]);
    expect(board).toBe(before);
  });

  it('make a new shelf once, even where the answer has arrived before the wish leaves', () => {
    const before = twoShelves();
    const newChain = newShelfFor(before, beer(6), idOf('chain', 9));
    const request = wish(6, { toChainId: 'new', ...(newChain && { newChain }) });
    const once = withPending(before, [request]);
    expect(once.chains).toHaveLength(3);
    expect(rowOf(once, idOf('chain', 9))).toEqual([beer(6)]);
    expect(withPending(once, [request])).toBe(once);
  });

  it('keep every row that they do not change as it is', () => {
    const before = twoShelves();
    const board = withPending(before, [wish(6, { afterBatchId: beer(3) })]);
    const kept = (number: number) => board.batches.find((row) => row.id === beer(number));
    expect([1, 2, 4, 5].map(kept)).toEqual([1, 2, 4, 5].map((n) => before.batches[n - 1]));
    expect(kept(4)).toBe(before.batches[3]);
  });
});

describe('the server’s answer', () => {
  const said = {
    changeId: beer(50),
    what: 'Moved',
    shifted: [],
    cleared: [],
    undo: null,
    redo: null,
  };

  it('replaces its rows, removes its chains and raises the revision', () => {
    const before = twoShelves();
    const row = makeBatch(6, { version: 2, chainId: LAGER, place: 2 });
    const board = withMoved(before, {
      ...said,
      revision: 2,
      batches: [row],
      chains: [],
      removedChainIds: [ALE],
    });
    expect(board.season.revision).toBe(2);
    expect(rowOf(board, LAGER)).toEqual([4, 5, 6].map(beer));
    expect(board.chains.map((chain) => chain.id)).toEqual([LAGER]);
  });

  it('is the very board that is kept, so that what is judged of it beforehand still counts', () => {
    const before = twoShelves();
    const same = before.batches.find(({ id }) => id === beer(5)) ?? expect.unreachable();
    const board = withMoved(before, {
      ...said,
      revision: 2,
      batches: [makeBatch(6, { version: 2, chainId: LAGER, place: 2 }), structuredClone(same)],
      chains: structuredClone(before.chains),
      removedChainIds: [],
    });
    expect(board.batches).toContain(same);
    expect(keepEqualRows(before, board)).toBe(board);
  });

  it('is left alone where the board is newer', () => {
    const before = twoShelves();
    const answer = { ...said, revision: 1, batches: [], chains: [], removedChainIds: [ALE] };
    expect(withMoved(before, answer)).toBe(before);
  });
});
