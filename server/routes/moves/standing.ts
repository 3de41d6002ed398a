import type { Batch, Link } from '#shared/api/batch.ts';
import type { Chain } from '#shared/api/chain.ts';
import type { BoardFacts, BoardIndex } from '#shared/chain/board.ts';
import { indexedBoard } from '#shared/chain/indexedBoard.ts';
import { isDeepStrictEqual } from 'node:util';

/** How one batch stands: all that a move may change of it. */
export interface Standing {
  id: string;
  chainId: string | null;
  /** The batch before it on its shelf; null: first. */
  afterId: string | null;
  brewOn: string | null;
  link: Link;
}

/** One side of a move, as the change record keeps it. The moved batch comes first. */
export interface Side {
  batches: Standing[];
  /** The shelf that is there on this side only. */
  chain: Chain | null;
  /** Where the moved batch stands among those on the bench, if it does; null: first, or not there. */
  benchAfterId: string | null;
}

export interface Sides {
  before: Side;
  after: Side;
}

/**
 * What differs between two boards, seen from each. Batches that only moved up in their row do not
 * differ: they still stand after the same one.
 */
export function sidesOf(before: BoardFacts, after: BoardFacts, movedId: string): Sides {
  const shelves = touchedShelves(before, after);
  const [was, is] = [standingsOf(before, shelves), standingsOf(after, shelves)];
  const differs = [...is.values()]
    .filter((row) => row.id !== movedId && !isSame(row, was.get(row.id)))
    .map(({ id }) => id);
  const ids = [movedId, ...differs];
  return {
    before: sideOf(before, was, ids, onlyIn(before, after)),
    after: sideOf(after, is, ids, onlyIn(after, before)),
  };
}

/** A link that a move left alone is the same object on both boards: it need not be read. */
const isSame = (a: Standing, b: Standing | undefined): boolean =>
  b !== undefined &&
  a.chainId === b.chainId &&
  a.afterId === b.afterId &&
  a.brewOn === b.brewOn &&
  (a.link === b.link || isDeepStrictEqual(a.link, b.link));

/** Shelves (null: the bench) of which any row is another one: only there can a standing differ. */
function touchedShelves(before: BoardFacts, after: BoardFacts): Set<string | null> {
  const known = new Map(before.batches.map((row) => [row.id, row]));
  const changed = after.batches.filter((row) => known.get(row.id) !== row);
  return new Set(changed.flatMap((row) => [row.chainId, known.get(row.id)?.chainId ?? null]));
}

/** Rows that a move is about: its batches, the moved one first, and the shelves that it went from and to. */
export function touchesOf({ before, after }: Sides): string[] {
  const moved = [before.batches[0]?.chainId, after.batches[0]?.chainId];
  const shelves = moved.filter((id): id is string => typeof id === 'string');
  return [...new Set([...after.batches.map(({ id }) => id), ...shelves])];
}

function sideOf(
  board: BoardFacts,
  standings: ReadonlyMap<string, Standing>,
  ids: readonly string[],
  chain: Chain | null,
): Side {
  const index = indexedBoard(board);
  const moved = index.batch(ids[0] ?? '');
  return {
    batches: ids.flatMap((id) => standings.get(id) ?? []),
    chain,
    benchAfterId: moved?.chainId === null ? mateBefore(index, moved) : null,
  };
}

const onlyIn = (one: BoardFacts, other: BoardFacts): Chain | null =>
  one.chains.find(({ id }) => !other.chains.some((chain) => chain.id === id)) ?? null;

/** By batch; of all shelves, or of some. */
export function standingsOf(
  board: BoardFacts,
  shelves?: ReadonlySet<string | null>,
): Map<string, Standing> {
  const index = indexedBoard(board);
  return new Map(
    board.batches
      .filter(({ stage, chainId }) => stage !== 'scrapped' && (shelves?.has(chainId) ?? true))
      .map((batch) => [batch.id, standingOf(index, batch)]),
  );
}

function standingOf(index: BoardIndex, batch: Batch): Standing {
  const { id, chainId, brewOn, link } = batch;
  // On the bench the order means nothing to anybody's yeast.
  return { id, chainId, afterId: chainId === null ? null : mateBefore(index, batch), brewOn, link };
}

function mateBefore(index: BoardIndex, { id, chainId }: Batch): string | null {
  const mates = chainId === null ? index.bench : index.batchesOf(chainId);
  return mates[mates.findIndex((mate) => mate.id === id) - 1]?.id ?? null;
}
