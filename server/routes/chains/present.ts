import type { Chain, ChainStart } from '#shared/api/chain.ts';
import type { chain } from '../../db/schema/chain.ts';

export type ChainRow = typeof chain.$inferSelect;

export function presentChain(row: ChainRow): Chain {
  return {
    id: row.id,
    version: row.version,
    name: row.name,
    yeastId: row.yeastId,
    vesselId: row.vesselId,
    lineId: row.lineId,
    position: row.position,
    start: presentStart(row),
  };
}

function presentStart(row: ChainRow): ChainStart {
  const { startKind, startBatchId, startGeneration, startPrice } = row;
  const { startAllergens: allergens, startCultures: cultures } = row;
  if (startKind === 'cake' && startBatchId !== null) return { kind: 'cake', batchId: startBatchId };
  if (startKind === 'outside' && startGeneration !== null)
    return { kind: 'outside', generation: startGeneration, price: startPrice, allergens, cultures };
  return { kind: 'pack', price: startPrice };
}

/** The columns that hold a start; a check in the database keeps them to one kind. */
export function startColumns(start: ChainStart) {
  return {
    startKind: start.kind,
    startBatchId: start.kind === 'cake' ? start.batchId : null,
    startGeneration: start.kind === 'outside' ? start.generation : null,
    startAllergens: start.kind === 'outside' ? start.allergens : null,
    startCultures: start.kind === 'outside' ? start.cultures : null,
    startPrice: start.kind === 'cake' ? null : start.price,
  };
}
