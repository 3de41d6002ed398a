import { describe, expect, it } from 'vitest';
import type { Batch } from '#shared/api/batch.ts';
import { factsOf } from '#shared/chain/batchFacts.ts';
import { indexBoard, UNSETTLED_LINK } from '#shared/chain/board.ts';
import { conflictsOf } from '#shared/chain/conflicts.ts';
import { judgeBoard } from '#shared/chain/judgeBoard.ts';
import { lapses } from '#shared/chain/lapses.ts';
import { withRows } from '#shared/chain/move.ts';
import type { RuleId } from '#shared/rules/vocabulary.ts';
import { boardOf, idOf, makeBatch, makeChain, makeVessel } from '../../support/boards.ts';

const b = (number: number) => idOf('batch', number);
const [one, two] = [idOf('chain', 1), idOf('chain', 2)];
const rules = (judged: ReturnType<typeof judgeBoard>, number: number) =>
  judged.links.get(b(number))?.findings.map((finding) => `${finding.verdict} ${finding.rule}`);

/** Shelf 1 holds 1 and 2; shelf 2 starts from the cake of 1 and holds 3. */
const split = boardOf({
  vessels: [makeVessel(1), makeVessel(2)],
  chains: [
    makeChain(1, { vesselId: idOf('vessel', 1), start: { kind: 'pack', price: 900 } }),
    makeChain(2, { vesselId: idOf('vessel', 2), start: { kind: 'cake', batchId: b(1) } }),
  ],
  batches: [
    makeBatch(1, { chainId: one, place: 0, brewOn: '2027-03-06', allergens: ['gluten', 'milk'] }),
    makeBatch(2, { chainId: one, place: 1, brewOn: '2027-03-20', allergens: ['gluten', 'milk'] }),
    makeBatch(3, { chainId: two, place: 0, brewOn: '2027-03-20' }),
    makeBatch(4, { place: 0 }),
  ],
});

describe('the facts of a batch', () => {
  it('are those that were read where there are any, and leave out what is unknown', () => {
    const read = { volumeL: 21, og: null, fg: 1.012, rackedOn: '2027-03-25' };
    const facts = factsOf(makeBatch(1, { brewOn: '2027-03-06', read, srm: null }));
    expect(facts).toMatchObject({ volumeL: 21, og: 1.046, fg: 1.012, daysUnderBeer: 19 });
    expect(facts.srm).toBeUndefined();
    expect(facts.measuredCake).toBeUndefined();
  });
});

describe('a judged season', () => {
  it('counts generations and hands allergens down through a split cake', () => {
    const judged = judgeBoard(split);
    expect([1, 2, 3].map((number) => judged.generation.get(b(number)))).toEqual([1, 2, 2]);
    expect(judged.generation.has(b(4))).toBe(false);
    expect(rules(judged, 2)).toEqual([]);
    expect(rules(judged, 3)).toEqual(['hold allergen']);
    expect(judged.links.get(b(3))?.from).toBe(b(1));
    expect(judged.chains.get(two)).toMatchObject({ verdict: 'hold', generations: [2, 2] });
  });

  it('shares the price of a pack among all batches made from it', () => {
    const judged = judgeBoard(split);
    expect(judged.chains.get(one)?.costPerBatch).toBe(300);
    expect(judged.chains.get(two)?.costPerBatch).toBe(300);
    expect(judged.totals).toMatchObject({ batches: 4, onShelves: 3, chains: 2, packs: 1, hold: 1 });
  });

  it('starts slurry from outside at its own generation', () => {
    const chains = [
      makeChain(1, {
        start: { kind: 'outside', generation: 4, price: null, allergens: [], cultures: [] },
      }),
    ];
    const judged = judgeBoard({ ...split, chains });
    expect(judged.chains.get(one)).toMatchObject({ generations: [4, 5], costPerBatch: null });
  });

  it('hands down what slurry from outside brings along, and says where that is not known', () => {
    const slurry = { kind: 'outside', generation: 4, price: null } as const;
    const judged = (allergens: ['milk'] | null) =>
      judgeBoard({
        ...split,
        chains: [makeChain(1, { start: { ...slurry, allergens, cultures: [] } })],
        batches: split.batches.map((batch) => ({ ...batch, allergens: [], cultures: [] })),
      }).links.get(b(2));
    expect(judged(['milk'])?.findings.map(({ rule }) => rule)).toContain('allergen');
    expect(judged(null)?.findings.map(({ rule }) => rule)).not.toContain('allergen');
    expect(judged(null)?.unchecked.map(({ rule }) => rule)).toContain('allergen');
    expect(judged(null)?.unchecked.map(({ rule }) => rule)).not.toContain('wild-culture');
  });

  it('goes around a scrapped batch', () => {
    const [first, second, third] = split.batches;
    if (!first || !second || !third) throw new Error('three batches');
    const scrapped = { ...second, stage: 'scrapped' as const };
    const last = { ...third, chainId: one, place: 2 };
    const judged = judgeBoard({ ...split, batches: [first, scrapped, last] });
    expect(judged.links.get(b(3))).toMatchObject({ from: b(1), generation: 2 });
    expect(judged.links.has(b(2))).toBe(false);
  });

  it('comes to an end with chains that hang on each other', () => {
    const chains = [
      makeChain(1, { start: { kind: 'cake', batchId: b(3) } }),
      makeChain(2, { start: { kind: 'cake', batchId: b(2) } }),
    ];
    const judged = judgeBoard({ ...split, chains });
    expect(judged.links.size).toBe(3);
    expect(judged.chains.get(one)?.costPerBatch).toBeNull();
  });

  it('holds a brew in a vessel that is not free, but not on its racking day', () => {
    expect(rules(judgeBoard(split), 2)).toEqual([]);
    const more = [
      makeBatch(4, { chainId: two, place: 1, brewOn: '2027-04-03' }),
      makeBatch(5, { chainId: two, place: 2, brewOn: '2027-04-10' }),
    ];
    const board = { ...split, batches: [...split.batches.slice(0, 3), ...more] };
    expect(rules(judgeBoard(board), 4)).toEqual(['hold allergen']);
    expect(rules(judgeBoard(board), 5)).toContain('hold brew-day');
  });

  it('counts beers since the vessel was cleaned, the third on mind', () => {
    const vessels = [makeVessel(1, { cleanedOn: '2027-03-01' })];
    const batches = [1, 2, 3].map((number) =>
      makeBatch(number, {
        chainId: one,
        place: number - 1,
        brewOn: ['2027-03-06', '2027-03-20', '2027-04-03'][number - 1] ?? null,
      }),
    );
    const chains = [makeChain(1, { vesselId: idOf('vessel', 1) })];
    const judged = judgeBoard(boardOf({ vessels, chains, batches }));
    expect(rules(judged, 2)).toEqual([]);
    expect(rules(judged, 3)).toEqual(['mind unwashed-vessel']);
  });

  it('takes a hold as accepted for the rules that were accepted, never an allergen', () => {
    const accepted = (accept: RuleId[], own: Partial<Batch>) => {
      const acceptance = {
        reason: 'As agreed',
        rules: accept,
        by: 'Mo',
        at: '2027-02-01T10:00:00Z',
      };
      const link = { ...UNSETTLED_LINK, acceptance };
      const row = makeBatch(2, { chainId: one, place: 1, brewOn: '2027-03-18', link, ...own });
      return judgeBoard(withRows(split, [row])).links.get(b(2));
    };
    const declared: Partial<Batch> = { allergens: ['gluten', 'milk'] };
    const early = accepted(['brew-day'], declared);
    expect(early).toMatchObject({ verdict: 'hold', accepted: true });
    expect(accepted(['cake-wait'], declared)).toMatchObject({ verdict: 'hold', accepted: false });
    const milk = accepted(['brew-day', 'allergen'], { allergens: ['gluten'] });
    expect(milk).toMatchObject({ verdict: 'hold', accepted: false });
  });
});

describe('conflicts', () => {
  it('name two beers in one vessel, blocked and crowded days, from today on', () => {
    const vesselId = idOf('vessel', 1);
    const board = boardOf({
      season: { ...split.season, blockedDays: ['2027-03-20'] },
      vessels: [makeVessel(1)],
      chains: [makeChain(1), makeChain(2)],
      batches: [
        makeBatch(1, { chainId: one, place: 0, brewOn: '2027-03-13', vesselId }),
        makeBatch(2, { chainId: two, place: 0, brewOn: '2027-03-20', vesselId }),
        makeBatch(3, { chainId: one, place: 1, brewOn: '2027-03-20' }),
        makeBatch(4, { chainId: two, place: 1, brewOn: '2027-03-29' }),
        makeBatch(5, { chainId: two, place: 2, brewOn: '2027-02-22' }),
        makeBatch(6, { place: 0, brewOn: '2027-03-20' }),
      ],
    });
    const found = conflictsOf(indexBoard(board)).map(({ kind, day, batchIds }) => [
      kind,
      day,
      batchIds,
    ]);
    expect(found).toEqual([
      ['blocked', '2027-03-20', [b(2), b(3)]],
      ['crowded', '2027-03-20', [b(2), b(3)]],
      ['vessel', '2027-03-20', [b(1), b(2)]],
      ['weekday', '2027-03-29', [b(4)]],
    ]);
  });
});

describe('an acceptance lapses', () => {
  const acceptance = { reason: 'As agreed', rules: [], by: 'Mo', at: '2027-02-01T10:00:00Z' };
  const accepted = (own = {}) =>
    withRows(split, [
      makeBatch(2, {
        chainId: one,
        place: 1,
        brewOn: '2027-03-20',
        link: { ...UNSETTLED_LINK, acceptance },
        ...own,
      }),
    ]);

  it('when a fact of either beer changes, not when it is renamed', () => {
    expect(lapses(accepted(), accepted({ name: 'Another name' }))).toEqual([]);
    expect(lapses(accepted(), accepted({ ibu: 60 }))).toEqual([b(2)]);
    const [first] = split.batches;
    if (!first) throw new Error('a batch');
    expect(lapses(accepted(), withRows(accepted(), [{ ...first, srm: 30 }]))).toEqual([b(2)]);
  });

  it('when the wait changes, not when the whole link shifts', () => {
    expect(lapses(accepted(), accepted({ brewOn: '2027-03-22' }))).toEqual([b(2)]);
    const [first] = split.batches;
    if (!first) throw new Error('a batch');
    const later = withRows(accepted({ brewOn: '2027-03-27' }), [
      { ...first, brewOn: '2027-03-13' },
    ]);
    expect(lapses(accepted(), later)).toEqual([]);
  });
});
