import { describe, expect, it } from 'vitest';
import type { Batch } from '#shared/api/batch.ts';
import { UNSETTLED_LINK, type BoardFacts } from '#shared/chain/board.ts';
import { judgeBoard } from '#shared/chain/judgeBoard.ts';
import { lapses } from '#shared/chain/lapses.ts';
import { allot, overstepOf, sharesOf } from '#shared/chain/shares.ts';
import { boardOf, idOf, makeBatch, makeChain } from '../../support/boards.ts';

const [SOURCE, NEXT, BRANCHED] = [idOf('batch', 1), idOf('batch', 2), idOf('batch', 3)];

interface Said {
  next?: Partial<Batch['link']>;
  branched?: Partial<Batch['link']>;
  /** The whole cake, measured, litres. */
  wholeL?: number;
  branchStage?: Batch['stage'];
}

/** One cake of 1.1 L under two worts on one day. */
function divided({ next, branched, wholeL = 1.1, branchStage = 'pencilled' }: Said): BoardFacts {
  const measured = { volumeL: wholeL, massKg: null, viability: null, cellsPerMl: null };
  const link = (own: Said['next']) => ({ ...UNSETTLED_LINK, ...own });
  return boardOf({
    chains: [
      makeChain(1),
      makeChain(2, { start: { kind: 'cake', batchId: SOURCE }, lineId: idOf('chain', 1) }),
    ],
    batches: [
      makeBatch(1, {
        name: 'Jetty Pale',
        chainId: idOf('chain', 1),
        brewOn: '2027-03-06',
        stage: 'racked',
        cake: { state: 'bare', check: null, measured },
      }),
      makeBatch(2, {
        name: 'Breakwater',
        chainId: idOf('chain', 1),
        place: 1,
        brewOn: '2027-03-20',
        link: link(next),
      }),
      makeBatch(3, {
        name: 'Slack Water',
        chainId: idOf('chain', 2),
        brewOn: '2027-03-20',
        stage: branchStage,
        link: link(branched),
      }),
    ],
  });
}

const partsOf = (board: BoardFacts) =>
  sharesOf(board, SOURCE).takers.map(({ batchId, litres }) => [batchId, litres]);

describe('a cake in two', () => {
  it('goes under the next of its chain and the first of the branch, each with its part', () => {
    const shares = sharesOf(divided({ next: { keepL: 0.4 }, branched: { keepL: 0.5 } }), SOURCE);
    expect(shares.wholeL).toBeCloseTo(1.1, 9);
    expect(shares.takers.map(({ name, litres }) => [name, litres])).toEqual([
      ['Breakwater', 0.4],
      ['Slack Water', 0.5],
    ]);
    expect(shares.leftL).toBeCloseTo(0.2, 9);
  });

  it('serves a named part before a recommended one, and those before all that is left', () => {
    const board = divided({ next: { keepWhole: true }, branched: { keepL: 0.3 } });
    expect(partsOf(board)).toEqual([
      [NEXT, expect.closeTo(0.8, 9)],
      [BRANCHED, 0.3],
    ]);
    expect(sharesOf(board, SOURCE).leftL).toBeCloseTo(0, 9);
  });

  it('recommends at most what the other leaves', () => {
    const board = divided({ next: { keepL: 1.05 } });
    expect(partsOf(board)[1]).toEqual([BRANCHED, expect.closeTo(0.05, 9)]);
    const link = judgeBoard(board).links.get(BRANCHED);
    expect(link?.keep.recommendedL).toBeCloseTo(0.05, 9);
    expect(link?.keep.keptL).toBeCloseTo(0.05, 9);
    expect(sharesOf(board, SOURCE).takers[1]?.isShort).toBe(true);
  });

  it('judges each link with its own part', () => {
    const generous = judgeBoard(divided({ next: { keepL: 0.1 } })).links.get(BRANCHED);
    const mean = judgeBoard(divided({ next: { keepL: 1.05 } })).links.get(BRANCHED);
    expect(generous?.findings.map(({ rule }) => rule)).not.toContain('pitch-amount');
    expect(mean?.findings.map(({ rule }) => rule)).toContain('pitch-amount');
  });

  it('says beside the link what of the cake goes elsewhere, and jars only what nobody takes', () => {
    const links = judgeBoard(divided({ next: { keepL: 0.4 }, branched: { keepL: 0.5 } })).links;
    const advice = (id: string) => links.get(NEXT)?.advice.find((one) => one.id === id)?.text;
    expect(advice('shared-cake')).toContain('500 mL goes under Slack Water');
    expect(advice('jar-the-rest')).toContain('The other 200 mL of cake');
  });

  it('says where a smaller cake no longer holds what was agreed', () => {
    const agreed = { next: { keepL: 0.5 }, branched: { keepL: 0.5 } };
    const textOf = (wholeL: number) =>
      judgeBoard(divided({ ...agreed, wholeL }))
        .links.get(BRANCHED)
        ?.advice.find(({ id }) => id === 'kept-all-there-is')?.text;
    expect(textOf(1.1)).toBeUndefined();
    expect(textOf(0.8)).toContain('500 mL goes under Breakwater');
    expect(partsOf(divided({ ...agreed, wholeL: 0.8 }))[1]).toEqual([
      BRANCHED,
      expect.closeTo(0.3, 9),
    ]);
  });

  it('lets an acceptance lapse when the other takes another part', () => {
    const acceptance = { reason: 'Tried before', rules: [], by: 'Mo', at: '2027-03-01T09:00:00Z' };
    const before = divided({ next: { keepL: 0.4 }, branched: { keepL: 0.2, acceptance } });
    const after = divided({ next: { keepL: 0.5 }, branched: { keepL: 0.2, acceptance } });
    expect(lapses(before, before)).toEqual([]);
    expect(lapses(before, after)).toEqual([BRANCHED]);
  });
});

describe('a part that does not fit', () => {
  it('is told with who has the rest', () => {
    const board = divided({ next: { keepL: 0.4 } });
    expect(overstepOf(board, BRANCHED, 0.7)).toBeNull();
    const overstep = overstepOf(board, BRANCHED, 0.72);
    expect(overstep?.leftL).toBeCloseTo(0.7, 9);
    expect(overstep?.others).toEqual([{ name: 'Breakwater', litres: 0.4 }]);
  });

  it('counts what was poured though nobody named it', () => {
    const poured = divided({ branched: { keepWhole: true }, branchStage: 'fermenting' });
    expect(overstepOf(poured, NEXT, 0.1)?.leftL).toBeCloseTo(0, 9);
  });

  it('does not concern a cake that goes under one wort', () => {
    const { chains, batches, ...rest } = divided({});
    const alone = { ...rest, chains: chains.slice(0, 1), batches: batches.slice(0, 2) };
    expect(overstepOf(alone, NEXT, 9)).toBeNull();
  });
});

it('leaves nobody less than nothing of an empty cake', () => {
  const named = { asked: 0.5, recommendedL: null } as const;
  expect(allot(0, [named, { asked: 'rest', recommendedL: null }])).toEqual([0, 0]);
});
