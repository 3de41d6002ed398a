import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { indexBoard, isPencilled, type BoardFacts } from '#shared/chain/board.ts';
import { judgeBoard, worstOf } from '#shared/chain/judgeBoard.ts';
import { moveBatch } from '#shared/chain/move.ts';
import { randomBoard, randomWish, randomWishes } from '../support/randomBoards.ts';
import { after, moved, wishOn } from '../support/wishes.ts';

/** Every batch in its place, chain by chain, the bench last. */
function orderOf(board: BoardFacts): Record<string, string[]> {
  const index = indexBoard(board);
  const shelves = index.chains.map(({ id }) => [id, index.batchesOf(id).map((one) => one.id)]);
  return Object.fromEntries([...shelves, ['bench', index.bench.map((one) => one.id)]]);
}

const nonEmpty = (order: Record<string, string[]>) =>
  Object.fromEntries(Object.entries(order).filter(([, ids]) => ids.length > 0));

describe('any sequence of moves', () => {
  it('keeps every batch exactly once, in places without a gap', () => {
    fc.assert(
      fc.property(randomBoard, randomWishes, (board, wishes) => {
        const end = wishes.reduce((at, wish) => moved(at, wishOn(at, wish)), board);
        expect(end.batches.map((one) => one.id)).toEqual(board.batches.map((one) => one.id));
        const places = new Map<string, number[]>();
        for (const { chainId, place } of end.batches) {
          const key = chainId ?? 'bench';
          places.set(key, [...(places.get(key) ?? []), place]);
        }
        for (const taken of places.values())
          expect(taken.toSorted((a, b) => a - b)).toEqual(taken.map((_, at) => at));
      }),
    );
  });

  it('never shifts or moves a batch that is fermenting or racked', () => {
    fc.assert(
      fc.property(randomBoard, randomWishes, (board, wishes) => {
        const poured = board.batches.filter((one) => !isPencilled(one));
        const end = wishes.reduce((at, wish) => moved(at, wishOn(at, wish)), board);
        const index = indexBoard(end);
        for (const before of poured) {
          const now = index.batch(before.id);
          expect([now?.chainId, now?.brewOn]).toEqual([before.chainId, before.brewOn]);
          expect(now?.place).toBeLessThanOrEqual(before.place);
        }
      }),
    );
  });

  it('leaves two copies that get the same wishes in the same order alike', () => {
    fc.assert(
      fc.property(randomBoard, randomWishes, randomWishes, (board, hers, his) => {
        // Each forms the wishes on what they saw at first; they arrive interleaved.
        const arriving = hers.flatMap((wish, at) => [wish, ...his.slice(at, at + 1)]);
        const wishes = arriving.map((wish) => wishOn(board, wish));
        const run = (start: BoardFacts) => wishes.reduce((at, wish) => moved(at, wish), start);
        const shuffled = { ...board, batches: board.batches.toReversed() };
        const [one, other] = [run(board), run(structuredClone(shuffled))];
        const byId = (facts: BoardFacts) =>
          facts.batches.toSorted((a, b) => (a.id < b.id ? -1 : 1));
        expect(byId(other)).toEqual(byId(one));
        expect(other.chains).toEqual(one.chains);
      }),
    );
  });
});

describe('one move', () => {
  it('and the move back restore the order', () => {
    fc.assert(
      fc.property(randomBoard, randomWish, (board, choice) => {
        const wish = wishOn(board, choice);
        fc.pre(wish !== null);
        const index = indexBoard(board);
        const before = index.batch(wish?.batchId ?? '');
        fc.pre(before !== undefined && wish !== null);
        if (!before || !wish) return;
        const result = moveBatch(board, wish);
        fc.pre(result.ok && result.batches.length > 0);
        const there = after(board, result);
        const mates = before.chainId === null ? index.bench : index.batchesOf(before.chainId);
        const at = mates.findIndex((mate) => mate.id === before.id);
        const back = moveBatch(there, {
          batchId: before.id,
          toChainId: before.chainId ?? 'bench',
          afterBatchId: mates[at - 1]?.id ?? null,
          expectedChainId: indexBoard(there).batch(before.id)?.chainId ?? null,
          dates: 'keep',
        });
        // A place that was odd to begin with, before a poured batch, is closed to the way back.
        fc.pre(back.ok);
        expect(nonEmpty(orderOf(after(there, back)))).toEqual(nonEmpty(orderOf(board)));
      }),
    );
  });

  it('changes nothing when it is asked for again', () => {
    fc.assert(
      fc.property(randomBoard, randomWish, (board, choice) => {
        const wish = wishOn(board, choice);
        if (!wish) return;
        const there = moved(board, wish);
        fc.pre(moveBatch(board, wish).ok);
        const again = moveBatch(there, wish);
        expect(again).toMatchObject({
          ok: true,
          batches: [],
          chains: [],
          shifted: [],
          cleared: [],
        });
      }),
    );
  });

  it('with dates kept changes no date', () => {
    fc.assert(
      fc.property(randomBoard, randomWish, (board, choice) => {
        const end = moved(board, wishOn(board, { ...choice, dates: 'keep' }));
        expect(end.batches.map((one) => one.brewOn)).toEqual(
          board.batches.map((one) => one.brewOn),
        );
      }),
    );
  });

  it('names exactly the rows that change', () => {
    fc.assert(
      fc.property(randomBoard, randomWish, (board, choice) => {
        const wish = wishOn(board, choice);
        const result = wish && moveBatch(board, wish);
        if (!result?.ok) return;
        const index = indexBoard(board);
        for (const row of result.batches) expect(row).not.toEqual(index.batch(row.id));
        const ids = result.batches.map((row) => row.id);
        expect(new Set(ids).size).toBe(ids.length);
        for (const { batchId, from, to } of result.shifted) {
          expect(from).toBe(index.batch(batchId)?.brewOn);
          expect(to).toBe(result.batches.find((row) => row.id === batchId)?.brewOn);
        }
      }),
    );
  });
});

describe('a judged board', () => {
  it('has for each chain the worst verdict of its links', () => {
    fc.assert(
      fc.property(randomBoard, (board) => {
        const judged = judgeBoard(board);
        const index = indexBoard(board);
        for (const { id } of index.chains) {
          const verdicts = index
            .batchesOf(id)
            .flatMap((batch) => judged.links.get(batch.id)?.verdict ?? []);
          const worst = (['hold', 'mind', 'pour'] as const).find((one) => verdicts.includes(one));
          const chain = judged.chains.get(id);
          expect(chain?.verdict).toBe(worst ?? 'pour');
          expect(chain && worstOf(chain.counts)).toBe(chain?.verdict);
        }
      }),
    );
  });
});
