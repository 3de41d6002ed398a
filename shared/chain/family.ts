import type { Batch } from '../api/batch.ts';
import type { Chain } from '../api/chain.ts';
import { indexBoard, type BoardFacts, type BoardIndex } from './board.ts';
import { judgeBoard, type JudgedBoard, type JudgedLink } from './judgeBoard.ts';

/** What a yeast's family starts from, or a batch in it. */
export type Kin =
  | { kind: 'start'; id: string; chain: Chain; children: readonly Kin[] }
  | {
      kind: 'batch';
      id: string;
      batch: Batch;
      chain: Chain;
      generation: number | null;
      /** The link onto the cake before; null on a fresh start. */
      link: JudgedLink | null;
      children: readonly Kin[];
    };

/**
 * All batches of a season that live on one yeast, by descent: from each pack or slurry to the
 * batches on it and the branches from their cakes. The next batch of a chain comes first among the
 * children of a cake, then branches in the order of the shelves. A branch whose source is gone
 * starts a tree of its own.
 */
export function familyOf(
  board: BoardFacts,
  yeastId: string,
  judged: JudgedBoard = judgeBoard(board),
): Kin[] {
  const index = indexBoard(board);
  const told = new Set<string>();
  const tellChain = (chain: Chain, place: number): Kin[] => {
    const batch = index.batchesOf(chain.id)[place];
    if (!batch || told.has(batch.id)) return [];
    told.add(batch.id);
    const branches = index.branchesOf(batch.id).flatMap((branch) => tellChain(branch, 0));
    return [
      {
        kind: 'batch',
        id: batch.id,
        batch,
        chain,
        generation: judged.generation.get(batch.id) ?? null,
        link: judged.links.get(batch.id) ?? null,
        children: [...tellChain(chain, place + 1), ...branches],
      },
    ];
  };
  return index.chains
    .filter((chain) => chain.yeastId === yeastId && isRoot(index, chain))
    .map((chain) => ({ kind: 'start', id: chain.id, chain, children: tellChain(chain, 0) }));
}

/** It comes of no cake that stands on a shelf. */
function isRoot(index: BoardIndex, { start }: Chain): boolean {
  if (start.kind !== 'cake') return true;
  const source = index.batch(start.batchId);
  return !source || source.stage === 'scrapped' || source.chainId === null;
}
