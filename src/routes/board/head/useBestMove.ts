import { useEffect, useState } from 'react';
import type { BestMove } from '#shared/chain/bestMove.ts';
import { bestMove } from '#shared/chain/bestMove.ts';
import { useBoardView } from '../view/BoardView.tsx';

const WAIT_MS = 250;

/**
 * The one move that would help most. Looked for once the page stands still: it weighs every batch
 * against every place and must not hold up a drag or the first paint.
 */
export function useBestMove(): BestMove | null {
  const { board } = useBoardView();
  const [found, setFound] = useState<{ board: typeof board; move: BestMove | null } | null>(null);
  useEffect(() => {
    const timer = window.setTimeout(() => setFound({ board, move: bestMove(board) }), WAIT_MS);
    return () => window.clearTimeout(timer);
  }, [board]);
  return found?.board === board ? found.move : null;
}
