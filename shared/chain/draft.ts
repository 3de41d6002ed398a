import type { Batch } from '../api/batch.ts';
import type { Chain } from '../api/chain.ts';
import { predecessorIn, type BoardIndex, type Layout } from './board.ts';

/** A board with some rows and orders replaced, the board itself untouched. */
export interface Draft extends Layout {
  /** Replaced rows by id. Places are written at the end, from the orders. */
  rows: ReadonlyMap<string, Batch>;
  /** Replaced orders by chain. */
  orders: ReadonlyMap<string, readonly Batch[]>;
  /** Stores a row, also in its chain's order if it stands there. */
  put(row: Batch): void;
  setOrder(chainId: string, batches: readonly Batch[]): void;
}

/** A draft over a board, with one more chain where `added` names it. */
export function draftOver(index: BoardIndex, added: Chain | null = null): Draft {
  const rows = new Map<string, Batch>();
  const orders = new Map<string, Batch[]>();
  const layout = {
    batch: (id: string) => rows.get(id) ?? index.batch(id),
    chain: (id: string) => (added?.id === id ? added : index.chain(id)),
    batchesOf: (chainId: string) => orders.get(chainId) ?? index.batchesOf(chainId),
    branchesOf: (batchId: string) =>
      added?.start.kind === 'cake' && added.start.batchId === batchId
        ? [...index.branchesOf(batchId), added]
        : index.branchesOf(batchId),
  };
  const setOrder = (chainId: string, batches: readonly Batch[]) =>
    void orders.set(chainId, [...batches]);
  return {
    ...layout,
    predecessor: (batchId) => predecessorIn(layout, batchId),
    rows,
    orders,
    setOrder,
    put(row) {
      rows.set(row.id, row);
      if (row.chainId === null) return;
      const mates = orders.get(row.chainId) ?? [...index.batchesOf(row.chainId)];
      const at = mates.findIndex((mate) => mate.id === row.id);
      if (at >= 0) mates[at] = row;
      orders.set(row.chainId, mates);
    },
  };
}
