import fc from 'fast-check';
import type { Batch } from '#shared/api/batch.ts';
import type { Chain } from '#shared/api/chain.ts';
import { UNSETTLED_LINK, type BoardFacts } from '#shared/chain/board.ts';
import { addDays } from '#shared/units/day.ts';
import { boardOf, idOf, makeBatch, makeChain, makeVessel, makeYeast, TODAY } from './boards.ts';

/** Small boards with all that moves have to cope with: branches, poured beers, gaps in the facts. */

const CHAINS = 4;
const PER_CHAIN = 5;
const BENCH = 3;

const link = fc.record({
  takenOn: fc.option(day(0, 60), { freq: 4 }),
  keepL: fc.option(fc.double({ min: 0.1, max: 2, noNaN: true }), { freq: 3 }),
  keepWhole: fc.boolean(),
  accepted: fc.boolean(),
});

const beer = fc.record({
  og: fc.option(fc.integer({ min: 1030, max: 1100 }), { freq: 8 }),
  srm: fc.option(fc.integer({ min: 2, max: 40 }), { freq: 8 }),
  ibu: fc.option(fc.integer({ min: 5, max: 80 }), { freq: 8 }),
  daysUnderBeer: fc.option(fc.integer({ min: 4, max: 40 }), { freq: 8 }),
  brewOn: fc.option(day(-30, 120), { freq: 5 }),
  milk: fc.boolean(),
  ownVessel: fc.option(fc.integer({ min: 1, max: CHAINS }), { nil: null, freq: 2 }),
  link,
});

function day(from: number, to: number) {
  return fc.integer({ min: from, max: to }).map((ahead) => addDays(TODAY, ahead));
}

const shelf = fc.record({
  beers: fc.array(beer, { maxLength: PER_CHAIN }),
  /** So many from the front are fermenting or racked. */
  poured: fc.integer({ min: 0, max: 3 }),
  vessel: fc.option(fc.integer({ min: 1, max: CHAINS }), { nil: null, freq: 4 }),
  yeast: fc.integer({ min: 1, max: 2 }),
  start: fc.oneof(
    fc.constant('pack' as const),
    fc.constant('outside' as const),
    fc.record({ shelf: fc.nat({ max: CHAINS }), place: fc.nat({ max: PER_CHAIN }) }),
  ),
});

type Beer = typeof beer extends fc.Arbitrary<infer B> ? B : never;
type Shelf = typeof shelf extends fc.Arbitrary<infer S> ? S : never;

/** Chains hang only on chains before them, so that no circle stands at the start. */
export const randomBoard: fc.Arbitrary<BoardFacts> = fc
  .record({
    shelves: fc.array(shelf, { minLength: 1, maxLength: CHAINS }),
    bench: fc.array(beer, { maxLength: BENCH }),
    cleaned: fc.array(fc.option(day(-20, 60)), { minLength: CHAINS, maxLength: CHAINS }),
  })
  .map(({ shelves, bench, cleaned }) =>
    boardOf({
      yeasts: [makeYeast(1, 'ale'), makeYeast(2, 'lager')],
      vessels: cleaned.map((cleanedOn, at) => makeVessel(at + 1, { cleanedOn })),
      chains: shelves.map((one, at) => chainOf(one, at, shelves)),
      batches: [
        ...shelves.flatMap((one, at) => shelved(one, at)),
        ...bench.map((one, place) => beerOf(numberOf(CHAINS, place), one, { place })),
      ],
    }),
  );

/**
 * The same with cakes that go under several worts: all shelves but the first start from one of its
 * first two cakes. Parts are often as large as a cake, so that one's gain is another's loss.
 */
export const dividedBoard: fc.Arbitrary<BoardFacts> = randomBoard.map((board) => {
  const [first, ...others] = board.chains;
  const cakes = board.batches.filter(({ chainId }) => chainId === first?.id).slice(0, 2);
  const branches = others.map((chain, at): Chain => {
    const source = cakes[at % Math.max(1, cakes.length)];
    return source ? { ...chain, start: { kind: 'cake', batchId: source.id } } : chain;
  });
  return { ...board, chains: first ? [first, ...branches] : [] };
});

const numberOf = (at: number, place: number): number => at * 100 + place + 1;

function chainOf({ vessel, yeast, start }: Shelf, at: number, shelves: readonly Shelf[]): Chain {
  const own = {
    vesselId: vessel === null ? null : idOf('vessel', vessel),
    yeastId: idOf('yeast', yeast),
  };
  if (start === 'pack') return makeChain(at + 1, own);
  if (start === 'outside')
    return makeChain(at + 1, {
      ...own,
      start: { kind: 'outside', generation: 3, price: null, allergens: ['milk'], cultures: null },
    });
  const source = Math.min(start.shelf, at - 1);
  const beers = shelves[source]?.beers.length ?? 0;
  if (source < 0 || beers === 0) return makeChain(at + 1, own);
  const batchId = idOf('batch', numberOf(source, start.place % beers));
  return makeChain(at + 1, { ...own, start: { kind: 'cake', batchId } });
}

const shelved = (one: Shelf, at: number): Batch[] =>
  one.beers.map((each, place) =>
    beerOf(numberOf(at, place), each, {
      chainId: idOf('chain', at + 1),
      place,
      ...(place < one.poured ? pouredStage(place, one.poured) : {}),
    }),
  );

const pouredStage = (place: number, poured: number): Partial<Batch> => ({
  stage: place === poured - 1 ? 'fermenting' : 'racked',
  cake: { state: place === poured - 1 ? 'growing' : 'bare', check: null, measured: null },
});

function beerOf(number: number, facts: Beer, own: Partial<Batch>): Batch {
  const { og, link: said } = facts;
  return makeBatch(number, {
    og: og === null ? null : og / 1000,
    fg: og === null ? null : 1 + (og - 1000) / 4000,
    srm: facts.srm,
    ibu: facts.ibu,
    daysUnderBeer: facts.daysUnderBeer,
    brewOn: facts.brewOn,
    allergens: facts.milk ? ['gluten', 'milk'] : ['gluten'],
    vesselId: facts.ownVessel === null ? null : idOf('vessel', facts.ownVessel),
    link: {
      ...UNSETTLED_LINK,
      takenOn: said.takenOn,
      keepL: said.keepWhole ? null : said.keepL,
      keepWhole: said.keepWhole,
      acceptance: said.accepted ? ACCEPTED : null,
    },
    ...own,
  });
}

const ACCEPTED = {
  reason: 'It was good last time',
  rules: ['gravity-jump' as const],
  by: 'Mo',
  at: '2027-02-01T10:00:00Z',
};

/** A wish that a person could form at some board: any batch, any place, new shelves too. */
export interface RandomWish {
  batch: number;
  place: number;
  dates: 'pull' | 'keep';
}

export const randomWish: fc.Arbitrary<RandomWish> = fc.record({
  batch: fc.nat({ max: 1000 }),
  place: fc.nat({ max: 1000 }),
  dates: fc.constantFrom('pull' as const, 'keep' as const),
});

export const randomWishes = fc.array(randomWish, { maxLength: 12 });
