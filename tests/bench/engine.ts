import { indexBoard, type BoardFacts } from '#shared/chain/board.ts';
import { bestMove, bestMoveSteps } from '#shared/chain/bestMove.ts';
import { factsOf } from '#shared/chain/batchFacts.ts';
import { checkLink } from '#shared/chain/checkLink.ts';
import { judgeGaps } from '#shared/chain/gaps.ts';
import { NOTHING_INHERITED } from '#shared/chain/inherit.ts';
import { judgeBoard } from '#shared/chain/judgeBoard.ts';
import { moveBatch } from '#shared/chain/move.ts';
import { DEFAULT_HOUSE_RULES } from '#shared/rules/resolve.ts';
import { idOf, makeBoard } from '../support/boards.ts';
import type { Part, Row } from './row.ts';

/** The engine alone, on one thread: no network, no database, no page. */
export const engine: Part = {
  name: 'engine',
  run: async () => [allPairs(), season(), gaps(), move(), help(), helpStep()],
};

/** The median of some runs, milliseconds, after as many to warm up. */
function median(runs: number, work: () => unknown): number {
  for (let run = 0; run < runs; run += 1) work();
  const times = Array.from({ length: runs }, () => {
    const start = performance.now();
    work();
    return performance.now() - start;
  }).sort((a, b) => a - b);
  return times[Math.floor(times.length / 2)] ?? Number.NaN;
}

function row(what: string, most: number | null, took: number): Row {
  return {
    what,
    reach: most === null ? '–' : `≤ ${most} ms`,
    measured: `${took.toFixed(1)} ms (median)`,
    holds: most === null || took <= most,
  };
}

/** The board as it comes off the wire: nothing that an earlier run worked out can be met again. */
const fresh = (board: BoardFacts): BoardFacts => structuredClone(board);

/** Pairs with every finding written and serialised; facts are made anew for each pair. */
function allPairs(): Row {
  const { batches, yeasts } = makeBoard({ chains: 0, perChain: 0, bench: 100, seed: 1 });
  const yeast = yeasts[0];
  if (!yeast) throw new Error('the board has no yeast');
  let pairs = 0;
  const took = median(7, () => {
    pairs = 0;
    for (const a of batches)
      for (const b of batches) {
        if (a === b) continue;
        const answer = checkLink({
          earlier: { ...factsOf(a), brewOn: '2027-03-06' },
          later: { ...factsOf(b), brewOn: '2027-03-20' },
          pour: {},
          yeast: { kind: yeast.kind, character: false, fermentMinC: 18, fermentMaxC: 22 },
          vessel: { capacityL: 32, blowOff: false },
          generation: 2,
          inherited: { ...NOTHING_INHERITED, allergens: a.allergens ?? [] },
          rules: DEFAULT_HOUSE_RULES,
        });
        if (JSON.stringify(answer).length > 100) pairs += 1;
      }
  });
  if (pairs !== 9900) throw new Error(`answered ${pairs} of 9900 pairs`);
  return row('all 9,900 ordered pairs of 100 batches, findings written and serialised', 250, took);
}

function season(): Row {
  const board = makeBoard({ chains: 12, perChain: 8, bench: 6, seed: 2 });
  const copies = copiesOf(board, 80);
  const took = median(40, () => judgeBoard(copies.pop() ?? board).links.size);
  return row('a season of 12 chains × 8 batches, findings written', 5, took);
}

const BIG = { chains: 25, perChain: 8, bench: 0, seed: 3 };

function gaps(): Row {
  const board = makeBoard(BIG);
  const copies = copiesOf(board, 80);
  const lifted = [3, 60, 117, 200];
  let at = 0;
  const took = median(40, () => {
    at += 1;
    return judgeGaps(copies.pop() ?? board, idOf('batch', lifted[at % lifted.length] ?? 1));
  });
  return row('all gaps of one lifted batch, 200 batches on 25 shelves', 8, took);
}

function move(): Row {
  const board = makeBoard(BIG);
  const [from, to] = indexBoard(board).chains;
  if (!from || !to) throw new Error('the board has no chains');
  const took = median(200, () =>
    moveBatch(board, {
      batchId: idOf('batch', 1),
      toChainId: to.id,
      afterBatchId: null,
      expectedChainId: from.id,
      dates: 'pull',
    }),
  );
  return row('one move on that board, rows and dates', null, took);
}

function help(): Row {
  const board = makeBoard({ chains: 12, perChain: 8, bench: 6, seed: 2 });
  const copies = copiesOf(board, 6);
  const took = median(3, () => bestMove(copies.pop() ?? board));
  return row('the move that would help most, 12 chains × 8 batches', null, took);
}

/** The page weighs that move in idle moments; a step must fit into one. */
function helpStep(): Row {
  const board = makeBoard(BIG);
  const steps = bestMoveSteps(fresh(board));
  const times: number[] = [];
  for (let done = false; !done;) {
    const start = performance.now();
    done = steps.next().done ?? false;
    times.push(performance.now() - start);
  }
  const took = times.sort((a, b) => a - b)[Math.floor(times.length * 0.95)] ?? Number.NaN;
  return {
    ...row('a step of it, 200 batches on 25 shelves', 8, took),
    measured: `${took.toFixed(1)} ms (95 of 100 steps take less)`,
  };
}

const copiesOf = (board: BoardFacts, count: number): BoardFacts[] =>
  Array.from({ length: count }, () => fresh(board));
