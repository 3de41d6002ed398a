import { describe, expect, it } from 'vitest';
import type { Batch } from '#shared/api/batch.ts';
import type { SeasonCopy } from '#shared/api/brewery.ts';
import type { Chain } from '#shared/api/chain.ts';
import { copiedSeason } from '#shared/chain/seasonCopy.ts';
import { UNSETTLED_LINK } from '#shared/chain/board.ts';
import { idOf, makeBatch, makeChain } from '../../support/boards.ts';

const [first, second] = [idOf('chain', 1), idOf('chain', 2)];
const acceptance = { reason: 'It is fine', rules: [], by: 'Mo', at: '2027-03-01T10:00:00.000Z' };

const racked: Partial<Batch> = {
  stage: 'racked',
  read: { volumeL: 22, og: 1.05, fg: 1.01, rackedOn: '2027-03-20' },
  cake: { state: 'poured', check: null, measured: null },
};
const batches = [
  makeBatch(1, { chainId: first, place: 0, brewOn: '2027-03-06', ...racked }),
  makeBatch(2, {
    chainId: first,
    place: 1,
    brewOn: '2027-03-20',
    wantedOn: '2027-05-01',
    link: { ...UNSETTLED_LINK, keepL: 1.5, takenOn: '2027-03-19', acceptance },
  }),
  makeBatch(3, {
    chainId: first,
    place: 2,
    brewOn: '2027-04-03',
    link: { ...UNSETTLED_LINK, keepWhole: true, acceptance },
  }),
  makeBatch(4, { chainId: second, place: 0, brewOn: '2027-03-20' }),
  makeBatch(5, { chainId: null, place: 0 }),
  makeBatch(6, { chainId: null, place: 1, stage: 'scrapped' }),
];
const chains: Chain[] = [
  // The shelf that lives on another's cake stands above it.
  { ...makeChain(2), start: { kind: 'cake', batchId: idOf('batch', 1) } },
  {
    ...makeChain(1),
    start: { kind: 'outside', generation: 3, price: 5, allergens: [], cultures: [] },
  },
];
const from = { chains, batches, yeasts: [{ id: idOf('yeast', 1), packPrice: 1400 }] };

const wish: Omit<SeasonCopy, 'seasonId'> = {
  chainIds: [first, second],
  bench: true,
  brewed: 'pencilled',
  dates: { shiftDays: 180 },
};
const copy = (change: Partial<typeof wish> = {}) => copiedSeason(from, { ...wish, ...change }, [6]);
const shelf = (copied: ReturnType<typeof copy>, id: string) =>
  copied.shelves.find(({ chain }) => chain.id === id);
const ids = (rows: readonly Batch[] | undefined) => rows?.map(({ id }) => id);

describe('a copied season', () => {
  it('has all as pencilled, on the same weekdays', () => {
    const copied = copy();
    expect(copied.shift).toBe(182);
    expect(shelf(copied, first)?.batches).toMatchObject([
      { stage: 'pencilled', brewOn: '2027-09-04', cake: null },
      { stage: 'pencilled', brewOn: '2027-09-18', wantedOn: '2027-10-30' },
      { stage: 'pencilled', brewOn: '2027-10-02' },
    ]);
  });

  it('knows nothing of what was read, accepted or scrapped', () => {
    const copied = copy();
    const all = [...copied.shelves.flatMap((each) => each.batches), ...copied.bench];
    expect(all).toHaveLength(5);
    for (const { read, link } of all) {
      expect(Object.values(read)).toEqual([null, null, null, null]);
      expect(link.acceptance).toBeNull();
    }
  });

  it('keeps how a cake goes on, its day with the rest', () => {
    expect(shelf(copy(), first)?.batches[1]?.link).toEqual({
      ...UNSETTLED_LINK,
      keepL: 1.5,
      takenOn: '2027-09-17',
    });
  });

  it('leaves what was brewed out, and with it the link to what stays behind', () => {
    const rest = shelf(copy({ brewed: 'left-out' }), first)?.batches;
    expect(ids(rest)).toEqual([idOf('batch', 2), idOf('batch', 3)]);
    expect(rest?.[0]?.link).toEqual(UNSETTLED_LINK);
    expect(rest?.[1]?.link.keepWhole).toBe(true);
  });

  it('makes the shelf that a cake comes from before the one that lives on it', () => {
    expect(copy().shelves.map(({ chain }) => chain.id)).toEqual([first, second]);
    expect(shelf(copy(), second)?.chain.start).toEqual({
      kind: 'cake',
      batchId: idOf('batch', 1),
    });
  });

  it.each([
    ['the batch is left out', { brewed: 'left-out' as const }],
    ['its shelf is left out', { chainIds: [second] }],
  ])('starts from a fresh pack where the cake stays behind: %s', (_, change) => {
    expect(shelf(copy(change), second)?.chain.start).toEqual({ kind: 'pack', price: 1400 });
  });

  it('takes the shelves and the bench that were chosen, and begins when it is asked to', () => {
    const copied = copy({ chainIds: [second], bench: false, dates: { startOn: '2028-03-04' } });
    expect(copied.shelves.map(({ chain }) => chain.id)).toEqual([second]);
    expect(copied.bench).toEqual([]);
    expect(copied.shelves[0]?.batches[0]?.brewOn).toBe('2028-03-04');
  });
});
