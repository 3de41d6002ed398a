import { describe, expect, it } from 'vitest';
import { indexBoard } from '#shared/chain/board.ts';
import { judgeBoard } from '#shared/chain/judgeBoard.ts';
import {
  filterOf,
  filterParams,
  matchesFirst,
  matching,
} from '../../../src/routes/board/finding/filter.ts';
import {
  boardOf,
  idOf,
  makeBatch,
  makeChain,
  makeVessel,
  makeYeast,
} from '../../support/boards.ts';

const [ale, lager] = [makeYeast(1, 'ale'), makeYeast(2, 'lager')];
const [bucket, cone] = [makeVessel(1), makeVessel(2)];
const board = boardOf({
  yeasts: [ale, lager],
  vessels: [bucket, cone],
  chains: [
    makeChain(1, { yeastId: ale.id, vesselId: bucket.id }),
    makeChain(2, { yeastId: lager.id, vesselId: null, position: 1 }),
  ],
  batches: [
    makeBatch(1, {
      chainId: idOf('chain', 1),
      place: 0,
      stage: 'racked',
      srm: 40,
      brewOn: '2027-03-06',
    }),
    // A pale beer on the cake of a black one.
    makeBatch(2, {
      chainId: idOf('chain', 1),
      place: 1,
      srm: 3,
      vesselId: cone.id,
      brewOn: '2027-03-20',
    }),
    makeBatch(3, { chainId: idOf('chain', 2), place: 0 }),
    makeBatch(4, { chainId: null, place: 0, yeastId: lager.id }),
  ],
});
const where = { index: indexBoard(board), judged: judgeBoard(board) };
const matches = (query: string) => matching(filterOf(new URLSearchParams(query)), where);
const ids = (...numbers: number[]) => new Set(numbers.map((number) => idOf('batch', number)));

describe('a filter', () => {
  it.each([
    ['a yeast, of the shelf or asked for on the bench', `yeast=${lager.id}`, ids(3, 4)],
    ['a vessel, the batch’s own before its shelf’s', `vessel=${bucket.id}`, ids(1)],
    ['a batch’s own vessel', `vessel=${cone.id}`, ids(2)],
    ['a stage', 'stage=racked', ids(1)],
    ['a verdict, of the link before', 'verdict=mind', ids(2)],
    ['two at once', `stage=pencilled&yeast=${ale.id}`, ids(2)],
    ['a yeast that is gone', 'yeast=gone', ids()],
  ])('lets through %s', (_, query, found) => {
    expect(matches(query)).toEqual(found);
  });

  it.each(['', 'stage=', 'stage=scrapped', 'verdict=maybe', 'link=x'])(
    'is none with %j',
    (query) => {
      expect(matches(query)).toBeNull();
    },
  );

  it('stays in the address when something is opened beside it', () => {
    const params = new URLSearchParams('stage=racked&batch=1&at=2&vessel=');
    expect(filterParams(params)).toEqual({ stage: 'racked' });
  });
});

it('puts first what is looked at, each part in its order', () => {
  expect(matchesFirst([1, 2, 3, 4], (n) => n % 2 === 0)).toEqual([2, 4, 1, 3]);
});
