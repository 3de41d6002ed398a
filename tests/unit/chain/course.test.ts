import { describe, expect, it } from 'vitest';
import { UNSETTLED_LINK, type BoardFacts } from '#shared/chain/board.ts';
import { courseOf } from '#shared/chain/course.ts';
import { judgeBoard } from '#shared/chain/judgeBoard.ts';
import { boardOf, idOf, makeBatch, makeChain } from '../../support/boards.ts';

const CHAIN = idOf('chain', 1);
const [FIRST, SECOND, THIRD, BRANCH] = [1, 2, 3, 4].map((n) => idOf('batch', n));

/** A blonde that was read, a pale and a stout that are planned, on a pack of 14.00. */
function season(): BoardFacts {
  const on = (place: number, brewOn: string) => ({ chainId: CHAIN, place, brewOn });
  return boardOf({
    chains: [makeChain(1, { start: { kind: 'pack', price: 1400 } })],
    batches: [
      makeBatch(1, {
        ...on(0, '2027-03-06'),
        og: 1.044,
        fg: 1.011,
        srm: 4,
        ibu: 20,
        stage: 'racked',
        read: { volumeL: 23, og: 1.045, fg: 1.01, rackedOn: '2027-03-20' },
        cake: { state: 'bare', check: null, measured: null },
      }),
      makeBatch(2, { ...on(1, '2027-03-20'), og: 1.052, fg: 1.013, srm: 7, ibu: 38 }),
      makeBatch(3, { ...on(2, '2027-04-03'), og: 1.06, fg: 1.015, srm: 30, ibu: 35 }),
    ],
  });
}

/** The same, and a bitter on a shelf that starts from the first cake on the same day. */
function branched(): BoardFacts {
  const board = season();
  return {
    ...board,
    chains: [...board.chains, makeChain(2, { start: { kind: 'cake', batchId: FIRST ?? '' } })],
    batches: [
      ...board.batches,
      makeBatch(4, {
        chainId: idOf('chain', 2),
        brewOn: '2027-03-20',
        link: { ...UNSETTLED_LINK, keepL: 0.3 },
      }),
    ],
  };
}

describe('the course of a chain', () => {
  it('is told batch by batch in its order, as read where it was read', () => {
    const { points } = courseOf(season(), CHAIN);
    expect(points.map(({ batchId }) => batchId)).toEqual([FIRST, SECOND, THIRD]);
    expect(points[0]).toMatchObject({ og: 1.045, fg: 1.01, isOgRead: true, isBrewed: true });
    expect(points[1]).toMatchObject({ og: 1.052, fg: 1.013, isOgRead: false, isBrewed: false });
    expect(points.map(({ generation }) => generation)).toEqual([1, 2, 3]);
  });

  it('has the first beer’s own colour, and the later ones’ with the retained beer in it', () => {
    const { points, steps } = courseOf(season(), CHAIN);
    expect([points[0]?.srm, points[0]?.ibu]).toEqual([4, 20]);
    // Between the beer on the cake and the wort: it is a mixture by volume.
    expect(points[1]?.srm).toBeGreaterThan(4);
    expect(points[1]?.srm).toBeLessThan(7);
    expect(points[1]?.ibu).toBeLessThan(38);
    expect(steps.map(({ laterId, isWithin }) => [laterId, isWithin])).toEqual([
      [SECOND, true],
      [THIRD, true],
    ]);
  });

  it('counts what lives against the need, with its interval; a fresh pack has no cake', () => {
    const { points } = courseOf(season(), CHAIN);
    expect(points[0]?.alive).toBeNull();
    const alive = points[1]?.alive;
    const link = judgeBoard(season()).links.get(SECOND ?? '');
    expect(alive?.cells).toEqual(link?.cake.viableCells);
    const { low = 0, likely = 0, high = 0 } = alive?.ratio ?? {};
    expect(likely * (alive?.need ?? 0)).toBeCloseTo(alive?.cells.likely ?? -1, 0);
    expect(low).toBeLessThan(likely);
    expect(likely).toBeLessThan(high);
  });

  it('divides the pack over more and more batches', () => {
    expect(courseOf(season(), CHAIN).points.map(({ cost }) => cost)).toEqual([1400, 700, 467]);
  });

  it('counts the batches of a branch by their days, and ends at what the chain costs', () => {
    const board = branched();
    const main = courseOf(board, CHAIN).points.map(({ cost }) => cost);
    const side = courseOf(board, idOf('chain', 2)).points.map(({ cost }) => cost);
    expect([main, side]).toEqual([[1400, 700, 350], [467]]);
    expect(judgeBoard(board).chains.get(CHAIN)?.costPerBatch).toBe(350);
  });

  it('leaves out the cells that go under another wort', () => {
    const whole = courseOf(season(), CHAIN).points[1]?.alive?.cells.likely ?? 0;
    const { points } = courseOf(branched(), CHAIN);
    const cakeL = points[1]?.cakeL ?? 0;
    const cells = points[1]?.alive?.cells.likely ?? 0;
    expect(cells / whole).toBeCloseTo((cakeL - 0.3) / cakeL, 9);
    expect(points.map(({ batchId }) => batchId)).not.toContain(BRANCH);
  });

  it('says of a branch where its first cake comes from', () => {
    const { points, steps } = courseOf(branched(), idOf('chain', 2));
    expect(points[0]?.generation).toBe(2);
    expect(steps).toMatchObject([{ laterId: BRANCH, earlierId: FIRST, isWithin: false }]);
  });

  it('knows nothing of what was never written down', () => {
    const board = season();
    const [first, ...rest] = board.batches;
    const blank = { volumeL: null, og: null, fg: null, srm: null, ibu: null };
    const read = { volumeL: null, og: null, fg: null, rackedOn: null };
    const batches = first ? [{ ...first, ...blank, read }, ...rest] : rest;
    const { points } = courseOf({ ...board, batches }, CHAIN);
    expect(points[0]).toMatchObject({ og: null, srm: null, ibu: null });
    expect(points[1]).toMatchObject({ srm: null, ibu: null, alive: null, cakeL: null });
    expect(courseOf(board, idOf('chain', 9))).toEqual({ points: [], steps: [] });
  });
});
