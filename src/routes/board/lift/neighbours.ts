import { isPencilled, type BoardFacts } from '#shared/chain/board.ts';
import { gapKey } from './places.ts';
import { indexed } from './indexed.ts';

/** A step along one's own shelf: the key of the place, or why there is none. */
export type Neighbour = { key: string; why: null } | { key: null; why: string };

const none = (why: string): Neighbour => ({ key: null, why });

/** Where a batch would go by one step earlier or later on its shelf. */
export function neighbours(
  board: BoardFacts,
  batchId: string,
): { earlier: Neighbour; later: Neighbour } {
  const index = indexed(board);
  const batch = index.batch(batchId);
  if (!batch || batch.chainId === null) {
    const why = none('It stands on no shelf');
    return { earlier: why, later: why };
  }
  if (!isPencilled(batch)) {
    const why = none(`It is ${batch.stage}, so it stays where it was poured`);
    return { earlier: why, later: why };
  }
  const row = index.batchesOf(batch.chainId);
  const at = row.findIndex((mate) => mate.id === batchId);
  const before = row[at - 1];
  const after = row[at + 1];
  return {
    earlier: !before
      ? none('It is the first on its shelf')
      : isPencilled(before)
        ? { key: gapKey(batch.chainId, row[at - 2]?.id ?? null), why: null }
        : none(`${before.name} before it is ${before.stage}`),
    later: !after
      ? none('It is the last on its shelf')
      : { key: gapKey(batch.chainId, after.id), why: null },
  };
}
