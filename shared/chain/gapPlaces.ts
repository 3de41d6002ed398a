import type { Batch } from '../api/batch.ts';
import type { BoardIndex } from './board.ts';
import { asLastShelf, proposeShelf } from './newShelf.ts';
import { descendsFrom, firstOpenPlace, type Lock, type Target } from './plan.ts';

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
  const standsAt = all.indexOf(batch);
  const mates = standsAt < 0 ? all : all.toSpliced(standsAt, 1);
  const open = firstOpenPlace(mates);
  const isOwnBranch = descendsFrom(index, chainId, batch.id, null);
  const places: Place[] = [];
  for (let at = 0; at <= mates.length; at += 1) {
    const afterId = at === 0 ? null : (mates[at - 1]?.id ?? null);
    const here = at === standsAt;
    const locked = here ? null : at < open ? 'poured' : isOwnBranch ? 'own-branch' : null;
    const key = `${chainId}:${afterId ?? 'first'}`;
    places.push({ key, chainId, toChainId: chainId, afterId, added: null, here, locked });
  }
  return places;
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
