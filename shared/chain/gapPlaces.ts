import type { Batch } from '../api/batch.ts';
import type { BoardIndex } from './board.ts';
import { asLastShelf, proposeShelf } from './newShelf.ts';
import { lockOf, withoutBatch, type Lock, type Target } from './plan.ts';

/** A place that a lifted batch could have, before anything is judged. */
export interface Place extends Target {
  /** `chainId:afterId`, `chainId:first`, `new` or `bench`. */
  key: string;
  toChainId: string;
  here: boolean;
  locked: Lock | null;
}

/** Stands for the id of a shelf that is not made yet. */
const NEW_SHELF = 'new';

/** Each gap of each shelf in their order, a new shelf, the bench. */
export function placesFor(index: BoardIndex, batch: Batch): Place[] {
  const shelves = index.chains.flatMap(({ id }) => shelfPlaces(index, batch, id));
  return [...shelves, newShelfPlace(index, batch), benchPlace(index, batch)];
}

function shelfPlaces(index: BoardIndex, batch: Batch, chainId: string): Place[] {
  const all = index.batchesOf(chainId);
  const at = all.findIndex((mate) => mate.id === batch.id);
  const standsAfter = at > 0 ? all[at - 1]?.id : at === 0 ? null : undefined;
  const afters = [null, ...withoutBatch(all, batch.id).map((mate) => mate.id)];
  return afters.map((afterId) => {
    const target = { chainId, afterId, added: null };
    const here = afterId === standsAfter;
    const locked = here ? null : lockOf(index, batch, target);
    return { ...target, key: `${chainId}:${afterId ?? 'first'}`, toChainId: chainId, here, locked };
  });
}

function newShelfPlace(index: BoardIndex, batch: Batch): Place {
  const shelf = proposeShelf(index, batch.id, NEW_SHELF);
  return {
    key: 'new',
    toChainId: 'new',
    chainId: NEW_SHELF,
    afterId: null,
    added: shelf ? asLastShelf(index, shelf) : null,
    here: false,
    locked: shelf ? null : 'no-yeast',
  };
}

/** Last on the bench; where a batch of the bench stands, its own place. */
function benchPlace(index: BoardIndex, batch: Batch): Place {
  const at = index.bench.findIndex((mate) => mate.id === batch.id);
  const before = at < 0 ? index.bench.at(-1) : index.bench[at - 1];
  return {
    key: 'bench',
    toChainId: 'bench',
    chainId: null,
    afterId: before?.id ?? null,
    added: null,
    here: at >= 0,
    locked: null,
  };
}
