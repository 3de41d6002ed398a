import { describe, expect, it } from 'vitest';
import { judgeGaps, rankGaps } from '#shared/chain/gaps.ts';
import { neighbours } from '../../../src/routes/board/lift/neighbours.ts';
import { step, walkOf } from '../../../src/routes/board/lift/places.ts';
import { ALE, beer, LAGER, twoShelves } from './board.ts';

const walkFor = (batchId: string) => {
  const board = twoShelves();
  return walkOf(board, rankGaps(judgeGaps(board, batchId)), batchId);
};

describe('the walk along the shelves', () => {
  it('leaves out locked places and the one where the batch is', () => {
    expect(walkFor(beer(2)).alongShelves).toEqual([
      `${ALE}:${beer(3)}`,
      `${LAGER}:first`,
      `${LAGER}:${beer(4)}`,
      `${LAGER}:${beer(5)}`,
      'new',
      'bench',
    ]);
  });

  it('starts beside the batch and crosses from shelf to shelf', () => {
    const walk = walkFor(beer(3));
    const first = step(walk, null, 'next');
    expect(first).toBe(`${LAGER}:first`);
    expect(step(walk, first, 'previous')).toBe(`${ALE}:${beer(1)}`);
    expect(step(walk, null, 'previous')).toBe(`${ALE}:${beer(1)}`);
  });

  it('goes round at the ends', () => {
    const walk = walkFor(beer(2));
    expect(step(walk, 'bench', 'next')).toBe(`${ALE}:${beer(3)}`);
    expect(step(walk, `${ALE}:${beer(3)}`, 'previous')).toBe('bench');
  });

  it('begins at the first shelf for a batch of the bench', () => {
    const walk = walkFor(beer(6));
    expect(step(walk, null, 'next')).toBe(`${ALE}:${beer(1)}`);
    expect(step(walk, null, 'previous')).toBe('new');
    expect(walk.alongShelves).not.toContain('bench');
  });
});

describe('the walk along the ranked list', () => {
  it('begins with the best place and stops at both ends', () => {
    const walk = walkFor(beer(6));
    const [best, second] = walk.ranked;
    expect(step(walk, null, 'worse')).toBe(best);
    expect(step(walk, best ?? '', 'worse')).toBe(second);
    expect(step(walk, best ?? '', 'better')).toBe(best);
    expect(step(walk, walk.ranked.at(-1) ?? '', 'worse')).toBe(walk.ranked.at(-1));
    expect(step(walk, second ?? '', 'best')).toBe(best);
  });

  it('stays nowhere where there is no place', () => {
    const nowhere = { alongShelves: [], ranked: [], start: 0 };
    expect(step(nowhere, null, 'next')).toBeNull();
    expect(step(nowhere, null, 'best')).toBeNull();
  });
});

describe('a step on one shelf', () => {
  it('names the place before and behind', () => {
    const { earlier, later } = neighbours(twoShelves(), beer(5));
    expect(earlier.key).toBe(`${LAGER}:first`);
    expect(later.why).toBe('It is the last on its shelf');
  });

  it.each([
    [2, 'earlier', 'Beer 1 before it is racked'],
    [4, 'earlier', 'It is the first on its shelf'],
    [1, 'later', 'It is racked, so it stays where it was poured'],
    [6, 'later', 'It stands on no shelf'],
  ] as const)('of Beer %i %s: %s', (number, way, why) => {
    expect(neighbours(twoShelves(), beer(number))[way]).toEqual({ key: null, why });
  });
});
