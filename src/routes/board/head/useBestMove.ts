import { useEffect, useState } from 'react';
import type { Board } from '#shared/api/board.ts';
import { bestMoveSteps, type BestMove } from '#shared/chain/bestMove.ts';
import type { BoardFacts } from '#shared/chain/board.ts';
import { useLiftMachine } from '../lift/liftContext.ts';
import { useBoardView } from '../view/BoardView.tsx';
import { stepWhenIdle } from './idleSteps.ts';

const WAIT_MS = 250;

const factsOf = (board: Board): BoardFacts => ({
  season: board.season,
  today: board.today,
  houseRules: board.houseRules,
  yeasts: board.yeasts,
  vessels: board.vessels,
  chains: board.chains,
  batches: board.batches,
});

/** `weighing` until it is known; null where no single move would help. */
export type BestMoveState = BestMove | 'weighing' | null;

/**
 * The one move that would help most. It is weighed in idle moments once the board stands still, and
 * dropped when the board changes: in one go a large season would take longer than a page may.
 */
export function useBestMove(): BestMoveState {
  const { board, judged } = useBoardView();
  const { store } = useLiftMachine();
  const [found, setFound] = useState<{ board: Board; move: BestMove | null } | null>(null);
  const isAllPour = judged.totals.hold + judged.totals.mind === 0;
  useEffect(() => {
    if (isAllPour) return;
    let stop = () => {};
    const timer = window.setTimeout(() => {
      stop = stepWhenIdle(
        bestMoveSteps(factsOf(board)),
        (move) => setFound({ board, move }),
        () => store.get().lifted !== null,
      );
    }, WAIT_MS);
    return () => {
      window.clearTimeout(timer);
      stop();
    };
  }, [board, isAllPour, store]);
  if (isAllPour) return null;
  return found?.board === board ? found.move : 'weighing';
}
