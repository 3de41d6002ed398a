import { describe, expect, test } from 'vitest';
import type { Batch } from '#shared/api/batch.ts';
import { pourStanding } from '#shared/pour/standing.ts';
import { DEFAULT_UNITS } from '#shared/units/quantity.ts';
import { waysFor } from '../../../src/routes/pour/ways/ways.ts';
import { boardOf, idOf, makeBatch, makeChain, TODAY } from '../../support/boards.ts';

const shelved = (number: number, chain: number, place: number, own: Partial<Batch> = {}) =>
  makeBatch(number, { chainId: idOf('chain', chain), place, ...own });
const racked = (check: 'fit' | 'unfit' | null): Partial<Batch> => ({
  stage: 'racked',
  brewOn: '2027-02-15',
  read: { volumeL: 22, og: 1.046, fg: 1.011, rackedOn: TODAY },
  cake: {
    state: 'bare',
    check: check && { judged: check, tasted: 'clean' },
    measured: null,
  },
});

/** A cake with two batches behind it, and the bare cakes of two other shelves, one of them unfit. */
const board = boardOf({
  chains: [1, 2, 3].map((number) => makeChain(number)),
  batches: [
    shelved(1, 1, 0, racked('unfit')),
    shelved(2, 1, 1, { brewOn: TODAY }),
    shelved(3, 1, 2, { brewOn: '2027-03-15' }),
    shelved(4, 2, 0, racked('fit')),
    shelved(5, 3, 0, racked('unfit')),
  ],
});
const wort = board.batches[1];
if (!wort) throw new Error('the board has no wort');
let made = 0;
const ids = () => idOf('chain', 100 + (made += 1));
const ways = waysFor(board, wort, ids, DEFAULT_UNITS);

describe('where a cake is unfit', () => {
  test('fresh yeast, the other cake that is fit, another day; never an unfit cake', () => {
    expect(ways.map(({ kind, source }) => [kind, source?.id ?? null])).toEqual([
      ['fresh', null],
      ['other-cake', idOf('batch', 4)],
      ['other-day', null],
    ]);
  });

  test('each names its cost and what the link says then', () => {
    const [fresh, other, later] = ways;
    expect(fresh).toMatchObject({ cost: 850, link: null });
    expect(other).toMatchObject({ cost: 0 });
    expect(other?.link?.from).toBe(idOf('batch', 4));
    expect(later?.link?.findings.map(({ rule }) => rule)).toContain('cake-check');
  });

  test('what is pencilled behind comes along, in its order', () => {
    expect(ways[0]?.moves.map(({ batchId, afterBatchId }) => [batchId, afterBatchId])).toEqual([
      [idOf('batch', 2), null],
      [idOf('batch', 3), idOf('batch', 2)],
    ]);
  });

  test('another day is the next free brew day, with the dates behind', () => {
    // 1 March 2027 is a Monday; the brewery brews on Saturdays and Sundays.
    expect(ways[2]?.days).toEqual([
      { batchId: idOf('batch', 2), brewOn: '2027-03-06' },
      { batchId: idOf('batch', 3), brewOn: '2027-03-20' },
    ]);
  });
});

describe('how a pour stands', () => {
  const at = Date.parse('2027-03-01T12:00:00Z');
  const standing = (of: Partial<Parameters<typeof pourStanding>[0]>) =>
    pourStanding({ board, batchId: idOf('batch', 2), at, day: TODAY, readings: [], ...of });

  test('a good temperature alone gives no leave where the link holds', () => {
    const found = standing({ readings: [{ at, c: 20 }] });
    expect(found).toMatchObject({ verdict: 'hold', clear: false, overridable: true });
    expect(found?.wort.verdict).toBe('pour');
    expect(found?.linkHolds.map(({ rule }) => rule)).toEqual(['cake-check']);
  });

  test('nothing is overridable without a reading', () => {
    expect(standing({})).toMatchObject({ clear: false, overridable: false });
  });

  test('a batch that is on no shelf has none', () => {
    expect(standing({ batchId: idOf('batch', 99) })).toBeNull();
  });
});
