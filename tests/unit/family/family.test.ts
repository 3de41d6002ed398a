import { describe, expect, it } from 'vitest';
import type { BoardFacts } from '#shared/chain/board.ts';
import { familyOf, type Kin } from '#shared/chain/family.ts';
import { layOut } from '../../../src/routes/family/layout.ts';
import { boardOf, idOf, makeBatch, makeChain, makeYeast } from '../../support/boards.ts';

const YEAST = idOf('yeast', 1);
const on = (chain: number, place: number) => ({ chainId: idOf('chain', chain), place });

/**
 * A pack makes 1, 2 and 3; of the cake of 1 comes 4 and then 5, of the cake of 4 comes 6. Slurry of
 * generation 3 makes 7. A lager has a chain of its own.
 */
function board(): BoardFacts {
  return boardOf({
    yeasts: [makeYeast(1, 'ale'), makeYeast(2, 'lager')],
    chains: [
      makeChain(1),
      makeChain(2, { start: { kind: 'cake', batchId: idOf('batch', 1) } }),
      makeChain(3, { start: { kind: 'cake', batchId: idOf('batch', 4) } }),
      makeChain(4, {
        start: { kind: 'outside', generation: 3, price: null, allergens: null, cultures: null },
      }),
      makeChain(5, { yeastId: idOf('yeast', 2) }),
    ],
    batches: [
      ...[1, 2, 3].map((n, place) => makeBatch(n, { name: `B${n}`, ...on(1, place) })),
      ...[4, 5].map((n, place) => makeBatch(n, { name: `B${n}`, ...on(2, place) })),
      makeBatch(6, { name: 'B6', ...on(3, 0) }),
      makeBatch(7, { name: 'B7', ...on(4, 0) }),
      makeBatch(8, { name: 'Lager', ...on(5, 0) }),
    ],
  });
}

const nameOf = (kin: Kin) => (kin.kind === 'batch' ? kin.batch.name : kin.chain.start.kind);
const told = (kin: Kin): unknown[] => [nameOf(kin), ...kin.children.map(told)];

describe('the family of a yeast', () => {
  it('goes from each start to the batches on it and the branches from their cakes', () => {
    expect(familyOf(board(), YEAST).map(told)).toEqual([
      ['pack', ['B1', ['B2', ['B3']], ['B4', ['B5'], ['B6']]]],
      ['outside', ['B7']],
    ]);
  });

  it('tells the generation, and what each link says', () => {
    const [pack] = familyOf(board(), YEAST);
    const first = pack?.children[0];
    expect(first).toMatchObject({ generation: 1, link: null });
    const branch = first?.children[1];
    expect(branch).toMatchObject({ generation: 2, link: { from: idOf('batch', 1) } });
  });

  it('lets a branch stand for itself whose source is gone', () => {
    const { batches, ...rest } = board();
    const gone = batches.map((row) =>
      row.name === 'B1' ? { ...row, stage: 'scrapped' as const, chainId: null } : row,
    );
    const family = familyOf({ ...rest, batches: gone }, YEAST);
    expect(family.map(told)).toEqual([
      ['pack', ['B2', ['B3']]],
      ['cake', ['B4', ['B5'], ['B6']]],
      ['outside', ['B7']],
    ]);
  });
});

describe('its drawing', () => {
  const placesOf = (family: readonly Kin[]) =>
    Object.fromEntries(
      layOut(family).placed.map(({ kin, column, row }) => [nameOf(kin), [column, row]]),
    );

  it('keeps a chain on one row, gives each branch the next, and each generation its column', () => {
    expect(placesOf(familyOf(board(), YEAST))).toEqual({
      pack: [0, 0],
      B1: [1, 0],
      B2: [2, 0],
      B3: [3, 0],
      B4: [2, 1],
      B5: [3, 1],
      B6: [3, 2],
      outside: [2, 3],
      B7: [3, 3],
    });
  });

  it('never puts two on one place, and joins each to what it comes from', () => {
    const { placed, rows, columns } = layOut(familyOf(board(), YEAST));
    const places = placed.map(({ column, row }) => `${column},${row}`);
    expect(new Set(places).size).toBe(placed.length);
    expect([rows, columns]).toEqual([4, 4]);
    for (const { from, kin } of placed) {
      if (from === null) expect(kin.kind).toBe('start');
      else expect(places).toContain(`${from.column},${from.row}`);
    }
  });

  it('draws nothing of a yeast on no shelf', () => {
    expect(layOut([])).toEqual({ placed: [], columns: 0, rows: 0 });
  });
});
