import type { Batch } from '#shared/api/batch.ts';
import type { Chain } from '#shared/api/chain.ts';
import { sourceOf, type BoardFacts, type BoardIndex } from '#shared/chain/board.ts';
import { sharesOf } from '#shared/chain/shares.ts';

/** Part of a cake that starts a chain. Litres; null: not known. */
export interface Origin {
  source: Batch;
  chain: Chain;
  partL: number | null;
  wholeL: number | null;
}

/** Whose cake a chain starts from, and with how much; null where it starts otherwise. */
export function originOf(board: BoardFacts, index: BoardIndex, chain: Chain): Origin | null {
  const source = sourceOf(index, chain);
  if (!source) return null;
  const { wholeL, takers } = sharesOf(board, source.id);
  const taker = takers.find(({ chainId }) => chainId === chain.id);
  return { source, chain, partL: taker?.litres ?? null, wholeL };
}

/** The chains that start from a cake of this one. */
export const branchesFrom = (board: BoardFacts, index: BoardIndex, chain: Chain): Origin[] =>
  index
    .batchesOf(chain.id)
    .flatMap(({ id }) => index.branchesOf(id))
    .flatMap((branch) => originOf(board, index, branch) ?? []);
