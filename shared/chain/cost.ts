import type { Batch } from '../api/batch.ts';
import type { Chain } from '../api/chain.ts';
import { order, type BoardIndex } from './board.ts';

/**
 * What a batch of each chain costs in yeast, in the currency's minor unit: the price of the pack
 * or slurry the chain goes back to, over all batches made from it, branches included. Null where
 * the price, or the first cake, is not known, or there is no batch yet.
 */
export function costsPerBatch(index: BoardIndex): Map<string, number | null> {
  const rootOf = new Map(index.chains.map((chain) => [chain.id, rootChain(index, chain)]));
  const batches = new Map<string, number>();
  for (const chain of index.chains) {
    const root = rootOf.get(chain.id);
    if (root) batches.set(root.id, (batches.get(root.id) ?? 0) + index.batchesOf(chain.id).length);
  }
  return new Map(
    index.chains.map((chain) => {
      const root = rootOf.get(chain.id) ?? null;
      const price = root ? priceOf(index, root) : null;
      const made = root ? (batches.get(root.id) ?? 0) : 0;
      return [chain.id, price === null || made === 0 ? null : Math.round(price / made)];
    }),
  );
}

/**
 * What a batch costs in yeast as the season goes on, in the currency's minor unit, by batch: the
 * price that its yeast goes back to, over all batches made from it by then, in the order of their
 * brew days. Null where the price, or the first cake, is not known.
 */
export function costsAsMade(index: BoardIndex): Map<string, number | null> {
  const costs = new Map<string, number | null>();
  const lines = new Map<Chain | null, Batch[]>();
  for (const chain of index.chains) {
    const root = rootChain(index, chain);
    lines.set(root, [...(lines.get(root) ?? []), ...index.batchesOf(chain.id)]);
  }
  for (const [root, batches] of lines) {
    const price = root ? priceOf(index, root) : null;
    for (const [made, { id }] of inBrewOrder(batches).entries())
      costs.set(id, price === null ? null : Math.round(price / (made + 1)));
  }
  return costs;
}

/** By brew day, the undated last; sorting keeps the order of a shelf. */
const inBrewOrder = (batches: readonly Batch[]): Batch[] =>
  batches.toSorted((a, b) => order(a.brewOn ?? '9999', b.brewOn ?? '9999'));

/** The chain at the head of the descent; null where the way up is lost. */
function rootChain(index: BoardIndex, chain: Chain): Chain | null {
  const seen = new Set<string>();
  let at: Chain | undefined = chain;
  while (at && at.start.kind === 'cake' && !seen.has(at.id)) {
    seen.add(at.id);
    const source = index.batch(at.start.batchId);
    at = source?.chainId && source.stage !== 'scrapped' ? index.chain(source.chainId) : undefined;
  }
  return at && at.start.kind !== 'cake' ? at : null;
}

/** A pack without a price of its own costs what the yeast usually does. */
function priceOf(index: BoardIndex, { start, yeastId }: Chain): number | null {
  switch (start.kind) {
    case 'pack':
      return start.price ?? index.yeasts.get(yeastId)?.packPrice ?? null;
    case 'outside':
      return start.price;
    case 'cake':
      return null;
  }
}

/** Packs that a season's shelves ask for. */
export const packsOf = (index: BoardIndex): number =>
  index.chains.filter((chain) => chain.start.kind === 'pack').length;
