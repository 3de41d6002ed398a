import type { Chain, ChainCreate } from '../api/chain.ts';
import { indexBoard, type BoardFacts, type BoardIndex } from './board.ts';

/**
 * A shelf for one batch, from a fresh pack of the yeast it asks for, else of its chain's, else of
 * the first there is; in its own vessel, else in one that no shelf uses. Null where the brewery
 * has no yeast yet.
 */
export function newShelfFor(board: BoardFacts, batchId: string, id: string): ChainCreate | null {
  return proposeShelf(indexBoard(board), batchId, id);
}

export function proposeShelf(index: BoardIndex, batchId: string, id: string): ChainCreate | null {
  const batch = index.batch(batchId);
  if (!batch) return null;
  const asked = batch.yeastId ?? (batch.chainId ? index.chain(batch.chainId)?.yeastId : undefined);
  const yeast = index.yeasts.get(asked ?? '') ?? index.board.yeasts[0];
  if (!yeast) return null;
  const used = new Set(index.chains.map((chain) => chain.vesselId));
  const free = index.board.vessels.find((vessel) => !used.has(vessel.id));
  return {
    id,
    name: freeName(index, yeast.name),
    yeastId: yeast.id,
    vesselId: batch.vesselId ?? free?.id ?? null,
    start: { kind: 'pack', price: yeast.packPrice },
  };
}

/** The yeast's name, with a number where a shelf already bears it. */
function freeName(index: BoardIndex, name: string): string {
  const taken = new Set(index.chains.map((chain) => chain.name));
  if (!taken.has(name)) return name;
  let number = 2;
  while (taken.has(numbered(name, number))) number += 1;
  return numbered(name, number);
}

const LONGEST_NAME = 60;

const numbered = (name: string, number: number): string =>
  `${name.slice(0, LONGEST_NAME - ` ${number}`.length).trimEnd()} ${number}`;

/**
 * A chain as the board's next one: last of the shelves. Its line is that of the cake it starts
 * from, else its own.
 */
export function asLastShelf(index: BoardIndex, create: ChainCreate): Chain {
  const last = index.chains.at(-1);
  const sourceId = create.start.kind === 'cake' ? index.batch(create.start.batchId)?.chainId : null;
  const lineId = (sourceId ? index.chain(sourceId)?.lineId : undefined) ?? create.id;
  return { ...create, version: 1, lineId, position: last ? last.position + 1 : 0 };
}
