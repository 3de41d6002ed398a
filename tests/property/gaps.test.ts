import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bestMove, bestMoveSteps } from '#shared/chain/bestMove.ts';
import { indexBoard, isPencilled, type BoardFacts } from '#shared/chain/board.ts';
import { judgeGaps, rankGaps, type Gap } from '#shared/chain/gaps.ts';
import { judgeBoard, type JudgedLink } from '#shared/chain/judgeBoard.ts';
import { moveBatch, type MoveWish } from '#shared/chain/move.ts';
import { newShelfFor } from '#shared/chain/newShelf.ts';
import { dividedBoard, randomBoard } from '../support/randomBoards.ts';
import { after } from '../support/wishes.ts';

function wishFor(board: BoardFacts, batchId: string, gap: Gap): MoveWish {
  const made = gap.key === 'new' ? newShelfFor(board, batchId, NEW_ID) : null;
  return {
    batchId,
    toChainId: gap.toChainId,
    afterBatchId: gap.afterBatchId,
    expectedChainId: indexBoard(board).batch(batchId)?.chainId ?? null,
    dates: 'pull',
    ...(made ? { newChain: made } : {}),
  };
}

const NEW_ID = 'd0000000-0000-4000-8000-0000000000ff';

/**
 * A whole board is judged at each step, so a failure is told as it was met: to make it small would
 * take minutes. The seed and path that are told find it again.
 */
const SEARCH = { endOnFailure: true };

const number = (link: JudgedLink | undefined, verdict: 'hold' | 'mind') =>
  link?.findings.filter((finding) => finding.verdict === verdict).length ?? 0;
const badness = (link: JudgedLink | undefined) =>
  link && [
    ['pour', 'mind', 'hold'].indexOf(link.verdict),
    number(link, 'hold'),
    number(link, 'mind'),
  ];

function isWorse(now: JudgedLink, before: JudgedLink | undefined): boolean {
  const [a, b] = [badness(now) ?? [], badness(before)];
  if (!b) return true;
  const at = a.findIndex((figure, i) => figure !== b[i]);
  return at >= 0 && (a[at] ?? 0) > (b[at] ?? 0);
}

/** What the gap should say, by making the move and judging both boards whole. */
function expectedOf(board: BoardFacts, batchId: string, gap: Gap) {
  const result = moveBatch(board, wishFor(board, batchId, gap));
  if (!result.ok) throw new Error(`refused: ${result.why}`);
  const there = after(board, result);
  const [before, now] = [judgeBoard(board), judgeBoard(there)];
  const [was, is] = [indexBoard(board), indexBoard(there)];
  const counted = [...now.links].filter(
    ([id, link]) =>
      was.predecessor(id)?.id !== is.predecessor(id)?.id || isWorse(link, before.links.get(id)),
  );
  const links = counted.map(([, link]) => link);
  const sum = (verdict: 'hold' | 'mind') =>
    links.reduce((total, link) => total + number(link, verdict), 0);
  const shifts = links.map((link) => link.blend.deltaE00);
  return {
    holds: sum('hold'),
    minds: sum('mind'),
    brewOn: is.batch(batchId)?.brewOn ?? null,
    generation: now.generation.get(batchId) ?? null,
    reasons: links.flatMap((link) => link.findings[0]?.title ?? []),
    colourShift: shifts.includes(null) ? null : Math.max(0, ...shifts.map((one) => one ?? 0)),
  };
}

function expectTrueGaps(board: BoardFacts, choice: number): void {
  const lifted = board.batches[choice % Math.max(1, board.batches.length)];
  fc.pre(lifted !== undefined);
  if (!lifted) return;
  const gaps = judgeGaps(board, lifted.id);
  expect(gaps.length > 0).toBe(isPencilled(lifted));
  for (const gap of gaps.filter((one) => one.locked === null && !one.here)) {
    const expected = expectedOf(board, lifted.id, gap);
    const { holds, minds, brewOn, generation, colourShift } = gap;
    const { reasons, ...figures } = expected;
    expect({ holds, minds, brewOn, generation, colourShift }).toEqual(figures);
    expect(new Set(gap.reasons)).toEqual(new Set(reasons));
    expect(gap.verdict).toBe(holds > 0 ? 'hold' : minds > 0 ? 'mind' : 'pour');
  }
}

describe('the gaps of a lifted batch', () => {
  it('say what the board says once the batch is put there', () => {
    fc.assert(fc.property(randomBoard, fc.nat({ max: 1000 }), expectTrueGaps), {
      ...SEARCH,
      numRuns: 60,
    });
  });

  it('say it also where a cake goes under several worts', () => {
    fc.assert(fc.property(dividedBoard, fc.nat({ max: 1000 }), expectTrueGaps), {
      ...SEARCH,
      numRuns: 120,
    });
  });

  it('are locked exactly where the move would be refused', () => {
    fc.assert(
      fc.property(randomBoard, fc.nat({ max: 1000 }), (board, choice) => {
        const lifted = board.batches[choice % Math.max(1, board.batches.length)];
        if (!lifted) return;
        for (const gap of judgeGaps(board, lifted.id)) {
          const result = moveBatch(board, wishFor(board, lifted.id, gap));
          expect(result.ok).toBe(gap.locked === null);
          if (gap.here && result.ok) expect(result.batches).toEqual([]);
        }
      }),
      SEARCH,
    );
  });

  it('have one best place at most, the first of the ranking, and never the bench', () => {
    fc.assert(
      fc.property(randomBoard, fc.nat({ max: 1000 }), (board, choice) => {
        const lifted = board.batches[choice % Math.max(1, board.batches.length)];
        if (!lifted) return;
        const gaps = judgeGaps(board, lifted.id);
        const best = gaps.filter((gap) => gap.best);
        expect(best.length).toBe(gaps.some((gap) => !gap.locked && gap.key !== 'bench') ? 1 : 0);
        if (best[0]) expect(rankGaps(gaps)[0]).toBe(best[0]);
        for (const gap of gaps)
          if (best[0] && !gap.locked && gap.key !== 'bench')
            expect(gap.holds).toBeGreaterThanOrEqual(best[0].holds);
      }),
      SEARCH,
    );
  });
});

/** Each step's value, the answer last. */
function* stepsOf(board: BoardFacts) {
  yield yield* bestMoveSteps(board);
}

type Fall = [holds: number, minds: number];

const isLarger = (a: Fall, b: Fall): boolean => a[0] > b[0] || (a[0] === b[0] && a[1] > b[1]);

function expectBestMove(board: BoardFacts): void {
  const totals = (facts: BoardFacts) => judgeBoard(facts).totals;
  const start = totals(board);
  let most: Fall = [0, 0];
  for (const batch of board.batches)
    for (const gap of judgeGaps(board, batch.id)) {
      if (gap.locked || gap.here || gap.key === 'bench') continue;
      const end = totals(after(board, moveBatch(board, wishFor(board, batch.id, gap))));
      const fall: Fall = [start.hold - end.hold, start.mind - end.mind];
      if (isLarger(fall, most)) most = fall;
    }
  const best = bestMove(board);
  const steps = [...stepsOf(board)];
  expect(JSON.stringify(steps.at(-1))).toBe(JSON.stringify(best));
  if (!best) {
    expect(most).toEqual([0, 0]);
    return;
  }
  expect([best.before.holds - best.after.holds, best.before.minds - best.after.minds]).toEqual(
    most,
  );
  const end = totals(after(board, moveBatch(board, wishFor(board, best.batchId, best.gap))));
  expect(best.after).toEqual({ holds: end.hold, minds: end.mind });
}

describe('the move that would help most', () => {
  it('lowers held, then minded links as much as any relocation does', () => {
    fc.assert(fc.property(randomBoard, expectBestMove), { ...SEARCH, numRuns: 15 });
  });

  it('does so also where a cake goes under several worts', () => {
    fc.assert(fc.property(dividedBoard, expectBestMove), { ...SEARCH, numRuns: 15 });
  });
});
