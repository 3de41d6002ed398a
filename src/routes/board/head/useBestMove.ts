import { useEffect, useState } from 'react';
import type { Board } from '#shared/api/board.ts';
import type { BestMove } from '#shared/chain/bestMove.ts';
import type { BoardFacts } from '#shared/chain/board.ts';
import { useBoardView } from '../view/BoardView.tsx';

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

/** Asks the worker; the answer is how to stop it, which is right when the board has changed. */
function weigh(board: Board, tell: (move: BestMove | null) => void): () => void {
  const worker = new Worker(new URL('./bestMove.worker.ts', import.meta.url), { type: 'module' });
  worker.addEventListener('message', ({ data }: MessageEvent<BestMove | null>) => {
    worker.terminate();
    tell(data);
  });
  worker.postMessage(factsOf(board));
  return () => worker.terminate();
}

/** `weighing` until it is known; null where no single move would help. */
export type BestMoveState = BestMove | 'weighing' | null;

/**
 * The one move that would help most. It is weighed in a thread of its own once the board stands
 * still: on a large season it takes longer than a page may.
 */
export function useBestMove(): BestMoveState {
  const { board, judged } = useBoardView();
  const [found, setFound] = useState<{ board: Board; move: BestMove | null } | null>(null);
  const isAllPour = judged.totals.hold + judged.totals.mind === 0;
  useEffect(() => {
    if (isAllPour) return;
    let stop = () => {};
    const timer = window.setTimeout(() => {
      stop = weigh(board, (move) => setFound({ board, move }));
    }, WAIT_MS);
    return () => {
      window.clearTimeout(timer);
      stop();
    };
  }, [board, isAllPour]);
  if (isAllPour) return null;
  return found?.board === board ? found.move : 'weighing';
}
