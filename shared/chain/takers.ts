import type { Batch } from '../api/batch.ts';
import { isPencilled, type Layout } from './board.ts';

/**
 * The batches that a cake goes under, or went: the next in its chain, and the first of each branch;
 * brewed ones first.
 */
export function takersOf(layout: Layout, source: Batch): Batch[] {
  if (source.chainId === null) return [];
  const mates = layout.batchesOf(source.chainId);
  const next = mates[mates.findIndex(({ id }) => id === source.id) + 1];
  const firsts = layout.branchesOf(source.id).map(({ id }) => layout.batchesOf(id)[0]);
  const takers = [next, ...firsts].filter((taker) => taker !== undefined);
  return takers.toSorted((a, b) => Number(isPencilled(a)) - Number(isPencilled(b)));
}
