import type { Batch } from '#shared/api/batch.ts';
import type { Board } from '#shared/api/board.ts';

/** The batch that ferments in a vessel now: in its own, else in its chain's. */
export function contentOf(
  board: Pick<Board, 'batches' | 'chains'>,
  vesselId: string,
): Batch | undefined {
  const ofChain = new Map(board.chains.map((chain) => [chain.id, chain.vesselId]));
  return board.batches.find(
    (batch) =>
      batch.stage === 'fermenting' &&
      (batch.vesselId ?? (batch.chainId ? ofChain.get(batch.chainId) : null)) === vesselId,
  );
}
