import type { Batch, Link } from '../api/batch.ts';
import type { Board } from '../api/board.ts';
import type { Chain } from '../api/chain.ts';
import type { Vessel } from '../api/vessel.ts';
import type { Yeast } from '../api/yeast.ts';

/** What the judgements and moves of a season read of its board. */
export type BoardFacts = Pick<
  Board,
  'season' | 'today' | 'houseRules' | 'yeasts' | 'vessels' | 'chains' | 'batches'
>;

/** A season's order: which batch stands where, and whose cake goes under which wort. */
export interface Layout {
  batch(id: string): Batch | undefined;
  chain(id: string): Chain | undefined;
  /** A chain's batches in order, without scrapped ones. */
  batchesOf(chainId: string): readonly Batch[];
  /** Chains that start from part of this batch's cake. */
  branchesOf(batchId: string): readonly Chain[];
  /** The batch before in the chain, or the one whose cake starts the chain; null: none. */
  predecessor(batchId: string): Batch | null;
}

/** A board with its rows found by id and its chains in order. */
export interface BoardIndex extends Layout {
  board: BoardFacts;
  /** In the order of the shelves. */
  chains: readonly Chain[];
  yeasts: ReadonlyMap<string, Yeast>;
  vessels: ReadonlyMap<string, Vessel>;
  /** Batches that are on no chain yet, in order, without scrapped ones. */
  bench: readonly Batch[];
  /** Scrapped batches carry no cake: they stand on no shelf and not on the bench. */
  scrapped: readonly Batch[];
}

/** A link of which nothing is settled: what a batch has after the batch before it changed. */
export const UNSETTLED_LINK: Link = {
  takenOn: null,
  keepL: null,
  keepWhole: false,
  leftAboveL: null,
  cakeC: null,
  starter: false,
  typed: {},
  acceptance: null,
};

const NONE: readonly never[] = [];

/** True of a batch that may be moved and whose dates may shift. */
export const isPencilled = (batch: Batch): boolean => batch.stage === 'pencilled';

/**
 * Reads a board into maps and ordered lists. Places need not be gapless; equal places are told
 * apart by id, so that two copies of a board always agree.
 */
export function indexBoard(board: BoardFacts): BoardIndex {
  const batches = byId(board.batches);
  const chains = [...board.chains].sort((a, b) => a.position - b.position || order(a.id, b.id));
  const chainById = byId(chains);
  const { inChain, bench, scrapped } = standings(board.batches);
  const branches = groupBranches(chains);
  const layout = {
    batch: (id: string) => batches.get(id),
    chain: (id: string) => chainById.get(id),
    batchesOf: (chainId: string) => inChain.get(chainId) ?? NONE,
    branchesOf: (batchId: string) => branches.get(batchId) ?? NONE,
  };
  return {
    ...layout,
    predecessor: (batchId) => predecessorIn(layout, batchId),
    board,
    chains,
    yeasts: byId(board.yeasts),
    vessels: byId(board.vessels),
    bench,
    scrapped,
  };
}

/** The batch whose cake goes under this one, by the order of any layout. */
export function predecessorIn(layout: Omit<Layout, 'predecessor'>, batchId: string): Batch | null {
  const batch = layout.batch(batchId);
  if (!batch || batch.chainId === null || batch.stage === 'scrapped') return null;
  const mates = layout.batchesOf(batch.chainId);
  const at = mates.findIndex((mate) => mate.id === batchId);
  if (at > 0) return mates[at - 1] ?? null;
  return sourceOf(layout, layout.chain(batch.chainId));
}

/** The batch whose cake starts a chain; null where it starts otherwise or the batch is gone. */
export function sourceOf(layout: Pick<Layout, 'batch'>, chain: Chain | undefined): Batch | null {
  if (chain?.start.kind !== 'cake') return null;
  const source = layout.batch(chain.start.batchId);
  return source && source.stage !== 'scrapped' ? source : null;
}

function standings(all: readonly Batch[]) {
  const inChain = new Map<string, Batch[]>();
  const bench: Batch[] = [];
  const scrapped: Batch[] = [];
  for (const batch of all) {
    if (batch.stage === 'scrapped') scrapped.push(batch);
    else if (batch.chainId === null) bench.push(batch);
    else push(inChain, batch.chainId, batch);
  }
  for (const list of [...inChain.values(), bench, scrapped])
    list.sort((a, b) => a.place - b.place || order(a.id, b.id));
  return { inChain, bench, scrapped };
}

function groupBranches(chains: readonly Chain[]): Map<string, Chain[]> {
  const branches = new Map<string, Chain[]>();
  for (const chain of chains)
    if (chain.start.kind === 'cake') push(branches, chain.start.batchId, chain);
  return branches;
}

const byId = <T extends { id: string }>(rows: readonly T[]): Map<string, T> =>
  new Map(rows.map((row) => [row.id, row]));

export const order = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);

export function push<T>(lists: Map<string, T[]>, key: string, value: T): void {
  const list = lists.get(key);
  if (list) list.push(value);
  else lists.set(key, [value]);
}
